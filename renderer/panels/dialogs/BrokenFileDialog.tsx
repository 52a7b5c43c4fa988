import type { JSX } from 'react';
import type { ProjectProblem } from '../../../core/project/problem.ts';
import { useActions } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

interface BrokenFileDialogProps {
  readonly name: string;
  readonly problems: readonly ProjectProblem[];
}

/** A file that cannot be opened: each thing wrong with it, where it is, and what to do. */
export function BrokenFileDialog({ name, problems }: BrokenFileDialogProps): JSX.Element {
  const actions = useActions();
  return (
    <DialogFrame
      title="This file cannot be opened"
      question
      onClose={actions.closeDialog}
      buttons={
        <button type="button" className="button main" data-first onClick={actions.closeDialog}>
          Close
        </button>
      }
    >
      <p>
        {name} was not opened, and nothing in it was changed. The project that was open is untouched.{' '}
        {problems.length === 1 ? 'One thing is wrong:' : `${problems.length} things are wrong:`}
      </p>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a list that scrolls must be reachable by keys. */}
      <ul className="problems" tabIndex={0} aria-label="What is wrong">
        {problems.map((problem) => (
          <li key={`${problem.path} ${problem.what}`}>
            {problem.path !== '' && <code>{problem.path}</code>}
            <b>{problem.what}</b>
            {problem.todo}
          </li>
        ))}
      </ul>
    </DialogFrame>
  );
}
