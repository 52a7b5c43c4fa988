/** How the schedule is looked at: which columns, in what order, which rows. Not part of the project. */
import type { Assessment } from '../../../core/assessment.ts';
import { type ColumnId, type ColumnSet, sortValue } from './scheduleColumns.ts';
import type { SeenRow } from './seenRow.ts';

export interface ScheduleView {
  /** What is read to judge, to make, or to see how the bars really bow. */
  readonly columns: ColumnSet;
  readonly sort: { readonly column: ColumnId; readonly down: boolean };
  readonly filtering: boolean;
  readonly text: string;
  readonly only: 'all' | 'over' | 'near' | 'findings';
}

export const FIRST_SCHEDULE_VIEW: ScheduleView = {
  columns: 'bracing',
  sort: { column: 'slenderness', down: true },
  filtering: false,
  text: '',
  only: 'all',
};

/** The filter shown or, with all that was asked of it, put away. */
export function withFilterTurned(view: ScheduleView): ScheduleView {
  return view.filtering ? { ...view, filtering: false, text: '', only: 'all' } : { ...view, filtering: true };
}

export function seenRows(assessment: Assessment, view: ScheduleView): readonly SeenRow[] {
  const wanted = view.text.trim().toLowerCase();
  const rows = assessment.schedule.flatMap((row): SeenRow[] => {
    const diagonal = assessment.diagonals.get(row.bar);
    const seen: SeenRow = {
      row,
      status: diagonal?.status ?? 'unknown',
      ratio: diagonal?.nearness ?? null,
      bowing: diagonal?.bowing ?? null,
    };
    return fits(seen, wanted, view.only) ? [seen] : [];
  });
  const { column, down } = view.sort;
  const sign = down ? -1 : 1;
  // Equal rows keep the order of the bays, which is the order they come in.
  return rows.sort((a, b) => sign * compare(sortValue(column, a), sortValue(column, b)));
}

function fits({ row, status }: SeenRow, wanted: string, only: ScheduleView['only']): boolean {
  if (only === 'over' && status !== 'over') return false;
  if (only === 'near' && status !== 'near') return false;
  if (only === 'findings' && row.findings.length === 0) return false;
  if (wanted === '') return true;
  const text = `${row.mark} ${row.bay} ${row.section.replace(/x/g, '×')} ${row.section}`.toLowerCase();
  return wanted.split(/\s+/).every((word) => text.includes(word));
}

/** Numbers by size, marks with their numbers by size too: D2 before D10. */
function compare(a: number | string, b: number | string): number {
  if (typeof a === 'number' && typeof b === 'number') return a - b;
  return String(a).localeCompare(String(b), 'en', { numeric: true });
}

/** "by slenderness, worst first". */
export function sortText({ column, down }: ScheduleView['sort']): string {
  if (column === 'slenderness') return down ? 'worst first' : 'least first';
  if (column === 'mark') return down ? 'by mark, last first' : 'by mark';
  return down ? 'largest first' : 'smallest first';
}
