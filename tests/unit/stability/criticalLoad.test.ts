/** Corners of the critical load: what must not hang, overflow or drown in rounding. */
import { describe, expect, it } from 'vitest';
import { criticalLoad } from '../../../core/stability/criticalLoad.ts';
import { type BarProblem, type Hold, PINNED } from '../../../core/stability/model.ts';
import { pairCriticalLoad, planarPair } from '../../../core/stability/pair.ts';
import { direction, E, sectionOf } from '../../properties/given/barProblems.ts';

const LENGTH = 5000;
const section = sectionOf(9e5, 6.7, 20);
const EULER = (Math.PI ** 2 * E * section.Iv) / LENGTH ** 2;

const bar = (change: Partial<BarProblem> = {}): BarProblem => ({
  E,
  length: LENGTH,
  section,
  holds: [],
  axial: [{ from: 0, to: LENGTH, share: 1 }],
  endI: PINNED,
  endJ: PINNED,
  twist: null,
  ...change,
});
const hold = (at: number, degrees: number, stiffness: Hold['stiffness']): Hold => ({
  at,
  direction: direction(degrees),
  stiffness,
});
const loadOf = (problem: BarProblem): number => criticalLoad(problem).N ?? Number.NaN;

describe('stations very near each other', () => {
  // Apart by 1e-12 to 1 mm of 5 m. Moving a hold by a share of the length moves the load by no more than a few times that share.
  it.each([1e-9, 1e-6, 1e-4, 1e-3, 0.01, 0.1, 0.4, 0.6, 1])(
    'give the load of one station when %d mm apart',
    (gap) => {
      const springs = (apart: number) =>
        loadOf(bar({ holds: [hold(2000, 0, 30), hold(2000 + apart, 53, 20)] }));
      const rigid = (apart: number) =>
        loadOf(bar({ holds: [hold(2000, 0, 'rigid'), hold(2000 + apart, 90, 'rigid')] }));
      const least = 5 * (gap / LENGTH) + 1e-9;
      expect(Math.abs(springs(gap) / springs(0) - 1)).toBeLessThan(least);
      expect(Math.abs(rigid(gap) / rigid(0) - 1)).toBeLessThan(least);
    },
  );

  it('count one after another, as on one place', () => {
    const three = loadOf(bar({ holds: [hold(2000, 0, 10), hold(2000.3, 0, 10), hold(2000.6, 0, 10)] }));
    const one = loadOf(bar({ holds: [hold(2000.3, 0, 30)] }));
    expect(Math.abs(three / one - 1)).toBeLessThan(5 * (0.6 / LENGTH));
  });

  it('do not mind a step of the force beside a station', () => {
    const stepped = loadOf(
      bar({
        holds: [hold(2000, 0, 'rigid')],
        axial: [
          { from: 0, to: 2000.1, share: 1 },
          { from: 2000.1, to: LENGTH, share: 1 },
        ],
      }),
    );
    expect(stepped / loadOf(bar({ holds: [hold(2000, 0, 'rigid')] }))).toBeCloseTo(1, 9);
  });
});

describe('springs far stiffer than the bar', () => {
  it.each([1e9, 1e12, 1e15, 1e18])('act as a rigid hold at %d N/mm, whichever way they point', (k) => {
    for (const degrees of [0, 20, 33, 110]) {
      const sprung = loadOf(bar({ holds: [hold(1800, degrees, k)] }));
      const rigid = loadOf(bar({ holds: [hold(1800, degrees, 'rigid')] }));
      // The ideal stiffness is about 100 N/mm here: what is lost is of the order of 100/k.
      expect(Math.abs(sprung / rigid - 1)).toBeLessThan(1000 / k + 1e-10);
    }
  });

  it('leave a soft spring beside them to do its work', () => {
    const both = (k: Hold['stiffness']) => loadOf(bar({ holds: [hold(2500, 70, k), hold(2500, 160, 30)] }));
    const without = loadOf(bar({ holds: [hold(2500, 70, 'rigid')] }));
    expect(both(1e15) / both('rigid')).toBeCloseTo(1, 9);
    expect(both(1e15)).toBeGreaterThan(without * 1.05);
  });

  it('hold an end against turning one way alone', () => {
    const clamped = (alongX: number | 'rigid') =>
      loadOf(bar({ endI: { alongX, alongY: 0 }, endJ: { alongX, alongY: 0 } }));
    expect(clamped(1e18) / clamped('rigid')).toBeCloseTo(1, 9);
    // More than pinned, less than clamped both ways.
    expect(clamped('rigid')).toBeGreaterThan(EULER * 1.1);
    expect(clamped('rigid')).toBeLessThan(4 * EULER);
  });
});

describe('bars that nothing presses', () => {
  it('have no critical load', () => {
    for (const share of [0, -1])
      expect(criticalLoad(bar({ axial: [{ from: 0, to: LENGTH, share }] }))).toMatchObject({
        factor: null,
        N: null,
        second: null,
      });
    expect(criticalLoad(bar({ axial: [] })).factor).toBeNull();
  });

  it('are so too when the only pressed piece has no length', () => {
    const axial = [
      { from: 0, to: 2500, share: -1 },
      { from: 2500, to: 2500, share: 1 },
      { from: 2500, to: LENGTH, share: 0 },
    ];
    expect(criticalLoad(bar({ axial })).factor).toBeNull();
  });
});

describe('bars with nothing left to move but what is between their nodes', () => {
  it('are found by the clamped count alone', () => {
    const clamped = { alongX: 'rigid', alongY: 'rigid' } as const;
    const { N, second } = criticalLoad(bar({ endI: clamped, endJ: clamped }));
    // Fixed ends: four times Euler's load about v; next the unsymmetric one, (2 × 4.4934/π)² = 8.1830 times.
    expect((N ?? 0) / EULER).toBeCloseTo(4, 8);
    expect((second ?? 0) / EULER).toBeCloseTo(8.183, 3);
  });
});

describe('a pair that is a chain of hinges', () => {
  const cut = { length: 5000, EI: 3e10, crossingAt: 2500, cut: true };

  it('moves without load when both bars are cut and the partner pulls less than the bar is pressed', () => {
    for (const taut of [-1, 0, 0.5, 0.99])
      expect(pairCriticalLoad(planarPair(cut, cut, taut), { second: true })).toMatchObject({
        factor: 0,
        N: 0,
      });
  });

  it('stands by the pull alone when that is greater: the halves then buckle as pinned bars', () => {
    const { N } = pairCriticalLoad(planarPair(cut, cut, 1.5));
    expect((N ?? 0) / ((Math.PI ** 2 * 3e10) / 2500 ** 2)).toBeCloseTo(1, 8);
  });
});
