/** What holds a bar, in which directions, and over what length it can bow. Section-plane vectors are [along x (shorter leg), along y (longer leg)]. */
import type { Vec2 } from '../geometry/vector.ts';
import type { BarId, CrossingId } from '../layout/model.ts';
import type { JoinKind, LengthOverride } from '../project/model.ts';
import type { Axis } from '../section/model.ts';

export type HoldDirection = 'in plane' | 'out of plane' | 'along holder' | 'twist';

/** One thing a mark claims to hold at a station. */
export interface Claim {
  readonly source: 'end' | CrossingId | BarId;
  readonly join: JoinKind | 'end' | 'bar end';
  /** Bar that holds, when it is one. */
  readonly holder: BarId | null;
  readonly direction: HoldDirection;
  /** Unit vector in the section plane; null for twist. */
  readonly vector: Vec2 | null;
  readonly counted: boolean;
  readonly reason: HoldReason;
  /** From the hold to a support, or to what turned out to be free. */
  readonly trail: readonly TrailStep[];
}

/** Why a hold counts or does not; told in words by `reasonText`. */
export type HoldReason =
  | { readonly kind: 'end' }
  | { readonly kind: 'end marked free'; readonly end: 'i' | 'j' }
  | { readonly kind: 'partner end-on'; readonly partner: string; readonly join: JoinKind }
  | { readonly kind: 'partner half free'; readonly partner: string; readonly node: string }
  | { readonly kind: 'partner only bends'; readonly partner: string }
  | { readonly kind: 'single plate hinges'; readonly partner: string }
  | { readonly kind: 'not joined'; readonly partner: string; readonly marked: boolean }
  /** Joined by the mark, with more between the bars, mm, than a join spans. */
  | { readonly kind: 'too far apart'; readonly partner: string; readonly gap: number }
  | { readonly kind: 'hung'; readonly line: string }
  | { readonly kind: 'line held along itself'; readonly line: string; readonly by: string }
  | { readonly kind: 'line free along itself'; readonly line: string; readonly why: string }
  | { readonly kind: 'line stiff across'; readonly line: string }
  /** A member of the framing that could hold across itself, had its own ends a hold. */
  | { readonly kind: 'line end free'; readonly line: string; readonly node: string }
  | { readonly kind: 'bar ends here'; readonly bar: string }
  | { readonly kind: 'bar ends here, itself free'; readonly bar: string; readonly node: string }
  | { readonly kind: 'twist held'; readonly line: string }
  | { readonly kind: 'nearly along the bar'; readonly holder: string };

export interface TrailStep {
  readonly text: string;
  /** Bar or node to light up in the view. */
  readonly bar: BarId | null;
  readonly node: string | null;
  readonly state: 'on the way' | 'held' | 'free';
}

export interface Station {
  /** mm from end i. */
  readonly at: number;
  /** Short name: "i", "j", "D1", "P2". */
  readonly label: string;
  readonly crossings: readonly CrossingId[];
  readonly claims: readonly Claim[];
  /** Directions counted: none, one unit vector, or both ways. */
  readonly held: Held;
  readonly twistHeld: boolean;
}

export type Held =
  | { readonly ways: 0 }
  | { readonly ways: 1; readonly direction: Vec2 }
  | { readonly ways: 2 };

/** A part of the bar that bows by itself, with the length that it counts as: more than its own where it reaches an end that does not hold. */
export interface Piece {
  readonly from: number;
  readonly to: number;
  /** mm. */
  readonly counts: number;
}

export interface Lane {
  readonly axis: Axis;
  /** Unit vector in which the bar moves when it bends about the axis. */
  readonly motion: Vec2;
  readonly pieces: readonly Piece[];
  /** Whether end i and end j stop this motion; both do unless marked otherwise. */
  readonly endsStop: readonly [boolean, boolean];
  /** One for each interior station: whether it stops this motion, and why (not). */
  readonly cuts: readonly LaneCut[];
  /** Longest piece, mm; with an override in force, the user's length times factor. */
  readonly unbraced: number;
  /** The length found from the marks, mm, whatever the override says. */
  readonly found: number;
  readonly radius: number;
  readonly slenderness: number;
  readonly override: LengthOverride | null;
}

export interface LaneCut {
  readonly at: number;
  readonly station: number;
  readonly stops: boolean;
  readonly claim: Claim | null;
}

/** Bowing between two stations in the direction that all the holds between leave free. */
export interface SpanCheck {
  readonly from: number;
  readonly to: number;
  /** Null: free every way, so the least radius. */
  readonly freeDirection: Vec2 | null;
  readonly radius: number;
  readonly slenderness: number;
}

export interface MixedBound {
  readonly slenderness: number;
  readonly length: number;
  readonly radius: number;
  /** a: holds of one direction only are counted, and what holds both ways; b: two perpendicular directions, each alone. */
  readonly route: 'a' | 'b';
  readonly freeDirection: Vec2 | null;
}

export interface Governing {
  /** 'free': bows in a direction that is none of the four. */
  readonly axis: Axis | 'free';
  /** Degrees from axis x to the bending axis, for 'free'; null otherwise. */
  readonly angle: number | null;
  readonly length: number;
  readonly radius: number;
  readonly slenderness: number;
  readonly from: number;
  readonly to: number;
  readonly basis: 'span' | 'mixed bound' | 'override';
  readonly freeDirection: Vec2 | null;
}

export interface Restraint {
  readonly bar: BarId;
  readonly stations: readonly Station[];
  readonly lanes: Readonly<Record<Axis, Lane>>;
  readonly spans: readonly SpanCheck[];
  readonly bound: MixedBound | null;
  readonly governing: Governing;
}
