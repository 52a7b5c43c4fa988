import { describe, expect, it } from 'vitest';
import { createStore } from 'zustand/vanilla';
import au from '../../../assets/catalogues/au.json' with { type: 'json' };
import en from '../../../assets/catalogues/en.json' with { type: 'json' };
import us from '../../../assets/catalogues/us.json' with { type: 'json' };
import { assess } from '../../../core/assess.ts';
import type { Catalogues } from '../../../core/catalogue/model.ts';
import { readCatalogue } from '../../../core/catalogue/readCatalogue.ts';
import { newWallBay } from '../../../core/project/newBay.ts';
import { newProject } from '../../../core/project/newProject.ts';
import type { AssessAnswer, Snapshot } from '../../../renderer/assessing/assessApi.ts';
import { type AssessWorker, createAssessor } from '../../../renderer/assessing/assessor.ts';
import { presentProject } from '../../../renderer/store/shown.ts';
import { windowActions } from '../../../renderer/store/windowActions.ts';
import { firstState, type WindowState } from '../../../renderer/store/windowState.ts';

const catalogues: Catalogues = { en: readCatalogue(en), us: readCatalogue(us), au: readCatalogue(au) };
const shed = { ...newProject('shed'), bays: [newWallBay('W1', 'wall')] };

interface Asked {
  readonly snapshot: Snapshot;
  answer(): void;
  fail(why: string): void;
}

/** A worker that answers only when told to, so that the order of things is in the test's hand. */
function handWorker(): { readonly make: () => AssessWorker; readonly asked: Asked[] } {
  const asked: Asked[] = [];
  const make = (): AssessWorker => ({
    api: {
      assess: (snapshot: Snapshot) =>
        new Promise<AssessAnswer>((resolve, reject) => {
          asked.push({
            snapshot,
            answer: () => resolve({ assessment: assess(snapshot.project, catalogues), took: 1 }),
            fail: (why) => reject(new Error(why)),
          });
        }),
    } as unknown as AssessWorker['api'],
    onBroken: () => undefined,
    end: () => undefined,
  });
  return { make, asked };
}

/** Lets the promises that are settled run on. */
const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

function begun() {
  const store = createStore<WindowState>(() => firstState('light'));
  const actions = windowActions(store, () => 0);
  const { make, asked } = handWorker();
  const assessor = createAssessor(store, make, () => 0);
  assessor.start();
  actions.replaceProject(shed, { name: 'shed', token: null, saved: true });
  const grade = (to: string) => actions.edit({ kind: 'diagonals', bay: 'W1', change: { grade: to } });
  return { store, actions, assessor, asked, grade };
}

describe('keeping the figures in step', () => {
  it('assesses what is opened and settles the selection', async () => {
    const { store, asked } = begun();
    expect(asked).toHaveLength(1);
    asked[0]?.answer();
    await settle();
    const { assessing, selection } = store.getState();
    expect(assessing.base?.project).toBe(shed);
    expect([assessing.workingSince, selection.bay]).toEqual([null, 'W1']);
  });

  it('lets only the latest of several edits wait, and drops results that were overtaken', async () => {
    const { store, asked, grade } = begun();
    grade('S235JR');
    grade('S275JR');
    grade('S460N');
    expect(asked).toHaveLength(1);
    asked[0]?.answer();
    await settle();
    expect(store.getState().assessing.base).toBe(null);
    expect(asked).toHaveLength(2);
    expect(asked[1]?.snapshot.project).toBe(presentProject(store.getState()));
    asked[1]?.answer();
    await settle();
    expect(store.getState().assessing.base?.project).toBe(presentProject(store.getState()));
    expect(asked).toHaveLength(2);
  });

  it('tells a failure, keeps the project, and tries again when asked or when the project changes', async () => {
    const { store, assessor, asked, grade } = begun();
    asked[0]?.fail('no figures');
    await settle();
    expect(store.getState().assessing.failure).toBe('no figures');
    expect(presentProject(store.getState())).toBe(shed);
    expect(asked).toHaveLength(1);
    assessor.retry();
    expect(asked).toHaveLength(2);
    asked[1]?.fail('still none');
    await settle();
    grade('S235JR');
    expect(asked).toHaveLength(3);
    asked[2]?.answer();
    await settle();
    expect(store.getState().assessing).toMatchObject({ failure: null, workingSince: null });
  });

  it('assesses a change on trial beside the project, and keeps its figures when it is kept', async () => {
    const { store, actions, asked } = begun();
    asked[0]?.answer();
    await settle();
    actions.startTrial({
      id: 'x',
      label: 'x',
      where: '',
      edits: [{ kind: 'diagonals', bay: 'W1', change: { section: '90x90x7' } }],
      bar: null,
    });
    asked[1]?.answer();
    await settle();
    const { assessing, trying } = store.getState();
    expect([assessing.base?.project, assessing.tried?.project]).toEqual([shed, trying?.project]);
    actions.keepTrial();
    await settle();
    expect(store.getState().assessing.base?.project).toBe(presentProject(store.getState()));
    expect(asked).toHaveLength(2);
  });
});
