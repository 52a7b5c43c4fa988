/** Answers that mark a crossing, or change its mark. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { BarId, Crossing } from '../layout/model.ts';
import type { Join } from '../project/model.ts';
import { barsOf, crossingsOn, unjoined } from './places.ts';
import type { Proposal } from './proposal.ts';

export function joinTheCrossings(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const open = crossingsOn(assessment, bars).filter(
    (each) => each.kind === 'diagonals' && unjoined(each) && !each.clash && !each.tooFarApart,
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

export function boltToLines(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const open = crossingsOn(assessment, bars).filter(
    (each) => each.kind === 'line' && !each.tooFarApart && (unjoined(each) || each.join?.kind === 'hung'),
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

export function hangFromLines(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
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

export function markCrossing(assessment: Assessment, id: string): readonly Proposal[] {
  const crossing = assessment.layout.crossings.get(id);
  if (!crossing) return [];
  if (crossing.tooFarApart) return [noJoin(id)];
  const join = joinFor(crossing);
  return [
    {
      label: 'Join the crossing',
      detail: join.kind === 'packed' ? 'bolted with packer' : 'bolted through',
      edits: [{ kind: 'join', crossings: [id], join }],
    },
    noJoin(id),
  ];
}

export const sayNotJoined = ({ crossing }: Finding): readonly Proposal[] =>
  crossing === null ? [] : [noJoin(crossing)];

const noJoin = (id: string): Proposal => ({
  label: 'Say that there is no join',
  detail: 'they slide past each other',
  edits: [{ kind: 'join', crossings: [id], join: { kind: 'none' } }],
});

export function markLines(assessment: Assessment, bay: string): readonly Proposal[] {
  const unmarked = [...assessment.layout.crossings.values()].filter(
    (each) => each.bay === bay && each.kind !== 'diagonals' && each.join === null,
  );
  const open = unmarked.map(({ id }) => id);
  const bolting: Proposal = {
    label: 'Bolt all to the purlins or rails',
    detail: 'one bolt at each',
    edits: [{ kind: 'join', crossings: open, join: { kind: 'purlin', boltsAcross: 1 } }],
  };
  return [
    ...(unmarked.some(({ tooFarApart }) => tooFarApart) ? [] : [bolting]),
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

export function passEachOther(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const crossing = finding.crossing ? assessment.layout.crossings.get(finding.crossing) : undefined;
  const bars = barsOf(assessment, finding.bars);
  const [a, b] = bars;
  if (!a?.angle || !b) return [];
  const other = a.angle.side === 'near' ? 'far' : 'near';
  const otherSide: Proposal = {
    label: `Put ${a.mark} on the ${other} side`,
    detail: 'back to back on the gusset',
    edits: [{ kind: 'bars', bars: [a.id], change: { side: other } }],
  };
  // Of bars that lie along each other there is nothing to cut; of bays in one place nothing to put on the other side.
  if (!crossing) return a.bay === b.bay ? [otherSide] : [];
  return [
    otherSide,
    {
      label: `Cut ${b.mark} and plate it`,
      detail: `${a.mark} runs through`,
      edits: [{ kind: 'join', crossings: [crossing.id], join: { kind: 'cut', cutBar: b.key } }],
    },
  ];
}

export function weldTheCrossing(finding: Finding): readonly Proposal[] {
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

export function packTheGap(finding: Finding): readonly Proposal[] {
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

export const isBetweenDiagonals = (assessment: Assessment, id: string): boolean =>
  assessment.layout.crossings.get(id)?.kind === 'diagonals';

/** A packer where the legs lie apart; straight through where they touch. */
const joinFor = (crossing: Crossing): Join =>
  crossing.gap > 0.5 ? { kind: 'packed', packer: null } : { kind: 'bolted' };
