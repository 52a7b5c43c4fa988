/** Equilibrium of a frame some of whose bars work in tension only. N, mm, MPa; tension positive. */
import type { Vec3 } from '../geometry/vector.ts';
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

/** What a combination does with every way of turning round the cases that act either way. */
export interface CombinationState {
  /** "C2", "C2 W turned". */
  readonly id: string;
  readonly combination: string;
  /** "0.9 G + 1.3 W, W turned round". */
  readonly name: string;
  readonly use: 'strength' | 'service';
  /** By the case's id, its sign with it. */
  readonly factors: Readonly<Record<string, number>>;
  /** Which way the practice's horizontal share of vertical loads acts along the bays, 1 towards greater X, or Y; 0 where it is left out. */
  readonly leaning: -1 | 0 | 1;
  /** Cases that act the other way round than they are given. */
  readonly turned: readonly string[];
}

/** A way that a building can move under a load, since nothing resists it. */
export interface NoWay {
  readonly bays: readonly string[];
  /** Nodes that move most, most first, with unit directions. */
  readonly moving: readonly { readonly node: string; readonly direction: Vec3 }[];
  /** Diagonals that the motion slackens. */
  readonly slackened: readonly BarId[];
}

/** How far one level of a bay moves along it against the level below, mm. */
export interface Drift {
  readonly bay: string;
  /** "t1", or of a roof the slope's id. */
  readonly level: string;
  readonly height: number;
  readonly elastic: number;
  /** With the slack of holes and the sag of bars taken up first; null where it was not asked for. */
  readonly withTakeUp: number | null;
}

/** Forces in one combination. N, mm; tension positive. */
export interface ForceState extends CombinationState {
  /** Of every bar of parts that carry the load; bars of others are not in it. */
  readonly forces: ReadonlyMap<BarId, number>;
  /** Greatest bending moment in the plane, N·mm, of members that bend. */
  readonly moments: ReadonlyMap<BarId, number>;
  /** Of diagonals, knees and ties. */
  readonly elongations: ReadonlyMap<BarId, number>;
  readonly slack: ReadonlySet<BarId>;
  /** Compression that each slack bar would take if it did not bow out of the way: an analysis with all bars working both ways. Only strength. */
  readonly attracted: ReadonlyMap<BarId, number>;
  readonly displacements: ReadonlyMap<string, Vec3>;
  /** What supports push with, N. */
  readonly reactions: ReadonlyMap<string, Vec3>;
  readonly drifts: readonly Drift[];
  readonly noWay: readonly NoWay[];
  /** Largest out-of-balance force over the largest load. */
  readonly residual: number;
}

/** A load, carry or combination that says something of what is not there. */
export interface ActionProblem {
  /** Path in the project file. */
  readonly path: string;
  readonly what: string;
  readonly todo: string;
}

export interface Forces {
  readonly states: readonly ForceState[];
  readonly problems: readonly ActionProblem[];
  /** Loads of each case on nodes, N, as found from everything it holds: for drawing. */
  readonly caseLoads: ReadonlyMap<string, ReadonlyMap<string, Vec3>>;
}
