import type { JSX } from 'react';
import { shownAssessment } from '../../store/shown.ts';
import { useActions, useWindow } from '../services.tsx';

/** The practice in force; opens the settings. */
export function PracticeButton(): JSX.Element | null {
  const actions = useActions();
  const name = useWindow((state) => shownAssessment(state)?.practice.name ?? null);
  if (name === null) return null;
  return (
    <button
      type="button"
      className="top-button"
      aria-label={`Practice: ${name}. Project settings`}
      onClick={() => actions.openDialog({ kind: 'settings' })}
    >
      <span className="top-word">Practice: </span>
      <b>{name}</b>
    </button>
  );
}
