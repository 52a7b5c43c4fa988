/** Random bars under load, for the laws of critical loads. */
import fc from 'fast-check';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import {
  type AxialPiece,
  type BarProblem,
  type BucklingSection,
  type EndRotation,
  type Hold,
  PINNED,
} from '../../../core/stability/model.ts';
import { propertiesOf } from '../../unit/assess/given/catalogues.ts';

export const E = 210_000;
export const G = 81_000;

export const ANGLES = ['70x70x6', '125x75x8', '200x100x10', '50x50x5', '100x75x8', '150x90x10'].map(
  propertiesOf,
);

export const direction = (degrees: number): Vec2 => [
  Math.cos((degrees * Math.PI) / 180),
  Math.sin((degrees * Math.PI) / 180),
];

/** Any section that bends: principal second moments and the angle of the major axis, the rest by Mohr's circle. */
export function sectionOf(Iv: number, ratio: number, degrees: number): BucklingSection {
  const Iu = Iv * ratio;
  const alpha = (degrees * Math.PI) / 180;
  const [c, s] = [Math.cos(alpha), Math.sin(alpha)];
  return {
    area: 1000,
    Ixx: Iu * c * c + Iv * s * s,
    Iyy: Iu * s * s + Iv * c * c,
    Iu,
    Iv,
    alpha,
    shearCentre: [0, 0],
    J: 10_000,
    Iw: 1e6,
  };
}

const between = (min: number, max: number) =>
  fc.integer({ min: 0, max: 1000 }).map((k) => min + ((max - min) * k) / 1000);
/** From 10^least to 10^most, every size alike. */
export const sized = (least: number, most: number) => between(least, most).map((power) => 10 ** power);

export const angle = fc.constantFrom(...ANGLES);

/** Angles, and sections whose second load comes near the first: as stiff both ways, or four times (two half-waves against one). */
export const anySection: fc.Arbitrary<BucklingSection> = fc.oneof(
  { weight: 3, arbitrary: angle },
  {
    weight: 1,
    arbitrary: fc
      .tuple(fc.constantFrom(1, 1.000_001, 1.01, 4, 4.000_001, 9, 25), between(-90, 90))
      .map(([ratio, degrees]) => sectionOf(2e5, ratio, degrees)),
  },
);

const anyDirection = fc
  .oneof(fc.constantFrom(0, 90, 45, 135, 15, 100), between(0, 180))
  .map((degrees) => direction(degrees));

/** Twentieths of the length, so that stations and steps of the force fall together now and then. */
export const place = (length: number) => fc.integer({ min: 1, max: 19 }).map((k) => (k * length) / 20);

export const stiffness: fc.Arbitrary<number | 'rigid'> = fc.oneof(
  fc.constant('rigid' as const),
  sized(-1, 5),
);

export const hold = (length: number): fc.Arbitrary<Hold> =>
  fc
    .tuple(place(length), anyDirection, stiffness)
    .map(([at, way, k]) => ({ at, direction: way, stiffness: k }));

const endSpring: fc.Arbitrary<number | 'rigid'> = fc.oneof(
  fc.constant(0),
  fc.constant('rigid' as const),
  sized(5, 10),
);
const end: fc.Arbitrary<EndRotation> = fc.oneof(
  { weight: 2, arbitrary: fc.constant(PINNED) },
  { weight: 1, arbitrary: fc.record({ alongX: endSpring, alongY: endSpring }) },
);

/** One to four pieces, some pulled, at least one pressed; none shorter than three twentieths. */
const axialOf = (length: number, cuts: number): fc.Arbitrary<readonly AxialPiece[]> =>
  fc
    .tuple(
      fc.subarray([3, 6, 10, 13, 16], { maxLength: cuts }),
      fc.tuple(between(0.2, 1), ...Array.from({ length: 3 }, () => between(-1.5, 1))),
      fc.integer({ min: 0, max: 3 }),
    )
    .map(([cuts, shares, turn]) => {
      const ends = [0, ...cuts, 20];
      const pieces = ends.slice(1).map((to, k) => ({
        from: ((ends[k] ?? 0) * length) / 20,
        to: to === 20 ? length : (to * length) / 20,
        share: shares[(k + turn) % (cuts.length + 1)] ?? 1,
      }));
      return pieces;
    });

/** Bars of 1 to 12 m with up to three holds. */
export const bowingBar = (section: fc.Arbitrary<BucklingSection> = anySection): fc.Arbitrary<BarProblem> =>
  fc.integer({ min: 1000, max: 12_000 }).chain((length) =>
    fc
      .record({
        section,
        holds: fc.array(hold(length), { maxLength: 3 }),
        axial: axialOf(length, 3),
        endI: end,
        endJ: end,
      })
      .map((rest): BarProblem => ({ ...rest, E, length, twist: null })),
  );

/** Angles of 2 to 8 m, with holds that grip anywhere within 40 mm of the centroid, and twist held at a place or two. */
export const twistingBar: fc.Arbitrary<BarProblem> = fc.integer({ min: 2000, max: 8000 }).chain((length) =>
  fc
    .record({
      section: angle,
      holds: fc.array(
        fc
          .tuple(hold(length), between(-40, 40), between(-40, 40))
          .map(([each, x, y]): Hold => ({ ...each, grip: [x, y] })),
        { maxLength: 2 },
      ),
      axial: axialOf(length, 1),
      endI: end,
      endJ: end,
      heldAt: fc.uniqueArray(place(length), { maxLength: 1 }),
    })
    .map(({ heldAt, ...rest }): BarProblem => ({ ...rest, E, length, twist: { G, heldAt } })),
);
