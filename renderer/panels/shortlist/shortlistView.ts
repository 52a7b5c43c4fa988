/** For which bars the shortlist chooses, and how it is looked at. */
import type { Assessment } from '../../../core/assessment.ts';
import type { BarId } from '../../../core/layout/model.ts';
import type { Edit } from '../../../core/project/edit.ts';
import type { Candidate, Shortlist } from '../../../core/shortlist/model.ts';

export type Scope = 'bar' | 'pair' | 'bay' | 'all';

export interface ShortlistView {
  readonly scope: Scope;
  readonly placements: 'as placed' | 'both';
  /** Leave out angles whose leg does not take the bolts. */
  readonly mustFit: boolean;
  readonly asTable: boolean;
}

export const FIRST_SHORTLIST_VIEW: ShortlistView = {
  scope: 'pair',
  placements: 'both',
  mustFit: true,
  asTable: false,
};

/** The candidates that are looked at; the one in place stays whatever it is. */
export function seenCandidates({ candidates }: Shortlist, { mustFit }: ShortlistView): readonly Candidate[] {
  return mustFit ? candidates.filter(({ fit, isPresent }) => fit === null || isPresent) : candidates;
}

/** The bars that must share a size. */
export function barsInScope(scope: Scope, bar: BarId, assessment: Assessment): readonly BarId[] {
  const { layout } = assessment;
  const bay = layout.bays.find(({ diagonals }) => diagonals.includes(bar));
  switch (scope) {
    case 'bar':
      return [bar];
    case 'pair':
      return [bar, ...partnersOf(bar, assessment)];
    case 'bay':
      return bay?.diagonals ?? [bar];
    case 'all':
      return layout.bays.flatMap(({ diagonals }) => diagonals);
    default:
      return scope satisfies never;
  }
}

function partnersOf(bar: BarId, { layout }: Assessment): readonly BarId[] {
  const partners = [...layout.crossings.values()].flatMap(({ kind, a, b }) =>
    kind !== 'diagonals' ? [] : a === bar ? [b] : b === bar ? [a] : [],
  );
  return [...new Set(partners)];
}

/** "D2", "D1 and D2", "all of W1", "every diagonal". */
export function scopeText(scope: Scope, bar: BarId, assessment: Assessment): string {
  const markOf = (id: BarId): string => assessment.layout.bars.get(id)?.mark ?? id;
  const bay = assessment.layout.bars.get(bar)?.bay ?? '';
  switch (scope) {
    case 'bar':
      return markOf(bar);
    case 'pair':
      return barsInScope('pair', bar, assessment).map(markOf).sort(byNumber).join(' and ');
    case 'bay':
      return `all of ${bay}`;
    case 'all':
      return 'every diagonal';
    default:
      return scope satisfies never;
  }
}

function byNumber(a: string, b: string): number {
  return a.localeCompare(b, 'en', { numeric: true });
}

/** Gives the bars that section, with the leg as the shortlist tried it. A whole bay takes it as its own, so that new bars follow. */
export function pickEdits(
  candidate: Candidate,
  scope: Scope,
  bar: BarId,
  assessment: Assessment,
): readonly Edit[] {
  const { layout } = assessment;
  const { designation: section, legInPlane } = candidate;
  if (scope === 'bar' || scope === 'pair')
    return [
      { kind: 'bars', bars: [...barsInScope(scope, bar, assessment)], change: { section, legInPlane } },
    ];
  const bays = scope === 'all' ? layout.bays : layout.bays.filter(({ diagonals }) => diagonals.includes(bar));
  return bays
    .filter(({ diagonals }) => diagonals.length > 0)
    .flatMap((bay): readonly Edit[] => [
      { kind: 'diagonals', bay: bay.id, change: { section, legInPlane } },
      { kind: 'bars', bars: [...bay.diagonals], change: {}, clear: ['section', 'legInPlane'] },
    ]);
}
