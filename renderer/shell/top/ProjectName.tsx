import type { JSX } from 'react';
import { useDraft } from '../../controls/useDraft.ts';
import { isChanged, presentProject } from '../../store/shown.ts';
import { useActions, useWindow } from '../services.tsx';

/** The project's name, to be changed in place, and whether its file is up to date. */
export function ProjectName(): JSX.Element {
  const actions = useActions();
  const name = useWindow((state) => presentProject(state).name);
  const saved = useWindow((state) => savedWord(isChanged(state), state.file.token));
  const file = useWindow((state) => state.file.name);
  const draft = useDraft(
    name,
    (text) =>
      text.trim() === ''
        ? { ok: false, message: 'A project needs a name.' }
        : { ok: true, value: text.trim() },
    (to) => actions.edit({ kind: 'name project', name: to })?.[0]?.what ?? null,
  );
  return (
    <div className="project-name">
      <input
        aria-label="Project name"
        aria-invalid={draft.message !== null || undefined}
        title={draft.message ?? file}
        autoComplete="off"
        spellCheck={false}
        value={draft.text}
        onChange={(event) => draft.type(event.target.value)}
        onBlur={() => draft.commit(true)}
        onKeyDown={(event) => {
          if (event.key === 'Enter') draft.commit(false);
          if (event.key === 'Escape') draft.drop();
        }}
      />
      <span className="project-saved">{saved}</span>
    </div>
  );
}

function savedWord(changed: boolean, token: string | null): string {
  if (changed) return 'changed';
  return token === null ? 'not in a file yet' : 'saved';
}
