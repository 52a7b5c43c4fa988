import type { BarId } from '../layout/model.ts';
import type { Axis } from '../section/model.ts';

export interface ShortlistOptions {
  /** Try unequal angles with either leg in the plane, or as placed now only. */
  readonly placements: 'as placed' | 'both';
}

export interface Candidate {
  readonly designation: string;
  readonly kind: 'equal' | 'unequal';
  readonly legInPlane: 'longer' | 'shorter';
  readonly massPerMetre: number;
  /** Of the worst bar of the group. */
  readonly bar: BarId;
  readonly slenderness: number;
  readonly axis: Axis | 'free';
  readonly bySlenderness: Readonly<Record<Axis, number>>;
  readonly handling: number;
  readonly limit: number;
  readonly passes: boolean;
  /** Of what acts: demand over resistance of the check that is used most, worst bar; null where nothing acts or it was not asked. */
  readonly utilisation: number | null;
  /** Bolts do not fit the leg: gauge and edge distance (common practice); null when they do. */
  readonly fit: string | null;
  /** Why it fails, in words; null when it passes. */
  readonly why: string | null;
  readonly isPresent: boolean;
}

export interface Shortlist {
  readonly bars: readonly BarId[];
  readonly limit: number;
  /** Least radius wanted about each axis, mm: unbraced length over limit, worst bar. */
  readonly neededRadius: Readonly<Record<Axis, number>>;
  /** Ranked by mass, then by slenderness. */
  readonly candidates: readonly Candidate[];
  /** The first that passes, or null. */
  readonly first: Candidate | null;
  readonly passing: number;
}
