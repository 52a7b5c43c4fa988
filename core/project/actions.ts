/** What acts on a project. Files and screens use the units that people write: kN, kN/m, kN/m², mm. Directions are global, Z up. */
import type { Vec3 } from '../geometry/vector.ts';

export interface Actions {
  readonly cases: readonly LoadCase[];
  readonly combinations: readonly Combination[];
  /** Where the eaves of a roof bay hand their forces on, when no wall bay shares their nodes. */
  readonly carries: readonly Carry[];
}

export type CaseKind = 'permanent' | 'imposed' | 'wind' | 'other';

export interface LoadCase {
  /** Short and lasting: "G", "W1". */
  readonly id: string;
  readonly name: string;
  readonly kind: CaseKind;
  /** The bars' own weight belongs to it. */
  readonly selfWeight: boolean;
  /** Acts either way: every combination with it is looked at with its loads turned round as well. */
  readonly reverses: boolean;
  readonly loads: readonly Load[];
}

export type Load =
  /** A force on a node, kN. */
  | { readonly kind: 'node'; readonly id: string; readonly node: string; readonly force: Vec3 }
  /** A force along a whole bar, kN for each metre of it. */
  | { readonly kind: 'line'; readonly id: string; readonly bar: string; readonly perMetre: Vec3 }
  /** A bar made shorter than its place by so many mm: above 0 it is drawn tight, below 0 it hangs slack. */
  | { readonly kind: 'shortened'; readonly id: string; readonly bar: string; readonly by: number }
  /**
   * Pressure on the gable that leans on a roof bay: its columns hand half of it on at the panel points of one rafter, each its share of the width.
   * kN/m², above 0 pushing along the bay from rafter 1 to rafter 2.
   */
  | {
      readonly kind: 'gable';
      readonly id: string;
      readonly bay: string;
      readonly pressure: number;
      readonly rafter: 1 | 2;
      /** Height of the gable's foot, mm. */
      readonly ground: number;
    }
  /** Pressure on a wall that leans on a wall bay, `width` mm of it at every level. kN/m², above 0 pushing from left to right. */
  | {
      readonly kind: 'side';
      readonly id: string;
      readonly bay: string;
      readonly pressure: number;
      readonly width: number;
    }
  /**
   * Rafters that are not quite straight, kept in line by the bracing of a roof bay: what they push it with when they are squeezed.
   * kN in each (in a beam the force of its flange), how many lean on this bay, and how far the bracing itself is taken to give way: its span over `gives`.
   */
  | {
      readonly kind: 'bowed';
      readonly id: string;
      readonly bay: string;
      readonly squeeze: number;
      readonly rafters: number;
      readonly gives: number;
    };
export type LoadKind = Load['kind'];

export interface Combination {
  readonly id: string;
  readonly name: string;
  /** Strength is checked against resistances, service for drift and for bars that go slack. */
  readonly use: 'strength' | 'service';
  /** By the case's id. */
  readonly factors: Readonly<Record<string, number>>;
  /** Adds the practice's horizontal share of vertical loads, along the bays. */
  readonly leaning: boolean;
}

export interface Carry {
  readonly from: string;
  /** Wall bay that takes the forces at its top, half on either side. */
  readonly to: string;
  /** Which eaves of the roof bay: that of its first slope or of its second. */
  readonly eaves: 1 | 2;
}

export const NO_ACTIONS: Actions = { cases: [], combinations: [], carries: [] };
