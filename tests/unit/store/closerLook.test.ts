import { describe, expect, it } from 'vitest';
import { createStore } from 'zustand/vanilla';
import { studyOf } from '../../../core/study/study.ts';
import type { Assessor, LookKind } from '../../../renderer/assessing/assessor.ts';
import { followCloser } from '../../../renderer/assessing/closerLook.ts';
import { latestStudy, shownPush, shownStudy } from '../../../renderer/store/closer.ts';
import { windowActions } from '../../../renderer/store/windowActions.ts';
import { firstState, type WindowState } from '../../../renderer/store/windowState.ts';
import { crossedTier, FALL, RISE } from '../documents/given.ts';

const assessment = crossedTier({ join: { kind: 'bolted' } });

interface Asked {
  readonly kind: LookKind;
  answer(value: unknown): void;
  fail(): void;
}

/** An assessor whose closer looks are answered by the test. */
function begun() {
  const asked: Asked[] = [];
  const look = (kind: LookKind) =>
    new Promise((resolve, reject) => {
      asked.push({ kind, answer: resolve, fail: () => reject(new Error('broken')) });
    });
  const store = createStore<WindowState>(() => ({
    ...firstState('light'),
    started: true,
    assessing: {
      base: { project: assessment.project, assessment, took: 1 },
      tried: null,
      workingSince: null,
      progress: null,
      stopped: false,
      failure: null,
    },
  }));
  const actions = windowActions(store, () => 0);
  const stop = followCloser(store, { look } as unknown as Assessor);
  const kinds = (): readonly LookKind[] => asked.map(({ kind }) => kind);
  return { store, actions, asked, kinds, stop };
}

const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

describe('looking closer at what is chosen', () => {
  it('studies each chosen bar once, and shows the answer for that bar alone', async () => {
    const { store, actions, asked, kinds } = begun();
    expect(kinds()).toEqual([]);
    actions.selectBar(RISE);
    actions.hover(FALL);
    expect(kinds()).toEqual(['study']);
    const study = studyOf(assessment, RISE);
    asked[0]?.answer(study);
    await settle();
    expect(shownStudy(store.getState())).toBe(study);
    actions.selectBar(FALL);
    expect(kinds()).toEqual(['study', 'study']);
    expect([shownStudy(store.getState()), latestStudy(store.getState())]).toEqual([null, null]);
  });

  it('asks for a push only while pushing, again for each place, and for the joins only where they are shown', () => {
    const { actions, kinds } = begun();
    actions.selectBar(RISE);
    actions.setPushMode(true);
    actions.push({ force: [5, 0] });
    expect(kinds()).toEqual(['study', 'push']);
    actions.push({ at: 1250 });
    actions.push({ way: 'in plane' });
    expect(kinds()).toEqual(['study', 'push', 'push']);
    actions.showTab('bowing');
    expect(kinds()).toEqual(['study', 'push', 'push', 'reliance']);
  });

  it('keeps the last answer where a newer question overtook another, and has none after a failure', async () => {
    const { store, actions, asked } = begun();
    actions.selectBar(RISE);
    asked[0]?.answer('overtaken');
    await settle();
    expect(store.getState().closer.study).toBeNull();
    actions.setPushMode(true);
    asked[1]?.fail();
    await settle();
    expect(store.getState().closer.push?.answer).toBeNull();
    expect(shownPush(store.getState())).toBeNull();
  });

  it('shows the last study of a bar while the project has moved on, marked by its own project', async () => {
    const { store, actions, asked, kinds } = begun();
    actions.selectBar(RISE);
    const study = studyOf(assessment, RISE);
    asked[0]?.answer(study);
    await settle();
    const other = { ...assessment.project, name: 'another' };
    store.setState(({ assessing }) => ({
      assessing: { ...assessing, base: { project: other, assessment, took: 1 } },
    }));
    expect([shownStudy(store.getState()), latestStudy(store.getState())]).toEqual([null, study]);
    expect(kinds()).toEqual(['study', 'study']);
  });

  it('asks nothing once it has been stopped', () => {
    const { actions, kinds, stop } = begun();
    stop();
    actions.selectBar(RISE);
    expect(kinds()).toEqual([]);
  });
});
