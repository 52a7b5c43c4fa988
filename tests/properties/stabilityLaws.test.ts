/** What must be true of critical loads whatever the bar. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '../../core/geometry/vector.ts';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { bucklingMode } from '../../core/stability/mode.ts';
import {
  type BarProblem,
  type BucklingSection,
  type EndRotation,
  type Hold,
  PINNED,
} from '../../core/stability/model.ts';
import { type PairBar, pairCriticalLoad } from '../../core/stability/pair.ts';
import { angle, bowingBar, E, hold, stiffness, twistingBar } from './given/barProblems.ts';
import { runs } from './given/runs.ts';

/** The search ends within 1e-11; where root and pole fall together a root is good to 1e-8. */
const SAME = 3e-8;

function loads(problem: BarProblem): readonly [number, number] {
  const { factor, second } = criticalLoad(problem);
  return [factor ?? Number.NaN, second ?? Number.NaN];
}
const lowest = (problem: BarProblem): number => loads(problem)[0];

function expectSame(a: BarProblem, b: BarProblem, scale = 1): void {
  const [first, second] = [loads(a), loads(b)];
  for (const k of [0, 1] as const)
    expect(Math.abs((second[k] * scale) / first[k] - 1), `${first[k]} and ${second[k]}`).toBeLessThan(SAME);
}

function expectNotBelow(less: BarProblem, more: BarProblem): void {
  const [a, b] = [loads(less), loads(more)];
  for (const k of [0, 1] as const) expect(b[k]).toBeGreaterThanOrEqual(a[k] * (1 - SAME));
}

const either = fc.oneof({ weight: 3, arbitrary: bowingBar() }, { weight: 1, arbitrary: twistingBar });

describe('more support never lowers a critical load', () => {
  it('nor does a stiffer spring', () => {
    fc.assert(
      fc.property(either, fc.nat(), fc.integer({ min: 1, max: 500 }), (problem, which, more) => {
        const k = problem.holds.length > 0 ? which % problem.holds.length : -1;
        const stiffer = problem.holds.map((each, index): Hold => {
          if (index !== k || each.stiffness === 'rigid') return each;
          return { ...each, stiffness: each.stiffness * (1 + more / 100) };
        });
        expectNotBelow(problem, { ...problem, holds: stiffer });
      }),
      runs(150),
    );
  });

  it('nor does an added hold, sprung or rigid', () => {
    fc.assert(
      fc.property(
        either.chain((problem) => fc.tuple(fc.constant(problem), hold(problem.length))),
        ([problem, added]) => expectNotBelow(problem, { ...problem, holds: [...problem.holds, added] }),
      ),
      runs(200),
    );
  });

  it('nor does an end held against turning', () => {
    fc.assert(
      fc.property(either, stiffness, (problem, alongX) => {
        const end = problem.endI.alongX === 'rigid' ? 'rigid' : alongX;
        const stiffer = end === 'rigid' ? end : Math.max(end, Number(problem.endI.alongX));
        expectNotBelow(problem, { ...problem, endI: { ...problem.endI, alongX: stiffer } });
      }),
      runs(100),
    );
  });

  it('nor does twist held at one place more', () => {
    fc.assert(
      fc.property(twistingBar, fc.integer({ min: 1, max: 19 }), (problem, k) => {
        const { twist } = problem;
        if (!twist) throw new Error('a bar that twists');
        const heldAt = [...twist.heldAt, (k * problem.length) / 20];
        expectNotBelow(problem, { ...problem, twist: { ...twist, heldAt } });
      }),
      runs(60),
    );
  });

  it('and twist set free never raises it', () => {
    fc.assert(
      fc.property(twistingBar, (problem) => expectNotBelow(problem, { ...problem, twist: null })),
      runs(100),
    );
  });
});

describe('a spring that grows', () => {
  it('tends to a rigid hold', () => {
    fc.assert(
      fc.property(either, (problem) => {
        const all = (k: Hold['stiffness']): number =>
          lowest({ ...problem, holds: problem.holds.map((each) => ({ ...each, stiffness: k })) });
        // Needed stiffness is of the order of N/L, at most some 10⁴ N/mm here; what is left is that over 10⁹, and a hold that grips far from the centre turns the section too.
        expect(Math.abs(all(1e9) / all('rigid') - 1)).toBeLessThan(2e-4);
        expect(all(1e9)).toBeLessThanOrEqual(all('rigid') * (1 + SAME));
        expect(Math.abs(all(1e14) / all('rigid') - 1)).toBeLessThan(SAME);
      }),
      runs(100),
    );
  });
});

describe('the same bar seen otherwise', () => {
  /** All axes turned, ends with springs that know no direction. */
  function turned(problem: BarProblem, degrees: number): BarProblem {
    const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
    const turn = ([x, y]: Vec2): Vec2 => [c * x - s * y, s * x + c * y];
    const { section } = problem;
    const alpha = section.alpha + (degrees * Math.PI) / 180;
    const { Iu, Iv } = section;
    const turnedSection: BucklingSection = {
      ...section,
      alpha,
      Ixx: Iu * Math.cos(alpha) ** 2 + Iv * Math.sin(alpha) ** 2,
      Iyy: Iu * Math.sin(alpha) ** 2 + Iv * Math.cos(alpha) ** 2,
      shearCentre: turn(section.shearCentre),
    };
    return {
      ...problem,
      section: turnedSection,
      holds: problem.holds.map(({ grip, ...rest }) => ({
        ...rest,
        direction: turn(rest.direction),
        ...(grip ? { grip: turn(grip) } : {}),
      })),
    };
  }
  const blind = ({ alongX }: EndRotation): EndRotation => ({ alongX, alongY: alongX });

  it('does not mind its axes turned', () => {
    fc.assert(
      fc.property(either, fc.integer({ min: -180, max: 180 }), (given, degrees) => {
        const problem = { ...given, endI: blind(given.endI), endJ: blind(given.endJ) };
        expectSame(problem, turned(problem, degrees));
      }),
      runs(150),
    );
  });

  it('does not mind being looked at in a mirror', () => {
    fc.assert(
      fc.property(either, (problem) => {
        const flip = ([x, y]: Vec2): Vec2 => [-x, y];
        const { section } = problem;
        expectSame(problem, {
          ...problem,
          section: { ...section, alpha: -section.alpha, shearCentre: flip(section.shearCentre) },
          holds: problem.holds.map(({ grip, ...rest }) => ({
            ...rest,
            direction: flip(rest.direction),
            ...(grip ? { grip: flip(grip) } : {}),
          })),
        });
      }),
      runs(100),
    );
  });

  it('does not mind being turned end for end', () => {
    fc.assert(
      fc.property(either, (problem) => {
        const { length, twist } = problem;
        expectSame(problem, {
          ...problem,
          endI: problem.endJ,
          endJ: problem.endI,
          holds: problem.holds.map((each) => ({ ...each, at: length - each.at })).reverse(),
          axial: problem.axial
            .map(({ from, to, share }) => ({ from: length - to, to: length - from, share }))
            .reverse(),
          twist: twist && { ...twist, heldAt: twist.heldAt.map((at) => length - at) },
        });
      }),
      runs(150),
    );
  });

  it('does not mind which way a hold’s direction points, or in which order holds are told', () => {
    fc.assert(
      fc.property(either, (problem) => {
        const holds = problem.holds
          .map(({ direction: [x, y], ...rest }): Hold => ({ ...rest, direction: [-x, -y] }))
          .reverse();
        expectSame(problem, { ...problem, holds });
      }),
      runs(100),
    );
  });

  it('follows a change of units, and of the measure of its force', () => {
    fc.assert(
      fc.property(
        either,
        fc.constantFrom(1 / 25.4, 7, 0.001),
        fc.constantFrom(0.2248, 3),
        (problem, l, f) => {
          const { section, twist } = problem;
          const spring = (k: Hold['stiffness'], by: number): Hold['stiffness'] =>
            k === 'rigid' ? k : k * by;
          const end = ({ alongX, alongY }: EndRotation): EndRotation => ({
            alongX: spring(alongX, f * l),
            alongY: spring(alongY, f * l),
          });
          const point = ([x, y]: Vec2): Vec2 => [x * l, y * l];
          expectSame(
            problem,
            {
              E: (problem.E * f) / l ** 2,
              length: problem.length * l,
              section: {
                area: section.area * l ** 2,
                Ixx: section.Ixx * l ** 4,
                Iyy: section.Iyy * l ** 4,
                Iu: section.Iu * l ** 4,
                Iv: section.Iv * l ** 4,
                alpha: section.alpha,
                shearCentre: point(section.shearCentre),
                J: section.J * l ** 4,
                Iw: section.Iw * l ** 6,
              },
              holds: problem.holds.map(({ grip, ...rest }) => ({
                ...rest,
                at: rest.at * l,
                stiffness: spring(rest.stiffness, f / l),
                ...(grip ? { grip: point(grip) } : {}),
              })),
              // Shares doubled: the factor halves.
              axial: problem.axial.map(({ from, to, share }) => ({
                from: from * l,
                to: to * l,
                share: share * 2,
              })),
              endI: end(problem.endI),
              endJ: end(problem.endJ),
              twist: twist && { G: (twist.G * f) / l ** 2, heldAt: twist.heldAt.map((at) => at * l) },
            },
            2 / f,
          );
        },
      ),
      runs(100),
    );
  });
});

describe('the shape at buckling', () => {
  it('keeps to the holds, is largest where it says, and shares out its energy', () => {
    fc.assert(
      fc.property(bowingBar(), (problem) => {
        const { factor, second } = criticalLoad(problem);
        // Two loads nearly one: any mixture of their shapes is a shape.
        fc.pre(factor !== null && second !== null && second > factor * 1.0001);
        const mode = bucklingMode(problem, factor ?? 0);
        expect(mode.energyAboutU + mode.energyAboutV).toBeCloseTo(1, 9);
        expect(Math.hypot(...mode.directionAtLargest)).toBeCloseTo(1, 9);
        for (const { displacement } of mode.shape) expect(Math.hypot(...displacement)).toBeLessThan(1 + 1e-9);
        for (const { at, direction, stiffness: k } of problem.holds) {
          const here = mode.shape.find((point) => Math.abs(point.at - at) < 1e-6);
          if (k !== 'rigid' || !here) continue;
          const [x, y] = here.displacement;
          expect(Math.abs(x * direction[0] + y * direction[1])).toBeLessThan(1e-9);
        }
        for (const end of [mode.shape[0], mode.shape.at(-1)])
          expect(Math.hypot(...(end?.displacement ?? [1, 1]))).toBe(0);
      }),
      runs(100),
    );
  });
});

describe('a crossed pair of angles', () => {
  const pair = fc.record({
    section: angle,
    other: angle,
    length: fc.integer({ min: 2000, max: 9000 }),
    share: fc.integer({ min: 15, max: 85 }),
    otherShare: fc.integer({ min: 15, max: 85 }),
    longer: fc.boolean(),
    barCut: fc.boolean(),
    partnerCut: fc.boolean(),
    k: fc.oneof(fc.constant('rigid' as const), fc.integer({ min: 1, max: 10_000 })),
  });

  function bars(given: Parameters<Parameters<typeof pair.map>[0]>[0], taut: number) {
    const { section, other, length, share, otherShare, longer, barCut, partnerCut, k } = given;
    const one = (own: BucklingSection, place: number, pressed: number, cut: boolean): PairBar => {
      const crossingAt = (length * place) / 100;
      return {
        problem: {
          E,
          length,
          section: own,
          holds: [{ at: crossingAt, direction: longer ? [0, 1] : [1, 0], stiffness: k }],
          axial: [{ from: 0, to: length, share: pressed }],
          endI: PINNED,
          endJ: PINNED,
          twist: null,
        },
        crossingAt,
        outOfPlane: longer ? [1, 0] : [0, 1],
        cut,
      };
    };
    return {
      bar: one(section, share, 1, barCut && !partnerCut),
      partner: one(other, otherShare, -taut, partnerCut),
    };
  }
  const load = (given: Parameters<typeof bars>[0], taut: number): number =>
    pairCriticalLoad(bars(given, taut)).factor ?? Number.NaN;

  it('never loses by a partner that pulls more', () => {
    fc.assert(
      fc.property(
        pair,
        fc.integer({ min: -150, max: 150 }),
        fc.integer({ min: 1, max: 100 }),
        (given, t, more) => {
          expect(load(given, (t + more) / 100)).toBeGreaterThanOrEqual(load(given, t / 100) * (1 - SAME));
        },
      ),
      runs(200),
    );
  });

  it('is one bar with a spring, where the partner is slack', () => {
    fc.assert(
      fc.property(pair, (given) => {
        // A slack partner that runs through, rigid in its plane: free in one direction only, in which it bends by I of that direction.
        const rigid = { ...given, k: 'rigid' as const, barCut: false, partnerCut: false };
        const { bar, partner } = bars(rigid, 0);
        const { length, section } = partner.problem;
        const [a, b] = [partner.crossingAt, length - partner.crossingAt];
        // Held in the plane at the crossing alone, bending out of it draws in the other principal axis: flexibility of the pinned bar, the reaction in the plane condensed out.
        const flex = (a * a * b * b) / (3 * E * length);
        const { Iu, Iv, alpha } = section;
        const inverse = (x: number, y: number, p: number, q: number): number => {
          const along = (m: number, n: number) =>
            [m * Math.cos(alpha) + n * Math.sin(alpha), -m * Math.sin(alpha) + n * Math.cos(alpha)] as const;
          const [v1, u1] = along(x, y);
          const [v2, u2] = along(p, q);
          return flex * ((v1 * v2) / Iv + (u1 * u2) / Iu);
        };
        const [ox, oy] = partner.outOfPlane;
        const out = inverse(ox, oy, ox, oy);
        const inPlane = inverse(oy, ox, oy, ox);
        const both = inverse(ox, oy, oy, ox);
        const spring = 1 / (out - (both * both) / inPlane);
        const alone = lowest({
          ...bar.problem,
          holds: [...bar.problem.holds, { at: bar.crossingAt, direction: bar.outOfPlane, stiffness: spring }],
        });
        expect(Math.abs(load(rigid, 0) / alone - 1)).toBeLessThan(SAME);
      }),
      runs(100),
    );
  });

  it('buckles first or last as one bar does when the other is infinitely stiff', () => {
    fc.assert(
      fc.property(pair, (given) => {
        const stiff = { ...given, barCut: false, partnerCut: false };
        const { bar, partner } = bars(stiff, 0);
        const { section } = partner.problem;
        const rigid = {
          bar,
          partner: {
            ...partner,
            problem: {
              ...partner.problem,
              section: { ...section, Iu: section.Iu * 1e9, Iv: section.Iv * 1e9 },
            },
          },
        };
        const held = lowest({
          ...bar.problem,
          holds: [
            ...bar.problem.holds,
            { at: bar.crossingAt, direction: bar.outOfPlane, stiffness: 'rigid' },
          ],
        });
        expect(Math.abs((pairCriticalLoad(rigid).factor ?? 0) / held - 1)).toBeLessThan(1e-5);
      }),
      runs(60),
    );
  });
});
