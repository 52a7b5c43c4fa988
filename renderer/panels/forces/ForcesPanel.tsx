import type { JSX } from 'react';
import { useWindow } from '../../shell/services.tsx';
import { shownForces } from '../../store/shownForces.ts';
import { CombinationTable } from './CombinationTable.tsx';
import type { ForcesView } from './ForcesBar.tsx';
import { LoadsEditor } from './LoadsEditor.tsx';
import './forces.css';

interface ForcesPanelProps {
  readonly view: ForcesView;
  onView(view: ForcesView): void;
}

/** Combinations and what they come to in the bay in hand; or cases, loads and factors. */
export function ForcesPanel({ view, onView }: ForcesPanelProps): JSX.Element {
  const there = useWindow((state) => shownForces(state) !== null);
  if (view === 'loads') return <LoadsEditor />;
  if (there) return <CombinationTable />;
  return (
    <div className="forces-empty">
      <h3>Nothing acts on this project yet</h3>
      <ol>
        <li>Add a case: dead load, imposed load, wind.</li>
        <li>Place its loads: wind on a gable, a push on a node, a load along a bar.</li>
        <li>Take the practice’s combinations, or make your own.</li>
      </ol>
      <button type="button" className="button" onClick={() => onView('loads')}>
        Say what acts
      </button>
    </div>
  );
}
