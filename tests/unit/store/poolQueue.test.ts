import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { workersFor } from '../../../renderer/assessing/bowingPool.ts';
import {
  isDone,
  isLost,
  nextQueue,
  type PoolEvent,
  type PoolQueue,
  startedQueue,
} from '../../../renderer/assessing/poolQueue.ts';
import { runs } from '../../properties/given/runs.ts';

const bays = (count: number): readonly number[] => Array.from({ length: count }, (_, k) => k);
const stepped = (queue: PoolQueue, ...events: readonly PoolEvent[]): PoolQueue =>
  events.reduce(nextQueue, queue);
const chunksAtWork = ({ workers }: PoolQueue) =>
  workers.flatMap((worker) => (typeof worker === 'string' ? [] : [worker]));

describe('bays handed to workers', () => {
  it('wait until a worker is ready, which then has the first of them', () => {
    const queue = startedQueue(bays(100), 2);
    expect(queue.workers).toEqual(['starting', 'starting']);
    const { workers, waiting } = stepped(queue, { kind: 'ready', worker: 1 });
    expect(workers[0]).toBe('starting');
    expect(workers[1]).toEqual(queue.waiting[0]);
    expect(waiting).toEqual(queue.waiting.slice(1));
  });

  it('count as done when their worker comes back, which takes the next', () => {
    const queue = stepped(
      startedQueue(bays(100), 1),
      { kind: 'ready', worker: 0 },
      { kind: 'back', worker: 0 },
    );
    const [first, second] = startedQueue(bays(100), 1).waiting;
    expect(queue.done).toBe(first?.length);
    expect(queue.workers[0]).toEqual(second);
  });

  it('go back to the front when their worker is gone, and another that is idle takes them', () => {
    const start = startedQueue([0, 1], 2);
    // Two bays for two workers: one each.
    const working = stepped(
      start,
      { kind: 'ready', worker: 0 },
      { kind: 'ready', worker: 1 },
      { kind: 'back', worker: 1 },
    );
    expect(working.workers).toEqual([[0], 'idle']);
    expect(stepped(working, { kind: 'gone', worker: 0 }).workers).toEqual(['gone', [0]]);
  });

  it('are lost when nobody is left, unless all were done', () => {
    const start = startedQueue(bays(3), 1);
    expect(isLost(stepped(start, { kind: 'gone', worker: 0 }))).toBe(true);
    const done = bays(3).reduce(
      (queue) => stepped(queue, { kind: 'back', worker: 0 }),
      stepped(start, { kind: 'ready', worker: 0 }),
    );
    expect(isDone(done)).toBe(true);
    expect(isLost(stepped(done, { kind: 'gone', worker: 0 }))).toBe(false);
  });

  it('are each at one place at a time and done once, whatever happens', () => {
    const event = fc.record({
      kind: fc.constantFrom<PoolEvent['kind']>('ready', 'back', 'back', 'back', 'gone'),
      worker: fc.integer({ min: 0, max: 4 }),
    });
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 400 }),
        fc.integer({ min: 1, max: 4 }),
        fc.array(event, { maxLength: 120 }),
        (count, workers, events) => {
          const queue = stepped(startedQueue(bays(count), workers), ...events);
          const open = [...chunksAtWork(queue), ...queue.waiting].flat();
          expect(new Set(open).size).toBe(open.length);
          expect(open.length + queue.done).toBe(count);
          // Nothing waits while somebody is idle.
          expect(queue.waiting.length > 0 && queue.workers.includes('idle')).toBe(false);
        },
      ),
      runs(400),
    );
  });

  it('are done in the end by workers that come back, in chunks that show progress', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1000 }), fc.integer({ min: 1, max: 8 }), (count, workers) => {
        let queue = startedQueue(bays(count), workers);
        for (let worker = 0; worker < workers; worker++) queue = nextQueue(queue, { kind: 'ready', worker });
        let steps = 0;
        while (!isDone(queue)) {
          const worker = queue.workers.findIndex((each) => typeof each !== 'string');
          queue = nextQueue(queue, { kind: 'back', worker });
          steps += 1;
        }
        expect(steps).toBeGreaterThanOrEqual(Math.min(count, 12));
      }),
      runs(100),
    );
  });
});

describe('the number of workers', () => {
  it('is that of the cores, at least one and at most eight', () => {
    expect([Number.NaN, 0, 1, 2, 8, 64].map(workersFor)).toEqual([1, 1, 1, 2, 8, 8]);
  });
});
