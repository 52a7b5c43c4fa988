import type { JSX } from 'react';
import { type LoadCase, NO_ACTIONS } from '../../../core/project/actions.ts';
import { useActions, useWindow } from '../../shell/services.tsx';
import { presentProject } from '../../store/shown.ts';
import { CarryFields } from './CarryFields.tsx';
import { CaseFields } from './CaseFields.tsx';
import { CombinationFields } from './CombinationFields.tsx';
import { freshId } from './freshId.ts';

/** Cases with their loads on the left, combinations on the right. Every change is a step that can be undone. */
export function LoadsEditor(): JSX.Element {
  const actions = useActions();
  const project = useWindow(presentProject);
  const trying = useWindow((state) => state.trying !== null);
  const given = project.actions ?? NO_ACTIONS;
  const addCase = (kind: LoadCase['kind'], letter: string, name: string): void => {
    const id = freshId(
      letter,
      given.cases.map((each) => each.id),
    );
    actions.edit({
      kind: 'load case',
      id,
      loadCase: { id, name, kind, selfWeight: kind === 'permanent', reverses: kind === 'wind', loads: [] },
    });
  };
  return (
    <fieldset className="loads" disabled={trying}>
      <legend className="unseen">What acts</legend>
      <section className="loads-cases" aria-label="Cases">
        <div className="loads-head">
          <h3>Cases</h3>
          <span className="loads-add">
            Add
            <button
              type="button"
              className="link-button"
              onClick={() => addCase('permanent', 'G', 'dead load')}
            >
              dead load
            </button>
            <button
              type="button"
              className="link-button"
              onClick={() => addCase('imposed', 'Q', 'imposed load')}
            >
              imposed load
            </button>
            <button type="button" className="link-button" onClick={() => addCase('wind', 'W', 'wind')}>
              wind
            </button>
            <button type="button" className="link-button" onClick={() => addCase('other', 'A', 'other')}>
              other
            </button>
          </span>
        </div>
        {given.cases.length === 0 && (
          <p className="second">
            No case yet. Wind pushes and pulls: it is looked at both ways round by itself.
          </p>
        )}
        {given.cases.map((loadCase) => (
          <CaseFields key={loadCase.id} loadCase={loadCase} project={project} />
        ))}
        <CarryFields project={project} />
      </section>
      <CombinationFields project={project} />
    </fieldset>
  );
}
