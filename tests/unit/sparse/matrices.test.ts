import fc from 'fast-check';
import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { inverse, principalOf2 } from '../../../core/sparse/dense.ts';
import { MatrixGatherer, times } from '../../../core/sparse/symmetricMatrix.ts';
import { runs } from '../../properties/given/runs.ts';
import { dense, entries, gathered } from './given.ts';

describe('gathering', () => {
  it('sums what falls on one place, in whatever order it comes, either triangle', () => {
    const gatherer = new MatrixGatherer(3, 1);
    gatherer.add(2, 0, 5);
    gatherer.add(1, 1, 2);
    gatherer.add(0, 2, -1);
    gatherer.add(1, 1, 3);
    const { start, row, value } = gatherer.matrix();
    expect([...start]).toEqual([0, 0, 1, 2]);
    expect([...row]).toEqual([1, 0]);
    expect([...value]).toEqual([5, 4]);
  });

  it('gives the matrix so far, and takes more', () => {
    const gatherer = new MatrixGatherer(1);
    gatherer.add(0, 0, 1);
    expect([...gatherer.matrix().value]).toEqual([1]);
    gatherer.add(0, 0, 1);
    expect([...gatherer.matrix().value]).toEqual([2]);
  });

  it('multiplies as the full matrix does', () => {
    fc.assert(
      fc.property(
        entries(20, (sum) => sum - 3),
        (given) => {
          const x = Float64Array.from({ length: given.size }, (_, k) => Math.cos(k));
          const full = dense(given);
          times(gathered(given), x).forEach((value, i) => {
            const expected = (full[i] ?? []).reduce((sum, a, j) => sum + a * (x[j] ?? 0), 0);
            expect(value).toBeCloseTo(expected, 10);
          });
        },
      ),
      runs(100),
    );
  });

  it('keeps rows rising within each column', () => {
    fc.assert(
      fc.property(
        entries(30, () => 1),
        (given) => {
          const { size, start, row } = gathered(given);
          for (let c = 0; c < size; c++)
            for (let k = (start[c] ?? 0) + 1; k < (start[c + 1] ?? 0); k++)
              expect(row[k]).toBeGreaterThan(row[k - 1] ?? -1);
        },
      ),
      runs(50),
    );
  });
});

describe('small dense matrices', () => {
  it('are inverted, also where the diagonal begins with nothing', () => {
    const turned = inverse(Float64Array.of(0, 2, 4, 0), 2);
    expect([...(turned ?? [])]).toEqual([0, 0.25, 0.5, 0]);
    fc.assert(
      fc.property(
        entries(8, (sum) => sum + 0.5),
        (given) => {
          const n = given.size;
          const full = dense(given);
          const found = inverse(Float64Array.from(full.flat()), n);
          for (let i = 0; i < n; i++)
            for (let j = 0; j < n; j++) {
              let sum = 0;
              for (let k = 0; k < n; k++) sum += (full[i]?.[k] ?? 0) * (found?.[k * n + j] ?? 0);
              expect(sum).toBeCloseTo(i === j ? 1 : 0, 10);
            }
        },
      ),
      runs(100),
    );
  });

  it('are told apart from singular ones', () => {
    expect(inverse(Float64Array.of(1, 2, 2, 4), 2)).toBeNull();
    expect(inverse(Float64Array.of(0), 1)).toBeNull();
  });

  it('have principal values in the direction given', () => {
    fc.assert(
      fc.property(
        fc.tuple(...Array.from({ length: 3 }, () => fc.integer({ min: -1000, max: 1000 }))),
        ([a = 0, b = 0, c = 0]) => {
          const { larger, smaller, angle } = principalOf2(a, b, c);
          const { realEigenvalues } = new EigenvalueDecomposition(
            new Matrix([
              [a, b],
              [b, c],
            ]),
            { assumeSymmetric: true },
          );
          expect(larger).toBeCloseTo(Math.max(...realEigenvalues), 8);
          expect(smaller).toBeCloseTo(Math.min(...realEigenvalues), 8);
          const [x, y] = [Math.cos(angle), Math.sin(angle)];
          expect(a * x * x + 2 * b * x * y + c * y * y).toBeCloseTo(larger, 8);
        },
      ),
      runs(100),
    );
  });
});
