import type { JSX } from 'react';
import type { CaseKind, Load, LoadCase } from '../../../core/project/actions.ts';
import type { Project } from '../../../core/project/model.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { IconButton } from '../../controls/IconButton.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { useActions } from '../../shell/services.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { freshId } from './freshId.ts';
import { LoadFields } from './LoadFields.tsx';
import { firstLoad, hasPlaceFor, LOAD_KINDS } from './loadKinds.ts';

const KINDS: readonly { readonly value: CaseKind; readonly label: string }[] = [
  { value: 'permanent', label: 'permanent' },
  { value: 'imposed', label: 'imposed' },
  { value: 'wind', label: 'wind' },
  { value: 'other', label: 'other' },
];

interface CaseFieldsProps {
  readonly loadCase: LoadCase;
  readonly project: Project;
}

/** One case: what it is, and its loads one by one. */
export function CaseFields({ loadCase, project }: CaseFieldsProps): JSX.Element {
  const actions = useActions();
  const set = (change: Partial<LoadCase>): string | null =>
    refusalText(actions.edit({ kind: 'load case', id: loadCase.id, loadCase: { ...loadCase, ...change } }));
  const add = (kind: Load['kind']): void => {
    const id = freshId(
      'l1',
      loadCase.loads.map((each) => each.id),
    ).replace(/^l1(?=\d)/, 'l');
    const load = firstLoad(kind, id, project);
    if (load !== null) actions.edit({ kind: 'load', loadCase: loadCase.id, id, load });
  };
  return (
    <section className="case" aria-label={`Case ${loadCase.id}`}>
      <div className="case-head">
        <b>{loadCase.id}</b>
        <TextField
          bare
          label={`Name of case ${loadCase.id}`}
          value={loadCase.name}
          onChange={(name) => set({ name })}
        />
        <SelectField
          bare
          label={`Kind of case ${loadCase.id}`}
          value={loadCase.kind}
          options={KINDS}
          onChange={(kind) => set({ kind })}
        />
        <IconButton
          label={`Remove case ${loadCase.id}`}
          onClick={() => actions.edit({ kind: 'load case', id: loadCase.id, loadCase: null })}
        >
          <CloseSign />
        </IconButton>
      </div>
      <div className="case-checks">
        <CheckField
          label="own weight of the bars"
          checked={loadCase.selfWeight}
          onChange={(selfWeight) => set({ selfWeight })}
        />
        <CheckField
          label="acts either way"
          checked={loadCase.reverses}
          onChange={(reverses) => set({ reverses })}
        />
      </div>
      <ul className="case-loads">
        {loadCase.loads.map((load) => (
          <LoadFields key={load.id} load={load} loadCase={loadCase} project={project} />
        ))}
      </ul>
      <div className="loads-add">
        Add
        {LOAD_KINDS.filter(({ kind }) => hasPlaceFor(kind, project)).map(({ kind, label }) => (
          <button key={kind} type="button" className="link-button" onClick={() => add(kind)}>
            {label}
          </button>
        ))}
      </div>
    </section>
  );
}
