import { actingFindings } from './acting.ts';
import { barFindings } from './bars.ts';
import { bowingFindings } from './bowing.ts';
import { checkedFindings } from './checked.ts';
import { crossingFindings } from './crossings.ts';
import { detailFindings } from './details.ts';
import { holderFindings } from './holders.ts';
import { looseEndFindings } from './looseEnds.ts';
import { markFindings } from './marks.ts';
import { memberFindings } from './members.ts';
import type { Finding, Severity } from './model.ts';
import { nameFindings } from './names.ts';
import { patternFindings } from './patterns.ts';
import { sharingFindings } from './sharing.ts';
import { slendernessFindings } from './slenderness.ts';
import type { FindingInput, FindingSubject } from './subject.ts';
import { turningFindings } from './turning.ts';

const RANK: Readonly<Record<Severity, number>> = { 'must fix': 0, 'look into': 1, note: 2 };

/** All findings, must-fix first, then bay by bay in the order of the project. */
export function findingsOf(input: FindingInput): readonly Finding[] {
  const places = new Map(input.project.bays.map((bay, index) => [bay.id, index]));
  const subject: FindingSubject = { ...input, places };
  const place = (finding: Finding) => places.get(finding.bay) ?? 0;
  return [
    ...barFindings(subject),
    ...markFindings(subject),
    ...nameFindings(subject),
    ...turningFindings(subject),
    ...looseEndFindings(subject),
    ...slendernessFindings(subject),
    ...crossingFindings(subject),
    ...sharingFindings(subject),
    ...holderFindings(subject),
    ...patternFindings(subject),
    ...bowingFindings(subject),
    ...actingFindings(subject),
    ...detailFindings(subject),
    ...checkedFindings(subject),
    ...memberFindings(subject),
  ].sort((a, b) => RANK[a.severity] - RANK[b.severity] || place(a) - place(b));
}
