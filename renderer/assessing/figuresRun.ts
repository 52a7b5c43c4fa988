import { type Remote, transfer } from 'comlink';
import type { AssessAnswer, AssessApi, Snapshot } from './assessApi.ts';
import { type AssessmentPart, joinedAssessment } from './assessmentParts.ts';
import type { BowingPool } from './bowingPool.ts';

/** From so many bays on the work is shared out, and the result fetched in parts; below, both cost more than they save. */
export const MANY_BAYS = 40;

export interface FiguresRun {
  /** 'ended' after `end`, unless the worker was busy: then it never comes. */
  readonly answer: Promise<AssessAnswer | 'ended'>;
  /** Whether the critical loads are being worked out by others, so that nothing is lost by ending now. */
  isShared(): boolean;
  end(): void;
}

export interface FiguresHelp {
  makePool(): BowingPool;
  progress(done: number, of: number): void;
  /** ms. */
  now(): number;
  /** Whether the worker that assesses has worked nothing out yet. */
  readonly remembersNothing: boolean;
}

/** Gets the figures of one project: a large one's critical loads from the pool, then all of it from the worker that assesses. */
export function figuresRun(
  api: Remote<AssessApi>,
  snapshot: Snapshot,
  { makePool, progress, now, remembersNothing }: FiguresHelp,
): FiguresRun {
  const began = now();
  let ended = false;
  let pool: BowingPool | null = null;

  const shared = async (): Promise<void> => {
    // Of a worker that remembers nothing there is no need to ask; it sets the project out while the others begin.
    const asked = api.unremembered(snapshot);
    const bays = remembersNothing ? snapshot.project.bays.map((_, k) => k) : await asked;
    if (ended || bays.length < MANY_BAYS) return;
    pool = makePool();
    const keep = (port: MessagePort): void => void api.keep(transfer(port, [port]));
    await Promise.all([pool.work(snapshot.project, bays, { progress, keep }), asked]);
    pool = null;
  };
  const inParts = async (): Promise<AssessAnswer | 'ended'> => {
    await shared();
    if (ended) return 'ended';
    const { head, parts: count } = await api.head(snapshot);
    const parts: AssessmentPart[] = [];
    // One after another, so that the window's thread is free between them.
    for (let k = 0; k < count && !ended; k++) parts.push(await api.part(snapshot, k));
    if (ended) return 'ended';
    const assessment = joinedAssessment(snapshot.project, head, parts);
    return { assessment, took: now() - began };
  };
  const few = snapshot.project.bays.length < MANY_BAYS;
  return {
    answer: few ? api.assess(snapshot) : inParts(),
    isShared: () => pool !== null,
    end: () => {
      ended = true;
      pool?.end();
    },
  };
}
