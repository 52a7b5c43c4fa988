/** A change on trial: shown through the whole window, kept out of the project until it is kept. */
import type { Assessment } from '../../core/assessment.ts';
import type { Finding } from '../../core/findings/model.ts';
import type { BarId } from '../../core/layout/model.ts';
import { applyEdit } from '../../core/project/applyEdit.ts';
import type { Edit } from '../../core/project/edit.ts';
import type { Project } from '../../core/project/model.ts';

export interface Trial {
  /** Tells this trial from others, so that its button can say "Trying". */
  readonly id: string;
  /** "Turn the longer leg out". */
  readonly label: string;
  /** "D1 to D4, W1"; empty where the label says it. */
  readonly where: string;
  readonly edits: readonly Edit[];
  /** The bar whose figure the banner tells. */
  readonly bar: BarId | null;
}

export interface Trying extends Trial {
  readonly project: Project;
}

export function tryingOf(trial: Trial, project: Project): Trying {
  return { ...trial, project: trial.edits.reduce(applyEdit, project) };
}

/** What a trial does to the list of findings. */
export interface FindingsChange {
  readonly closes: readonly Finding[];
  readonly opens: readonly Finding[];
}

export function findingsChange(before: Assessment, after: Assessment): FindingsChange {
  const missingFrom = (other: Assessment) => {
    const ids = new Set(other.findings.map(({ id }) => id));
    return ({ id }: Finding): boolean => !ids.has(id);
  };
  return {
    closes: before.findings.filter(missingFrom(after)),
    opens: after.findings.filter(missingFrom(before)),
  };
}
