/** Stability cases: bars and crossed pairs under load, each given by itself in a file, and what comes out of them. N, mm, MPa, rad. */
import type { Axis, SectionProperties } from '../section/model.ts';
import type { BarProblem } from '../stability/model.ts';
import type { PlanarBar } from '../stability/pair.ts';

export type CaseType = 'bar' | 'xbrace-planar' | 'bar-flexural-torsional';

export type StabilityCase = BarCase | PairCase;

/** Directions lie in the case's own axes: x along the leg `b`, y along the leg `h`, whichever is the longer. */
export interface BarCase {
  readonly type: 'bar' | 'bar-flexural-torsional';
  readonly id: string;
  readonly section: CaseSection;
  readonly problem: BarProblem;
}

/** What a case says of its section; the centroid's place is not asked for. */
export type CaseSection = Omit<SectionProperties, 'centroidX' | 'centroidY'>;

/** Two bars that cross, bending out of their plane only. */
export interface PairCase {
  readonly type: 'xbrace-planar';
  readonly id: string;
  readonly considered: PlanarBar;
  readonly partner: PlanarBar;
  /** Tension in the partner over compression in the bar considered; below zero when both are compressed. */
  readonly tensionShare: number;
}

export interface CaseProblem {
  /** Where in the case: "stations[1].k"; '' for the case itself. */
  readonly path: string;
  readonly what: string;
  readonly todo: string;
}

export type CaseRead =
  | { readonly ok: true; readonly case: StabilityCase }
  | { readonly ok: false; readonly id: string; readonly problems: readonly CaseProblem[] };

export type CasesRead =
  | { readonly ok: true; readonly cases: readonly CaseRead[] }
  | { readonly ok: false; readonly problem: CaseProblem };

export interface SolvedBar {
  readonly type: 'bar' | 'bar-flexural-torsional';
  readonly id: string;
  readonly length: number;
  /** Null when nothing presses the bar. */
  readonly critical: SolvedLoad | null;
  readonly says: string;
  readonly mode: SolvedMode | null;
  /** Null where a hold is a spring, since the rule knows only what holds and what does not. */
  readonly rule: SolvedRule | null;
  /** Of a bar with twist: the load without it; null of others. */
  readonly bowingOnly: number | null;
}

export interface SolvedLoad {
  /** Largest compression at buckling, N, and the factor on the given forces. */
  readonly N: number;
  readonly factor: number;
  readonly secondN: number;
  readonly secondFactor: number;
  /** π√(EA/N). */
  readonly slenderness: number;
  /** π√(EI/N) about each axis, mm. */
  readonly effectiveLength: Readonly<Record<Axis, number>>;
}

export interface SolvedMode {
  readonly halfWaves: number;
  readonly symmetry: 'symmetric' | 'antisymmetric' | 'unsymmetric';
  readonly energyAboutV: number;
  readonly energyAboutU: number;
  /** Share of the length, and degrees from x towards y, in [0, 180). */
  readonly largestAt: number;
  readonly largestDirection: number;
}

export interface SolvedRule {
  readonly unbraced: Readonly<Record<Axis, number>>;
  readonly slenderness: number;
  /** About which it bows; 'free' for a direction that is none of the four. */
  readonly axis: Axis | 'free';
  readonly basis: 'span' | 'mixed bound';
  /** π²EA/slenderness², N. */
  readonly N: number;
  /** That load against the exact one, per cent: above zero the rule is on the unsafe side. */
  readonly difference: number;
}

export interface SolvedPair {
  readonly type: 'xbrace-planar';
  readonly id: string;
  /** Compression in the bar considered. */
  readonly N: number;
  readonly secondN: number;
  /** π√(EI/N) of the bar considered, mm; null when it moves without load. */
  readonly effectiveLength: number | null;
  /** That length over the bar's. */
  readonly K: number | null;
  readonly says: string;
}

export type SolvedCase = SolvedBar | SolvedPair;
