import type { Confidence } from '../../practice/model.ts';
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';

/** One check of what holds an end: design resistance of the whole group, N, with its working. */
export interface EndRule {
  readonly clause: string;
  readonly confidence: Confidence;
  readonly of: (question: TensionQuestion, end: ResistingEnd, working: Working) => number;
}

/** Least length of a fillet weld: a multiple of its size, and not below a length. */
export interface LeastWeld {
  readonly sizes: number;
  /** mm. */
  readonly length: number;
  readonly clause: string;
}

/** What one practice says of bolts and welds. A first check: the gusset, prying and eccentricity of the group are not looked at. */
export interface EndPack {
  readonly standard: string;
  readonly boltShear: EndRule;
  readonly bearing: EndRule;
  readonly weld: EndRule & { readonly least: LeastWeld };
}
