/** A symmetric matrix of which each row is kept from its first entry up to the diagonal, and its L D Lᵀ in place. */

export class Skyline {
  readonly size: number;
  /** Entry (i, j), j ≤ i, stands at base[i] + j. */
  readonly #base: Int32Array;
  readonly #first: Int32Array;
  readonly #values: Float64Array;

  /** @param first of each row, the column where it begins */
  constructor(first: Int32Array) {
    this.size = first.length;
    this.#first = first;
    this.#base = new Int32Array(this.size);
    let used = 0;
    for (let i = 0; i < this.size; i++) {
      const start = first[i] ?? 0;
      this.#base[i] = used - start;
      used += i - start + 1;
    }
    this.#values = new Float64Array(used);
  }

  /** Where entry (i, j), j ≤ i, is kept. */
  placeOf(i: number, j: number): number {
    return (this.#base[i] ?? 0) + j;
  }

  get values(): Float64Array {
    return this.#values;
  }

  /** D on the diagonal, L below it. @returns how many pivots are below zero, and the logarithm of the determinant's size */
  factor(): { readonly negative: number; readonly logDeterminant: number } {
    const a = this.#values;
    const first = this.#first;
    const base = this.#base;
    let negative = 0;
    let mantissa = 1;
    let logDeterminant = 0;
    for (let i = 0; i < this.size; i++) {
      const start = first[i] ?? 0;
      const row = base[i] ?? 0;
      for (let j = start; j < i; j++) {
        const other = base[j] ?? 0;
        let sum = a[row + j] ?? 0;
        for (let k = Math.max(start, first[j] ?? 0); k < j; k++)
          sum -= (a[row + k] ?? 0) * (a[other + k] ?? 0);
        // Holds L·D until the row is done.
        a[row + j] = sum;
      }
      let pivot = a[row + i] ?? 0;
      const scale = Math.abs(pivot);
      for (let j = start; j < i; j++) {
        const held = a[row + j] ?? 0;
        const l = held / (a[(base[j] ?? 0) + j] ?? 1);
        pivot -= held * l;
        a[row + j] = l;
      }
      // A pivot that vanishes altogether counts as not yet buckled, by less than rounding.
      if (pivot === 0) pivot = scale * 1e-17 + 1e-300;
      a[row + i] = pivot;
      if (pivot < 0) negative += 1;
      mantissa *= Math.abs(pivot);
      if (mantissa > 1e200 || mantissa < 1e-200) {
        logDeterminant += Math.log(mantissa);
        mantissa = 1;
      }
    }
    return { negative, logDeterminant: logDeterminant + Math.log(mantissa) };
  }

  /** Solves with the factors, in place. */
  solve(rhs: Float64Array): void {
    const a = this.#values;
    for (let i = 0; i < this.size; i++) {
      const row = this.#base[i] ?? 0;
      let sum = rhs[i] ?? 0;
      for (let j = this.#first[i] ?? 0; j < i; j++) sum -= (a[row + j] ?? 0) * (rhs[j] ?? 0);
      rhs[i] = sum;
    }
    for (let i = 0; i < this.size; i++) rhs[i] = (rhs[i] ?? 0) / (a[(this.#base[i] ?? 0) + i] ?? 1);
    for (let i = this.size - 1; i >= 0; i--) {
      const row = this.#base[i] ?? 0;
      const known = rhs[i] ?? 0;
      for (let j = this.#first[i] ?? 0; j < i; j++) rhs[j] = (rhs[j] ?? 0) - (a[row + j] ?? 0) * known;
    }
  }
}
