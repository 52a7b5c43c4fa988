/** Answers that change what holds a purlin or rail along itself. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { Bar, BarId } from '../layout/model.ts';
import { crossingsOn } from './places.ts';
import type { Proposal } from './proposal.ts';

export function tieLinesOf(assessment: Assessment, bars: readonly BarId[]): readonly Proposal[] {
  const lines = new Map(
    crossingsOn(assessment, bars)
      .filter((each) => each.kind === 'line' && each.join?.kind === 'purlin')
      .flatMap(({ b }) => assessment.layout.bars.get(b) ?? [])
      .filter(({ id }) => isFreeLine(assessment, id))
      .map((bar) => [bar.id, bar]),
  );
  return lines.size === 0 ? [] : [tie([...lines.values()])];
}

export function tieHolder(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const holder = holderOf(assessment, finding);
  return holder?.line ? [tie([holder])] : [];
}

export function withdrawClaim(assessment: Assessment, finding: Finding): readonly Proposal[] {
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

const TIED = 'to be tied to a braced panel point: detail and confirm';

function isFreeLine(assessment: Assessment, line: BarId): boolean {
  for (const { restraint } of assessment.diagonals.values())
    for (const station of restraint?.stations ?? [])
      for (const claim of station.claims)
        if (claim.holder === line && claim.direction === 'along holder') return !claim.counted;
  return false;
}

/** The finding's id ends in the id of the bar that was to hold. */
function holderOf(assessment: Assessment, finding: Finding): Bar | undefined {
  return assessment.layout.bars.get(finding.id.slice(finding.id.indexOf(':') + 1));
}
