/** Several workers that work critical loads out together. Made for one piece of work, and ended with it: each holds the whole project set out. */
import { type Remote, transfer, wrap } from 'comlink';
import type { Project } from '../../core/project/model.ts';
import type { BowingApi } from './bowingApi.ts';
import {
  type Chunk,
  isDone,
  isLost,
  nextQueue,
  type PoolEvent,
  type PoolQueue,
  startedQueue,
} from './poolQueue.ts';

export interface BowingWorker {
  readonly api: Remote<BowingApi>;
  onBroken(listener: () => void): void;
  end(): void;
}

export interface BowingPool {
  /** 'lost' when no worker is left before all is done: what was found is kept, and whoever assesses does the rest. 'ended' after `end`. */
  work(project: Project, bays: readonly number[], told: PoolListener): Promise<'done' | 'lost' | 'ended'>;
  /** Stops at once. */
  end(): void;
}

export interface PoolListener {
  /** How many bays are worked out. */
  progress(done: number, of: number): void;
  /** Takes the port through which one worker's finds come. */
  keep(port: MessagePort): void;
}

export function bowingPool(makeWorker: () => BowingWorker, count: number): BowingPool {
  let end = (): void => undefined;
  return {
    work: (project, bays, told) =>
      new Promise((resolve) => {
        const workers = Array.from({ length: count }, makeWorker);
        let queue = startedQueue(bays, count);
        let over = false;
        const finish = (how: 'done' | 'lost' | 'ended'): void => {
          if (over) return;
          over = true;
          for (const worker of workers) worker.end();
          resolve(how);
        };
        end = () => finish('ended');
        const happens = (event: PoolEvent): void => {
          if (over) return;
          const before = queue;
          queue = nextQueue(queue, event);
          if (queue.done !== before.done) told.progress(queue.done, queue.of);
          if (isDone(queue)) finish('done');
          else if (isLost(queue)) finish('lost');
          if (over) return;
          newChunks(before, queue).forEach(([worker, chunk]) => {
            workers[worker]?.api.work(chunk).then(
              () => happens({ kind: 'back', worker }),
              () => happens({ kind: 'gone', worker }),
            );
          });
        };
        told.progress(0, queue.of);
        workers.forEach(({ api, onBroken }, worker) => {
          onBroken(() => happens({ kind: 'gone', worker }));
          const { port1, port2 } = new MessageChannel();
          told.keep(port1);
          api.begin(project, transfer(port2, [port2])).then(
            () => happens({ kind: 'ready', worker }),
            () => happens({ kind: 'gone', worker }),
          );
        });
      }),
    end: () => end(),
  };
}

/** What workers have now and had not before. */
function newChunks(before: PoolQueue, now: PoolQueue): readonly (readonly [number, Chunk])[] {
  return now.workers.flatMap((has, worker) =>
    typeof has === 'string' || has === before.workers[worker] ? [] : [[worker, has] as const],
  );
}

/** More workers than this wait for memory, not for one another. */
const MOST_WORKERS = 8;

/** @param cores that the machine has, as far as it says */
export const workersFor = (cores: number): number => Math.max(1, Math.min(MOST_WORKERS, cores || 1));

/** A worker of this window's own script. */
export function bowingWorker(): BowingWorker {
  const worker = new Worker(new URL('./bowing.worker.ts', import.meta.url), { type: 'module' });
  return {
    api: wrap<BowingApi>(worker),
    onBroken: (listener) => {
      worker.addEventListener('error', listener);
      worker.addEventListener('messageerror', listener);
    },
    end: () => worker.terminate(),
  };
}
