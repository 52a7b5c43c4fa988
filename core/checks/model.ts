/** Demand against resistance, bar by bar. N. */
import type { MemberPlates } from '../frame/memberPlates.ts';
import type { BarId } from '../layout/model.ts';
import type { Member } from '../project/model.ts';
import type { Resistance, Steel } from '../resistance/model.ts';

/** The greatest force of one sign, and where it comes from. */
export interface Demand {
  /** N, above 0. */
  readonly force: number;
  /** Id and name of the combination's state. */
  readonly state: string;
  readonly name: string;
}

export interface Check {
  readonly resistance: Resistance;
  /** Null while nothing acts: the resistance stands alone. */
  readonly demand: Demand | null;
  /** Demand over resistance, 999 at most: nothing resists. Null where one of them is missing. */
  readonly utilisation: number | null;
}

export interface BarChecks {
  readonly bar: BarId;
  readonly steel: Steel | null;
  readonly tension: Demand | null;
  readonly compression: Demand | null;
  /** States in which the bar hangs slack. */
  readonly slackIn: readonly string[];
  /** Every check, in order of working: the bar, end i, end j, compression. */
  readonly checks: readonly Check[];
  /** The check that is used most; where nothing acts, the one with the least resistance in tension. */
  readonly governing: Check | null;
  /** What compression is judged by, if the bar is counted on in it or is squeezed. */
  readonly compressionBy: Resistance | null;
  /** 'unknown' too where a check that what acts calls for gives no figure, unless another is over. */
  readonly status: 'over' | 'near' | 'within' | 'unknown' | 'no load';
  /** Why nothing could be checked; null otherwise. */
  readonly unknown: string | null;
}

/** Between what holds a strut or beam, mm. */
export interface MemberLengths {
  /** Against motion in the plane of the bay, and out of it. */
  readonly inPlane: number;
  readonly outOfPlane: number;
  /** The depth stands in the plane. */
  readonly onEdge: boolean;
}

/** A strut or beam in compression: what squeezes it against what it resists along itself. Bending is told, not checked. */
export interface MemberChecks {
  readonly bar: BarId;
  readonly member: Member;
  readonly plates: MemberPlates;
  readonly lengths: MemberLengths;
  readonly grade: string;
  readonly steel: Steel | null;
  readonly tension: Demand | null;
  readonly compression: Demand | null;
  /** Greatest moment in the plane in any combination for strength, N·mm. */
  readonly moment: number;
  /** Greatest L/r, and the limit for a bar in compression; null where the section has no figures here. */
  readonly slenderness: number | null;
  readonly limit: number | null;
  readonly check: Check | null;
  readonly status: BarChecks['status'];
  /** Why it could not be checked; null otherwise. */
  readonly unknown: string | null;
}
