/** What is worked out of the chosen bar and its bay when someone looks closer; each answer says of what it is. */
import type { PushTest } from '../../core/frame/pushTest.ts';
import type { BarId } from '../../core/layout/model.ts';
import type { Project } from '../../core/project/model.ts';
import type { BarStudy, Reliance } from '../../core/study/model.ts';
import { shownAssessed } from './shown.ts';
import type { WindowState } from './windowState.ts';

export interface StudyQuestion {
  readonly project: Project;
  readonly bar: BarId;
}

export interface PushQuestion extends StudyQuestion {
  /** mm from end i. */
  readonly at: number;
}

export interface RelianceQuestion {
  readonly project: Project;
  readonly bay: string;
}

export interface Answered<Question, Answer> {
  readonly question: Question;
  /** Null: there is nothing to say of it, or the worker failed. */
  readonly answer: Answer | null;
}

export interface Closer {
  readonly study: Answered<StudyQuestion, BarStudy> | null;
  readonly push: Answered<PushQuestion, PushTest> | null;
  readonly reliance: Answered<RelianceQuestion, readonly Reliance[]> | null;
}

export const NOTHING_CLOSER: Closer = { study: null, push: null, reliance: null };

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
export function latestStudy({ closer, selection }: WindowState): BarStudy | null {
  const { study } = closer;
  return study !== null && study.question.bar === selection.bar ? study.answer : null;
}

/** What the joins of the chosen bay are worth, in the project as it stands; while it is worked out anew, as it was. */
export function latestReliance({ closer, selection }: WindowState): readonly Reliance[] | null {
  const { reliance } = closer;
  return reliance !== null && reliance.question.bay === selection.bay ? reliance.answer : null;
}
