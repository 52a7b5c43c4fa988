/**
 * The elastic critical load of one bar: what goes in and what comes out. N, mm, MPa, rad; compression positive.
 * Directions lie in the section plane, [along the shorter leg, along the longer leg], as everywhere in core.
 */
import type { Vec2 } from '../geometry/vector.ts';

/** What a bar's section brings to buckling. An angle's `SectionProperties` has all of it. */
export interface BucklingSection {
  readonly area: number;
  readonly Ixx: number;
  readonly Iyy: number;
  readonly Iu: number;
  readonly Iv: number;
  /** From axis x to axis u, rad. */
  readonly alpha: number;
  /** Relative to the centroid, mm; wanted for twist only. */
  readonly shearCentre: Vec2;
  readonly J: number;
  readonly Iw: number;
}

/** A hold at a place along the bar, in one direction. */
export interface Hold {
  /** mm from end i, inside the bar. */
  readonly at: number;
  /** Unit vector. */
  readonly direction: Vec2;
  /** N/mm, or 'rigid'. */
  readonly stiffness: number | 'rigid';
  /** Where it grips the section, relative to the centroid, mm. The centroid when left out; counts only where twist is looked at. */
  readonly grip?: Vec2;
}

/** A part of the bar with a constant force: `share` times the load factor, compression positive. */
export interface AxialPiece {
  readonly from: number;
  readonly to: number;
  readonly share: number;
}

/** Rotational springs at an end against the slopes of the displacements along x and y, N·mm/rad. */
export interface EndRotation {
  readonly alongX: number | 'rigid';
  readonly alongY: number | 'rigid';
}

export interface BarProblem {
  readonly E: number;
  readonly length: number;
  readonly section: BucklingSection;
  readonly holds: readonly Hold[];
  /** In order, from 0 to the length. */
  readonly axial: readonly AxialPiece[];
  readonly endI: EndRotation;
  readonly endJ: EndRotation;
  /** Directions in which end i and end j stay in place; both ways where left out. The force keeps its direction at an end that moves. */
  readonly endsStay?: { readonly i: readonly Vec2[]; readonly j: readonly Vec2[] };
  /** Directions in which end i and end j keep their slope; none where left out. */
  readonly slopesStay?: { readonly i: readonly Vec2[]; readonly j: readonly Vec2[] };
  /** Null: bowing only. Otherwise bowing and twisting coupled, ends held against twist, free to warp. */
  readonly twist: { readonly G: number; readonly heldAt: readonly number[] } | null;
}

export const PINNED: EndRotation = { alongX: 0, alongY: 0 };

export interface CriticalLoad {
  /** Load factor at which the bar buckles; N for shares of 1. Null when nothing compresses it. */
  readonly factor: number | null;
  /** Largest compression in the bar at that factor, N. */
  readonly N: number | null;
  /** Factor of the second way to buckle; counts a double root twice. */
  readonly second: number | null;
  /** Trial loads that were looked at. */
  readonly trials: number;
}

/** The shape at buckling. */
export interface BucklingMode {
  /** Evenly spaced places along the bar, mm, with the displacement of the centroid [along x, along y], largest 1, and the twist, rad per mm of that. */
  readonly shape: readonly ModePoint[];
  /** Share of the bending energy about v and about u; they add up to 1, or to 0 for a bar that stays at rest. */
  readonly energyAboutV: number;
  readonly energyAboutU: number;
  /** Half-waves in the part with most bending energy; 0 at rest. */
  readonly halfWaves: number;
  readonly symmetry: 'symmetric' | 'antisymmetric' | 'unsymmetric';
  /** Where it moves most, mm from end i, and which way there. */
  readonly largestAt: number;
  readonly directionAtLargest: Vec2;
}

export interface ModePoint {
  readonly at: number;
  readonly displacement: Vec2;
  readonly twist: number;
}
