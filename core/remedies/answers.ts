/** Which changes might answer a finding. Whether they do, and what else they do, is found out by assessing. */
import type { Assessment } from '../assessment.ts';
import type { Catalogues } from '../catalogue/model.ts';
import type { Finding } from '../findings/model.ts';
import { takeAway } from './acting.ts';
import { holdTheEnds, knownGrades, moreBattens, strongerEnds, usualDistances } from './ends.ts';
import {
  boltToLines,
  hangFromLines,
  isBetweenDiagonals,
  joinTheCrossings,
  markCrossing,
  markLines,
  packTheGap,
  passEachOther,
  sayNotJoined,
  weldTheCrossing,
} from './joining.ts';
import { clearTheMarks } from './marks.ts';
import { takeIdleEntriesAway } from './names.ts';
import { vouchForTheNodes } from './nodes.ts';
import { changePattern, countOnBoth, crossOpenPanels, kneesOnBothSides } from './patterns.ts';
import type { Proposal } from './proposal.ts';
import { handlingSections, heavier, nearestSections, otherSections, turnTheLeg } from './sections.ts';
import { tieHolder, tieLinesOf, withdrawClaim } from './tying.ts';

export function proposalsFor(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
): readonly Proposal[] {
  switch (finding.kind) {
    case 'too slender in service':
      return [
        ...holdTheEnds(assessment, finding),
        ...joinTheCrossings(assessment, finding.bars),
        ...boltToLines(assessment, finding.bars),
        ...tieLinesOf(assessment, finding.bars),
        ...turnTheLeg(assessment, finding.bars),
        ...otherSections(assessment, finding, catalogues),
      ];
    case 'too slender to handle':
      return handlingSections(assessment, finding, catalogues);
    case 'crossing unmarked':
      return finding.crossing && isBetweenDiagonals(assessment, finding.crossing)
        ? markCrossing(assessment, finding.crossing)
        : markLines(assessment, finding.bay);
    case 'mark given twice':
      return clearTheMarks(assessment, finding);
    case 'names what is not there':
      return takeIdleEntriesAway(assessment, finding);
    case 'too far apart to join':
      return sayNotJoined(finding);
    case 'hold without a holder':
      return [
        ...tieHolder(assessment, finding),
        ...withdrawClaim(assessment, finding),
        ...crossOpenPanels(assessment, finding),
      ];
    case 'clash':
      return passEachOther(assessment, finding);
    case 'no partner':
      return [
        ...changePattern(assessment, finding, 'crossed', 'Cross the panel'),
        ...kneesOnBothSides(assessment, finding),
        countOnBoth(finding.bars),
      ];
    case 'beam takes the pull':
      return [...changePattern(assessment, finding, 'crossed', 'Cross the tier'), countOnBoth(finding.bars)];
    case 'sag':
      return [
        ...hangFromLines(assessment, finding.bars),
        ...joinTheCrossings(assessment, finding.bars),
        ...heavier(assessment, finding, catalogues),
      ];
    case 'override in force':
      return [
        {
          label: 'Take the override away',
          detail: 'back to the length found from the marks',
          edits: [{ kind: 'bars', bars: finding.bars, change: {}, clear: ['overrides'] }],
        },
      ];
    case 'section unknown':
      return nearestSections(assessment, finding);
    case 'packer differs':
      return packTheGap(finding);
    case 'bar can move':
      return [
        ...holdTheEnds(assessment, finding),
        ...joinTheCrossings(assessment, finding.bars),
        ...boltToLines(assessment, finding.bars),
      ];
    case 'end held by nothing':
      return vouchForTheNodes(assessment, finding);
    case 'bay can move':
      return crossOpenPanels(assessment, finding);
    case 'hold weaker than claimed':
      return weldTheCrossing(finding);
    case 'rule unsafe here':
    case 'twist governs':
      return [...turnTheLeg(assessment, finding.bars), ...otherSections(assessment, finding, catalogues)];
    case 'load on nothing':
      return takeAway(assessment, finding);
    case 'no way to carry a load':
    case 'reversed load not carried':
      return [
        ...crossOpenPanels(assessment, finding),
        ...changePattern(assessment, finding, 'crossed', 'Cross the panel'),
        ...(finding.bars.length > 0 ? [countOnBoth(finding.bars)] : []),
      ];
    case 'beam bends under the pull':
      return [...changePattern(assessment, finding, 'crossed', 'Cross the tier'), countOnBoth(finding.bars)];
    case 'squeezed with no partner':
      return [...changePattern(assessment, finding, 'crossed', 'Cross the panel'), countOnBoth(finding.bars)];
    case 'too stocky to go slack':
      return [countOnBoth(finding.bars)];
    case 'resistance exceeded':
      return [
        ...strongerEnds(assessment, finding),
        ...joinTheCrossings(assessment, finding.bars),
        ...heavier(assessment, finding, catalogues),
      ];
    case 'not checked':
      return knownGrades(assessment, finding);
    case 'end detail too small':
      return usualDistances(assessment, finding);
    case 'one bolt at an end':
      return strongerEnds(assessment, finding).slice(0, 1);
    case 'battens too far apart':
      return moreBattens(assessment, finding);
    case 'squeezed off its middle':
      return strongerEnds(assessment, finding);
    case 'pretension lost':
    case 'moves far before it works':
    case 'both diagonals squeezed':
    case 'loses support when the partner goes slack':
    case 'turnings left out':
    case 'strut too weak':
    case 'strut too slender':
    case 'strut not checked':
    case 'steep or flat':
    case 'out of the plane':
    case 'no length left':
      return [];
    default:
      return finding.kind satisfies never;
  }
}
