/** Tiers of a wall and panels of a slope: added, removed and changed, each keeping its lasting id. */
import type { Line, Tier } from '../../../core/project/model.ts';

/** One more on top, like the last. */
export function withTierAdded(tiers: readonly Tier[], letter: string): readonly Tier[] {
  const last = tiers.at(-1);
  return [
    ...tiers,
    { id: freeId(tiers, letter), height: last?.height ?? 4000, pattern: last?.pattern ?? 'crossed' },
  ];
}

export function withTierChanged(tiers: readonly Tier[], id: string, change: Partial<Tier>): readonly Tier[] {
  return tiers.map((tier) => (tier.id === id ? { ...tier, ...change } : tier));
}

/** As many tiers as asked for: added on top or taken from there. */
export function withTierCount(tiers: readonly Tier[], count: number, letter: string): readonly Tier[] {
  let counted = tiers.slice(0, Math.max(1, count));
  while (counted.length < count) counted = [...withTierAdded(counted, letter)];
  return counted;
}

/** One more line, one spacing beyond the last, and clear of the end. */
export function withLineAdded(lines: readonly Line[], total: number, letter: string): readonly Line[] {
  const sorted = [...lines].sort((a, b) => a.at - b.at);
  const last = sorted.at(-1);
  const before = sorted.at(-2);
  const spacing = last === undefined ? total / 2 : last.at - (before?.at ?? 0);
  const beyond = (last?.at ?? 0) + spacing;
  const at = beyond < total ? beyond : ((last?.at ?? 0) + total) / 2;
  return [...lines, { id: freeId(lines, letter), at: Math.round(at), heldBy: { kind: 'nothing' } }];
}

export function withLineChanged(lines: readonly Line[], id: string, change: Partial<Line>): readonly Line[] {
  return lines.map((line) => (line.id === id ? { ...line, ...change } : line));
}

/** "t3" after t1 and t2. */
export function freeId(taken: readonly { readonly id: string }[], letter: string): string {
  const ids = new Set(taken.map(({ id }) => id));
  let number = 1;
  while (ids.has(`${letter}${number}`)) number += 1;
  return `${letter}${number}`;
}
