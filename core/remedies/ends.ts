/** Answers at the ends: more bolts, usual distances, a longer weld; and a grade that is known. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { Edit } from '../project/edit.ts';
import type { BarMark, EndConnection } from '../project/model.ts';
import { usualGrades } from '../resistance/grades.ts';
import { endsHoldOf, endsMarkedFree } from '../restraint/endWords.ts';
import { showLength } from '../units/quantity.ts';
import { MM_PER_INCH } from '../units/unitSystem.ts';
import { barsOf } from './places.ts';
import type { Proposal } from './proposal.ts';

/** More bolts in line, or more weld, at both ends. */
export function strongerEnds(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const [first] = barsOf(assessment, finding.bars);
  const end = first?.angle?.ends.i;
  if (!end) return [];
  if (end.kind === 'welded') {
    const { units } = assessment.project.settings;
    const step = units === 'us' ? MM_PER_INCH / 2 : 10;
    const weldLength = Math.ceil((end.weldLength * 1.5) / step) * step;
    return [
      endProposal(
        assessment,
        finding,
        `Weld ${showLength(weldLength, units)} at each end`,
        'half as much again',
        {
          weldLength,
        },
      ),
    ];
  }
  return [1, 2].map((more) =>
    endProposal(
      assessment,
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
    endProposal(
      assessment,
      finding,
      'Usual distances',
      'end twice, pitch three times the bolt, on the usual line',
      {
        endDistance: Math.max(end.endDistance, roundUp(2 * end.boltDiameter)),
        pitch: Math.max(end.pitch, roundUp(3 * end.boltDiameter)),
      },
    ),
  ];
}

/** As many battens as bring one angle of the pair within what it may be between them. */
export function moreBattens(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const [first] = barsOf(assessment, finding.bars);
  if (!first?.angle || finding.value === null || finding.limit === null) return [];
  const present = first.angle.spec.battens ?? 0;
  const battens = Math.min(100, Math.ceil(((present + 1) * finding.value) / finding.limit) - 1);
  return [
    {
      label: battens === 1 ? 'One batten' : `${battens} battens`,
      detail: 'evenly spaced between the ends',
      edits: [{ kind: 'diagonals', bay: first.bay, change: { battens } }],
    },
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

/** Every end that is marked as holding less holds both ways, as an end does that is not marked. */
export function holdTheEnds(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const edits = barsOf(assessment, finding.bars).flatMap(({ id, angle }): readonly Edit[] => {
    if (!angle) return [];
    const held = (end: 'i' | 'j', own: BarMark['endI']) =>
      endsHoldOf(angle)[end] === 'both' ? own : { ...own, holds: 'both' as const };
    const [endI, endJ] = [held('i', angle.mark.endI), held('j', angle.mark.endJ)];
    return [{ kind: 'bars', bars: [id], change: { ...(endI && { endI }), ...(endJ && { endJ }) } }];
  });
  const ends = barsOf(assessment, finding.bars).flatMap(({ angle }) =>
    angle ? endsMarkedFree({ endsHold: endsHoldOf(angle) }) : [],
  );
  if (ends.length === 0) return [];
  const label = ends.length === 1 ? 'Hold the end' : 'Hold the ends';
  return [{ label, detail: 'both ways, as a gusset does', edits }];
}

/** The rest of what each end has of its own stays. */
function endProposal(
  assessment: Assessment,
  finding: Finding,
  label: string,
  detail: string,
  change: Partial<EndConnection>,
): Proposal {
  const edits = barsOf(assessment, finding.bars).map(({ id, angle }): Edit => {
    const { endI = {}, endJ = {} } = angle?.mark ?? {};
    return {
      kind: 'bars',
      bars: [id],
      change: { endI: { ...endI, ...change }, endJ: { ...endJ, ...change } },
    };
  });
  return { label, detail, edits };
}
