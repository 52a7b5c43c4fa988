import type { Edit } from '../project/edit.ts';

/** A change that answers a finding, with what it does, computed by assessing the changed project. */
export interface Remedy {
  readonly id: string;
  readonly label: string;
  readonly detail: string;
  readonly edits: readonly Edit[];
  readonly effect: RemedyEffect;
}

export interface RemedyEffect {
  /** The figure of the finding before and after: worst slenderness of the bars concerned, as a rule. */
  readonly before: number | null;
  readonly after: number | null;
  readonly limit: number | null;
  /** kg/m of the section. */
  readonly massPerMetreChange: number;
  /** Finding ids. */
  readonly closes: readonly string[];
  readonly opens: readonly string[];
  /** Whether the finding it answers is gone afterwards. */
  readonly answers: boolean;
}
