/** Follows what is chosen, and asks for what is worth a closer look: the study of the bar always, the push and the bay's joins where they are shown. */
import type { StoreApi } from 'zustand/vanilla';
import type { Closer, PushQuestion, RelianceQuestion, StudyQuestion } from '../store/closerAnswers.ts';
import { pushedAt } from '../store/pushing.ts';
import { shownAssessed } from '../store/shown.ts';
import type { WindowState } from '../store/windowState.ts';
import type { Assessor } from './assessor.ts';

/** Begins to follow the store; returns how to stop. */
export function followCloser(store: StoreApi<WindowState>, assessor: Assessor): () => void {
  const put = (change: Partial<Closer>): void =>
    store.setState(({ closer }) => ({ closer: { ...closer, ...change } }));
  const stops = [
    followed<StudyQuestion>(store, wantedStudy, sameStudy, async (question) => {
      const answer = await assessor
        .look('study', (api, snapshot) => api.study(snapshot(question.project), question.bar))
        .catch(() => null);
      if (answer !== 'overtaken') put({ study: { question, answer } });
    }),
    followed<PushQuestion>(store, wantedPush, samePush, async (question) => {
      const answer = await assessor
        .look('push', (api, snapshot) => api.push(snapshot(question.project), question.bar, question.at))
        .catch(() => null);
      if (answer !== 'overtaken') put({ push: { question, answer } });
    }),
    followed<RelianceQuestion>(store, wantedReliance, sameReliance, async (question) => {
      const answer = await assessor
        .look('reliance', (api, snapshot) => api.reliance(snapshot(question.project), question.bay))
        .catch(() => null);
      if (answer !== 'overtaken') put({ reliance: { question, answer } });
    }),
  ];
  return () => {
    for (const stop of stops) stop();
  };
}

/** Asks whenever what is wanted has become another question. */
function followed<Question>(
  store: StoreApi<WindowState>,
  wanted: (state: WindowState) => Question | null,
  same: (a: Question, b: Question) => boolean,
  ask: (question: Question) => Promise<void>,
): () => void {
  let asked: Question | null = null;
  const follow = (): void => {
    const question = wanted(store.getState());
    if (question === null || (asked !== null && same(asked, question))) return;
    asked = question;
    void ask(question);
  };
  follow();
  return store.subscribe(follow);
}

function wantedStudy(state: WindowState): StudyQuestion | null {
  const shown = shownAssessed(state);
  const { bar } = state.selection;
  if (shown === null || bar === null || !shown.assessment.diagonals.get(bar)?.restraint) return null;
  return { project: shown.project, bar };
}

function wantedPush(state: WindowState): PushQuestion | null {
  const study = state.view.push ? wantedStudy(state) : null;
  const shown = shownAssessed(state);
  const at = shown === null ? null : pushedAt(state, shown.assessment);
  return study === null || at === null ? null : { ...study, at };
}

function wantedReliance(state: WindowState): RelianceQuestion | null {
  const { base } = state.assessing;
  const { bay } = state.selection;
  return state.tab === 'bowing' && base !== null && bay !== null ? { project: base.project, bay } : null;
}

const sameStudy = (a: StudyQuestion, b: StudyQuestion): boolean => a.project === b.project && a.bar === b.bar;
const samePush = (a: PushQuestion, b: PushQuestion): boolean => sameStudy(a, b) && a.at === b.at;
const sameReliance = (a: RelianceQuestion, b: RelianceQuestion): boolean =>
  a.project === b.project && a.bay === b.bay;
