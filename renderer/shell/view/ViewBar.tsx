import type { JSX } from 'react';
import { Key } from '../../controls/Key.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { shownAssessment } from '../../store/shown.ts';
import type { ViewName } from '../../store/windowState.ts';
import { useActions, useWindow } from '../services.tsx';

const VIEWS: readonly { readonly name: ViewName; readonly label: string }[] = [
  { name: 'elevation', label: 'Elevation' },
  { name: 'plan', label: 'Plan' },
  { name: 'side', label: 'Side' },
  { name: 'axonometric', label: 'Axonometric' },
];

/** Named views, how large the angles are drawn, and whether the chosen one bows. */
export function ViewBar(): JSX.Element {
  const actions = useActions();
  const view = useWindow((state) => state.view);
  const mark = useWindow((state) => {
    const { bar } = state.selection;
    const found = bar === null ? undefined : shownAssessment(state)?.layout.bars.get(bar);
    return found?.angle == null ? null : found.mark;
  });
  return (
    <div className="view-bar" role="toolbar" aria-label="View">
      <div className="view-names">
        {VIEWS.map(({ name, label }) => (
          <button
            key={name}
            type="button"
            className="view-name"
            aria-pressed={view.name === name && !view.turned}
            onClick={() => actions.look(name)}
          >
            {label}
          </button>
        ))}
      </div>
      <div className="view-tools">
        <span className="view-angles">
          <span aria-hidden="true">Angles</span>
          <Segmented
            bare
            label="Angles drawn"
            value={view.scale}
            options={[
              { value: 'true', label: 'true' },
              { value: 'doubled', label: 'doubled' },
            ]}
            onChange={(scale) => actions.setView({ scale })}
          />
        </span>
        <button
          type="button"
          className="toggle"
          aria-pressed={view.bow && !view.forces}
          aria-keyshortcuts="B"
          onClick={() => actions.setBow(!view.bow || view.forces)}
        >
          <span className="toggle-box" aria-hidden="true" />
          Bow{mark === null ? '' : ` ${mark}`} <Key>B</Key>
        </button>
        {mark !== null && (
          <button
            type="button"
            className="toggle"
            aria-pressed={view.push}
            aria-keyshortcuts="P"
            onClick={() => actions.setPushMode(!view.push)}
          >
            <span className="toggle-box" aria-hidden="true" />
            Push <Key>P</Key>
          </button>
        )}
        <button
          type="button"
          className="toggle"
          aria-pressed={view.forces}
          aria-keyshortcuts="F"
          onClick={() => actions.showForces(!view.forces)}
        >
          <span className="toggle-box" aria-hidden="true" />
          Forces <Key>F</Key>
        </button>
        <button
          type="button"
          className="toggle view-trail"
          aria-pressed={view.trail}
          aria-keyshortcuts="T"
          onClick={() => actions.setView({ trail: !view.trail })}
        >
          <span className="toggle-box" aria-hidden="true" />
          Trail <Key>T</Key>
        </button>
      </div>
    </div>
  );
}
