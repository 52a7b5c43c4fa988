import fc from 'fast-check';
import { eliminationOrder } from '../../../core/sparse/eliminationOrder.ts';
import { analysed, type Factored, factored } from '../../../core/sparse/factor.ts';
import { MatrixGatherer, type SymmetricMatrix } from '../../../core/sparse/symmetricMatrix.ts';

/** A symmetric matrix as its entries on and above the diagonal. */
export interface Entries {
  readonly size: number;
  readonly entries: readonly { readonly i: number; readonly j: number; readonly value: number }[];
}

/** Off-diagonal entries at random, and on the diagonal what `onDiagonal` makes of the sum of their sizes in that row. */
export const entries = (
  most: number,
  onDiagonal: (rowSum: number, k: number) => number,
): fc.Arbitrary<Entries> =>
  fc.integer({ min: 1, max: most }).chain((size) =>
    fc
      .uniqueArray(
        fc
          .tuple(fc.nat(size - 1), fc.nat(size - 1), fc.integer({ min: -1000, max: 1000 }))
          .map(([a, b, value]) => ({ i: Math.min(a, b), j: Math.max(a, b), value: value / 100 })),
        { maxLength: 3 * size, selector: ({ i, j }) => i * size + j },
      )
      .map((all) => {
        const off = all.filter(({ i, j }) => i !== j);
        const sums = new Array<number>(size).fill(0);
        for (const { i, j, value } of off) for (const k of [i, j]) sums[k] = (sums[k] ?? 0) + Math.abs(value);
        const diagonal = sums.map((sum, k) => ({ i: k, j: k, value: onDiagonal(sum, k) }));
        return { size, entries: [...off, ...diagonal] };
      }),
  );

export function gathered({ size, entries: all }: Entries): SymmetricMatrix {
  const gatherer = new MatrixGatherer(size, 4);
  for (const { i, j, value } of all) gatherer.add(i, j, value);
  return gatherer.matrix();
}

export function dense({ size, entries: all }: Entries): number[][] {
  const full = Array.from({ length: size }, () => new Array<number>(size).fill(0));
  for (const { i, j, value } of all) {
    const [row, column] = [full[i] ?? [], full[j] ?? []];
    row[j] = (row[j] ?? 0) + value;
    if (i !== j) column[i] = (column[i] ?? 0) + value;
  }
  return full;
}

export function neighboursOf({ size, entries: all }: Entries): readonly (readonly number[])[] {
  const sets = Array.from({ length: size }, () => new Set<number>());
  for (const { i, j } of all)
    if (i !== j) {
      sets[i]?.add(j);
      sets[j]?.add(i);
    }
  return sets.map((set) => [...set]);
}

export function factoredInOrder(given: Entries): Factored {
  const matrix = gathered(given);
  return factored(matrix, analysed(matrix, eliminationOrder(neighboursOf(given))));
}
