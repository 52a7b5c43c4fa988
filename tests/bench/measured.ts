/** Times and memory, measured plainly. A busy machine only ever adds to a time, so the least of several is told beside the median. */
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

setFlagsFromString('--expose-gc');
const collect = runInNewContext('gc') as () => void;

export interface Times {
  /** ms */
  readonly median: number;
  readonly least: number;
  readonly runs: number;
}

/** @param warmUps runs that are not counted: the first ones wait for the compiler */
export function timed(work: () => unknown, runs: number, warmUps = 2): Times {
  for (let k = 0; k < warmUps; k++) work();
  const times: number[] = [];
  for (let k = 0; k < runs; k++) {
    collect();
    const start = performance.now();
    work();
    times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  return { median: times[Math.floor(times.length / 2)] ?? 0, least: times[0] ?? 0, runs };
}

/** Out of reach of the compiler, which would let go of a result after its last use. */
const kept: unknown[] = [];

/** Heap that a result keeps, bytes. */
export function heapKept(work: () => unknown): number {
  hold(work);
  collect();
  const holding = process.memoryUsage().heapUsed;
  kept.length = 0;
  collect();
  return holding - process.memoryUsage().heapUsed;
}

/** In a frame of its own, so that none that stays has the result at hand. */
function hold(work: () => unknown): void {
  kept.push(work());
}
