/** Critical loads that can be had from a formula: Euler, ends held against turning, one hold at mid-length, Winter's holds in a row. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { type BarProblem, type EndRotation, type Hold, PINNED } from '../../core/stability/model.ts';
import { ANGLES, direction, E, sectionOf } from '../properties/given/barProblems.ts';
import { runs } from '../properties/given/runs.ts';
import { propertiesOf } from '../unit/assess/given/catalogues.ts';
import { bisected } from './bisected.ts';

const L = 4000;
const angle = propertiesOf('70x70x6');
const euler = (I: number, length = L): number => (Math.PI ** 2 * E * I) / length ** 2;

function problem(change: Partial<BarProblem> = {}): BarProblem {
  const length = change.length ?? L;
  return {
    E,
    length,
    section: angle,
    holds: [],
    axial: [{ from: 0, to: length, share: 1 }],
    endI: PINNED,
    endJ: PINNED,
    twist: null,
    ...change,
  };
}
const loadOf = (change: Partial<BarProblem>): number => criticalLoad(problem(change)).N ?? Number.NaN;

/** The search ends within 1e-11 of the root; stability functions carry about fourteen figures. */
const EXACT = 1e-9;
const near = (actual: number, expected: number, share = EXACT): void =>
  void expect(Math.abs(actual / expected - 1), `${actual} against ${expected}`).toBeLessThan(share);

describe('a bar with nothing between its ends', () => {
  it('carries Euler’s load about its least axis, and about u next or two half-waves about v', () => {
    for (const section of ANGLES) {
      const { N, second } = criticalLoad(problem({ section }));
      near(N ?? 0, euler(section.Iv));
      // Two half-waves come just where the piece clamped at both ends has its load: root and pole cancel to the square root of working accuracy.
      near(second ?? 0, Math.min(4 * euler(section.Iv), euler(section.Iu)), 2e-8);
    }
  });

  // Timoshenko and Gere, Theory of Elastic Stability, §2.2 and after: both ends fixed K = 0.5; one end fixed, K from tan φ = φ, φ = 4.493 409 458.
  it('has K = 0.5 with both ends fixed against turning, and 0.6992 with one', () => {
    const fixed: EndRotation = { alongX: 'rigid', alongY: 'rigid' };
    near(loadOf({ endI: fixed, endJ: fixed }), 4 * euler(angle.Iv));
    const one = loadOf({ endI: fixed });
    near(one, (4.493_409_457_909_064 / Math.PI) ** 2 * euler(angle.Iv));
    expect(Math.sqrt(euler(angle.Iv) / one)).toBeCloseTo(0.6992, 4);
  });

  it('follows tan(φ/2) = −φEI/cL with equal springs at both ends', () => {
    // Symmetric shape A(cos kz − cos kL/2) with EIw″ + cw′ = 0 at the end. Springs alike both ways leave u and v apart.
    for (const c of [1e4, 1e6, 3e7, 1e9, 1e11]) {
      const spring: EndRotation = { alongX: c, alongY: c };
      const half = bisected(
        (h) => (2 * h * E * angle.Iv * Math.cos(h)) / L + c * Math.sin(h),
        Math.PI / 2,
        Math.PI,
      );
      near(loadOf({ endI: spring, endJ: spring }), ((2 * half) / L) ** 2 * E * angle.Iv);
    }
  });

  it('follows tan φ = φ/(1 + φ²EI/cL) with a spring at one end', () => {
    for (const c of [1e5, 1e7, 1e9]) {
      const phi = bisected(
        (p) => Math.sin(p) * (1 + (p * p * E * angle.Iv) / (c * L)) - p * Math.cos(p),
        Math.PI,
        4.5,
      );
      near(loadOf({ endJ: { alongX: c, alongY: c } }), (phi / L) ** 2 * E * angle.Iv);
    }
  });
});

describe('a bar with one hold at mid-length', () => {
  /**
   * METHODS.md, "Critical load of a bar": cos²ψ tan β_v/β_v + sin²ψ tan β_u/β_u = 1 − 4N/kL, β = (L/2)√(N/EI); the load is its lowest root, or that of
   * two half-waves about v. The left side less the right rises between its poles, so bisection between Euler's load and the next pole finds the root.
   */
  function byFormula(Iv: number, Iu: number, psi: number, k: number): number {
    const [c2, s2] = [Math.cos(psi) ** 2, Math.sin(psi) ** 2];
    const beta = (N: number, I: number): number => (L / 2) * Math.sqrt(N / (E * I));
    const f = (N: number): number => {
      const [v, u] = [beta(N, Iv), beta(N, Iu)];
      return (c2 * Math.tan(v)) / v + (s2 * Math.tan(u)) / u - 1 + (4 * N) / (k * L);
    };
    const pole = Math.min(9 * euler(Iv), euler(Iu));
    const root = bisected(f, euler(Iv) * (1 + 1e-14), pole * (1 - 1e-14));
    return Math.min(root, 4 * euler(Iv));
  }

  it('agrees with the formula within a millionth, for any stiffness, direction and section', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 600 }),
        fc.integer({ min: 0, max: 89 }),
        fc.integer({ min: 11, max: 300 }),
        fc.integer({ min: -89, max: 90 }),
        (power, psi, tenths, turn) => {
          const section = sectionOf(152_679, tenths / 10, turn);
          const k = 10 ** (power / 100);
          const weak = (section.alpha * 180) / Math.PI;
          const hold: Hold = { at: L / 2, direction: direction(weak + psi), stiffness: k };
          const expected = byFormula(section.Iv, section.Iu, (psi * Math.PI) / 180, k);
          near(loadOf({ section, holds: [hold] }), expected, 1e-6);
        },
      ),
      runs(500),
    );
  });

  it('gains nothing from a hold square to the weak motion, and two half-waves from a rigid one along it', () => {
    for (const section of ANGLES) {
      const along = (degrees: number): Hold => ({
        at: L / 2,
        direction: direction((section.alpha * 180) / Math.PI + degrees),
        stiffness: 'rigid',
      });
      near(loadOf({ section, holds: [along(90)] }), euler(section.Iv));
      near(loadOf({ section, holds: [along(0)] }), Math.min(4 * euler(section.Iv), euler(section.Iu)));
    }
  });
});

describe('holds in a row', () => {
  // Winter (1958), as in Yura, Fundamentals of Beam Bracing, for one hold: β = N P/Lb with N = 2(1 + cos π/(n + 1)): 2, 3, 3.414, 3.618.
  it.each([
    [1, 2],
    [2, 3],
    [3, 3.414],
    [4, 3.618],
  ])('%d equal ones need %f P/Lb each for the bar to carry P between them', (n, printed) => {
    const span = L / (n + 1);
    const P = euler(angle.Iv, span);
    const weak = direction((angle.alpha * 180) / Math.PI);
    // Stiff beyond reach about u, so that it bends in one plane.
    const planar = (stiffness: number): number =>
      loadOf({
        section: { ...angle, Iu: angle.Iu * 1000 },
        holds: Array.from({ length: n }, (_, k) => ({ at: (k + 1) * span, direction: weak, stiffness })),
      });
    const ideal = (2 * (1 + Math.cos(Math.PI / (n + 1))) * P) / span;
    expect(Math.abs((ideal * span) / P - printed)).toBeLessThan(0.0005);
    near(planar(ideal), P, 1e-8);
    // A little less stiff does not carry it; stiffer carries no more.
    expect(planar(0.99 * ideal)).toBeLessThan(P * (1 - 1e-4));
    near(planar(10 * ideal), P, 1e-8);
  });
});

describe('what a hold must be', () => {
  // METHODS.md, "The push test": a spring of exactly the ideal stiffness of the weak axis gives 78 % of the load with a rigid hold; 95 % needs 5 times, 99 % 26 times.
  // Tolerance: half of the last digit printed.
  it.each([
    [1, 0.78],
    [5, 0.95],
    [26, 0.99],
  ])('%d times the ideal stiffness in the plane gives %f of what a rigid hold does', (times, share) => {
    const ideal = (16 * Math.PI ** 2 * E * angle.Iv) / L ** 3;
    const load = (stiffness: Hold['stiffness']): number =>
      loadOf({ holds: [{ at: L / 2, direction: [1, 0], stiffness }] });
    expect(Math.abs(load(times * ideal) / load('rigid') - share)).toBeLessThan(0.005);
  });

  // METHODS.md, "The push test": 70x70x6, 7.32 m, E = 200 000, held in the plane: 6.5 N/mm out of it, against 29.7 for the planar bar; an equal partner gives 9.0.
  it('is far less out of the plane for an angle that is held in it than for a planar bar', () => {
    const [length, steel] = [7320, 200_000];
    const load = (k: number): number =>
      loadOf({
        E: steel,
        length,
        holds: [
          { at: length / 2, direction: [1, 0], stiffness: 'rigid' },
          { at: length / 2, direction: [0, 1], stiffness: k },
        ],
      });
    const two = (4 * Math.PI ** 2 * steel * angle.Iv) / length ** 2;
    const needed = bisected((k) => load(k) / two - 1 + 1e-9, 0, 29.7);
    expect(Math.abs(needed - 6.5)).toBeLessThan(0.05);
    expect(Math.abs((16 * Math.PI ** 2 * steel * angle.Ixx) / length ** 3 - 29.7)).toBeLessThan(0.05);
    expect(Math.abs((48 * steel * angle.Ixx) / length ** 3 - 9.0)).toBeLessThan(0.05);
  });
});

describe('a bar that runs on beyond its last hold to an end that does not hold', () => {
  // Span b and the part a beyond it, load keeping its direction. Beyond the hold w = A sin k(L − z) less its value at the tip, so the slope over the
  // moment there is k cot ka; in the span it is 1/b − k cot kb: k(cot ka + cot kb) = 1/b. Beam-column formulas of Timoshenko and Gere, §1.11.
  const root = (a: number, b: number): number =>
    bisected((k) => 1 / b - k / Math.tan(k * a) - k / Math.tan(k * b), 1e-7, Math.PI / Math.max(2 * a, b));
  const withSpan = (b: number): number =>
    loadOf({
      endsStay: {
        i: [
          [1, 0],
          [0, 1],
        ],
        j: [],
      },
      holds: ([0, 90] as const).map((way) => ({
        at: b,
        direction: direction(way),
        stiffness: 'rigid' as const,
      })),
    });

  it('has the load of k(cot ka + cot kb) = 1/b about its least axis', () => {
    for (const b of [400, 1000, 2000, 3000, 3600])
      near(withSpan(b), E * angle.Iv * root(L - b, b) ** 2, 1e-8);
  });

  it('carries no less than a pinned bar of the span and twice the part beyond, and tends to it at both extremes', () => {
    for (const b of [40, 400, 1000, 2000, 3000, 3600, 3960])
      expect(withSpan(b)).toBeGreaterThanOrEqual(euler(angle.Iv, b + 2 * (L - b)) * (1 - EXACT));
    // With 1 % of the bar as span, or beyond it, the lengths differ by less than that, the loads by twice as much.
    for (const b of [40, 3960]) expect(withSpan(b) / euler(angle.Iv, b + 2 * (L - b))).toBeLessThan(1.02);
  });

  it('is a mechanism with one hold alone: no load is carried', () => {
    expect(
      loadOf({
        endsStay: {
          i: [
            [1, 0],
            [0, 1],
          ],
          j: [[1, 0]],
        },
      }),
    ).toBe(0);
  });

  it('with one end held in one direction alone bows square to it as if the end were not there', () => {
    // Legs at right angles to the principal axes do not part the two; held along the weak motion at j, the strong motion swings out past the hold.
    const weak = [Math.cos(angle.alpha), Math.sin(angle.alpha)] as const;
    const load = loadOf({
      endsStay: {
        i: [
          [1, 0],
          [0, 1],
        ],
        j: [weak],
      },
      holds: ([0, 90] as const).map((way) => ({
        at: 2000,
        direction: direction(way),
        stiffness: 'rigid' as const,
      })),
    });
    // About v over 2 m: π²EI_v/b²; about u with the part beyond: from the same equation. Whichever is less.
    near(load, Math.min(E * angle.Iu * root(2000, 2000) ** 2, euler(angle.Iv, 2000)), 1e-8);
  });
});
