/** Bars along each other in one place. Sections are 70 × 70 × 6, so that depths are read off a sketch: legs of 70 less how far they lie apart. */
import { describe, expect, it } from 'vitest';
import type { Vec3 } from '../../../core/geometry/vector.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import { type SharedSpace, sharedSpaces } from '../../../core/layout/sharedSpace.ts';
import type { Bay, FreeRecipe } from '../../../core/project/model.ts';
import { bay, free, knee, project, roof, wall } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';

const shared = (...bays: readonly Bay[]): readonly SharedSpace[] =>
  sharedSpaces(layOut(project(bays), stock()));

const N1: Vec3 = [0, 0, 0];
const N2: Vec3 = [4000, 0, 3000];
/** Square to the bar in its plane. */
const moved = ([x, y, z]: Vec3, by: number): Vec3 => [x - 0.6 * by, y, z + 0.8 * by];

const sameSide = (recipe: FreeRecipe, rest: Partial<Bay> = {}): Bay =>
  bay(recipe, { ...rest, diagonals: { arrangement: 'same side' } });
const pair = (from: Vec3, to: Vec3): FreeRecipe =>
  free({ n1: N1, n2: N2, n3: from, n4: to }, [
    ['b1', 'n1', 'n2'],
    ['b2', 'n3', 'n4'],
  ]);

describe('bars in one place', () => {
  it('are found between the same nodes, whichever way each runs, all through and all along their steel', () => {
    for (const [from, to] of [
      [N1, N2],
      [N2, N1],
    ] as const) {
      const [found, ...more] = shared(sameSide(pair(from, to)));
      expect(more).toEqual([]);
      expect([found?.a, found?.b]).toEqual(['B/b1', 'B/b2']);
      // Exact but for rounding. Steel begins 310 from each end of the 5000 (see ENDS).
      expect(found?.deep).toBeCloseTo(70, 6);
      expect(found?.along).toBeCloseTo(5000 - 620, 6);
    }
  });

  it('are not found on the two sides of a gusset', () => {
    expect(shared(bay(pair(N1, N2)))).toEqual([]);
  });

  it('are found for bars beside each other while their legs overlap', () => {
    expect(shared(sameSide(pair(moved(N1, 50), moved(N2, 50))))[0]?.deep).toBeCloseTo(20, 6);
    expect(shared(sameSide(pair(moved(N1, -50), moved(N2, -50))))[0]?.deep).toBeCloseTo(20, 6);
    expect(shared(sameSide(pair(moved(N1, 71), moved(N2, 71))))).toEqual([]);
  });

  it('are found for bars in one line that overlap, and not end to end', () => {
    // b2 begins 3000 along: its steel from 3310, that of b1 to 5000 − 310.
    const [found] = shared(sameSide(pair([2400, 0, 1800], [6400, 0, 4800])));
    expect(found?.along).toBeCloseTo(5000 - 310 - 3310, 6);
    expect(shared(sameSide(pair(N2, [8000, 0, 6000])))).toEqual([]);
  });

  it('are found in two bays at one place, bar by bar, and not in bays beside each other', () => {
    const at = (id: string, x: number) =>
      bay(wall(6000, [[4000, 'crossed']]), { id, place: { origin: [x, 0, 0], turn: 0 } });
    expect(shared(at('A', 0), at('C', 0)).map(({ a, b }) => [a, b])).toEqual([
      ['A/t1.rise', 'C/t1.rise'],
      ['A/t1.fall', 'C/t1.fall'],
    ]);
    expect(shared(at('A', 0), at('C', 6000))).toEqual([]);
  });

  it('are not found in sound bays of every kind', () => {
    for (const recipe of [
      wall(6000, [
        [4000, 'crossed'],
        [3000, 'peaked'],
      ]),
      roof(6000, 8, [
        [4000, 'crossed'],
        [3000, 'vee'],
      ]),
      knee(),
    ])
      expect(shared(bay(recipe))).toEqual([]);
  });

  it('are told of with the next one only, so that a crowd of bays stays a short list', () => {
    const many = Array.from({ length: 200 }, (_, k) =>
      sameSide(free({ n1: N1, n2: N2 }, [['b1', 'n1', 'n2']]), { id: `B${k}` }),
    );
    expect(shared(...many)).toHaveLength(199);
  });
});
