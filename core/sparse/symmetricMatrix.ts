/** A symmetric sparse matrix, upper part by columns; entries may be added in any order and more than once. */

export interface SymmetricMatrix {
  readonly size: number;
  /** Where each column begins; size + 1 numbers. */
  readonly start: Int32Array;
  /** Row of each entry, at most the column; rising within a column. */
  readonly row: Int32Array;
  readonly value: Float64Array;
}

/** Gathers entries and sums those at one place. */
export class MatrixGatherer {
  readonly size: number;
  #rows: Int32Array;
  #columns: Int32Array;
  #values: Float64Array;
  #count = 0;

  constructor(size: number, expected = 16) {
    this.size = size;
    this.#rows = new Int32Array(expected);
    this.#columns = new Int32Array(expected);
    this.#values = new Float64Array(expected);
  }

  /** Adds to the entry (i, j) and with it to (j, i). Each off-diagonal pair is to be given once. */
  add(i: number, j: number, value: number): void {
    if (this.#count === this.#rows.length) this.#grow();
    this.#rows[this.#count] = Math.min(i, j);
    this.#columns[this.#count] = Math.max(i, j);
    this.#values[this.#count] = value;
    this.#count += 1;
  }

  /** The matrix so far; more may be added afterwards. */
  matrix(): SymmetricMatrix {
    const { size } = this;
    const count = this.#count;
    // Sort by row, then by column, each by counting: entries then stand by column with rows rising.
    const byRow = ordered(this.#rows.subarray(0, count), size, null);
    const byColumn = ordered(this.#columns.subarray(0, count), size, byRow);
    const start = new Int32Array(size + 1);
    const row = new Int32Array(count);
    const value = new Float64Array(count);
    let filled = 0;
    let column = 0;
    for (let k = 0; k < count; k++) {
      const entry = byColumn[k] ?? 0;
      const c = this.#columns[entry] ?? 0;
      const r = this.#rows[entry] ?? 0;
      while (column < c) start[++column] = filled;
      if (filled > (start[column] ?? 0) && row[filled - 1] === r)
        value[filled - 1] = (value[filled - 1] ?? 0) + (this.#values[entry] ?? 0);
      else {
        row[filled] = r;
        value[filled] = this.#values[entry] ?? 0;
        filled += 1;
      }
    }
    while (column < size) start[++column] = filled;
    return { size, start, row: row.slice(0, filled), value: value.slice(0, filled) };
  }

  #grow(): void {
    const larger = this.#rows.length * 2;
    const copy = <A extends Int32Array | Float64Array>(from: A, to: A): A => {
      to.set(from);
      return to;
    };
    this.#rows = copy(this.#rows, new Int32Array(larger));
    this.#columns = copy(this.#columns, new Int32Array(larger));
    this.#values = copy(this.#values, new Float64Array(larger));
  }
}

/** Places in order of their keys; of equal keys, in the order given. */
function ordered(keys: Int32Array, most: number, given: Int32Array | null): Int32Array {
  const start = new Int32Array(most + 1);
  for (let k = 0; k < keys.length; k++) start[(keys[k] ?? 0) + 1] = (start[(keys[k] ?? 0) + 1] ?? 0) + 1;
  for (let k = 0; k < most; k++) start[k + 1] = (start[k + 1] ?? 0) + (start[k] ?? 0);
  const order = new Int32Array(keys.length);
  for (let k = 0; k < keys.length; k++) {
    const entry = given ? (given[k] ?? 0) : k;
    const key = keys[entry] ?? 0;
    order[start[key] ?? 0] = entry;
    start[key] = (start[key] ?? 0) + 1;
  }
  return order;
}

/** y = A x. */
export function times(matrix: SymmetricMatrix, x: Float64Array): Float64Array {
  const y = new Float64Array(matrix.size);
  for (let c = 0; c < matrix.size; c++)
    for (let k = matrix.start[c] ?? 0; k < (matrix.start[c + 1] ?? 0); k++) {
      const r = matrix.row[k] ?? 0;
      const a = matrix.value[k] ?? 0;
      y[r] = (y[r] ?? 0) + a * (x[c] ?? 0);
      if (r !== c) y[c] = (y[c] ?? 0) + a * (x[r] ?? 0);
    }
  return y;
}
