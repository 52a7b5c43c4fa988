import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eliminationOrder } from '../../../core/sparse/eliminationOrder.ts';
import { analysed } from '../../../core/sparse/factor.ts';
import { runs } from '../../properties/given/runs.ts';
import { type Entries, entries, gathered, neighboursOf } from './given.ts';

const fillOf = (given: Entries, order: Int32Array): number =>
  analysed(gathered(given), order).columnStart[given.size] ?? 0;

/** Vertices joined as a path, a star, a grid. */
function graph(size: number, pairs: readonly (readonly [number, number])[]): Entries {
  const diagonal = Array.from({ length: size }, (_, k) => ({ i: k, j: k, value: 10 }));
  return {
    size,
    entries: [...diagonal, ...pairs.map(([a, b]) => ({ i: Math.min(a, b), j: Math.max(a, b), value: -1 }))],
  };
}

describe('the order of elimination', () => {
  it('takes every vertex once', () => {
    fc.assert(
      fc.property(
        entries(80, () => 1),
        (given) => {
          const order = eliminationOrder(neighboursOf(given));
          expect([...order].sort((a, b) => a - b)).toEqual(Array.from({ length: given.size }, (_, k) => k));
        },
      ),
      runs(300),
    );
  });

  it('is the same every time', () => {
    fc.assert(
      fc.property(
        entries(40, () => 1),
        (given) => {
          const neighbours = neighboursOf(given);
          expect([...eliminationOrder(neighbours)]).toEqual([...eliminationOrder(neighbours)]);
        },
      ),
      runs(30),
    );
  });

  it('fills in nothing in a tree', () => {
    const path = graph(
      50,
      Array.from({ length: 49 }, (_, k) => [k, k + 1] as const),
    );
    const star = graph(
      50,
      Array.from({ length: 49 }, (_, k) => [0, k + 1] as const),
    );
    for (const tree of [path, star]) expect(fillOf(tree, eliminationOrder(neighboursOf(tree)))).toBe(49);
    // The star begun at its middle would fill in everything.
    expect(
      fillOf(
        star,
        Int32Array.from({ length: 50 }, (_, k) => k),
      ),
    ).toBe((49 * 50) / 2);
  });

  it('fills in far less of a grid than row by row', () => {
    const n = 30;
    const at = (r: number, c: number): number => r * n + c;
    const grid = graph(
      n * n,
      Array.from({ length: n * n }, (_, k) => {
        const [r, c] = [Math.floor(k / n), k % n];
        return [
          ...(c + 1 < n ? [[at(r, c), at(r, c + 1)] as const] : []),
          ...(r + 1 < n ? [[at(r, c), at(r + 1, c)] as const] : []),
        ];
      }).flat(),
    );
    const given = fillOf(
      grid,
      Int32Array.from({ length: n * n }, (_, k) => k),
    );
    expect(fillOf(grid, eliminationOrder(neighboursOf(grid)))).toBeLessThan(given / 2);
  });
});
