import type { Restraint } from '../restraint/model.ts';
import type { SectionProperties } from '../section/model.ts';
import { bareBar, rigidHolds } from './barProblems.ts';
import { loadOf } from './critical.ts';

/** Slenderness from the exact critical load with all counted holds rigid. It does not depend on the modulus. */
export function exactSlenderness(section: SectionProperties, restraint: Restraint): number {
  const N = loadOf({ ...bareBar({ section, restraint }, { E: 1 }), holds: rigidHolds({ restraint }) });
  return Math.PI * Math.sqrt(section.area / N);
}

/**
 * The in-service slenderness by the marks: the rule's, and for a bar with mixed holds the exact one, whose bound is kept beside it.
 * A length that the user sets by hand stands.
 */
export function inServiceSlenderness(section: SectionProperties, restraint: Restraint): InServiceReading {
  const { governing, bound } = restraint;
  if (bound === null || governing.basis === 'override')
    return {
      slenderness: governing.slenderness,
      length: governing.length,
      radius: governing.radius,
      bound: null,
    };
  const slenderness = exactSlenderness(section, restraint);
  return { slenderness, length: slenderness * section.rv, radius: section.rv, bound: governing.slenderness };
}

export interface InServiceReading {
  readonly slenderness: number;
  /** mm; of an exact reading, the length of a pinned bar over its least radius with the same slenderness. */
  readonly length: number;
  readonly radius: number;
  /** The rule's bound for mixed holds, when the reading is exact; null otherwise. */
  readonly bound: number | null;
}
