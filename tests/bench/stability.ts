/** Critical loads: bars and pairs by the exact solver, the same bar as a dense eigenproblem, and one bay's push test. */
import { assess } from '../../core/assess.ts';
import { angleProperties } from '../../core/section/angleProperties.ts';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { type BarProblem, PINNED } from '../../core/stability/model.ts';
import { pairCriticalLoad, planarPair } from '../../core/stability/pair.ts';
import { pushOf } from '../../core/study/study.ts';
import { CATALOGUES, fourPanelBays } from './given.ts';
import { hermiteLoad } from './hermite.ts';
import { timed } from './measured.ts';
import { ms, type Row, row } from './row.ts';

/** Enough that what the compiler has to learn again after each collection of garbage does not count. */
const BARS = 40_000;
const PAIRS = 15_000;
const DENSE = 20;
/** µs a bar with a middle hold. */
const GOAL = 20;

const section = angleProperties({ longLeg: 70, shortLeg: 70, thickness: 6, rootRadius: 9, toeRadius: 4.5 });

/** No two alike, so that nothing can be carried over from one to the next. */
function bar(k: number, twist = false): BarProblem {
  const length = 3000 + k / 10;
  return {
    E: 210_000,
    length,
    section,
    holds: [{ at: length / 2, direction: [1, 0], stiffness: 'rigid' }],
    axial: [{ from: 0, to: length, share: 1 }],
    endI: PINNED,
    endJ: PINNED,
    twist: twist ? { G: 81_000, heldAt: [] } : null,
  };
}

const summed = (count: number, each: (k: number) => number | null): number => {
  let sum = 0;
  for (let k = 0; k < count; k++) sum += each(k) ?? 0;
  return sum;
};

export function stability(): readonly Row[] {
  const exact = timed(() => summed(BARS, (k) => criticalLoad(bar(k), { second: false }).N), 7);
  const twisting = timed(() => summed(BARS / 10, (k) => criticalLoad(bar(k, true), { second: false }).N), 5);
  const pairs = timed(() => summed(PAIRS, pairLoad), 5);
  const dense = timed(() => summed(DENSE, (k) => hermiteLoad(bar(k))), 3, 1);
  const each = (exact.median / BARS) * 1000;
  const denseEach = dense.median / DENSE;
  const error = Math.abs(hermiteLoad(bar(0)) / (criticalLoad(bar(0)).N ?? 1) - 1);
  return [
    row(
      `critical load of a bar with a middle hold, to 1e-11, median of ${exact.runs}`,
      `${each.toFixed(1)} µs, ${Math.round(1e6 / each)} bars a second`,
      `under ${GOAL} µs`,
      each < GOAL,
    ),
    row('  the least of them', `${((exact.least / BARS) * 1000).toFixed(1)} µs`),
    row(
      '  as a dense eigenproblem of 16 Hermite elements (ml-matrix: JavaScript, not LAPACK)',
      `${ms(denseEach)}, × ${Math.round((denseEach * 1000) / each)}, ${(error * 100).toExponential(0)} % above`,
    ),
    row('  with twist', `${((twisting.median / (BARS / 10)) * 1000).toFixed(0)} µs`),
    row('critical load of a crossed pair', `${((pairs.median / PAIRS) * 1000).toFixed(0)} µs`),
    ...pushing(),
  ];
}

const through = { length: 5000, EI: 3e10, crossingAt: 2500, cut: false };
const pairLoad = (k: number): number | null => pairCriticalLoad(planarPair(through, through, k / PAIRS)).N;

function pushing(): readonly Row[] {
  const assessment = assess(fourPanelBays(1), CATALOGUES);
  const [bay] = assessment.layout.bays;
  const id = bay?.diagonals[0] ?? '';
  let at = 1000;
  const push = timed(() => {
    at += 10;
    return pushOf(assessment, id, at);
  }, 15);
  return [row('one push on a four-panel bay: framed, factored, pushed both ways', ms(push.median))];
}
