/**
 * L D Lᵀ of a sparse symmetric matrix in a given order, row by row over the elimination tree, without exchanges: right for stiffness
 * matrices, and for counting the negative pivots of one that is not positive. Source: the up-looking method as described by Davis,
 * Direct Methods for Sparse Linear Systems (2006).
 */
import type { SymmetricMatrix } from './symmetricMatrix.ts';

/** What depends on the pattern alone; many matrices of one pattern share it. */
export interface Symbolic {
  readonly size: number;
  /** Unknown that stands at each place of the order, and the place of each unknown. */
  readonly order: Int32Array;
  readonly place: Int32Array;
  readonly parent: Int32Array;
  readonly columnStart: Int32Array;
  /** The matrix reordered: where each entry of the given matrix goes. */
  readonly start: Int32Array;
  readonly row: Int32Array;
  readonly from: Int32Array;
}

export interface Factored {
  readonly symbolic: Symbolic;
  readonly row: Int32Array;
  readonly value: Float64Array;
  readonly diagonal: Float64Array;
  readonly negative: number;
  /** Unknowns whose pivot vanished: they move without resistance once the earlier ones have followed. */
  readonly vanished: readonly number[];
}

export function analysed(matrix: SymmetricMatrix, order: Int32Array): Symbolic {
  const n = matrix.size;
  const place = new Int32Array(n);
  for (let k = 0; k < n; k++) place[order[k] ?? 0] = k;
  const { start, row, from } = reordered(matrix, place);
  const parent = new Int32Array(n).fill(-1);
  const visited = new Int32Array(n).fill(-1);
  const count = new Int32Array(n);
  for (let k = 0; k < n; k++) {
    visited[k] = k;
    for (let p = start[k] ?? 0; p < (start[k + 1] ?? 0); p++)
      for (let i = row[p] ?? 0; i >= 0 && i < k && visited[i] !== k; i = parent[i] ?? -1) {
        if (parent[i] === -1) parent[i] = k;
        count[i] = (count[i] ?? 0) + 1;
        visited[i] = k;
      }
  }
  const columnStart = new Int32Array(n + 1);
  for (let k = 0; k < n; k++) columnStart[k + 1] = (columnStart[k] ?? 0) + (count[k] ?? 0);
  return { size: n, order, place, parent, columnStart, start, row, from };
}

function reordered(matrix: SymmetricMatrix, place: Int32Array) {
  const n = matrix.size;
  const start = new Int32Array(n + 1);
  const each = (visit: (column: number, row: number, entry: number) => void): void => {
    for (let c = 0; c < n; c++)
      for (let e = matrix.start[c] ?? 0; e < (matrix.start[c + 1] ?? 0); e++) {
        const a = place[c] ?? 0;
        const b = place[matrix.row[e] ?? 0] ?? 0;
        visit(Math.max(a, b), Math.min(a, b), e);
      }
  };
  each((column) => {
    start[column + 1] = (start[column + 1] ?? 0) + 1;
  });
  for (let k = 0; k < n; k++) start[k + 1] = (start[k + 1] ?? 0) + (start[k] ?? 0);
  const next = start.slice(0, n);
  const row = new Int32Array(matrix.row.length);
  const from = new Int32Array(matrix.row.length);
  each((column, r, entry) => {
    const at = next[column] ?? 0;
    next[column] = at + 1;
    row[at] = r;
    from[at] = entry;
  });
  return { start, row, from };
}

/** A pivot this small beside what it was put together from has vanished. */
const VANISHED = 1e-11;
/** One smaller than this may have vanished but for the rounding of those before it: the motion that it stands for is looked at. */
const SUSPECT = 1e-7;
/** What a motion resists beside what its parts would, when it resists nothing. */
const NO_RESISTANCE = 1e-13;

/** @param gross what each diagonal entry was put together from, before anything cancelled; the entry itself where not given */
export function factored(
  matrix: SymmetricMatrix,
  symbolic: Symbolic,
  gross: Float64Array | null = null,
): Factored {
  const { size: n, parent, columnStart, start, row, from, order } = symbolic;
  const lRow = new Int32Array(columnStart[n] ?? 0);
  const lValue = new Float64Array(columnStart[n] ?? 0);
  const diagonal = new Float64Array(n);
  const filled = new Int32Array(n);
  const y = new Float64Array(n);
  const pattern = new Int32Array(n);
  const path = new Int32Array(n);
  const visited = new Int32Array(n).fill(-1);
  const vanished: number[] = [];
  let negative = 0;
  for (let k = 0; k < n; k++) {
    let top = n;
    visited[k] = k;
    let pivot = 0;
    for (let p = start[k] ?? 0; p < (start[k + 1] ?? 0); p++) {
      let i = row[p] ?? 0;
      const value = matrix.value[from[p] ?? 0] ?? 0;
      if (i === k) {
        pivot = value;
        continue;
      }
      y[i] = (y[i] ?? 0) + value;
      let length = 0;
      while (visited[i] !== k) {
        path[length++] = i;
        visited[i] = k;
        i = parent[i] ?? 0;
      }
      while (length > 0) pattern[--top] = path[--length] ?? 0;
    }
    const began = Math.max(Math.abs(pivot), gross?.[order[k] ?? 0] ?? 0);
    for (; top < n; top++) {
      const i = pattern[top] ?? 0;
      const yi = y[i] ?? 0;
      y[i] = 0;
      const first = columnStart[i] ?? 0;
      const end = first + (filled[i] ?? 0);
      for (let p = first; p < end; p++) {
        const r = lRow[p] ?? 0;
        y[r] = (y[r] ?? 0) - (lValue[p] ?? 0) * yi;
      }
      const l = yi / (diagonal[i] ?? 1);
      pivot -= l * yi;
      lRow[end] = k;
      lValue[end] = l;
      filled[i] = (filled[i] ?? 0) + 1;
    }
    const lost = Math.abs(pivot) / (began || 1);
    if (
      lost <= VANISHED ||
      (lost < SUSPECT && motionResists(matrix, symbolic, gross, { lRow, lValue, filled }, k) < NO_RESISTANCE)
    ) {
      vanished.push(order[k] ?? 0);
      // Held from here on, so that the rest can be judged.
      pivot = began > 0 ? began : 1;
      diagonal[k] = pivot * 1e12;
      continue;
    }
    diagonal[k] = pivot;
    if (pivot < 0) negative += 1;
  }
  return { symbolic, row: lRow, value: lValue, diagonal, negative, vanished };
}

interface Columns {
  readonly lRow: Int32Array;
  readonly lValue: Float64Array;
  readonly filled: Int32Array;
}

/**
 * The motion of one unknown, those before it following and those after it held: what it resists, by the matrix itself, over what its
 * parts would resist one by one. A small pivot carries the rounding of all before it; this does not.
 */
function motionResists(
  matrix: SymmetricMatrix,
  { columnStart, start, row, from, order }: Symbolic,
  gross: Float64Array | null,
  { lRow, lValue, filled }: Columns,
  k: number,
): number {
  const x = new Float64Array(k + 1);
  x[k] = 1;
  for (let i = k - 1; i >= 0; i--) {
    const first = columnStart[i] ?? 0;
    let sum = 0;
    for (let p = first; p < first + (filled[i] ?? 0); p++) sum -= (lValue[p] ?? 0) * (x[lRow[p] ?? 0] ?? 0);
    x[i] = sum;
  }
  let resisted = 0;
  let parts = 0;
  for (let c = 0; c <= k; c++) {
    const xc = x[c] ?? 0;
    if (xc === 0) continue;
    for (let p = start[c] ?? 0; p < (start[c + 1] ?? 0); p++) {
      const r = row[p] ?? 0;
      const a = matrix.value[from[p] ?? 0] ?? 0;
      resisted += (r === c ? 1 : 2) * a * xc * (x[r] ?? 0);
      if (r === c) parts += Math.max(Math.abs(a), gross?.[order[c] ?? 0] ?? 0) * xc * xc;
    }
  }
  return parts > 0 ? Math.abs(resisted) / parts : 0;
}

/** Solves A x = b; b stays as it is. */
export function solved(factors: Factored, b: Float64Array): Float64Array {
  const { symbolic, row, value, diagonal } = factors;
  const { size: n, order, columnStart } = symbolic;
  const x = new Float64Array(n);
  for (let k = 0; k < n; k++) x[k] = b[order[k] ?? 0] ?? 0;
  for (let k = 0; k < n; k++) {
    const xk = x[k] ?? 0;
    if (xk === 0) continue;
    for (let p = columnStart[k] ?? 0; p < (columnStart[k + 1] ?? 0); p++) {
      const r = row[p] ?? 0;
      x[r] = (x[r] ?? 0) - (value[p] ?? 0) * xk;
    }
  }
  for (let k = 0; k < n; k++) x[k] = (x[k] ?? 0) / (diagonal[k] ?? 1);
  for (let k = n - 1; k >= 0; k--) {
    let sum = x[k] ?? 0;
    for (let p = columnStart[k] ?? 0; p < (columnStart[k + 1] ?? 0); p++)
      sum -= (value[p] ?? 0) * (x[row[p] ?? 0] ?? 0);
    x[k] = sum;
  }
  const result = new Float64Array(n);
  for (let k = 0; k < n; k++) result[order[k] ?? 0] = x[k] ?? 0;
  return result;
}
