import type { JSX } from 'react';
import { useActions, useWindow } from '../../shell/services.tsx';
import type { Trial } from '../../store/trying.ts';

interface TryButtonProps {
  /** What the button is called to those who do not see its row. */
  readonly name: string;
  trial(): Trial;
  readonly id: string;
}

/** Starts a trial, says so while it lasts, and puts it back when pressed again. One button throughout, so that it keeps the focus. */
export function TryButton({ name, id, trial }: TryButtonProps): JSX.Element {
  const actions = useActions();
  const on = useWindow((state) => state.trying?.id === id);
  return (
    <button
      type="button"
      className={on ? 'trying' : 'button try'}
      aria-label={`${on ? 'Trying' : 'Try'}: ${name}`}
      title={on ? 'Put it back' : undefined}
      onClick={() => (on ? actions.putBackTrial() : actions.startTrial(trial()))}
    >
      {on && <span className="try-dot" aria-hidden="true" />}
      {on ? 'Trying' : 'Try'}
    </button>
  );
}
