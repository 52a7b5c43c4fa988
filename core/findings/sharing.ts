import type { Bar } from '../layout/model.ts';
import { type SharedSpace, sharedSpaces } from '../layout/sharedSpace.ts';
import { showLength } from '../units/quantity.ts';
import type { Finding } from './model.ts';
import { bayPath, type FindingSubject, grouped } from './subject.ts';

interface Pair extends SharedSpace {
  readonly barA: Bar;
  readonly barB: Bar;
}

/** Diagonals along each other with their steel in one place: each pair of one bay, and two bays that stand in one place once. */
export function sharingFindings(subject: FindingSubject): readonly Finding[] {
  const pairs = sharedSpaces(subject.layout).flatMap((shared): readonly Pair[] => {
    const barA = subject.layout.bars.get(shared.a);
    const barB = subject.layout.bars.get(shared.b);
    return barA && barB ? [{ ...shared, barA, barB }] : [];
  });
  return grouped(pairs, ({ barA, barB }) =>
    barA.bay === barB.bay ? `${barA.id} ${barB.id}` : `${barA.bay} ${barB.bay}`,
  ).flatMap((group) => findingOf(subject, group) ?? []);
}

function findingOf(subject: FindingSubject, group: readonly Pair[]): Finding | null {
  const [first] = group;
  if (!first) return null;
  const { barA, barB, deep, along } = first;
  const units = subject.project.settings.units;
  const base = {
    kind: 'clash',
    severity: 'must fix',
    breaksLimit: false,
    bay: barA.bay,
    bars: [...new Set(group.flatMap(({ a, b }) => [a, b]))],
    crossing: null,
    value: deep,
    limit: 0,
    quantity: 'length',
  } as const;
  const depth = `run through each other by ${showLength(deep, units, 'small')} over ${showLength(along, units, 'spoken')}`;
  if (barA.bay === barB.bay)
    return {
      ...base,
      id: `clash:${barA.id}:${barB.id}`,
      title: `${barA.mark} and ${barB.mark} lie in one place`,
      detail: `They lie along each other and ${depth}. Put one on the other side of the gusset, move its nodes, or take it out.`,
      path: `${bayPath(subject, barA.bay)}.bars`,
    };
  return {
    ...base,
    id: `clash:${barA.bay}:${barB.bay}`,
    title: `${barA.bay} and ${barB.bay} stand in one place`,
    detail: `${group.length === 1 ? `${barA.mark} and ${barB.mark} lie` : `${group.length} pairs of their diagonals lie`} along each other and ${depth}${group.length === 1 ? '' : ` (${barA.mark} and ${barB.mark})`}. Give one of the bays another place, or take it out; bays that are built alike are one bay with its number off.`,
    path: `${bayPath(subject, barB.bay)}.place`,
  };
}
