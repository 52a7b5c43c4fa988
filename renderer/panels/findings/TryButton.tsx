import type { JSX } from 'react';
import { useActions, useWindow } from '../../shell/services.tsx';
import type { Trial } from '../../store/trying.ts';

interface TryButtonProps {
  /** What the button is called to those who do not see its row. */
  readonly name: string;
  trial(): Trial;
  readonly id: string;
}

/** Starts a trial; says so while it lasts. */
export function TryButton({ name, id, trial }: TryButtonProps): JSX.Element {
  const actions = useActions();
  const on = useWindow((state) => state.trying?.id === id);
  if (on)
    return (
      <span className="trying">
        <span className="try-dot" aria-hidden="true" />
        Trying
      </span>
    );
  return (
    <button
      type="button"
      className="button try"
      aria-label={`Try: ${name}`}
      onClick={() => actions.startTrial(trial())}
    >
      Try
    </button>
  );
}
