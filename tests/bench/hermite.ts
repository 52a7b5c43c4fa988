/**
 * One bar of sixteen Hermite elements as a dense generalised eigenproblem, solved by ml-matrix: what the exact solver is held against. The
 * same problem as there, a bar with a hold at mid-length rigid in one direction. It is JavaScript; compiled LAPACK takes about 0.45 ms for one.
 */
import { CholeskyDecomposition, EigenvalueDecomposition, Matrix, solve } from 'ml-matrix';
import type { BarProblem } from '../../core/stability/model.ts';

const ELEMENTS = 16;

/** Lowest critical load, N. The hold must lie along x, so that it takes one unknown away. */
export function hermiteLoad({ E, length, section }: BarProblem): number {
  const h = length / ELEMENTS;
  const nodes = ELEMENTS + 1;
  const Ixy = -(section.Iu - section.Iv) * Math.sin(section.alpha) * Math.cos(section.alpha);
  const size = 4 * nodes;
  const [K, G] = [Matrix.zeros(size, size), Matrix.zeros(size, size)];
  const I = [
    [section.Iyy, Ixy],
    [Ixy, section.Ixx],
  ];
  const curvature = [
    [12, 6 * h, -12, 6 * h],
    [6 * h, 4 * h * h, -6 * h, 2 * h * h],
    [-12, -6 * h, 12, -6 * h],
    [6 * h, 2 * h * h, -6 * h, 4 * h * h],
  ];
  const slope = [
    [36, 3 * h, -36, 3 * h],
    [3 * h, 4 * h * h, -3 * h, -h * h],
    [-36, -3 * h, 36, -3 * h],
    [3 * h, -h * h, -3 * h, 4 * h * h],
  ];
  for (let e = 0; e < ELEMENTS; e++)
    for (let p = 0; p < 2; p++)
      for (let q = 0; q < 2; q++)
        for (let a = 0; a < 4; a++)
          for (let b = 0; b < 4; b++) {
            const i = 4 * (e + (a >> 1)) + 2 * p + (a & 1);
            const j = 4 * (e + (b >> 1)) + 2 * q + (b & 1);
            K.set(i, j, K.get(i, j) + ((E * (I[p]?.[q] ?? 0)) / h ** 3) * (curvature[a]?.[b] ?? 0));
            if (p === q) G.set(i, j, G.get(i, j) + (slope[a]?.[b] ?? 0) / (30 * h));
          }
  const held = new Set([0, 2, 4 * ELEMENTS, 4 * ELEMENTS + 2, 2 * ELEMENTS]);
  const free = Array.from({ length: size }, (_, k) => k).filter((k) => !held.has(k));
  const L = new CholeskyDecomposition(K.selection(free, free)).lowerTriangularMatrix;
  const half = solve(L, G.selection(free, free));
  const A = solve(L, half.transpose());
  const { realEigenvalues } = new EigenvalueDecomposition(A.add(A.transpose()).mul(0.5), {
    assumeSymmetric: true,
  });
  return 1 / Math.max(...realEigenvalues);
}
