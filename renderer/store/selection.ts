/** What is chosen and pointed at. Not part of the project, so not part of undo. */
import type { Assessment } from '../../core/assessment.ts';
import type { BarId, CrossingId } from '../../core/layout/model.ts';

export interface BarEnd {
  readonly bar: BarId;
  readonly end: 'i' | 'j';
}

export interface Selection {
  readonly bay: string | null;
  readonly bar: BarId | null;
  readonly crossing: CrossingId | null;
  readonly end: BarEnd | null;
}

export const NOTHING_SELECTED: Selection = { bay: null, bar: null, crossing: null, end: null };

/** The bay that a bar's or crossing's id begins with. */
export function bayOf(id: BarId | CrossingId): string {
  return id.slice(0, id.indexOf('/'));
}

/** A bar, in its bay. What was docked for another bar closes. */
export function withBar(selection: Selection, bar: BarId): Selection {
  const keeps = selection.bar === bar;
  return {
    bay: bayOf(bar),
    bar,
    crossing: keeps ? selection.crossing : null,
    end: keeps ? selection.end : null,
  };
}

/** A bay, with its worst diagonal unless one of its bars is chosen already. */
export function withBay(selection: Selection, bay: string, assessment: Assessment | null): Selection {
  if (selection.bay === bay && selection.bar !== null) return selection;
  return { bay, bar: assessment === null ? null : worstBarOf(assessment, bay), crossing: null, end: null };
}

/** A crossing, read for the chosen bar if it passes there, else for the crossing's first. */
export function withCrossing(selection: Selection, crossing: CrossingId, assessment: Assessment): Selection {
  const found = assessment.layout.crossings.get(crossing);
  if (found === undefined) return selection;
  const passes = selection.bar === found.a || selection.bar === found.b;
  return { bay: found.bay, bar: passes ? selection.bar : found.a, crossing, end: null };
}

export function withEnd(end: BarEnd): Selection {
  return { bay: bayOf(end.bar), bar: end.bar, crossing: null, end };
}

/** Goes back one step: first what is docked, then nothing more (the bar stays, so that its card does). */
export function steppedBack(selection: Selection): Selection {
  return selection.crossing === null && selection.end === null
    ? selection
    : { ...selection, crossing: null, end: null };
}

/** The selection after a bay took another name. */
export function withRenamedBay(selection: Selection, from: string, to: string): Selection {
  const follow = (id: string): string => (bayOf(id) === from ? `${to}/${id.slice(from.length + 1)}` : id);
  return {
    bay: selection.bay === from ? to : selection.bay,
    bar: selection.bar === null ? null : follow(selection.bar),
    crossing: selection.crossing === null ? null : follow(selection.crossing),
    end: selection.end === null ? null : { ...selection.end, bar: follow(selection.end.bar) },
  };
}

/** Lets go of what the project no longer has, and takes the worst diagonal where nothing is left. */
export function settled(selection: Selection, assessment: Assessment): Selection {
  const { layout } = assessment;
  const bays = layout.bays.map(({ id }) => id);
  const bay = selection.bay !== null && bays.includes(selection.bay) ? selection.bay : worstBay(assessment);
  if (bay === null) return NOTHING_SELECTED;
  const bar =
    selection.bar !== null && layout.bars.has(selection.bar) && bayOf(selection.bar) === bay
      ? selection.bar
      : worstBarOf(assessment, bay);
  const crossing =
    selection.crossing !== null && layout.crossings.has(selection.crossing) ? selection.crossing : null;
  const end = selection.end !== null && layout.bars.has(selection.end.bar) ? selection.end : null;
  const unchanged =
    bay === selection.bay &&
    bar === selection.bar &&
    crossing === selection.crossing &&
    end === selection.end;
  return unchanged ? selection : { bay, bar, crossing, end };
}

/** The bay's diagonal nearest to its limit, or its first. */
function worstBarOf(assessment: Assessment, bay: string): BarId | null {
  const worst = assessment.bays.get(bay)?.worst?.bar;
  return worst ?? assessment.layout.bays.find(({ id }) => id === bay)?.diagonals[0] ?? null;
}

function worstBay(assessment: Assessment): string | null {
  let found: { readonly bay: string; readonly ratio: number } | null = null;
  for (const { bay, worst } of assessment.bays.values()) {
    const ratio = worst === null ? 0 : worst.slenderness / worst.limit;
    if (found === null || ratio > found.ratio) found = { bay, ratio };
  }
  return found?.bay ?? null;
}
