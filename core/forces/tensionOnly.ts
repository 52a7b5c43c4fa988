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

/** What problems of one build share: the pattern of their stiffness does not depend on loads or on which bars are taut. */
export interface SharedPattern {
  symbolic: Symbolic | null;
}

/**
 * The one state in which bars that only pull carry the load: the minimum of ½qᵀKq + Σ½(EA/L)max(0, e + e₀)² − fᵀq over tension-only bars, which is convex, so the
 * answer does not depend on the start. Newton's method on the set of taut bars, each step shortened until the energy falls.
 *
 * @param pattern kept from one problem to the next of the same bars and held unknowns
 */
export function tensionOnlyEquilibrium(
  problem: EquilibriumProblem,
  start: Float64Array | null = null,
  pattern: SharedPattern = { symbolic: null },
): Equilibrium {
  const state = new Search(problem, pattern);
  return state.run(start ?? new Float64Array(state.size));
}

/** Bars and entries in rows of numbers: the search runs over them many times. */
interface Flat {
  readonly count: number;
  readonly i: Int32Array;
  readonly j: Int32Array;
  readonly direction: Float64Array;
  readonly stiffness: Float64Array;
  readonly preset: Float64Array;
  readonly tensionOnly: Uint8Array;
  readonly restI: Int32Array;
  readonly restJ: Int32Array;
  readonly restValue: Float64Array;
}

class Search {
  readonly #problem: EquilibriumProblem;
  readonly size: number;
  readonly #flat: Flat;
  readonly #load: Float64Array;
  readonly #scale: number;
  readonly #stiffest: number;
  readonly #pattern: SharedPattern;

  constructor(problem: EquilibriumProblem, pattern: SharedPattern) {
    this.#problem = problem;
    this.#pattern = pattern;
    this.size = problem.nodes * 3 + (problem.turns?.length ?? 0);
    this.#flat = flattened(problem);
    this.#load = problem.load.slice();
    for (const unknown of problem.held) this.#load[unknown] = 0;
    const { stiffness, preset, count } = this.#flat;
    let presets = 0;
    let stiffest = 1;
    for (let b = 0; b < count; b++) {
      presets = Math.max(presets, Math.abs(preset[b] ?? 0) * (stiffness[b] ?? 0));
      stiffest = Math.max(stiffest, stiffness[b] ?? 0);
    }
    this.#scale = Math.max(largest(this.#load), presets, 1e-12);
    this.#stiffest = stiffest;
  }

  run(start: Float64Array): Equilibrium {
    let q: Float64Array = start.slice();
    for (const unknown of this.#problem.held) q[unknown] = 0;
    let residual = Number.POSITIVE_INFINITY;
    for (let round = 0; round < MOST_ROUNDS; round++) {
      const gradient = this.#gradient(q);
      residual = largest(gradient) / this.#scale;
      if (residual < BALANCED) return this.#answer(q, residual, round);
      const taut = this.#taut(q);
      const step = this.#step(gradient, taut);
      const next = this.#descended(q, step, gradient, taut);
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
    const forces = Float64Array.from(bars, (_, b) => this.#force(b, q));
    const slack = bars.filter((bar, b) => bar.tensionOnly && this.#stretch(b, q) <= 0).map(({ id }) => id);
    return { kind: 'balanced', displacement: q, forces, slack, residual, rounds };
  }

  #stretch(b: number, q: Float64Array): number {
    const { i, j, direction, preset } = this.#flat;
    const from = 3 * (i[b] ?? 0);
    const to = 3 * (j[b] ?? 0);
    return (
      (preset[b] ?? 0) +
      (direction[3 * b] ?? 0) * ((q[to] ?? 0) - (q[from] ?? 0)) +
      (direction[3 * b + 1] ?? 0) * ((q[to + 1] ?? 0) - (q[from + 1] ?? 0)) +
      (direction[3 * b + 2] ?? 0) * ((q[to + 2] ?? 0) - (q[from + 2] ?? 0))
    );
  }

  #force(b: number, q: Float64Array): number {
    const e = this.#stretch(b, q);
    return this.#flat.tensionOnly[b] && e <= 0 ? 0 : (this.#flat.stiffness[b] ?? 0) * e;
  }

  /** 1 for each bar that works. */
  #taut(q: Float64Array): Uint8Array {
    const { count, tensionOnly } = this.#flat;
    const taut = new Uint8Array(count);
    for (let b = 0; b < count; b++) taut[b] = tensionOnly[b] && this.#stretch(b, q) <= 0 ? 0 : 1;
    return taut;
  }

  /** Out-of-balance forces: what resists less what loads. */
  #gradient(q: Float64Array): Float64Array {
    const { count, i, j, direction, restI, restJ, restValue } = this.#flat;
    const g = new Float64Array(this.size);
    for (let k = 0; k < restValue.length; k++) {
      const a = restI[k] ?? 0;
      const b = restJ[k] ?? 0;
      const value = restValue[k] ?? 0;
      g[a] = (g[a] ?? 0) + value * (q[b] ?? 0);
      if (a !== b) g[b] = (g[b] ?? 0) + value * (q[a] ?? 0);
    }
    for (let b = 0; b < count; b++) {
      const force = this.#force(b, q);
      if (force === 0) continue;
      const from = 3 * (i[b] ?? 0);
      const to = 3 * (j[b] ?? 0);
      for (let c = 0; c < 3; c++) {
        const d = (direction[3 * b + c] ?? 0) * force;
        g[to + c] = (g[to + c] ?? 0) + d;
        g[from + c] = (g[from + c] ?? 0) - d;
      }
    }
    for (let k = 0; k < this.size; k++) g[k] = (g[k] ?? 0) - (this.#load[k] ?? 0);
    for (const unknown of this.#problem.held) g[unknown] = 0;
    return g;
  }

  #energy(q: Float64Array): number {
    const { count, stiffness, tensionOnly, restI, restJ, restValue } = this.#flat;
    let sum = 0;
    for (let k = 0; k < restValue.length; k++) {
      const a = restI[k] ?? 0;
      const b = restJ[k] ?? 0;
      sum += (a === b ? 0.5 : 1) * (restValue[k] ?? 0) * (q[a] ?? 0) * (q[b] ?? 0);
    }
    for (let b = 0; b < count; b++) {
      const e = this.#stretch(b, q);
      if (!tensionOnly[b] || e > 0) sum += 0.5 * (stiffness[b] ?? 0) * e * e;
    }
    for (let k = 0; k < this.size; k++) sum -= (this.#load[k] ?? 0) * (q[k] ?? 0);
    return sum;
  }

  #step(gradient: Float64Array, taut: Uint8Array): Float64Array {
    const matrix = this.#tangent(taut);
    this.#pattern.symbolic ??= analysed(matrix, ordered(matrix, this.#problem));
    const step = solved(factored(matrix, this.#pattern.symbolic), gradient);
    for (let k = 0; k < this.size; k++) step[k] = -(step[k] ?? 0);
    return step;
  }

  /** Bars that are slack leave zeros, so that the pattern stays the same. */
  #tangent(taut: Uint8Array): SymmetricMatrix {
    const { held } = this.#problem;
    const { count, i, j, direction, stiffness, restI, restJ, restValue } = this.#flat;
    const gatherer = new MatrixGatherer(this.size, count * 21 + restValue.length + this.size);
    const isHeld = new Uint8Array(this.size);
    for (const unknown of held) isHeld[unknown] = 1;
    for (let k = 0; k < this.size; k++)
      gatherer.add(k, k, isHeld[k] ? this.#stiffest : LENT * this.#stiffest);
    const put = (a: number, b: number, value: number): void => {
      if (!isHeld[a] && !isHeld[b]) gatherer.add(a, b, value);
    };
    for (let k = 0; k < restValue.length; k++) put(restI[k] ?? 0, restJ[k] ?? 0, restValue[k] ?? 0);
    for (let b = 0; b < count; b++) {
      const k = taut[b] ? (stiffness[b] ?? 0) : 0;
      const from = 3 * (i[b] ?? 0);
      const to = 3 * (j[b] ?? 0);
      for (let c = 0; c < 3; c++)
        for (let d = 0; d < 3; d++) {
          const value = k * (direction[3 * b + c] ?? 0) * (direction[3 * b + d] ?? 0);
          if (d >= c) {
            put(from + c, from + d, value);
            put(to + c, to + d, value);
          }
          put(from + c, to + d, -value);
        }
    }
    return gatherer.matrix();
  }

  /** A point farther down along the step; null when there is none to working accuracy. */
  #descended(
    q: Float64Array,
    step: Float64Array,
    gradient: Float64Array,
    taut: Uint8Array,
  ): Float64Array | null {
    let slope = 0;
    for (let k = 0; k < gradient.length; k++) slope += (gradient[k] ?? 0) * (step[k] ?? 0);
    if (!(slope < 0)) return null;
    const whole = moved(q, step, 1);
    // While no bar goes slack or taut the energy is a quadratic, and the whole step is its minimum.
    if (alike(this.#taut(whole), taut)) return whole;
    const before = this.#energy(q);
    for (let share = 1; share > 1e-12; share /= 2) {
      const next = share === 1 ? whole : moved(q, step, share);
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

function flattened({ bars, rest }: EquilibriumProblem): Flat {
  const count = bars.length;
  const flat = {
    count,
    i: new Int32Array(count),
    j: new Int32Array(count),
    direction: new Float64Array(3 * count),
    stiffness: new Float64Array(count),
    preset: new Float64Array(count),
    tensionOnly: new Uint8Array(count),
    restI: new Int32Array(rest.length),
    restJ: new Int32Array(rest.length),
    restValue: new Float64Array(rest.length),
  };
  bars.forEach((bar: AxialBar, b) => {
    flat.i[b] = bar.i;
    flat.j[b] = bar.j;
    flat.direction.set(bar.direction, 3 * b);
    flat.stiffness[b] = bar.EA / bar.length;
    flat.preset[b] = bar.preset;
    flat.tensionOnly[b] = bar.tensionOnly ? 1 : 0;
  });
  rest.forEach(([i, j, value], k) => {
    flat.restI[k] = i;
    flat.restJ[k] = j;
    flat.restValue[k] = value;
  });
  return flat;
}

function moved(q: Float64Array, step: Float64Array, share: number): Float64Array {
  const next = q.slice();
  for (let k = 0; k < next.length; k++) next[k] = (next[k] ?? 0) + share * (step[k] ?? 0);
  return next;
}

function alike(a: Uint8Array, b: Uint8Array): boolean {
  for (let k = 0; k < a.length; k++) if (a[k] !== b[k]) return false;
  return true;
}

function largest(values: Float64Array): number {
  let most = 0;
  for (let k = 0; k < values.length; k++) {
    const size = Math.abs(values[k] ?? 0);
    if (size > most) most = size;
  }
  return most;
}

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
