import { type JSX, type KeyboardEvent, useRef } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { ForceState, Forces } from '../../../core/forces/model.ts';
import type { Bar, BayLayout } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce, showMovement } from '../../../core/units/loads.ts';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { shownForces } from '../../store/shownForces.ts';
import { greatestOf, leastReaction, mostUsedIn } from './envelope.ts';
import { ForceCell } from './ForceCell.tsx';

/** One row a combination, every way round; one column a diagonal of the bay in hand. The chosen row is the one that is drawn. */
export function CombinationTable(): JSX.Element | null {
  const assessment = useWindow(shownAssessment);
  const forces = useWindow(shownForces);
  const bayId = useWindow((state) => state.selection.bay);
  const units = useWindow((state) => shownProject(state).settings.units);
  const chosen = useWindow((state) => state.view.forceState);
  const drawn = useWindow((state) => state.view.forces);
  const bar = useWindow((state) => state.selection.bar);
  const actions = useActions();
  const body = useRef<HTMLTableSectionElement>(null);
  if (assessment === null || forces === null) return null;
  const { layout } = assessment;
  const bay = layout.bays.find(({ id }) => id === bayId) ?? layout.bays[0];
  if (!bay) return null;
  const bars = bay.diagonals.flatMap((id) => layout.bars.get(id) ?? []);
  const ids = [null, ...forces.states.map(({ id }) => id)];
  const onKeyDown = (event: KeyboardEvent): void => {
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (step === 0) return;
    event.preventDefault();
    const at = Math.min(ids.length - 1, Math.max(0, ids.indexOf(chosen) + step));
    actions.chooseForceState(ids[at] ?? null);
    body.current?.querySelectorAll<HTMLButtonElement>('button.combination')[at]?.focus();
  };
  const shared = { bars, bay, forces, assessment, units };
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a part that scrolls must be reached by keys
    <section className="forces-scroll" tabIndex={0} aria-label={`Forces in ${bay.id}`}>
      <table className="forces-table">
        <thead>
          <tr>
            <th className="l">No.</th>
            <th className="l">Combination</th>
            {bars.map(({ id, mark }) => (
              <th key={id} data-chosen={id === bar || undefined}>
                {mark}
              </th>
            ))}
            <th>
              Squeezed most<small>other members</small>
            </th>
            <th>
              Footing<small>least, down</small>
            </th>
            <th>
              Moves<small>with slack</small>
            </th>
            <th>Most used</th>
          </tr>
        </thead>
        <tbody ref={body} onKeyDown={onKeyDown}>
          <Row
            {...shared}
            state={null}
            number=""
            chosen={drawn && chosen === null}
            onChoose={actions.chooseForceState}
          />
          {forces.states.map((state, index) => (
            <Row
              key={state.id}
              {...shared}
              state={state}
              number={String(index + 1)}
              chosen={drawn && chosen === state.id}
              onChoose={actions.chooseForceState}
            />
          ))}
        </tbody>
      </table>
    </section>
  );
}

interface RowProps {
  readonly state: ForceState | null;
  readonly number: string;
  readonly chosen: boolean;
  readonly bars: readonly Bar[];
  readonly bay: BayLayout;
  readonly forces: Forces;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
  onChoose(state: string | null): void;
}

function Row({
  state,
  number,
  chosen,
  bars,
  bay,
  forces,
  assessment,
  units,
  onChoose,
}: RowProps): JSX.Element {
  const noWay = state?.noWay.some(({ bays }) => bays.includes(bay.id)) ?? false;
  const states = state === null ? forces.states : [state];
  const strut = greatestOf(states, bay, assessment.layout);
  const footing = leastReaction(states, bay, assessment.layout);
  const drifts = states.flatMap(({ drifts: all }) => all.filter((drift) => drift.bay === bay.id));
  const drift = drifts.reduce((most, each) => Math.max(most, Math.abs(each.elastic)), 0);
  const taken = drifts.reduce<number | null>(
    (most, { withTakeUp }) => (withTakeUp === null ? most : Math.max(most ?? 0, Math.abs(withTakeUp))),
    null,
  );
  const used = mostUsedIn(state, bay, assessment);
  return (
    <tr data-chosen={chosen || undefined}>
      <td className="l">{number}</td>
      <th scope="row" className="l">
        <button
          type="button"
          className="combination"
          aria-pressed={chosen}
          onClick={() => onChoose(state?.id ?? null)}
        >
          {state === null ? 'greatest of all' : state.name}
          <small>{state === null ? '' : state.use}</small>
        </button>
      </th>
      {noWay ? (
        <td colSpan={bars.length} className="l no-way">
          <SeverityGlyph severity="must fix" /> no way to carry it
        </td>
      ) : (
        bars.map(({ id }) => (
          <td key={id}>
            <ForceCell states={states} bar={id} units={units} />
          </td>
        ))
      )}
      <td>{strut === null ? '–' : showForce(strut, units, 'bare')}</td>
      <td>
        {footing === null ? (
          '–'
        ) : (
          <>
            {footing < 0 && <SeverityGlyph severity="look into" />} {showForce(footing, units, 'bare')}
            {footing < 0 && <span className="unseen"> holds down</span>}
          </>
        )}
      </td>
      <td>
        {drifts.length === 0 ? '–' : showMovement(drift, units, 'bare')}
        {taken !== null && <small>{showMovement(taken, units)}</small>}
      </td>
      <td>{used === null ? '–' : `${(100 * used).toFixed(0)} %`}</td>
    </tr>
  );
}
