/** What is worked out of the chosen bar and its bay when someone looks closer; each answer says of what it is. */
import type { PushTest } from '../../core/frame/pushing.ts';
import type { BarId } from '../../core/layout/model.ts';
import type { Project } from '../../core/project/model.ts';
import type { BarStudy, Reliance } from '../../core/study/model.ts';

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
