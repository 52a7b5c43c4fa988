/** Which changes might answer a finding. Whether they do, and what else they do, is found out by assessing. */
import type { Assessment } from '../assessment.ts';
import type { Catalogues } from '../catalogue/model.ts';
import type { Finding } from '../findings/model.ts';
import type { Bar, BarId, Crossing } from '../layout/model.ts';
import type { Edit } from '../project/edit.ts';
import type { Bay, Join, Pattern, Recipe } from '../project/model.ts';
import { shortlist } from '../shortlist/shortlist.ts';

export interface Proposal {
  readonly label: string;
  readonly detail: string;
  readonly edits: readonly Edit[];
}

export function proposalsFor(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
): readonly Proposal[] {
  switch (finding.kind) {
    case 'too slender in service':
      return [
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
    case 'hold without a holder':
      return [
        ...tieHolder(assessment, finding),
        ...withdrawClaim(assessment, finding),
        ...crossOpenPanels(assessment, finding),
      ];
    case 'clash':
      return passEachOther(assessment, finding);
    case 'no partner':
      return [...changePattern(assessment, finding, 'crossed', 'Cross the panel'), countOnBoth(finding.bars)];
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
    case 'bay can move':
      return crossOpenPanels(assessment, finding);
    case 'hold weaker than claimed':
      return weldTheCrossing(finding);
    case 'rule unsafe here':
    case 'twist governs':
      return [...turnTheLeg(assessment, finding.bars), ...otherSections(assessment, finding, catalogues)];
    case 'both diagonals squeezed':
    case 'loses support when the partner goes slack':
    case 'steep or flat':
    case 'no length left':
      return [];
    default:
      return finding.kind satisfies never;
  }
}

const barsOf = (assessment: Assessment, ids: readonly BarId[]): readonly Bar[] =>
  ids.flatMap((id) => assessment.layout.bars.get(id) ?? []);

function crossingsOn(assessment: Assessment, ids: readonly BarId[]): readonly Crossing[] {
  const bars = new Set(ids);
  return [...assessment.layout.crossings.values()].filter(({ a, b }) => bars.has(a) || bars.has(b));
}

const isBetweenDiagonals = (assessment: Assessment, id: string): boolean =>
  assessment.layout.crossings.get(id)?.kind === 'diagonals';

const unjoined = ({ join }: Crossing): boolean => join === null || join.kind === 'none';

/** A packer where the legs lie apart; straight through where they touch. */
const joinFor = (crossing: Crossing): Join =>
  crossing.gap > 0.5 ? { kind: 'packed', packer: null } : { kind: 'bolted' };

function joinTheCrossings(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const open = crossingsOn(assessment, bars).filter(
    (each) => each.kind === 'diagonals' && unjoined(each) && !each.clash,
  );
  if (open.length === 0) return [];
  return [
    {
      label: open.length > 1 ? 'Join the crossings' : 'Join the crossing',
      detail: open.some((each) => each.gap > 0.5) ? 'bolted with packer' : 'bolted through',
      edits: open.map((each) => ({ kind: 'join', crossings: [each.id], join: joinFor(each) })),
    },
  ];
}

function boltToLines(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const open = crossingsOn(assessment, bars).filter(
    (each) => each.kind === 'line' && (unjoined(each) || each.join?.kind === 'hung'),
  );
  return open.length === 0
    ? []
    : [
        {
          label: open.length > 1 ? 'Bolt to the purlins or rails' : 'Bolt to the purlin or rail',
          detail: 'one bolt at each',
          edits: [
            { kind: 'join', crossings: open.map(({ id }) => id), join: { kind: 'purlin', boltsAcross: 1 } },
          ],
        },
      ];
}

function tieLinesOf(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const lines = new Map(
    crossingsOn(assessment, bars)
      .filter((each) => each.kind === 'line' && each.join?.kind === 'purlin')
      .flatMap(({ b }) => assessment.layout.bars.get(b) ?? [])
      .filter(({ id }) => isFreeLine(assessment, id))
      .map((bar) => [bar.id, bar]),
  );
  return lines.size === 0 ? [] : [tie([...lines.values()])];
}

function isFreeLine(assessment: Assessment, line: BarId): boolean {
  for (const { restraint } of assessment.diagonals.values())
    for (const station of restraint?.stations ?? [])
      for (const claim of station.claims)
        if (claim.holder === line && claim.direction === 'along holder') return !claim.counted;
  return false;
}

const TIED = 'to be tied to a braced panel point: detail and confirm';

function tie(lines: readonly Bar[]): Proposal {
  const names = lines.map(({ mark }) => mark).join(', ');
  return {
    label: `Tie ${names} along ${lines.length > 1 ? 'themselves' : 'itself'}`,
    detail: 'to a braced panel point, which you vouch for',
    edits: lines.map((line) => ({
      kind: 'line holder',
      bay: line.bay,
      line: line.line?.id ?? line.mark,
      heldBy: { kind: 'vouched', reason: TIED },
    })),
  };
}

function tieHolder(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const holder = holderOf(assessment, finding);
  return holder?.line ? [tie([holder])] : [];
}

function withdrawClaim(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const holder = holderOf(assessment, finding);
  if (!holder?.line || holder.line.heldBy.kind === 'nothing') return [];
  return [
    {
      label: `Withdraw the claim at ${holder.mark}`,
      detail: 'it is then said to be held by nothing',
      edits: [{ kind: 'line holder', bay: holder.bay, line: holder.line.id, heldBy: { kind: 'nothing' } }],
    },
  ];
}

/** The finding's id ends in the id of the bar that was to hold. */
function holderOf(assessment: Assessment, finding: Finding): Bar | undefined {
  return assessment.layout.bars.get(finding.id.slice(finding.id.indexOf(':') + 1));
}

function turnTheLeg(assessment: Assessment, ids: readonly BarId[]): readonly Proposal[] {
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

function otherSections(
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
    detail: `${signed(each.massPerMetre - present)} kg/m, ${each === lightest ? 'the lightest that passes' : 'the lightest equal angle that passes'}`,
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

function handlingSections(
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
function heavier(assessment: Assessment, finding: Finding, catalogues: Catalogues): readonly Proposal[] {
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

function sectionProposal(
  assessment: Assessment,
  bars: readonly BarId[],
  designation: string,
  massPerMetre: number,
  what: string,
): Proposal {
  return {
    label: `Change to ${shown(designation)}`,
    detail: `${signed(massPerMetre - presentMass(assessment, bars))} kg/m, ${what}`,
    edits: [{ kind: 'bars', bars, change: { section: designation } }],
  };
}

function presentMass(assessment: Assessment, bars: readonly BarId[]): number {
  return barsOf(assessment, bars).reduce(
    (most, { angle }) => Math.max(most, angle?.stock?.massPerMetre ?? 0),
    0,
  );
}

const signed = (value: number): string => `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(1)}`;
const shown = (designation: string): string => designation.replaceAll(/(?<=\d)x(?=\d)/gi, '×');

function nearestSections(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const nearest = barsOf(assessment, finding.bars)[0]?.angle?.nearest ?? [];
  return nearest.slice(0, 3).map((section) => ({
    label: `Take ${shown(section)}`,
    detail: 'from stock',
    edits: [{ kind: 'bars', bars: finding.bars, change: { section } }],
  }));
}

function markCrossing(assessment: Assessment, id: string): readonly Proposal[] {
  const crossing = assessment.layout.crossings.get(id);
  if (!crossing) return [];
  const join = joinFor(crossing);
  return [
    {
      label: 'Join the crossing',
      detail: join.kind === 'packed' ? 'bolted with packer' : 'bolted through',
      edits: [{ kind: 'join', crossings: [id], join }],
    },
    {
      label: 'Say that there is no join',
      detail: 'they slide past each other',
      edits: [{ kind: 'join', crossings: [id], join: { kind: 'none' } }],
    },
  ];
}

function markLines(assessment: Assessment, bay: string): readonly Proposal[] {
  const open = [...assessment.layout.crossings.values()]
    .filter((each) => each.bay === bay && each.kind !== 'diagonals' && each.join === null)
    .map(({ id }) => id);
  return [
    {
      label: 'Bolt all to the purlins or rails',
      detail: 'one bolt at each',
      edits: [{ kind: 'join', crossings: open, join: { kind: 'purlin', boltsAcross: 1 } }],
    },
    {
      label: 'Hang all, against sag only',
      detail: 'holds nothing',
      edits: [{ kind: 'join', crossings: open, join: { kind: 'hung' } }],
    },
    {
      label: 'Say that none is joined',
      detail: 'they pass clear',
      edits: [{ kind: 'join', crossings: open, join: { kind: 'none' } }],
    },
  ];
}

function hangFromLines(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const open = crossingsOn(assessment, bars)
    .filter((each) => each.kind === 'line' && unjoined(each))
    .map(({ id }) => id);
  return open.length === 0
    ? []
    : [
        {
          label: 'Hang from the purlins or rails',
          detail: 'against sag only',
          edits: [{ kind: 'join', crossings: open, join: { kind: 'hung' } }],
        },
      ];
}

function passEachOther(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const crossing = finding.crossing ? assessment.layout.crossings.get(finding.crossing) : undefined;
  const bars = barsOf(assessment, finding.bars);
  const [a, b] = bars;
  if (!crossing || !a?.angle || !b) return [];
  const other = a.angle.side === 'near' ? 'far' : 'near';
  return [
    {
      label: `Put ${a.mark} on the ${other} side`,
      detail: 'back to back on the gusset',
      edits: [{ kind: 'bars', bars: [a.id], change: { side: other } }],
    },
    {
      label: `Cut ${b.mark} and plate it`,
      detail: `${a.mark} runs through`,
      edits: [{ kind: 'join', crossings: [crossing.id], join: { kind: 'cut', cutBar: b.key } }],
    },
  ];
}

function countOnBoth(bars: readonly BarId[]): Proposal {
  return {
    label: 'Count it on in compression too',
    detail: 'its limit then follows the compression class',
    edits: [{ kind: 'bars', bars, change: { countedOn: 'both' } }],
  };
}

function changePattern(
  assessment: Assessment,
  finding: Finding,
  pattern: Pattern,
  label: string,
): readonly Proposal[] {
  const bay = assessment.project.bays.find((each) => each.id === finding.bay);
  const key = barsOf(assessment, finding.bars)[0]?.key;
  if (!bay || !key) return [];
  const recipe = withPattern(bay.recipe, key, pattern);
  return recipe ? [patternProposal(bay, recipe, label, 'a second diagonal for the reversed load')] : [];
}

function patternProposal(bay: Bay, recipe: Recipe, label: string, detail: string): Proposal {
  return { label, detail, edits: [{ kind: 'recipe', bay: bay.id, recipe, what: 'the pattern' }] };
}

/** The recipe with another pattern in the tier or panel to which the bar belongs; null where there is no such thing. */
function withPattern(recipe: Recipe, key: string, pattern: Pattern): Recipe | null {
  const panel = key.slice(0, key.lastIndexOf('.'));
  if (recipe.kind === 'wall')
    return {
      ...recipe,
      tiers: recipe.tiers.map((tier) => (tier.id === panel ? { ...tier, pattern } : tier)),
    };
  if (recipe.kind === 'roof')
    return {
      ...recipe,
      slopes: recipe.slopes.map((slope) => ({
        ...slope,
        panels: slope.panels.map((each) =>
          `${slope.id}.${each.id}` === panel ? { ...each, pattern } : each,
        ),
      })),
    };
  return null;
}

/** A partner whose end is free as a rule stands over an open tier: bracing that tier holds it. */
function crossOpenPanels(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const bay = assessment.project.bays.find((each) => each.id === finding.bay);
  if (finding.id.startsWith('free-line') || bay?.recipe.kind !== 'wall') return [];
  if (!bay.recipe.tiers.some((tier) => tier.pattern === 'open')) return [];
  const tiers = bay.recipe.tiers.map((tier) =>
    tier.pattern === 'open' ? { ...tier, pattern: 'crossed' as const } : tier,
  );
  return [
    patternProposal(
      bay,
      { ...bay.recipe, tiers },
      'Brace the open tier',
      'crossed, so that what stands on it is held',
    ),
  ];
}

function weldTheCrossing(finding: Finding): readonly Proposal[] {
  return finding.crossing
    ? [
        {
          label: 'Weld the crossing',
          detail: 'ties the turns of both bars too',
          edits: [{ kind: 'join', crossings: [finding.crossing], join: { kind: 'welded' } }],
        },
      ]
    : [];
}

function packTheGap(finding: Finding): readonly Proposal[] {
  return finding.crossing
    ? [
        {
          label: 'Put in a packer that fills the gap',
          detail: 'bolted with packer',
          edits: [{ kind: 'join', crossings: [finding.crossing], join: { kind: 'packed', packer: null } }],
        },
      ]
    : [];
}
