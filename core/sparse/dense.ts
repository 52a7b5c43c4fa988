/** Small dense matrices, row by row in one array. */

/** Inverse by elimination with pivots chosen on the whole diagonal's row; null where the matrix is singular to working accuracy. */
export function inverse(matrix: Float64Array, size: number): Float64Array | null {
  const a = matrix.slice();
  const b = new Float64Array(size * size);
  for (let k = 0; k < size; k++) b[k * size + k] = 1;
  let scale = 0;
  for (const value of a) scale = Math.max(scale, Math.abs(value));
  for (let k = 0; k < size; k++) {
    let best = k;
    for (let r = k + 1; r < size; r++)
      if (Math.abs(a[r * size + k] ?? 0) > Math.abs(a[best * size + k] ?? 0)) best = r;
    const pivot = a[best * size + k] ?? 0;
    if (!(Math.abs(pivot) > 1e-14 * scale)) return null;
    if (best !== k)
      for (let c = 0; c < size; c++) {
        swap(a, k * size + c, best * size + c);
        swap(b, k * size + c, best * size + c);
      }
    for (let c = 0; c < size; c++) {
      a[k * size + c] = (a[k * size + c] ?? 0) / pivot;
      b[k * size + c] = (b[k * size + c] ?? 0) / pivot;
    }
    for (let r = 0; r < size; r++) {
      const factor = a[r * size + k] ?? 0;
      if (r === k || factor === 0) continue;
      for (let c = 0; c < size; c++) {
        a[r * size + c] = (a[r * size + c] ?? 0) - factor * (a[k * size + c] ?? 0);
        b[r * size + c] = (b[r * size + c] ?? 0) - factor * (b[k * size + c] ?? 0);
      }
    }
  }
  return b;
}

function swap(m: Float64Array, i: number, j: number): void {
  const kept = m[i] ?? 0;
  m[i] = m[j] ?? 0;
  m[j] = kept;
}

/** The 2 × 2 symmetric matrix [[a, b], [b, c]] by its principal values and the angle from the first axis to the direction of the larger, rad. */
export function principalOf2(
  a: number,
  b: number,
  c: number,
): { readonly larger: number; readonly smaller: number; readonly angle: number } {
  const middle = (a + c) / 2;
  const radius = Math.hypot((a - c) / 2, b);
  return { larger: middle + radius, smaller: middle - radius, angle: Math.atan2(2 * b, a - c) / 2 };
}
