import type { Assessment } from '../../../core/assessment.ts';
import type { Finding } from '../../../core/findings/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { showLength, showSlenderness } from '../../../core/units/quantity.ts';

/** The bars that a finding names, in short: "D1, D2", "D9 to D16", "D1 × D2" at a crossing. */
export function findingPlace(finding: Finding, assessment: Assessment): string {
  const crossing = finding.crossing === null ? undefined : assessment.layout.crossings.get(finding.crossing);
  const markOf = (bar: string): string => assessment.layout.bars.get(bar)?.mark ?? bar;
  if (crossing !== undefined) return `${markOf(crossing.a)} × ${markOf(crossing.b)}`;
  const marks = finding.bars.map(markOf);
  if (marks.length === 0) return finding.bay;
  return marks.length > 3 ? `${marks[0]} to ${marks.at(-1)}` : marks.join(', ');
}

/** A finding's figure with its unit; empty where it has none. */
export function findingFigure(value: number | null, finding: Finding, units: UnitSystem): string {
  if (value === null) return '';
  switch (finding.quantity) {
    case 'slenderness':
      return showSlenderness(value, finding.limit);
    case 'length':
      return showLength(value, units, 'small');
    case 'angle':
      return `${grouped(value, 0)}°`;
    case 'ratio':
      return ratioText(value, finding.kind);
    case 'none':
      return finding.kind === 'rule unsafe here' ? `${grouped(value, 1)} %` : '';
    default:
      return finding.quantity satisfies never;
  }
}

/** Whether what a finding is held against is a limit worth telling: not where it is nought, or all of a load. */
export function tellsLimit({ kind, limit }: Finding): boolean {
  return limit !== 0 && kind !== 'twist governs';
}

/** Sag is a share of the length as builders say it; the others are shares of a load. */
function ratioText(value: number, kind: Finding['kind']): string {
  switch (kind) {
    case 'sag':
      return `L/${grouped(value, 0)}`;
    case 'both diagonals squeezed':
      return `T/C ${grouped(value, 2)}`;
    default:
      return `${grouped(value * 100, value > 0.9 && value < 1 ? 1 : 0)} %`;
  }
}
