/** Plates at the ends of diagonals: drawn, not designed. */
import { describe, expect, it } from 'vitest';
import { distance, dot, subtract, type Vec3 } from '../../../core/geometry/vector.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import { bay, free, project } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';

const platesOf = (to: Vec3) =>
  layOut(project([bay(free({ a: [0, 0, 0], b: to }, [['ab', 'a', 'b']]))]), stock()).bays[0]?.gussets ?? [];

describe('the plate at an end of a bar', () => {
  it.each([
    ['level', [4000, 0, 0]],
    ['level, backwards', [-4000, 0, 0]],
    ['upright', [0, 0, 4000]],
    ['a hair off level', [4000, 0, 1e-9]],
    ['square out of its plane', [0, 4000, 0]],
    ['at 45°', [4000, 0, 4000]],
    ['falling', [4000, 0, -4000]],
  ] as const)('has corners apart that lie in its own plane when the bar runs %s', (_how, to) => {
    const plates = platesOf(to);
    expect(plates).toHaveLength(2);
    for (const { corners, normal } of plates) {
      corners.forEach((corner, index) => {
        const next = corners[(index + 1) % corners.length] ?? corner;
        // Half a leg of 70 and half the margin of 40 beside the line of bolts: no edge is shorter than that 55 mm.
        expect(distance(corner, next)).toBeGreaterThan(55 - 1e-6);
        // The plate is flat: rounding at lengths of 4000 mm.
        expect(dot(subtract(next, corner), normal)).toBeCloseTo(0, 6);
      });
    }
  });
});
