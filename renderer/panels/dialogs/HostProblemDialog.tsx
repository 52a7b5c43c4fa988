import type { JSX } from 'react';
import type { HostProblem } from '../../host/host.ts';
import { useServices } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

interface HostProblemDialogProps {
  /** "open", "save", "print". */
  readonly doing: string;
  readonly problem: HostProblem;
}

/** A file could not be read or written, and what to do about it. The project stays as it is. */
export function HostProblemDialog({ doing, problem }: HostProblemDialogProps): JSX.Element {
  const { actions, documents } = useServices();
  const saving = doing === 'save';
  return (
    <DialogFrame
      title={`Could not ${doing}`}
      question
      onClose={actions.closeDialog}
      buttons={
        <>
          {saving && (
            <button
              type="button"
              className="button"
              onClick={() => {
                actions.closeDialog();
                void documents.saveAs();
              }}
            >
              Save as…
            </button>
          )}
          <button type="button" className="button main" data-first onClick={actions.closeDialog}>
            Close
          </button>
        </>
      }
    >
      <p>{problemText(problem)}</p>
      {saving && <p>Nothing was saved; the project is as you left it.</p>}
    </DialogFrame>
  );
}

function problemText(problem: HostProblem): string {
  const name = problem.name === '' ? 'The file' : problem.name;
  switch (problem.kind) {
    case 'changed on disk':
      return `${name} was written by something else since it was opened here.`;
    case 'not found':
      return `${name} is not where it was. It may have been moved, renamed or deleted; look for it with Open…`;
    case 'not allowed':
      return `${name} may not be read or written here. Ask for the right to it, or use another folder.`;
    case 'too large':
      return `${name} is larger than any project: it is probably another kind of file.`;
    case 'no room':
      return `There is no room left where ${name} should go. Make room, or save somewhere else.`;
    case 'failed':
      return `${name}: ${problem.detail}`;
    default:
      return problem satisfies never;
  }
}
