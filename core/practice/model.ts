/** What one design standard says of slenderness. */
import type { PracticeId } from '../project/model.ts';
import type { BarShape } from '../section/barShape.ts';
import type { Axis } from '../section/model.ts';

/** How sure we are of a clause: read in the source, or from memory. Shown on screen and in reports. */
export type Confidence = 'read in a source' | 'from memory, sure' | 'from memory, verify';

export interface MemberClass {
  readonly id: string;
  readonly name: string;
  /** L/r; null: the standard gives none, so the user's own limit, 300 unless set. */
  readonly limit: number | null;
  readonly clause: string;
  readonly confidence: Confidence;
}

export interface Practice {
  readonly id: PracticeId;
  readonly name: string;
  readonly edition: string;
  /** Whether the limit is a must, advice, or absent. */
  readonly standing: 'shall' | 'advice' | 'none';
  /** Which verdict the practice asks for. */
  readonly asks: 'inService' | 'handling';
  readonly tension: readonly MemberClass[];
  /** For a bar counted on in compression too. */
  readonly compression: readonly MemberClass[];
  /** The standard's own letters for our axes. */
  readonly axisLetters: Readonly<Record<Axis, string>>;
  readonly note: string;
  /** Shapes that the standard's limit for ties leaves out. */
  readonly exempt: readonly BarShape['kind'][];
  /** Moduli of steel that the standard uses, N/mm². Practice-facts, from memory, sure. */
  readonly steel: { readonly E: number; readonly G: number };
}

export interface LimitInForce {
  readonly limit: number;
  readonly source: 'practice' | 'own limit' | 'own limit, practice gives none';
  readonly clause: string;
  readonly confidence: Confidence;
  readonly standing: 'shall' | 'advice' | 'own';
  readonly className: string;
}

export interface Verdict {
  readonly slenderness: number;
  readonly length: number;
  readonly radius: number;
  readonly limit: number;
  readonly ok: boolean;
  /** In service, for a bar with mixed holds: the rule's bound, while `slenderness` is the exact one. Null otherwise. */
  readonly bound: number | null;
  /** Whether the practice asks for this one. */
  readonly asked: boolean;
}
