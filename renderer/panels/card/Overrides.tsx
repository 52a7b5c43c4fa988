import { type JSX, useState } from 'react';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { LengthOverride, UnitSystem } from '../../../core/project/model.ts';
import type { Restraint } from '../../../core/restraint/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { useActions, useWindow } from '../../shell/services.tsx';
import { Fold } from '../recipe/Fold.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { OverrideForm } from './OverrideForm.tsx';

interface OverridesProps {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly restraint: Restraint | null;
  readonly units: UnitSystem;
}

/** Lengths taken by hand in place of those found from the marks, each with the reason that every output shows. */
export function Overrides({ bar, angle, restraint, units }: OverridesProps): JSX.Element {
  const actions = useActions();
  const trying = useWindow((state) => state.trying !== null);
  const [adding, setAdding] = useState(false);
  const overrides = angle.mark.overrides ?? [];
  const put = (list: readonly LengthOverride[], label: string): string | null =>
    refusalText(
      actions.edit(
        list.length === 0
          ? { kind: 'bars', bars: [bar.id], change: {}, clear: ['overrides'] }
          : { kind: 'bars', bars: [bar.id], change: { overrides: list } },
        label,
      ),
    );
  return (
    <Fold
      title="Lengths by hand"
      aside={overrides.length === 0 ? 'none' : String(overrides.length)}
      open={overrides.length > 0}
    >
      <fieldset disabled={trying} className="overrides">
        <legend className="unseen">Lengths by hand of {bar.mark}</legend>
        <ul>
          {overrides.map((override) => (
            <li key={override.axis} className="override">
              <span>
                <b>{override.axis}</b> {takenText(override, units)}
                <em>“{override.reason}”</em>
              </span>
              <button
                type="button"
                className="link-button"
                onClick={() =>
                  put(
                    overrides.filter(({ axis }) => axis !== override.axis),
                    `Take back the length about ${override.axis} of ${bar.mark}`,
                  )
                }
              >
                Take back
              </button>
            </li>
          ))}
        </ul>
        {adding ? (
          <OverrideForm
            restraint={restraint}
            units={units}
            onDone={() => setAdding(false)}
            onTake={(override) =>
              put(
                [...overrides.filter(({ axis }) => axis !== override.axis), override],
                `Take a length about ${override.axis} of ${bar.mark} by hand`,
              )
            }
          />
        ) : (
          <div className="recipe-add">
            <button type="button" className="link-button" onClick={() => setAdding(true)}>
              Take another length, with a reason
            </button>
          </div>
        )}
      </fieldset>
    </Fold>
  );
}

function takenText({ length, factor }: LengthOverride, units: UnitSystem): string {
  const taken = length === null ? 'the length found' : showLength(length, units, 'spoken');
  return factor === 1 ? taken : `${taken} × ${factor}`;
}
