/** How a bar really bows: what the framing offers at its stations, and the critical load with it. N, mm. */
import type { StationStiffness } from '../frame/push.ts';
import type { BarId } from '../layout/model.ts';
import type { Axis } from '../section/model.ts';

export interface Bowing {
  readonly bar: BarId;
  /** By stiffness: what is offered at each station where something is joined; empty where nothing is. */
  readonly stations: readonly OfferedStation[];
  /** All counted holds taken as rigid. */
  readonly rigid: Critical;
  /** The real stiffness of the holds, the partner's own bowing and force, and twist where it matters. */
  readonly real: Critical;
  /** How the rule's load compares with the exact one for rigid holds, per cent; above 0 the rule is on the unsafe side. */
  readonly ruleError: number;
  readonly twist: TwistEffect;
  readonly partner: PartnerState | null;
  /** Why the real figure could not be had; null as a rule. */
  readonly unsupported: string | null;
}

export interface Critical {
  /** Largest compression at buckling, N. */
  readonly N: number;
  /** π√(EA/N). */
  readonly slenderness: number;
  /** π√(EI/N) about each axis, mm. */
  readonly effectiveLength: Readonly<Record<Axis, number>>;
}

export interface OfferedStation extends StationStiffness {
  /** Index among the restraint's stations. */
  readonly station: number;
  readonly holds: readonly HoldGrip[];
}

/** One direction at a station: counted by the marks or not. */
export interface HoldGrip {
  readonly direction: 'in plane' | 'out of plane';
  readonly counted: boolean;
  /** N/mm against being pushed this way. */
  readonly offered: number;
  /** Ideal stiffness of the planar bar over equal spans (Winter), N/mm. */
  readonly ideal: number;
  /** N_cr with this hold as it is, over N_cr with it rigid, all other counted holds rigid; null where it is not counted. */
  readonly grip: number | null;
}

export interface TwistEffect {
  /** N with twist over N without. */
  readonly ratio: number;
  /** Lower by more than 1 %, so that it is in the real figure. */
  readonly governs: boolean;
}

export interface PartnerState {
  readonly bar: BarId;
  readonly crossing: string;
  /** Tension in the partner over compression in the bar. */
  readonly tensionShare: number;
  /** From the combination that is worst for this bar, or as the user assumes. */
  readonly shareFrom: { readonly kind: 'combination'; readonly state: string } | { readonly kind: 'assumed' };
  readonly cut: 'neither' | 'this bar' | 'partner';
  /** Critical load with the partner slack, N; null where the partner is not counted on as taut. */
  readonly slackLoad: number | null;
}

/** A way in which a bay can move without resistance, by name. */
export interface NamedMechanism {
  /** "left head of tier 1 to the right": the places that move most, and which way. */
  readonly says: string;
  readonly bars: readonly BarId[];
}
