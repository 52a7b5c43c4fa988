import type { JSX } from 'react';
import type { Pattern, Tier, UnitSystem } from '../../../core/project/model.ts';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Row } from '../../controls/Row.tsx';
import { PatternField } from './PatternField.tsx';
import { PatternMenu } from './PatternMenu.tsx';
import { withTierChanged, withTierCount } from './tiers.ts';

interface TierFieldsProps {
  /** "Tier" or "Panel". */
  readonly word: string;
  readonly letter: string;
  readonly tiers: readonly Tier[];
  readonly units: UnitSystem;
  onChange(tiers: readonly Tier[], what: string): string | null;
}

/** The tiers of a wall, or the panels of a slope: how many, how high each, and how they are braced. Topmost first, as they stand. */
export function TierFields({ word, letter, tiers, units, onChange }: TierFieldsProps): JSX.Element {
  const lower = word.toLowerCase();
  const size = word === 'Tier' ? 'height' : 'length';
  const setPatterns = (pattern: Pattern): string | null =>
    onChange(
      tiers.map((tier) => ({ ...tier, pattern })),
      `${lower} patterns`,
    );
  return (
    <>
      <NumberField
        label={`${word}s`}
        value={tiers.length}
        least={1}
        most={40}
        onChange={(count) => onChange(withTierCount(tiers, count, letter), `the number of ${lower}s`)}
      />
      {tiers
        .map((tier, index) => {
          const name = `${lower} ${index + 1}`;
          return (
            <Row key={tier.id} label={`${word} ${index + 1}`}>
              <LengthField
                bare
                label={`${word} ${index + 1} ${size}`}
                mm={tier.height}
                units={units}
                least={100}
                most={50_000}
                onChange={(height) =>
                  onChange(withTierChanged(tiers, tier.id, { height }), `${name} ${size}`)
                }
              />
              <PatternMenu
                of={name}
                pattern={tier.pattern}
                onChange={(pattern) =>
                  onChange(withTierChanged(tiers, tier.id, { pattern }), `${name} pattern`)
                }
                onRemove={
                  tiers.length < 2
                    ? null
                    : () =>
                        onChange(
                          tiers.filter(({ id }) => id !== tier.id),
                          `the number of ${lower}s`,
                        )
                }
              />
            </Row>
          );
        })
        .reverse()}
      <PatternField label="Pattern" pattern={commonPattern(tiers)} onChange={setPatterns} />
    </>
  );
}

function commonPattern(tiers: readonly Tier[]): Pattern | null {
  const [first, ...rest] = tiers;
  return first !== undefined && rest.every(({ pattern }) => pattern === first.pattern) ? first.pattern : null;
}
