import { describe, expect, it } from 'vitest';
import { cross, dot, subtract, type Vec3 } from '../../../core/geometry/vector.ts';
import { angleProperties } from '../../../core/section/angleProperties.ts';
import { outlinePolygon } from '../../../core/section/outlinePath.ts';
import { mergedSteel } from '../../../renderer/scene/geometry/mergedSteel.ts';
import { edgesOf, type Prism, sideFaces } from '../../../renderer/scene/geometry/prism.ts';
import type { SteelPart } from '../../../renderer/scene/geometry/steelPart.ts';

const OUTLINE = { longLeg: 70, shortLeg: 70, thickness: 6, rootRadius: 9, toeRadius: 4.5 };

const angle: Prism = {
  outline: outlinePolygon(OUTLINE, 2),
  origin: [100, 200, 300],
  x: [1, 0, 0],
  y: [0, 1, 0],
  axis: [0, 0, 1],
  from: 50,
  to: 1050,
  endAtFrom: true,
  endAtTo: true,
};

/** The same with the section mirrored, as on the other side of a gusset: x × y runs against the axis. */
const mirrored: Prism = { ...angle, x: [-1, 0, 0] };

const part = (prism: Prism): SteelPart => ({
  prism,
  paint: 'diagonal',
  bay: 'W1',
  plane: 'wall',
  bar: 'W1/a',
});

function triangles(prism: Prism): readonly (readonly [Vec3, Vec3, Vec3])[] {
  const merged = mergedSteel([part(prism)]);
  const point = (at: number): Vec3 => {
    const index = (merged.triangles[at] ?? 0) * 3;
    return [merged.positions[index] ?? 0, merged.positions[index + 1] ?? 0, merged.positions[index + 2] ?? 0];
  };
  return Array.from({ length: merged.triangles.length / 3 }, (_, t) => [
    point(3 * t),
    point(3 * t + 1),
    point(3 * t + 2),
  ]);
}

/** Volume by the divergence theorem: right only if the surface is closed and every triangle faces outwards. */
function volume(prism: Prism): number {
  return triangles(prism).reduce((sum, [a, b, c]) => {
    const [p, q, r] = [a, b, c].map((corner) => subtract(corner, prism.origin));
    return p && q && r ? sum + dot(p, cross(q, r)) / 6 : sum;
  }, 0);
}

describe('the solid of a bar', () => {
  for (const [name, prism] of [
    ['an angle', angle],
    ['the same angle with its section mirrored', mirrored],
  ] as const) {
    it(`is closed: every side of a triangle of ${name} is shared with one that runs the other way`, () => {
      const sides = new Map<string, number>();
      // Positions are single precision: a thousandth of a millimetre tells corners apart and forgives the rounding.
      const key = (p: Vec3): string => p.map((value) => value.toFixed(3)).join(' ');
      for (const [a, b, c] of triangles(prism)) {
        for (const [p, q] of [
          [a, b],
          [b, c],
          [c, a],
        ] as const) {
          const [from, to] = [key(p), key(q)];
          const [name_, way] = from < to ? [`${from}|${to}`, 1] : [`${to}|${from}`, -1];
          sides.set(name_, (sides.get(name_) ?? 0) + way);
        }
      }
      expect([...sides.values()].filter((balance) => balance !== 0)).toEqual([]);
    });

    it(`faces outwards: the volume inside ${name} is its area times its length`, () => {
      // Area of 70×70×6 with r1 = 9, r2 = 4.5 is 812.69 mm² (METHODS.md §1); two chords an arc lose or gain at most
      // (1 − π/4 − chord area) of a square of the radius at each arc: below 1 % of the area here.
      const area = angleProperties(OUTLINE).area;
      expect(volume(prism) / (area * 1000)).toBeGreaterThan(0.99);
      expect(volume(prism) / (area * 1000)).toBeLessThan(1.01);
    });

    it(`has normals that agree with the way the triangles of ${name} turn`, () => {
      for (const face of sideFaces(prism)) {
        const [a, b, c] = face.corners;
        if (!a || !b || !c) throw new Error('a face without corners');
        expect(dot(cross(subtract(b, a), subtract(c, a)), face.normal)).toBeGreaterThan(0);
      }
    });
  }

  it('has no faces and no outline at an end where the member runs on', () => {
    const open = { ...angle, endAtFrom: false, endAtTo: false };
    expect(triangles(open)).toHaveLength(2 * angle.outline.length);
    expect(edgesOf(open).every((edge) => edge.from[2] !== edge.to[2])).toBe(true);
  });

  it('draws the heel and both toes as full lines and the inner corners as fine ones', () => {
    const open = { ...angle, endAtFrom: false, endAtTo: false };
    const full = edgesOf(open).filter((edge) => !edge.fine);
    expect(full.map((edge) => [edge.from[0] - 100, edge.from[1] - 200])).toEqual([
      [0, 0],
      [70, 0],
      [0, 70],
    ]);
    // Root and the two rounded toes: one line in the middle of each arc.
    expect(edgesOf(open).filter((edge) => edge.fine)).toHaveLength(3);
  });
});
