import type { Assessment, DiagonalAssessment } from '../../../core/assessment.ts';
import { STATUS_NAMES } from '../../../core/documents/words.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { Verdict } from '../../../core/practice/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';

export interface BarLabel {
  readonly mark: string;
  readonly status: DiagonalAssessment['status'];
  /** "344"; an en dash where there is none. */
  readonly slenderness: string;
  /** The whole in words, for those who do not see it. */
  readonly spoken: string;
}

/** What is written beside a diagonal: its mark, how near it is to the limit, its slenderness. */
export function barLabel(assessment: Assessment, bar: Bar): BarLabel {
  const diagonal = assessment.diagonals.get(bar.id);
  const verdict = diagonal ? askedVerdict(diagonal) : null;
  const status = diagonal?.status ?? 'unknown';
  const slenderness = verdict ? showSlenderness(verdict.slenderness, verdict.limit) : '–';
  const figure = verdict ? `, slenderness ${slenderness}, limit ${showSlenderness(verdict.limit)}` : '';
  return { mark: bar.mark, status, slenderness, spoken: `${bar.mark}${figure}, ${STATUS_NAMES[status]}` };
}

/** The verdict that the practice asks for; of two, the one nearer to its limit. In service where it asks for none. */
function askedVerdict(diagonal: DiagonalAssessment): Verdict | null {
  const asked = [diagonal.inService, diagonal.handling].filter((one): one is Verdict => one?.asked === true);
  const worst = asked.toSorted((a, b) => b.slenderness / b.limit - a.slenderness / a.limit)[0];
  return worst ?? diagonal.inService;
}
