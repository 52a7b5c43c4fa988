/** How bays are handed to several workers: which chunk each has, which still wait, how far they are. Pure; who sends the messages is another matter. */

/** Places of bays in the project. */
export type Chunk = readonly number[];

export interface PoolQueue {
  readonly waiting: readonly Chunk[];
  /** By worker: what it works on, or why it does not. */
  readonly workers: readonly (Chunk | 'starting' | 'idle' | 'gone')[];
  /** Bays. */
  readonly done: number;
  readonly of: number;
}

export type PoolEvent =
  | { readonly kind: 'ready'; readonly worker: number }
  /** Its chunk is worked out. */
  | { readonly kind: 'back'; readonly worker: number }
  /** It will not answer any more. */
  | { readonly kind: 'gone'; readonly worker: number };

/** So many chunks for each worker that none waits long for the last one, and progress is seen. */
const CHUNKS_EACH = 12;
const LARGEST_CHUNK = 25;

export function startedQueue(bays: readonly number[], workers: number): PoolQueue {
  const size = Math.max(1, Math.min(LARGEST_CHUNK, Math.ceil(bays.length / (workers * CHUNKS_EACH))));
  const waiting = Array.from({ length: Math.ceil(bays.length / size) }, (_, k) =>
    bays.slice(k * size, (k + 1) * size),
  );
  return {
    waiting,
    workers: Array.from({ length: workers }, () => 'starting' as const),
    done: 0,
    of: bays.length,
  };
}

/** A worker that is free takes the next chunk; that of a worker that is gone goes back to the front, and others who are idle take it. */
export function nextQueue(queue: PoolQueue, { kind, worker }: PoolEvent): PoolQueue {
  const had = queue.workers[worker];
  if (had === undefined || had === 'gone') return queue;
  const chunk = typeof had === 'string' ? null : had;
  switch (kind) {
    case 'ready':
      return had === 'starting' ? handedOut(withWorker(queue, worker, 'idle')) : queue;
    case 'back':
      return chunk === null
        ? queue
        : handedOut({ ...withWorker(queue, worker, 'idle'), done: queue.done + chunk.length });
    case 'gone': {
      const waiting = chunk === null ? queue.waiting : [chunk, ...queue.waiting];
      return handedOut({ ...withWorker(queue, worker, 'gone'), waiting });
    }
    default:
      return kind satisfies never;
  }
}

export const isDone = ({ done, of }: PoolQueue): boolean => done === of;

/** Nobody is left to do what remains. */
export const isLost = (queue: PoolQueue): boolean =>
  !isDone(queue) && queue.workers.every((worker) => worker === 'gone');

const withWorker = (queue: PoolQueue, worker: number, to: PoolQueue['workers'][number]): PoolQueue => ({
  ...queue,
  workers: queue.workers.map((each, k) => (k === worker ? to : each)),
});

function handedOut(queue: PoolQueue): PoolQueue {
  const idle = queue.workers.indexOf('idle');
  const [chunk, ...waiting] = queue.waiting;
  return idle < 0 || chunk === undefined ? queue : handedOut({ ...withWorker(queue, idle, chunk), waiting });
}
