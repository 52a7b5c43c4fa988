import { eliminationOrder } from '../sparse/eliminationOrder.ts';
import { analysed, factored, type Symbolic, solved } from '../sparse/factor.ts';
import { MatrixGatherer, type SymmetricMatrix } from '../sparse/symmetricMatrix.ts';
import type { AxialBar, Equilibrium, EquilibriumProblem } from './model.ts';

/** Rounds of the search; a handful is usual, and every round takes energy out. */
const MOST_ROUNDS = 200;
/** Out of balance by less than this share of the load is balanced. */
const BALANCED = 1e-10;
/** Stiffness that is lent to every unknown while slack bars leave some without, as a share of the largest bar's. */
const LENT = 1e-9;
/** A displacement beyond this many times the stiffest answer means that nothing holds. */
const RUNAWAY = 1e7;

/**
 * The one state in which bars that only pull carry the load: the minimum of ½qᵀKq + Σ½(EA/L)max(0, e + e₀)² − fᵀq over tension-only bars, which is convex, so the
 * answer does not depend on the start. Newton's method on the set of taut bars, each step shortened until the energy falls.
 */
export function tensionOnlyEquilibrium(
  problem: EquilibriumProblem,
  start: Float64Array | null = null,
): Equilibrium {
  const state = new Search(problem);
  return state.run(start ?? new Float64Array(state.size));
}

class Search {
  readonly #problem: EquilibriumProblem;
  readonly size: number;
  readonly #load: Float64Array;
  readonly #scale: number;
  readonly #stiffest: number;
  #symbolic: Symbolic | null = null;

  constructor(problem: EquilibriumProblem) {
    this.#problem = problem;
    this.size = problem.nodes * 3 + (problem.turns?.length ?? 0);
    this.#load = problem.load.slice();
    for (const unknown of problem.held) this.#load[unknown] = 0;
    const presets = problem.bars.reduce(
      (most, bar) => Math.max(most, (Math.abs(bar.preset) * bar.EA) / bar.length),
      0,
    );
    this.#scale = Math.max(
      this.#load.reduce((most, f) => Math.max(most, Math.abs(f)), 0),
      presets,
      1e-12,
    );
    this.#stiffest = problem.bars.reduce((most, bar) => Math.max(most, bar.EA / bar.length), 1);
  }

  run(start: Float64Array): Equilibrium {
    let q: Float64Array = start.slice();
    for (const unknown of this.#problem.held) q[unknown] = 0;
    let residual = Number.POSITIVE_INFINITY;
    for (let round = 0; round < MOST_ROUNDS; round++) {
      const gradient = this.#gradient(q);
      residual = largest(gradient) / this.#scale;
      if (residual < BALANCED) return this.#answer(q, residual, round);
      const taut = this.#problem.bars.map((bar) => this.#pulls(bar, q));
      const step = this.#step(gradient, taut);
      const next = this.#descended(q, step, gradient);
      if (next === null)
        return residual < 1e-6
          ? this.#answer(q, residual, round)
          : { kind: 'no way to carry', motion: unit(step) };
      q = next;
      if (largest(q) > (RUNAWAY * this.#scale) / this.#stiffest)
        return { kind: 'no way to carry', motion: unit(step) };
    }
    return residual < 1e-6
      ? this.#answer(q, residual, MOST_ROUNDS)
      : { kind: 'no way to carry', motion: unit(q) };
  }

  #answer(q: Float64Array, residual: number, rounds: number): Equilibrium {
    const { bars } = this.#problem;
    const forces = Float64Array.from(bars, (bar) => this.#force(bar, q));
    const slack = bars.filter((bar) => bar.tensionOnly && !this.#pulls(bar, q)).map(({ id }) => id);
    return { kind: 'balanced', displacement: q, forces, slack, residual, rounds };
  }

  #stretch(bar: AxialBar, q: Float64Array): number {
    let e = bar.preset;
    for (let c = 0; c < 3; c++)
      e += (bar.direction[c] ?? 0) * ((q[3 * bar.j + c] ?? 0) - (q[3 * bar.i + c] ?? 0));
    return e;
  }

  #pulls(bar: AxialBar, q: Float64Array): boolean {
    return !bar.tensionOnly || this.#stretch(bar, q) > 0;
  }

  #force(bar: AxialBar, q: Float64Array): number {
    const e = this.#stretch(bar, q);
    return bar.tensionOnly && e <= 0 ? 0 : (bar.EA / bar.length) * e;
  }

  /** Out-of-balance forces: what resists less what loads. */
  #gradient(q: Float64Array): Float64Array {
    const g = new Float64Array(this.size);
    for (const [i, j, value] of this.#problem.rest) {
      g[i] = (g[i] ?? 0) + value * (q[j] ?? 0);
      if (i !== j) g[j] = (g[j] ?? 0) + value * (q[i] ?? 0);
    }
    for (const bar of this.#problem.bars) {
      const force = this.#force(bar, q);
      if (force === 0) continue;
      for (let c = 0; c < 3; c++) {
        const d = (bar.direction[c] ?? 0) * force;
        g[3 * bar.j + c] = (g[3 * bar.j + c] ?? 0) + d;
        g[3 * bar.i + c] = (g[3 * bar.i + c] ?? 0) - d;
      }
    }
    for (let k = 0; k < this.size; k++) g[k] = (g[k] ?? 0) - (this.#load[k] ?? 0);
    for (const unknown of this.#problem.held) g[unknown] = 0;
    return g;
  }

  #energy(q: Float64Array): number {
    let sum = 0;
    for (const [i, j, value] of this.#problem.rest)
      sum += (i === j ? 0.5 : 1) * value * (q[i] ?? 0) * (q[j] ?? 0);
    for (const bar of this.#problem.bars) {
      const e = this.#stretch(bar, q);
      if (!bar.tensionOnly || e > 0) sum += (0.5 * bar.EA * e * e) / bar.length;
    }
    for (let k = 0; k < this.size; k++) sum -= (this.#load[k] ?? 0) * (q[k] ?? 0);
    return sum;
  }

  #step(gradient: Float64Array, taut: readonly boolean[]): Float64Array {
    const matrix = this.#tangent(taut);
    this.#symbolic ??= analysed(matrix, ordered(matrix, this.#problem));
    const step = solved(factored(matrix, this.#symbolic), gradient);
    for (let k = 0; k < this.size; k++) step[k] = -(step[k] ?? 0);
    return step;
  }

  /** Bars that are slack leave zeros, so that the pattern stays the same. */
  #tangent(taut: readonly boolean[]): SymmetricMatrix {
    const { bars, rest, held } = this.#problem;
    const gatherer = new MatrixGatherer(this.size, bars.length * 21 + rest.length + this.size);
    const put = (i: number, j: number, value: number): void => {
      if (held.has(i) || held.has(j)) return;
      gatherer.add(i, j, value);
    };
    for (let k = 0; k < this.size; k++)
      gatherer.add(k, k, held.has(k) ? this.#stiffest : LENT * this.#stiffest);
    for (const [i, j, value] of rest) put(i, j, value);
    bars.forEach((bar, index) => {
      const k = taut[index] ? bar.EA / bar.length : 0;
      for (let a = 0; a < 3; a++)
        for (let b = 0; b < 3; b++) {
          const value = k * (bar.direction[a] ?? 0) * (bar.direction[b] ?? 0);
          if (b >= a) {
            put(3 * bar.i + a, 3 * bar.i + b, value);
            put(3 * bar.j + a, 3 * bar.j + b, value);
          }
          put(3 * bar.i + a, 3 * bar.j + b, -value);
        }
    });
    return gatherer.matrix();
  }

  /** A point farther down along the step; null when there is none to working accuracy. */
  #descended(q: Float64Array, step: Float64Array, gradient: Float64Array): Float64Array | null {
    const slope = gradient.reduce((sum, g, k) => sum + g * (step[k] ?? 0), 0);
    if (!(slope < 0)) return null;
    const before = this.#energy(q);
    for (let share = 1; share > 1e-12; share /= 2) {
      const next = q.map((value, k) => value + share * (step[k] ?? 0));
      const after = this.#energy(next);
      if (after <= before + 1e-4 * share * slope) return next;
      // Where energies can no longer be told apart, the smaller out-of-balance decides.
      if (
        Math.abs(after - before) <= 1e-13 * Math.abs(before) &&
        largest(this.#gradient(next)) < largest(gradient)
      )
        return next;
    }
    return null;
  }
}

const largest = (values: Float64Array): number =>
  values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);

function unit(values: Float64Array): Float64Array {
  const most = largest(values);
  return most > 0 ? values.map((value) => value / most) : values;
}

/** Nodes are ordered as wholes, each with its turns. */
function ordered(matrix: SymmetricMatrix, { nodes, turns = [] }: EquilibriumProblem): Int32Array {
  const nodeOf = (unknown: number): number =>
    unknown < 3 * nodes ? Math.floor(unknown / 3) : (turns[unknown - 3 * nodes] ?? 0);
  const neighbours = Array.from({ length: nodes }, () => new Set<number>());
  for (let c = 0; c < matrix.size; c++)
    for (let k = matrix.start[c] ?? 0; k < (matrix.start[c + 1] ?? 0); k++) {
      const a = nodeOf(c);
      const b = nodeOf(matrix.row[k] ?? 0);
      if (a === b) continue;
      neighbours[a]?.add(b);
      neighbours[b]?.add(a);
    }
  const turnsOf = Array.from({ length: nodes }, (): number[] => []);
  turns.forEach((node, k) => {
    turnsOf[node]?.push(3 * nodes + k);
  });
  const order = new Int32Array(matrix.size);
  let place = 0;
  for (const node of eliminationOrder(neighbours.map((set) => [...set]))) {
    for (let c = 0; c < 3; c++) order[place++] = 3 * node + c;
    for (const turn of turnsOf[node] ?? []) order[place++] = turn;
  }
  return order;
}
