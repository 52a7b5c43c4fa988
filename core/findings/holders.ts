import type { BarId } from '../layout/model.ts';
import type { Claim } from '../restraint/model.ts';
import type { Finding } from './model.ts';
import { bayPath, type FindingSubject, grouped, type Judged, judgedIn, marksInWords } from './subject.ts';

interface Idle {
  readonly judged: Judged;
  readonly claim: Claim;
  readonly at: number;
}

/** Holds that are claimed by a mark and do not count, because what holds is itself free: one finding for each holder. */
export function holderFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const idle = judgedIn(subject, bay).flatMap((judged) =>
      (judged.restraint?.stations ?? []).flatMap((station) =>
        station.claims.filter(isIdle).map((claim): Idle => ({ judged, claim, at: station.at })),
      ),
    );
    return grouped(idle, ({ claim }) => claim.holder ?? '').flatMap(
      (group) => holderFinding(subject, bay.id, group) ?? [],
    );
  });
}

function isIdle(claim: Claim): boolean {
  if (claim.counted) return false;
  const { kind } = claim.reason;
  return (
    kind === 'line free along itself' ||
    kind === 'line end free' ||
    kind === 'partner half free' ||
    kind === 'bar ends here, itself free'
  );
}

function holderFinding(subject: FindingSubject, bay: string, group: readonly Idle[]): Finding | null {
  const [first] = group;
  if (!first) return null;
  const { claim } = first;
  const bars = [...new Map(group.map(({ judged }) => [judged.bar.id, judged])).values()];
  const holder = claim.holder ? subject.layout.bars.get(claim.holder) : undefined;
  const base = {
    kind: 'hold without a holder',
    breaksLimit: false,
    bay,
    bars: bars.map(({ bar }): BarId => bar.id),
    crossing: claim.source === 'end' || !subject.layout.crossings.has(claim.source) ? null : claim.source,
    value: null,
    limit: null,
    quantity: 'none',
    path: holder?.line ? `${bayPath(subject, bay)}.recipe` : null,
  } as const;
  const { reason } = claim;
  switch (reason.kind) {
    case 'line free along itself': {
      // Saying "nothing" holds the line is an answer; naming a holder that does not hold is a mistake.
      const claimed = holder?.line ? holder.line.heldBy.kind !== 'nothing' : true;
      return {
        ...base,
        id: `free-line:${claim.holder}`,
        severity: claimed ? 'look into' : 'note',
        title: `${reason.line} is itself free: it holds ${marksInWords(bars)} one way only`,
        detail: `${reason.line} can move along itself (${reason.why}), so it stops no bowing in the plane. Out of the plane it holds.`,
      };
    }
    case 'partner half free':
      return {
        ...base,
        id: `free-partner:${claim.holder}`,
        severity: 'must fix',
        title: `${reason.partner} holds ${marksInWords(bars)} nowhere: its end at ${reason.node} is free`,
        detail: `The hold at the crossing is claimed, but ${reason.partner} reaches no held point at ${reason.node}, so nothing is taken from it.`,
      };
    case 'line end free':
      return {
        ...base,
        id: `free-ends:${claim.holder}`,
        severity: 'look into',
        title: `${sentence(reason.line)} holds ${marksInWords(bars)} nowhere: its end at ${reason.node} is free`,
        detail: `${sentence(reason.line)} is claimed to hold across itself, but nothing holds it at ${reason.node}.`,
      };
    case 'bar ends here, itself free':
      return {
        ...base,
        id: `free-end:${claim.holder}`,
        severity: 'look into',
        title: `${reason.bar} holds ${marksInWords(bars)} nowhere: its other end is free`,
        detail: `${reason.bar} ends on the bar, but nothing holds it at ${reason.node}.`,
      };
    default:
      return null;
  }
}

const sentence = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
