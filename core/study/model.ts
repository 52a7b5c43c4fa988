/** What is worked out for one bar when someone looks closer: too much to do for every bar at every edit. */
import type { CurvePoint, PositionPoint } from '../bowing/curves.ts';
import type { NeededStiffness } from '../bowing/needs.ts';
import type { BarMovement } from '../frame/pushing.ts';
import type { Vec2, Vec3 } from '../geometry/vector.ts';
import type { BarId, CrossingId } from '../layout/model.ts';
import type { RestraintDemand } from '../practice/restraintDemand.ts';

export interface BarStudy {
  readonly bar: BarId;
  readonly mode: ModeInSpace;
  /** "one half-wave, 23 % about v, …": the mode in words. */
  readonly modeSays: string;
  readonly needs: readonly StationNeed[];
  /** Critical load against tension in the partner over compression here; null without a partner. */
  readonly againstPartner: { readonly points: readonly CurvePoint[]; readonly present: number } | null;
  /** Critical load against the place of a crossing, as a share of the length; null without a partner. */
  readonly againstPosition: { readonly points: readonly PositionPoint[]; readonly present: number } | null;
  /** What the practice asks of a hold when the bar is squeezed; null for a bar in tension only. */
  readonly demands: HoldDemands | null;
  /** The whole bay under this bar's compression and its partner's share. */
  readonly bay: BayStudy;
}

export interface HoldDemands {
  /** N. */
  readonly compression: number;
  /** What squeezes it so: a combination by name, or its own critical load, where that is more or nothing acts. */
  readonly from: { readonly kind: 'combination'; readonly name: string } | { readonly kind: 'critical load' };
  readonly each: readonly RestraintDemand[];
}

/** A shape in space: displacements square to the bar, largest 1. */
export interface ModeInSpace {
  readonly points: readonly { readonly at: number; readonly displacement: Vec3; readonly twist: number }[];
  readonly largestAt: number;
  /** In the section plane. */
  readonly direction: Vec2;
}

export interface StationNeed {
  readonly station: number;
  readonly at: number;
  readonly direction: 'in plane' | 'out of plane';
  readonly offered: number;
  readonly needed: NeededStiffness;
}

export interface BayStudy {
  /** Load factor on 1 N in the bar, so N; null when the bay is a mechanism. */
  readonly N: number | null;
  /** Over the single bar's figure without twist. */
  readonly ratio: number | null;
  readonly movement: readonly BarMovement[];
}

/** What it costs to leave one join out. */
export interface Reliance {
  readonly crossing: CrossingId;
  /** "D1 × D2, bolted through" */
  readonly says: string;
  /** The bar that loses most. */
  readonly bar: BarId;
  readonly before: number;
  readonly after: number;
  readonly limit: number;
  /** Ids of findings that would open. */
  readonly opens: readonly string[];
}
