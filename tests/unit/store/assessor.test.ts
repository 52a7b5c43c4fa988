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
import { headOf, partOf, partsOf } from '../../../renderer/assessing/assessmentParts.ts';
import { type AssessWorker, createAssessor } from '../../../renderer/assessing/assessor.ts';
import type { BowingPool } from '../../../renderer/assessing/bowingPool.ts';
import { isUpToDate, presentProject } from '../../../renderer/store/shown.ts';
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
function handWorker(): {
  readonly make: () => AssessWorker;
  readonly asked: Asked[];
  readonly ended: () => number;
} {
  const asked: Asked[] = [];
  let ended = 0;
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
      unremembered: async (snapshot: Snapshot) => snapshot.project.bays.map((_, k) => k),
      keep: async () => undefined,
      head: async ({ project }: Snapshot) => {
        const whole = assess(project, catalogues, 'by the marks');
        return { head: headOf(whole), parts: partsOf(whole) };
      },
      part: async ({ project }: Snapshot, k: number) =>
        partOf(assess(project, catalogues, 'by the marks'), k),
    } as unknown as AssessWorker['api'],
    onBroken: () => undefined,
    end: () => {
      ended += 1;
    },
  });
  return { make, asked, ended: () => ended };
}

interface Pooled {
  readonly bays: readonly number[];
  progress(done: number): void;
  finish(how: 'done' | 'lost'): void;
}

/** A pool that gets on only when told to. */
function handPool(): {
  readonly make: () => BowingPool;
  readonly given: Pooled[];
  readonly ended: () => number;
} {
  const given: Pooled[] = [];
  let ended = 0;
  const make = (): BowingPool => {
    let end = (): void => undefined;
    return {
      work: (_, bays, told) =>
        new Promise((resolve) => {
          end = () => resolve('ended');
          given.push({ bays, progress: (done) => told.progress(done, bays.length), finish: resolve });
        }),
      end: () => {
        ended += 1;
        end();
      },
    };
  };
  return { make, given, ended: () => ended };
}

/** Lets the promises that are settled run on. */
const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

function begun() {
  const store = createStore<WindowState>(() => firstState('light'));
  const actions = windowActions(store, () => 0);
  const { make, asked, ended } = handWorker();
  const pools = handPool();
  const assessor = createAssessor(store, make, () => 0, pools.make);
  assessor.start();
  actions.replaceProject(shed, { name: 'shed', token: null, saved: true });
  const grade = (to: string) => actions.edit({ kind: 'diagonals', bay: 'W1', change: { grade: to } });
  return { store, actions, assessor, asked, ended, pools, grade };
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

describe('many bays', () => {
  const many = {
    ...newProject('many'),
    bays: Array.from({ length: 45 }, (_, k) => newWallBay(`W${k + 1}`, `wall ${k + 1}`)),
  };
  const rename = { kind: 'name project', name: 'another' } as const;

  async function opened() {
    const window = begun();
    window.asked[0]?.answer();
    await settle();
    window.actions.replaceProject(many, { name: 'many', token: null, saved: true });
    await settle();
    return window;
  }

  it('are shared out, tell how far they are, and then have their figures', async () => {
    const { store, pools } = await opened();
    expect(pools.given[0]?.bays).toHaveLength(45);
    pools.given[0]?.progress(9);
    expect(store.getState().assessing.progress).toEqual({ done: 9, of: 45 });
    pools.given[0]?.finish('done');
    await settle();
    const { assessing } = store.getState();
    expect(assessing).toMatchObject({ workingSince: null, progress: null, stopped: false });
    expect(assessing.base?.project).toBe(many);
    expect(assessing.base?.assessment.diagonals.size).toBe(
      assess(many, catalogues, 'by the marks').diagonals.size,
    );
  });

  it('have their figures even when every worker of the pool is lost', async () => {
    const { store, pools } = await opened();
    pools.given[0]?.finish('lost');
    await settle();
    expect(store.getState().assessing.base?.project).toBe(many);
  });

  it('can be left off: what is remembered stays, nothing is begun by itself, and the work is taken up again when asked', async () => {
    const { store, actions, assessor, pools, ended } = await opened();
    assessor.stop();
    await settle();
    expect(store.getState().assessing).toMatchObject({
      stopped: true,
      workingSince: null,
      progress: null,
      base: null,
    });
    expect([pools.ended(), ended()]).toEqual([1, 0]);
    actions.edit(rename);
    await settle();
    expect(pools.given).toHaveLength(1);
    expect(isUpToDate(store.getState())).toBe(false);
    assessor.retry();
    await settle();
    expect(pools.given).toHaveLength(2);
    pools.given[1]?.finish('done');
    await settle();
    expect(store.getState().assessing).toMatchObject({ stopped: false, workingSince: null });
    expect(isUpToDate(store.getState())).toBe(true);
  });

  it('are left at once for a later project, whose figures come', async () => {
    const { store, actions, pools } = await opened();
    actions.edit(rename);
    await settle();
    expect(pools.ended()).toBe(1);
    expect(pools.given).toHaveLength(2);
    pools.given[1]?.finish('done');
    await settle();
    expect(store.getState().assessing.base?.project).toBe(presentProject(store.getState()));
  });

  it('can be left off while the one worker is busy, which ends it; another project begins afresh', async () => {
    const { store, actions, assessor, asked, ended } = begun();
    assessor.stop();
    expect([ended(), store.getState().assessing.stopped]).toEqual([1, true]);
    actions.replaceProject(shed, { name: 'shed', token: null, saved: true });
    await settle();
    expect(asked).toHaveLength(2);
    expect(store.getState().assessing.stopped).toBe(false);
  });
});
