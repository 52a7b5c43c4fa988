import type { UnitSystem } from '../project/model.ts';

/** What a report is printed with, beside the assessment. */
export interface ReportOptions {
  readonly units: UnitSystem;
  /** As printed; null leaves it out, so that the same project gives the same report. */
  readonly date: string | null;
  /** Style text with the @font-face rules of "IBM Plex Sans" and "IBM Plex Sans Condensed", the faces embedded. Without it the reader's own faces serve. */
  readonly fonts?: string;
  /** What would answer each finding, by the finding's id. */
  readonly remedies?: ReadonlyMap<string, readonly ReportedRemedy[]>;
}

/** What a report tells of a remedy: its label, and the figure of the finding before and after it. */
export interface ReportedRemedy {
  readonly label: string;
  readonly effect: { readonly before: number | null; readonly after: number | null };
}
