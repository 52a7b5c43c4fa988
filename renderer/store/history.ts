/** The project's past and future, one step an edit, for undo and redo. Selection, camera and theme stay out of it. */
import type { Project } from '../../core/project/model.ts';

export interface Step {
  readonly project: Project;
  /** What was done to reach this project: "Change width of W1". */
  readonly label: string;
  /** Steps of one key that follow each other soon are one step; null never joins. */
  readonly key: string | null;
  /** ms on any clock that does not run backwards. */
  readonly at: number;
}

export interface History {
  readonly past: readonly Step[];
  readonly present: Step;
  readonly future: readonly Step[];
}

/** Steps kept; the oldest go first. */
const LONGEST = 200;
/** Edits of one field closer together than this are taken as one, so that undo does not replay every press of an arrow. */
const SOON = 1500;

export function startedHistory(project: Project): History {
  return { past: [], present: { project, label: 'Open', key: null, at: 0 }, future: [] };
}

export function recorded(history: History, step: Step): History {
  const { past, present } = history;
  const joins =
    step.key !== null && step.key === present.key && step.at - present.at < SOON && past.length > 0;
  return { past: joins ? past : [...past, present].slice(-LONGEST), present: step, future: [] };
}

export function undone(history: History): History {
  const before = history.past.at(-1);
  if (before === undefined) return history;
  return {
    past: history.past.slice(0, -1),
    // What is gone back to joins with no later edit.
    present: { ...before, key: null },
    future: [history.present, ...history.future],
  };
}

export function redone(history: History): History {
  const [next, ...rest] = history.future;
  if (next === undefined) return history;
  return { past: [...history.past, history.present], present: { ...next, key: null }, future: rest };
}

/** What undo would take back, or null. */
export function undoLabel(history: History): string | null {
  return history.past.length > 0 ? history.present.label : null;
}

/** What redo would do again, or null. */
export function redoLabel(history: History): string | null {
  return history.future[0]?.label ?? null;
}
