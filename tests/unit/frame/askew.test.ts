/**
 * Bays whose plane lies askew in space: hinged two-storey frames of random shape, turned in plan by any angle. What can move must be found
 * and nothing else, and nothing may be counted as buckled at no load, whatever rounding does.
 */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bayCriticalLoad } from '../../../core/frame/bayCriticalLoad.ts';
import type { Vec3 } from '../../../core/geometry/vector.ts';
import type { Bay } from '../../../core/project/model.ts';
import { runs } from '../../properties/given/runs.ts';
import { bay, free, STRUT } from '../assess/given/bays.ts';
import { built, diagonal, withMember } from './bayGiven.ts';
import { E } from './given.ts';

/** Any angle, and angles a hair off the axes, where a direction is nearly but not quite one of them. */
const turn = fc.oneof(
  fc.integer({ min: 0, max: 3600 }).map((tenths) => (tenths / 10) * (Math.PI / 180)),
  fc
    .tuple(fc.integer({ min: 0, max: 3 }), fc.integer({ min: 0, max: 80 }), fc.integer({ min: -9, max: 9 }))
    .map(([quarter, power, k]) => (quarter * Math.PI) / 2 + k * 10 ** (-power / 10)),
);
const offset = fc.integer({ min: -400, max: 400 });
const shape = fc.tuple(turn, fc.array(offset, { minLength: 12, maxLength: 12 }));
type Shape = readonly [number, readonly number[]];

/** Feet a and b, heads c and d, e and f above; without the lower diagonal it has a spare one between its feet. */
function storeys([angle, offsets]: Shape, lower: 'braced' | 'open'): Bay {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const at = (k: number, x: number, z: number): Vec3 => {
    const along = x + (offsets[2 * k] ?? 0);
    return [along * c, along * s, z + (offsets[2 * k + 1] ?? 0)];
  };
  const nodes = {
    a: at(0, 0, 0),
    b: at(1, 4000, 0),
    c: at(2, 0, 3000),
    d: at(3, 4000, 3000),
    e: at(4, 0, 6000),
    f: at(5, 4000, 6000),
  };
  const recipe = free(
    nodes,
    [
      ['ac', 'a', 'c', 'strut'],
      ['bd', 'b', 'd', 'strut'],
      ['cd', 'c', 'd', 'strut'],
      ['ce', 'c', 'e', 'strut'],
      ['df', 'd', 'f', 'strut'],
      ['ef', 'e', 'f', 'strut'],
      ['upper', 'c', 'f'],
      lower === 'braced' ? ['lower', 'a', 'd'] : ['lower', 'a', 'b'],
    ],
    { free: ['c', 'd', 'e', 'f'], normal: null },
  );
  return bay(withMember(recipe, STRUT));
}

describe('a hinged frame of two storeys', () => {
  it('braced in both stands, with no critical load below none, and buckles as its diagonal does', () => {
    fc.assert(
      fc.property(shape, (given) => {
        const of = built(storeys(given, 'braced'));
        expect(of.solver.mechanisms()).toEqual([]);
        expect(of.solver.criticalLoadsBelow).toBe(0);
        const upper = diagonal(of, 'B/upper');
        const euler = (Math.PI ** 2 * E * upper.section.Iv) / upper.length ** 2;
        const { factor } = bayCriticalLoad(of.frame, new Map([['B/upper', -1]]), euler);
        expect((factor ?? 0) / euler).toBeCloseTo(1, 6);
      }),
      runs(250),
    );
  });

  it('open below sways one way: four heads and no foot, in its plane, told once', () => {
    fc.assert(
      fc.property(shape, (given) => {
        const of = built(storeys(given, 'open'));
        const [mechanism, ...others] = of.solver.mechanisms();
        expect(others).toEqual([]);
        expect(of.solver.criticalLoadsBelow).toBe(0);
        expect(mechanism?.moving.map(({ node }) => of.frame.nodes[node]?.name).sort()).toEqual([
          'node c',
          'node d',
          'node e',
          'node f',
        ]);
        const [normal] = of.bay.planes.map((plane) => plane.normal);
        for (const { displacement } of mechanism?.moving ?? []) {
          const out = displacement.reduce((sum, value, k) => sum + value * (normal?.[k] ?? 0), 0);
          expect(Math.abs(out)).toBeLessThan(1e-6);
        }
        expect(bayCriticalLoad(of.frame, new Map([['B/upper', -1]]), 1e4).factor).toBeNull();
      }),
      runs(250),
    );
  });
});
