/** Laws that any section must obey, over random outlines (seeded, shrinking). */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '../../core/geometry/vector.ts';
import { angleProperties } from '../../core/section/angleProperties.ts';
import {
  type AreaIntegrals,
  areaIntegrals,
  type Segment,
  shifted,
} from '../../core/section/areaIntegrals.ts';
import { inertiaFor, motionAbout, radiusFor } from '../../core/section/direction.ts';
import { type AngleOutline, AXES } from '../../core/section/model.ts';
import { outlinePath, outlinePolygon } from '../../core/section/outlinePath.ts';
import { outlineProblem } from '../../core/section/outlineProblem.ts';

const SEEDED = { seed: 20240611, numRuns: 300 };
/** Sums of a dozen exact terms that partly cancel: a few thousand roundings of 1e-16. */
const ROUNDING = 1e-10;

/** Outlines over the whole range that the program accepts, from thin to stocky, toes up to rounder than thick. */
const outlines: fc.Arbitrary<AngleOutline> = fc
  .record({
    longLeg: fc.double({ min: 15, max: 400, noNaN: true }),
    ratio: fc.double({ min: 0.3, max: 1, noNaN: true }),
    slimness: fc.double({ min: 0.04, max: 0.45, noNaN: true }),
    root: fc.double({ min: 0, max: 1, noNaN: true }),
    toe: fc.double({ min: 0, max: 1, noNaN: true }),
  })
  .map(({ longLeg, ratio, slimness, root, toe }) => {
    const shortLeg = longLeg * ratio;
    const thickness = shortLeg * slimness;
    const room = shortLeg - thickness;
    const toeRadius = toe * Math.min(1.5 * thickness, 0.45 * room);
    return { longLeg, shortLeg, thickness, rootRadius: root * 0.5 * room, toeRadius };
  });

const turns = fc.double({ min: -Math.PI, max: Math.PI, noNaN: true });

function near(a: number, b: number, size: number, tolerance = ROUNDING): void {
  expect(Math.abs(a - b)).toBeLessThanOrEqual(tolerance * size);
}

describe('the integrals of an outline', () => {
  it('accepts every outline of the range', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        expect(outlineProblem(outline)).toBeNull();
      }),
      SEEDED,
    );
  });

  it('is walked end to end, anticlockwise, from the heel', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        const path = outlinePath(outline);
        path.forEach((piece, i) => {
          const next = path[(i + 1) % path.length];
          if (!next) throw new Error('an empty path');
          near(piece.to[0], next.from[0], outline.longLeg);
          near(piece.to[1], next.from[1], outline.longLeg);
        });
        expect(path[0]?.from).toEqual([0, 0]);
        expect(areaIntegrals(path).area).toBeGreaterThan(0);
      }),
      SEEDED,
    );
  });

  // Rotating the plane turns (∫xx, ∫yy, ∫xy) as a tensor.
  it('turns as a tensor when the outline is turned', () => {
    fc.assert(
      fc.property(outlines, turns, (outline, turn) => {
        const path = outlinePath(outline);
        const before = areaIntegrals(path);
        const after = areaIntegrals(path.map((piece) => turned(piece, turn)));
        const [c, s] = [Math.cos(turn), Math.sin(turn)];
        const size = before.xx + before.yy;
        near(after.area, before.area, before.area);
        near(after.xx, c * c * before.xx - 2 * c * s * before.xy + s * s * before.yy, size);
        near(after.yy, s * s * before.xx + 2 * c * s * before.xy + c * c * before.yy, size);
        near(after.xy, c * s * (before.xx - before.yy) + (c * c - s * s) * before.xy, size);
      }),
      SEEDED,
    );
  });

  it('swaps x and y in a mirror on the diagonal, and keeps the sign of the product', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        const before = areaIntegrals(outlinePath(outline));
        const after = areaIntegrals(outlinePath(outline).map(mirrored));
        const size = before.xx + before.yy;
        // A mirror reverses the walk, so every integral changes sign.
        near(-after.area, before.area, before.area);
        near(-after.xx, before.yy, size);
        near(-after.yy, before.xx, size);
        near(-after.xy, before.xy, size);
      }),
      SEEDED,
    );
  });

  // Steiner: moving the outline and moving the origin are the same.
  it('moves with the outline as the shifted integrals say', () => {
    const move = fc.double({ min: -200, max: 200, noNaN: true });
    fc.assert(
      fc.property(outlines, move, move, (outline, dx, dy) => {
        const path = outlinePath(outline);
        const moved = areaIntegrals(path.map((piece) => mapped(piece, (p) => [p[0] + dx, p[1] + dy])));
        const said = shifted(areaIntegrals(path), dx, dy);
        const size = said.xx + said.yy + said.area * (dx * dx + dy * dy);
        near(moved.xx, said.xx, size);
        near(moved.yy, said.yy, size);
        near(moved.xy, said.xy, size);
      }),
      SEEDED,
    );
  });

  // What n chords leave of an arc goes with 1/n²: doubling them leaves a quarter. A tenth is left for the next term, and the roundings.
  it('is the limit of polygons, which close in by four when their sides are doubled', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        const exact = areaIntegrals(outlinePath(outline));
        const [coarse, fine] = [facets(outline, 24), facets(outline, 48)];
        for (const [k, size] of [
          ['area', exact.area],
          ['xx', exact.xx],
          ['yy', exact.yy],
        ] as const)
          expect(Math.abs(fine[k] - exact[k])).toBeLessThanOrEqual(
            (1.1 / 4) * Math.abs(coarse[k] - exact[k]) + 1e-7 * size,
          );
      }),
      SEEDED,
    );
  });
});

describe('the properties of an angle', () => {
  it('grows with the powers of its scale', () => {
    const scales = fc.double({ min: 0.1, max: 20, noNaN: true });
    fc.assert(
      fc.property(outlines, scales, (outline, k) => {
        const p = angleProperties(outline);
        const q = angleProperties({
          longLeg: outline.longLeg * k,
          shortLeg: outline.shortLeg * k,
          thickness: outline.thickness * k,
          rootRadius: outline.rootRadius * k,
          toeRadius: outline.toeRadius * k,
        });
        near(q.area / k ** 2, p.area, p.area);
        for (const I of ['Ixx', 'Iyy', 'Ixy', 'Iu', 'Iv', 'J'] as const)
          near(q[I] / k ** 4, p[I], p.Iu + p.J, 1e-9);
        for (const r of ['rx', 'ry', 'ru', 'rv', 'centroidX', 'centroidY'] as const)
          near(q[r] / k, p[r], p[r], 1e-9);
        near(q.Iw / k ** 6, p.Iw, p.Iw);
      }),
      SEEDED,
    );
  });

  it('is as stiff about x as about y, with its axis of symmetry at 45°, when the legs are equal', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        // Radii are kept to what the shorter leg takes, so the equal angle of the shorter leg is sound too.
        const p = angleProperties({ ...outline, longLeg: outline.shortLeg });
        expect(p.Ixx).toBe(p.Iyy);
        near(p.alpha, Math.PI / 4, 1);
        near(p.centroidX, p.centroidY, p.centroidX);
      }),
      SEEDED,
    );
  });

  it('has x no weaker than y, the heel on the negative side of both, and u and v at the ends of the range', () => {
    fc.assert(
      fc.property(outlines, turns, (outline, turn) => {
        const p = angleProperties(outline);
        expect(p.Ixx).toBeGreaterThanOrEqual(p.Iyy * (1 - ROUNDING));
        expect(p.Ixy).toBeLessThan(0);
        expect(p.alpha).toBeGreaterThan(0);
        expect(p.alpha).toBeLessThanOrEqual(Math.PI / 4 + ROUNDING);
        const n: Vec2 = [Math.cos(turn), Math.sin(turn)];
        expect(inertiaFor(p, n)).toBeLessThanOrEqual(p.Iu * (1 + ROUNDING));
        expect(inertiaFor(p, n)).toBeGreaterThanOrEqual(p.Iv * (1 - 1e-8));
      }),
      SEEDED,
    );
  });

  it('adds up to the same in any two directions at right angles', () => {
    fc.assert(
      fc.property(outlines, turns, (outline, turn) => {
        const p = angleProperties(outline);
        const n: Vec2 = [Math.cos(turn), Math.sin(turn)];
        const across: Vec2 = [-n[1], n[0]];
        near(inertiaFor(p, n) + inertiaFor(p, across), p.Iu + p.Iv, p.Iu);
        near(radiusFor(p, n) ** 2 + radiusFor(p, across) ** 2, p.ru ** 2 + p.rv ** 2, p.ru ** 2);
      }),
      SEEDED,
    );
  });

  it('has in every direction the radius of the second moment there, and at each axis its own', () => {
    fc.assert(
      fc.property(outlines, turns, (outline, turn) => {
        const p = angleProperties(outline);
        const n: Vec2 = [Math.cos(turn), Math.sin(turn)];
        near(radiusFor(p, n) ** 2, inertiaFor(p, n) / p.area, p.ru ** 2);
        const own = { x: p.rx, y: p.ry, u: p.ru, v: p.rv };
        for (const axis of AXES) near(radiusFor(p, motionAbout(p, axis)), own[axis], p.ru, 1e-9);
      }),
      SEEDED,
    );
  });
});

describe('closed forms', () => {
  const sharpEqual = fc
    .record({
      b: fc.double({ min: 10, max: 300, noNaN: true }),
      share: fc.double({ min: 0.03, max: 0.6, noNaN: true }),
    })
    .map(({ b, share }) => ({ b, t: b * share }));

  // A sharp equal angle is a square less a square on the same diagonal, and a square has b⁴/12 about its diagonal.
  it('gives a sharp equal angle Iu = (b⁴ − (b − t)⁴)/12', () => {
    fc.assert(
      fc.property(sharpEqual, ({ b, t }) => {
        const p = angleProperties({ longLeg: b, shortLeg: b, thickness: t, rootRadius: 0, toeRadius: 0 });
        near(p.Iu, (b ** 4 - (b - t) ** 4) / 12, p.Iu);
      }),
      SEEDED,
    );
  });

  // Two rectangles and the theorem of parallel axes.
  it('gives a sharp unequal angle the sums of its two rectangles', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        const { longLeg: h, shortLeg: b, thickness: t } = outline;
        const p = angleProperties({ ...outline, rootRadius: 0, toeRadius: 0 });
        const [flat, upright] = [b * t, t * (h - t)];
        const area = flat + upright;
        const x = (flat * (b / 2) + upright * (t / 2)) / area;
        const y = (flat * (t / 2) + upright * ((h + t) / 2)) / area;
        near(p.area, area, area);
        near(p.centroidX, x, x);
        near(p.centroidY, y, y);
        const Ixx =
          (b * t ** 3) / 12 +
          flat * (t / 2 - y) ** 2 +
          (t * (h - t) ** 3) / 12 +
          upright * ((h + t) / 2 - y) ** 2;
        const Iyy =
          (t * b ** 3) / 12 + flat * (b / 2 - x) ** 2 + ((h - t) * t ** 3) / 12 + upright * (t / 2 - x) ** 2;
        const Ixy = flat * (b / 2 - x) * (t / 2 - y) + upright * (t / 2 - x) * ((h + t) / 2 - y);
        near(p.Ixx, Ixx, Ixx);
        near(p.Iyy, Iyy, Ixx);
        near(p.Ixy, Ixy, Ixx);
      }),
      SEEDED,
    );
  });

  // The corner between a quarter circle and its tangents is (1 − π/4) r².
  it('adds (1 − π/4) r1² of area at the root and takes (1 − π/4) r2² off at each toe', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        fc.pre(outline.toeRadius <= outline.thickness);
        const { longLeg: h, shortLeg: b, thickness: t, rootRadius: r1, toeRadius: r2 } = outline;
        const area = t * (h + b - t) + (1 - Math.PI / 4) * (r1 ** 2 - 2 * r2 ** 2);
        near(angleProperties(outline).area, area, area);
      }),
      SEEDED,
    );
  });

  // A toe radius just above the thickness is a toe radius just below it: nothing jumps where the drawing of the toe changes.
  it('does not jump where the toe radius passes the thickness', () => {
    fc.assert(
      fc.property(outlines, (outline) => {
        fc.pre(3 * outline.thickness + outline.rootRadius < outline.shortLeg);
        const at = (toeRadius: number): AreaIntegrals =>
          areaIntegrals(outlinePath({ ...outline, toeRadius }));
        const step = 1e-7 * outline.thickness;
        const below = at(outline.thickness - step);
        const above = at(outline.thickness + step);
        near(above.area, below.area, below.area, 1e-6);
        near(above.xx, below.xx, below.xx, 1e-6);
      }),
      SEEDED,
    );
  });
});

function facets(outline: AngleOutline, stepsPerArc: number): AreaIntegrals {
  const corners = outlinePolygon(outline, stepsPerArc);
  return areaIntegrals(
    corners.map((from, i) => ({ kind: 'line', from, to: corners[(i + 1) % corners.length] ?? from })),
  );
}

function mapped(piece: Segment, to: (p: Vec2) => Vec2): Segment {
  if (piece.kind === 'line') return { kind: 'line', from: to(piece.from), to: to(piece.to) };
  return { ...piece, from: to(piece.from), to: to(piece.to), centre: to(piece.centre) };
}

function turned(piece: Segment, turn: number): Segment {
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  const image = mapped(piece, (p) => [c * p[0] - s * p[1], s * p[0] + c * p[1]]);
  return image.kind === 'arc' ? { ...image, start: image.start + turn } : image;
}

/** Over the diagonal: (x, y) → (y, x). */
function mirrored(piece: Segment): Segment {
  const image = mapped(piece, (p) => [p[1], p[0]]);
  return image.kind === 'arc' ? { ...image, start: Math.PI / 2 - image.start, sweep: -image.sweep } : image;
}
