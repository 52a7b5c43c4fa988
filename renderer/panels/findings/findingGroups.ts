/** The findings as the list shows them: while a change is on trial, what it touches first; else by weight. */
import type { Assessment } from '../../../core/assessment.ts';
import type { Finding, Severity } from '../../../core/findings/model.ts';
import { findingsChange } from '../../store/trying.ts';

export type FindingState = 'stands' | 'closes' | 'opens';

export type FindingItem =
  | { readonly kind: 'group'; readonly title: string; readonly aside: string }
  | { readonly kind: 'finding'; readonly finding: Finding; readonly state: FindingState };

const WEIGHTS: readonly { readonly severity: Severity; readonly title: string }[] = [
  { severity: 'must fix', title: 'Must fix' },
  { severity: 'look into', title: 'Look into' },
  { severity: 'note', title: 'Notes' },
];

/** @param bay only that bay's findings; null for all */
export function findingItems(
  shown: Assessment,
  before: Assessment | null,
  bay: string | null,
): readonly FindingItem[] {
  const wanted = (finding: Finding): boolean => bay === null || finding.bay === bay;
  if (before === null)
    return WEIGHTS.flatMap(({ severity, title }) => {
      const found = shown.findings.filter((finding) => finding.severity === severity && wanted(finding));
      return found.length === 0
        ? []
        : [{ kind: 'group' as const, title, aside: String(found.length) }, ...found.map(standing)];
    });
  const { closes, opens } = findingsChange(before, shown);
  const opened = new Set(opens.map(({ id }) => id));
  const rest = shown.findings.filter((finding) => !opened.has(finding.id) && wanted(finding));
  return [
    { kind: 'group', title: 'Touched by this trial', aside: `${closes.length} close, ${opens.length} open` },
    ...closes.map((finding) => ({ kind: 'finding' as const, finding, state: 'closes' as const })),
    ...opens.map((finding) => ({ kind: 'finding' as const, finding, state: 'opens' as const })),
    ...(rest.length === 0
      ? []
      : [
          { kind: 'group' as const, title: 'Everything else', aside: countWords(rest) },
          ...rest.map(standing),
        ]),
  ];
}

function standing(finding: Finding): FindingItem {
  return { kind: 'finding', finding, state: 'stands' };
}

function countWords(findings: readonly Finding[]): string {
  return WEIGHTS.map(({ severity }) => ({
    severity,
    count: findings.filter((each) => each.severity === severity).length,
  }))
    .filter(({ count }) => count > 0)
    .map(({ severity, count }) => `${count} ${severity === 'note' && count > 1 ? 'notes' : severity}`)
    .join(', ');
}
