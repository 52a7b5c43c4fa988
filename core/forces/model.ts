/** Equilibrium of a frame some of whose bars work in tension only. N, mm, MPa; tension positive. */
import type { BarId } from '../layout/model.ts';

/** A straight bar that only pulls or pushes along itself, between two nodes with three displacements each. */
export interface AxialBar {
  readonly id: BarId;
  readonly i: number;
  readonly j: number;
  /** Unit vector from i to j. */
  readonly direction: readonly [number, number, number];
  readonly length: number;
  /** N. */
  readonly EA: number;
  readonly tensionOnly: boolean;
  /** Elongation that the bar has before anything moves, mm: below 0 a slack to take up, above 0 a pretension. */
  readonly preset: number;
}

export interface EquilibriumProblem {
  /** Number of nodes; unknown 3k + c is displacement c of node k. */
  readonly nodes: number;
  /** Further unknowns after those, such as turns of joints; each with the node that it belongs to. Left out where there are none. */
  readonly turns?: readonly number[];
  /** Held displacements, by unknown. */
  readonly held: ReadonlySet<number>;
  readonly bars: readonly AxialBar[];
  /** Stiffness of everything else, as entries (row, column, value) with each pair once. */
  readonly rest: readonly (readonly [number, number, number])[];
  /** Load on each unknown, N. */
  readonly load: Float64Array;
}

export type Equilibrium =
  | {
      readonly kind: 'balanced';
      /** mm, by unknown. */
      readonly displacement: Float64Array;
      /** N, by bar, in the order of the problem. */
      readonly forces: Float64Array;
      readonly slack: readonly BarId[];
      /** Largest out-of-balance force over the largest load. */
      readonly residual: number;
      readonly rounds: number;
    }
  /** Some motion meets no resistance, and the load does work in it. */
  | { readonly kind: 'no way to carry'; readonly motion: Float64Array };
