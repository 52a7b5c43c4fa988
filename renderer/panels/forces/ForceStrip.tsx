import { type JSX, useEffect, useState } from 'react';
import { useStore } from 'zustand';
import { Key } from '../../controls/Key.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { useServices } from '../../shell/services.tsx';
import { caseForArrows } from '../../shell/view/forcesToShow.ts';
import { presentProject } from '../../store/shown.ts';
import { shownForceState, shownForces } from '../../store/shownForces.ts';
import './forces.css';

/** ms for each combination when going through all. */
const EACH = 1400;

/** Under the bar of views while forces are drawn: which combination, and which case arrows go into. */
export function ForceStrip(): JSX.Element {
  const { store, actions } = useServices();
  const state = useStore(store);
  const forces = shownForces(state);
  const one = shownForceState(state);
  const [going, setGoing] = useState(false);
  useEffect(() => {
    if (!going) return;
    const timer = setInterval(() => actions.stepForceState(1), EACH);
    return () => clearInterval(timer);
  }, [going, actions]);
  const { cases = [] } = presentProject(state).actions ?? {};
  const into = caseForArrows(state);
  const states = forces?.states ?? [];
  const at = one === null ? 0 : states.findIndex(({ id }) => id === one.id) + 1;
  return (
    <div className="view-strip force-strip" role="toolbar" aria-label="Forces">
      {states.length > 0 && (
        <>
          <input
            type="range"
            className="force-slider"
            aria-label="Combination"
            aria-valuetext={one?.name ?? 'greatest of all'}
            min={0}
            max={states.length}
            step={1}
            value={at}
            onChange={(event) => {
              setGoing(false);
              actions.chooseForceState(states[Number(event.target.value) - 1]?.id ?? null);
            }}
          />
          <span className="force-says" role="status" title={one?.name}>
            <b>{one === null ? 'Greatest of all' : `${at} of ${states.length}`}</b>{' '}
            {one === null ? `${states.length} combinations` : `${one.name}, ${one.use}`}
          </span>
          <button type="button" className="button" aria-pressed={going} onClick={() => setGoing(!going)}>
            {going ? 'Stop' : 'Go through all'}
          </button>
          <span className="second force-keys">
            <Key>,</Key> <Key>.</Key>
          </span>
        </>
      )}
      {states.length === 0 && (
        <span className="second">
          {cases.length === 0
            ? 'Nothing acts yet. The Forces table below says how to begin.'
            : 'No combination yet: the Forces table below has those of the practice.'}
        </span>
      )}
      {into !== null && (
        <span className="force-into">
          <span className="force-into-words">Arrows go into</span>
          <SelectField
            bare
            label="Case that arrows go into"
            value={into.id}
            options={cases.map(({ id, name }) => ({ value: id, label: name === '' ? id : `${id} ${name}` }))}
            onChange={(loadCase) => actions.setView({ loadCase })}
          />
        </span>
      )}
    </div>
  );
}
