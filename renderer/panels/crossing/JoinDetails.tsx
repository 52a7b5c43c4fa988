import type { JSX } from 'react';
import type { Bar, Crossing, Layout } from '../../../core/layout/model.ts';
import type { Join, LineHolder, UnitSystem } from '../../../core/project/model.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { Row } from '../../controls/Row.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { useActions } from '../../shell/services.tsx';
import { HolderField } from '../recipe/HolderField.tsx';

interface JoinDetailsProps {
  readonly crossing: Crossing;
  readonly layout: Layout;
  readonly units: UnitSystem;
  onJoin(join: Join): void;
}

/** What the chosen join still leaves open: the packer, which bar is cut, the bolts to a purlin and what holds it. */
export function JoinDetails({ crossing, layout, units, onJoin }: JoinDetailsProps): JSX.Element | null {
  const { join } = crossing;
  const b = layout.bars.get(crossing.b);
  const a = layout.bars.get(crossing.a);
  switch (join?.kind) {
    case 'packed':
      return (
        <div className="join-details">
          <CheckField
            label="Packer as thick as the gap"
            checked={join.packer === null}
            onChange={(auto) =>
              onJoin({ kind: 'packed', packer: auto ? null : Math.max(1, Math.round(crossing.gap)) })
            }
          />
          {join.packer !== null && (
            <LengthField
              label="Packer"
              mm={join.packer}
              units={units}
              least={0.5}
              most={200}
              step={1}
              small
              onChange={(packer) => {
                onJoin({ kind: 'packed', packer });
                return null;
              }}
            />
          )}
        </div>
      );
    case 'cut':
      return (
        <div className="join-details">
          <Segmented
            label="Bar that is cut"
            value={join.cutBar}
            options={[a, b].flatMap((bar) =>
              bar === undefined ? [] : [{ value: bar.key, label: bar.mark }],
            )}
            onChange={(cutBar) => onJoin({ kind: 'cut', cutBar })}
          />
        </div>
      );
    case 'purlin':
      return (
        <div className="join-details">
          <Segmented
            label="Bolts across"
            value={join.boltsAcross === 2 ? 'two' : 'one'}
            options={[
              { value: 'one', label: 'One' },
              { value: 'two', label: 'Two, hold twist' },
            ]}
            onChange={(bolts) => onJoin({ kind: 'purlin', boltsAcross: bolts === 'two' ? 2 : 1 })}
          />
          {b?.line != null && <LineHolderFields bar={b} />}
        </div>
      );
    default:
      return null;
  }
}

/** What holds the purlin along itself, without which it holds nothing in the plane. */
function LineHolderFields({ bar }: { readonly bar: Bar }): JSX.Element | null {
  const actions = useActions();
  const { line } = bar;
  if (line === null) return null;
  const setHolder = (heldBy: LineHolder): void => {
    actions.edit({ kind: 'line holder', bay: bar.bay, line: line.id, heldBy });
  };
  if (line.ownPanelPoint !== null)
    return (
      <p className="join-note">{bar.mark} runs through a panel point of its own bay, and is held there.</p>
    );
  return (
    <>
      <Row label={`${bar.mark} held by`}>
        <HolderField line={line.id} bay={bar.bay} heldBy={line.heldBy} onChange={setHolder} />
      </Row>
      {line.heldBy.kind === 'vouched' && (
        <TextField
          label="Because"
          value={line.heldBy.reason}
          check={(text) => (text === '' ? 'Say what holds it: the checker will ask.' : null)}
          onChange={(reason) => {
            setHolder({ kind: 'vouched', reason });
            return null;
          }}
        />
      )}
    </>
  );
}
