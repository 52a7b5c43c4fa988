/** Answers at the ends: more bolts, usual distances, a longer weld; and a grade that is known. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { EndConnection } from '../project/model.ts';
import { usualGrades } from '../resistance/grades.ts';
import { barsOf } from './places.ts';
import type { Proposal } from './proposal.ts';

/** More bolts in line, or more weld, at both ends. */
export function strongerEnds(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const [first] = barsOf(assessment, finding.bars);
  const end = first?.angle?.ends.i;
  if (!end) return [];
  if (end.kind === 'welded') {
    const weldLength = Math.ceil((end.weldLength * 1.5) / 10) * 10;
    return [endProposal(finding, `Weld ${weldLength} mm at each end`, 'half as much again', { weldLength })];
  }
  return [1, 2].map((more) =>
    endProposal(
      finding,
      `${end.bolts + more} bolts at each end`,
      `${more === 1 ? 'one' : 'two'} more in line`,
      { bolts: end.bolts + more },
    ),
  );
}

/** Common practice, no source: end distance twice, pitch three times the bolt, on the usual line. */
export function usualDistances(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const [first] = barsOf(assessment, finding.bars);
  const end = first?.angle?.ends.i;
  if (end?.kind !== 'bolted') return [];
  const roundUp = (mm: number): number => Math.ceil(mm / 5) * 5;
  return [
    endProposal(finding, 'Usual distances', 'end twice, pitch three times the bolt, on the usual line', {
      endDistance: Math.max(end.endDistance, roundUp(2 * end.boltDiameter)),
      pitch: Math.max(end.pitch, roundUp(3 * end.boltDiameter)),
    }),
  ];
}

export function knownGrades(assessment: Assessment, finding: Finding): readonly Proposal[] {
  return usualGrades(assessment.practice.id)
    .slice(0, 3)
    .map((grade) => ({
      label: `Take ${grade}`,
      detail: 'a usual grade of this practice',
      edits: [{ kind: 'bars', bars: finding.bars, change: { grade } }],
    }));
}

function endProposal(
  finding: Finding,
  label: string,
  detail: string,
  change: Partial<EndConnection>,
): Proposal {
  return {
    label,
    detail,
    edits: [{ kind: 'bars', bars: finding.bars, change: { endI: change, endJ: change } }],
  };
}
