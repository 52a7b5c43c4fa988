/**
 * Keeps the figures in step with the project. One worker assesses, newest project first: while it works, only the latest
 * request waits, and a result for a project that is no longer wanted is dropped. The critical loads of many bays are shared out to a
 * pool, which lasts as long as that work. A second worker tries things out
 * (remedies, joins, shortlists, documents), so that a long trial never keeps the figures waiting. A third looks closer at what is
 * chosen (its mode, a push), since a hand that pushes cannot wait for trials.
 */
import { type Remote, wrap } from 'comlink';
import type { StoreApi } from 'zustand/vanilla';
import type { Project } from '../../core/project/model.ts';
import type { Remedy } from '../../core/remedies/model.ts';
import { settled } from '../store/selection.ts';
import { presentProject, shownAssessment } from '../store/shown.ts';
import type { Assessed, WindowState } from '../store/windowState.ts';
import type { AssessApi, Snapshot } from './assessApi.ts';
import type { BowingPool } from './bowingPool.ts';
import { type FiguresRun, figuresRun } from './figuresRun.ts';
import { newestFirst } from './newestFirst.ts';

export interface Assessor {
  /** Begins to follow the store; returns how to stop. */
  start(): () => void;
  /** Begins afresh after a failure, or after a stop. */
  retry(): void;
  /** Leaves off; the figures stay as they are until `retry`, or until another project is opened. */
  stop(): void;
  /** Asks the second worker. Rejects when the worker fails. */
  ask<T>(
    question: (api: Remote<AssessApi>, snapshotOf: (project: Project) => Snapshot) => Promise<T>,
  ): Promise<T>;
  /** Asks the third worker. Of each kind only the newest question waits; one that was overtaken is answered with 'overtaken'. */
  look<T>(
    kind: LookKind,
    question: (api: Remote<AssessApi>, snapshotOf: (project: Project) => Snapshot) => Promise<T>,
  ): Promise<T | 'overtaken'>;
  /** The remedies of a finding of that project, worked out once. */
  remedies(project: Project, finding: string): Promise<readonly Remedy[]>;
}

/** Closer looks, the most pressing first. */
const LOOK_KINDS = ['push', 'study', 'reliance'] as const;
export type LookKind = (typeof LOOK_KINDS)[number];

interface LookWorker {
  readonly worker: AssessWorker;
  /** Never kept; broken when the worker is, so that no question waits for good. */
  readonly broken: Promise<never>;
}

export interface AssessWorker {
  readonly api: Remote<AssessApi>;
  /** Called when the worker cannot run at all. */
  onBroken(listener: (what: string) => void): void;
  end(): void;
}

export function createAssessor(
  store: StoreApi<WindowState>,
  makeWorker: () => AssessWorker,
  now: () => number,
  makePool: () => BowingPool,
): Assessor {
  const snapshotOf = numberedSnapshots();
  let figures: AssessWorker | null = null;
  let trials: AssessWorker | null = null;
  let looks: LookWorker | null = null;
  let running: { readonly project: Project; readonly run: FiguresRun } | null = null;
  /** Workers of figures that have been asked before, and may remember. */
  const begun = new WeakSet<AssessWorker>();
  /** A project that could not be assessed is not tried again by itself; another one is. */
  let failedOn: Project | null = null;

  const figuresWorker = (): AssessWorker => {
    if (figures === null) {
      figures = makeWorker();
      figures.onBroken(fail);
    }
    return figures;
  };

  /** Ends what is under way; a worker that is busy is ended too, and with it all that it remembers. */
  const endRun = (): void => {
    if (running === null) return;
    const { run } = running;
    if (!run.isShared()) {
      figures?.end();
      figures = null;
    }
    run.end();
    running = null;
  };

  const fail = (what: string): void => {
    failedOn = wanted(store.getState());
    running?.run.end();
    running = null;
    figures?.end();
    figures = null;
    setAssessing(store, { ...NOT_WORKING, failure: what });
  };

  const follow = (): void => {
    const state = store.getState();
    const project = wanted(state);
    if (state.assessing.stopped) return;
    // Work that is shared out is left for a later project at once, and what was found is kept; the rest is short.
    if (running?.run.isShared() && running.project !== project) endRun();
    if (running || (project !== null && project === failedOn)) return;
    if (project === null) {
      if (state.assessing.workingSince !== null) setAssessing(store, NOT_WORKING);
      return;
    }
    const worker = figuresWorker();
    const progress = (done: number, of: number): void => setAssessing(store, { progress: { done, of } });
    const remembersNothing = !begun.has(worker);
    begun.add(worker);
    const run = figuresRun(worker.api, snapshotOf(project), {
      makePool,
      progress,
      now,
      remembersNothing,
    });
    running = { project, run };
    setAssessing(store, { workingSince: state.assessing.workingSince ?? now(), progress: null });
    run.answer.then(
      (answer) => {
        if (worker !== figures || running?.run !== run || answer === 'ended') return;
        running = null;
        accept(store, { project, ...answer });
        follow();
      },
      (error: unknown) => {
        if (worker === figures && running?.run === run) fail(wordsOf(error));
      },
    );
  };

  const ask: Assessor['ask'] = (question) => {
    if (trials === null) {
      const fresh = makeWorker();
      trials = fresh;
      fresh.onBroken(() => {
        fresh.end();
        if (trials === fresh) trials = null;
      });
    }
    return question(trials.api, snapshotOf);
  };

  const inTurn = newestFirst(LOOK_KINDS);
  const look: Assessor['look'] = (kind, question) =>
    inTurn(kind, () => {
      looks ??= lookWorker();
      return Promise.race([question(looks.worker.api, snapshotOf), looks.broken]);
    });
  const lookWorker = (): LookWorker => {
    const worker = makeWorker();
    const broken = new Promise<never>((_, reject) => {
      worker.onBroken((what) => {
        worker.end();
        if (looks?.worker === worker) looks = null;
        reject(new Error(what));
      });
    });
    // Nothing may be asked of it when it breaks.
    broken.catch(() => undefined);
    return { worker, broken };
  };

  const known = new WeakMap<Project, Map<string, Promise<readonly Remedy[]>>>();

  return {
    start: () => {
      const stop = store.subscribe(follow);
      follow();
      return () => {
        stop();
        running?.run.end();
        figures?.end();
        trials?.end();
        looks?.worker.end();
        figures = null;
        trials = null;
        looks = null;
        running = null;
      };
    },
    retry: () => {
      failedOn = null;
      setAssessing(store, { failure: null, stopped: false });
      follow();
    },
    stop: () => {
      if (running === null) return;
      endRun();
      setAssessing(store, { ...NOT_WORKING, stopped: true });
    },
    ask,
    look,
    remedies: (project, finding) => {
      const ofProject = known.get(project) ?? new Map<string, Promise<readonly Remedy[]>>();
      known.set(project, ofProject);
      const asked =
        ofProject.get(finding) ?? ask((api, snapshot) => api.remedies(snapshot(project), finding));
      ofProject.set(finding, asked);
      return asked;
    },
  };
}

const NOT_WORKING = { workingSince: null, progress: null } as const;

/** A worker of this window's own script, reached over comlink. */
export function assessWorker(): AssessWorker {
  const worker = new Worker(new URL('./assess.worker.ts', import.meta.url), { type: 'module' });
  return {
    api: wrap<AssessApi>(worker),
    onBroken: (listener) => {
      worker.addEventListener('error', (event) =>
        listener(event.message || 'The assessing part could not be loaded.'),
      );
      worker.addEventListener('messageerror', () => listener('A result could not be read.'));
    },
    end: () => worker.terminate(),
  };
}

/** The project whose figures are missing: the one as it stands before the one on trial. */
function wanted(state: WindowState): Project | null {
  const { assessing, trying, started } = state;
  if (!started) return null;
  const present = presentProject(state);
  if (assessing.base?.project !== present) return present;
  if (trying !== null && assessing.tried?.project !== trying.project) return trying.project;
  return null;
}

function accept(store: StoreApi<WindowState>, assessed: Assessed): void {
  store.setState((state) => {
    const { assessing } = state;
    const isBase = assessed.project === presentProject(state);
    const isTried = assessed.project === state.trying?.project;
    if (!isBase && !isTried) return {}; // Overtaken by a later edit.
    const next = {
      ...assessing,
      ...(isBase ? { base: assessed } : { tried: assessed }),
      ...NOT_WORKING,
      failure: null,
    };
    const shown = shownAssessment({ ...state, assessing: next });
    return {
      assessing: next,
      selection: shown === null ? state.selection : settled(state.selection, shown),
    };
  });
}

function setAssessing(store: StoreApi<WindowState>, change: Partial<WindowState['assessing']>): void {
  store.setState(({ assessing }) => ({ assessing: { ...assessing, ...change } }));
}

/** Gives each project, told by identity, a number that stays. */
function numberedSnapshots(): (project: Project) => Snapshot {
  const serials = new WeakMap<Project, number>();
  let last = 0;
  return (project) => {
    let serial = serials.get(project);
    if (serial === undefined) {
      last += 1;
      serial = last;
      serials.set(project, serial);
    }
    return { serial, project };
  };
}

function wordsOf(error: unknown): string {
  return error instanceof Error ? error.message : String(error);
}
