import type { JSX } from 'react';
import type { Forces } from '../../../../core/forces/model.ts';
import type { Bar } from '../../../../core/layout/model.ts';
import type { UnitSystem } from '../../../../core/project/model.ts';
import { showForce } from '../../../../core/units/loads.ts';
import { useActions } from '../../../shell/services.tsx';
import { ForceGlyph } from '../../forces/ForceGlyph.tsx';

const TALL = 26;

interface CombinationBarsProps {
  readonly bar: Bar;
  readonly forces: Forces;
  readonly chosen: string | null;
  readonly units: UnitSystem;
}

/** The bar in every combination: how hard it is pulled or squeezed, or that it hangs slack. One press shows that combination. */
export function CombinationBars({ bar, forces, chosen, units }: CombinationBarsProps): JSX.Element {
  const actions = useActions();
  const most = forces.states.reduce(
    (top, state) => Math.max(top, Math.abs(state.forces.get(bar.id) ?? 0)),
    1,
  );
  return (
    <ol className="combination-bars" aria-label={`${bar.mark} in each combination`}>
      {forces.states.map((state, index) => {
        const force = state.forces.get(bar.id);
        const slack = state.slack.has(bar.id);
        const way = force === undefined ? 'not carried' : slack ? 'slack' : force < 0 ? 'squeezed' : 'pulled';
        const figure = force === undefined || slack ? '' : showForce(Math.abs(force), units, 'bare');
        return (
          <li key={state.id}>
            <button
              type="button"
              aria-pressed={state.id === chosen}
              title={`${state.name}: ${way} ${figure}`}
              aria-label={`${index + 1}, ${state.name}: ${way} ${figure}`}
              onClick={() => actions.chooseForceState(state.id)}
            >
              <span className="combination-figure">{slack ? 'slack' : figure || '–'}</span>
              <span className="combination-stand">
                {slack || force === undefined ? (
                  <ForceGlyph kind="slack" />
                ) : (
                  <span
                    className="combination-bar"
                    data-way={way}
                    style={{ height: `${Math.max(1, (TALL * Math.abs(force)) / most)}px` }}
                  />
                )}
              </span>
              <span>{index + 1}</span>
            </button>
          </li>
        );
      })}
    </ol>
  );
}
