import type { Confidence } from '../../practice/model.ts';
import type { CompressionQuestion, Resistance } from '../model.ts';
import type { Working } from '../working.ts';
import type { WallLimits } from './walls.ts';

/** How a practice makes a resistance of an elastic stress. */
export interface ColumnRule {
  readonly standard: string;
  readonly clause: string;
  readonly confidence: Confidence;
  /** Where twist takes part. */
  readonly twist: { readonly clause: string; readonly confidence: Confidence };
  /** Of tubes. */
  readonly walls: WallLimits;
  /** Why the practice does not ask for bowing with twist; null where it does. */
  twistLeftOut(question: CompressionQuestion): string | null;
  /** What the rule does beyond its plain form, where it is less sure than the rest; null where nothing. */
  remark(question: CompressionQuestion): string | null;
  /**
   * Resistance, N, with its steps. The area A, F_e and N_cr stand among the steps already.
   *
   * @param Fe elastic buckling stress, N/mm², above 0
   */
  strength(question: CompressionQuestion, Fe: number, working: Working): number;
}

export interface CompressionPack {
  readonly column: ColumnRule;
  /** For a single angle held by a leg. */
  oneLeg(question: CompressionQuestion): Resistance;
}
