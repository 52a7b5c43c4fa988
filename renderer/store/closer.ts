/** The answers about the chosen bar, as they are shown. */
import type { PushTest } from '../../core/frame/pushing.ts';
import type { BarStudy, Reliance } from '../../core/study/model.ts';
import { shownAssessed } from './shown.ts';
import type { WindowState } from './windowState.ts';

/** The study of the chosen bar as it is shown; null while it is worked out. */
export function shownStudy(state: WindowState): BarStudy | null {
  const { study } = state.closer;
  return study !== null &&
    study.question.bar === state.selection.bar &&
    study.question.project === shownAssessed(state)?.project
    ? study.answer
    : null;
}

/** The push of the chosen bar as it is shown, wherever on it; null while it is worked out. */
export function shownPush(state: WindowState): PushTest | null {
  const { push } = state.closer;
  return push !== null &&
    push.question.bar === state.selection.bar &&
    push.question.project === shownAssessed(state)?.project
    ? push.answer
    : null;
}

/** As `shownStudy`, but while figures are worked out anew the last ones of the same bar, so that pictures do not flicker. */
export function latestStudy(state: WindowState): BarStudy | null {
  const { study } = state.closer;
  if (study === null || study.question.bar !== state.selection.bar) return null;
  // A bar that has lost its figures meanwhile has no shape any more.
  const assessed = shownAssessed(state)?.assessment.diagonals.get(study.question.bar);
  return assessed?.restraint == null ? null : study.answer;
}

/** What the joins of the chosen bay are worth, in the project as it stands; while it is worked out anew, as it was. */
export function latestReliance({ closer, selection }: WindowState): readonly Reliance[] | null {
  const { reliance } = closer;
  return reliance !== null && reliance.question.bay === selection.bay ? reliance.answer : null;
}
