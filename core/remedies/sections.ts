/** Answers that turn the leg or take another angle from stock. */
import type { Assessment } from '../assessment.ts';
import type { Catalogues } from '../catalogue/model.ts';
import type { Finding } from '../findings/model.ts';
import type { BarId } from '../layout/model.ts';
import { shortlist } from '../shortlist/shortlist.ts';
import { showMassPerMetre } from '../units/quantity.ts';
import { barsOf } from './places.ts';
import type { Proposal } from './proposal.ts';

export function turnTheLeg(assessment: Assessment, ids: readonly BarId[]): readonly Proposal[] {
  const turnable = barsOf(assessment, ids).filter(({ angle }) => angle?.stock?.kind === 'unequal');
  if (turnable.length === 0 || turnable.length < ids.length) return [];
  const longerIn = turnable[0]?.angle?.spec.legInPlane === 'longer';
  return [
    {
      label: longerIn ? 'Turn the longer leg out' : 'Turn the longer leg into the plane',
      detail: 'same section, same mass',
      edits: [{ kind: 'bars', bars: ids, change: { legInPlane: longerIn ? 'shorter' : 'longer' } }],
    },
  ];
}

export function otherSections(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
): readonly Proposal[] {
  const list = shortlist(assessment, catalogues, finding.bars, { placements: 'both' });
  const fitting = list.candidates.filter((each) => each.passes && each.fit === null && !each.isPresent);
  const lightest = fitting[0];
  const lightestEqual = fitting.find((each) => each.kind === 'equal');
  const present = presentMass(assessment, finding.bars);
  const wanted = [lightestEqual, lightest].filter((each) => each !== undefined);
  return [...new Set(wanted)].map((each) => ({
    label:
      each.kind === 'equal'
        ? `Change to ${shown(each.designation)}`
        : `Change to ${shown(each.designation)}, longer leg ${each.legInPlane === 'longer' ? 'in plane' : 'out'}`,
    detail: `${massChange(assessment, each.massPerMetre - present)}, ${each === lightest ? 'the lightest that passes' : 'the lightest equal angle that passes'}`,
    edits: [
      {
        kind: 'bars',
        bars: finding.bars,
        change:
          each.kind === 'equal'
            ? { section: each.designation }
            : { section: each.designation, legInPlane: each.legInPlane },
      },
    ],
  }));
}

export function handlingSections(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
): readonly Proposal[] {
  const list = shortlist(assessment, catalogues, finding.bars, { placements: 'as placed' });
  const first = list.candidates.find(
    (each) => each.handling <= each.limit && each.fit === null && !each.isPresent,
  );
  return first
    ? [
        sectionProposal(
          assessment,
          finding.bars,
          first.designation,
          first.massPerMetre,
          'the lightest that is stiff enough to handle',
        ),
      ]
    : [];
}

/** The next few heavier angles: which of them sags little enough is found out by assessing. */
export function heavier(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
): readonly Proposal[] {
  const present = presentMass(assessment, finding.bars);
  const list = shortlist(assessment, catalogues, finding.bars, { placements: 'as placed' });
  const larger = list.candidates.filter(
    (each) => each.fit === null && each.kind === 'equal' && each.massPerMetre > present,
  );
  return larger
    .filter((_, index) => index % 3 === 0)
    .slice(0, 5)
    .map((each) =>
      sectionProposal(assessment, finding.bars, each.designation, each.massPerMetre, 'a stiffer equal angle'),
    );
}

export function nearestSections(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const nearest = barsOf(assessment, finding.bars)[0]?.angle?.nearest ?? [];
  return nearest.slice(0, 3).map((section) => ({
    label: `Take ${shown(section)}`,
    detail: 'from stock',
    edits: [{ kind: 'bars', bars: finding.bars, change: { section } }],
  }));
}

function sectionProposal(
  assessment: Assessment,
  bars: readonly BarId[],
  designation: string,
  massPerMetre: number,
  what: string,
): Proposal {
  return {
    label: `Change to ${shown(designation)}`,
    detail: `${massChange(assessment, massPerMetre - presentMass(assessment, bars))}, ${what}`,
    edits: [{ kind: 'bars', bars, change: { section: designation } }],
  };
}

function presentMass(assessment: Assessment, bars: readonly BarId[]): number {
  return barsOf(assessment, bars).reduce(
    (most, { angle }) => Math.max(most, angle?.stock?.massPerMetre ?? 0),
    0,
  );
}

/** "+2.1 kg/m", "−0.75 lb/ft": heavier or lighter for each length of bar, in the units of the project. */
function massChange({ project }: Assessment, kgPerMetre: number): string {
  return `${kgPerMetre < 0 ? '−' : '+'}${showMassPerMetre(Math.abs(kgPerMetre), project.settings.units)}`;
}

const shown = (designation: string): string => designation.replaceAll(/(?<=\d)x(?=\d)/gi, '×');
