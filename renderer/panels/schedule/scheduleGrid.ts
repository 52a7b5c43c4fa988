/** How wide the columns of the schedule are: no figure is ever cut short; a table too wide for its room scrolls. */
import type { UnitSystem } from '../../../core/project/model.ts';
import { sansWidth } from '../../controls/textWidth.ts';
import { cellText } from './cellText.ts';
import type { Column } from './scheduleColumns.ts';
import type { SeenRow } from './seenRow.ts';

export interface ScheduleGrid {
  /** CSS grid columns. */
  readonly columns: string;
  /** The least that all take together, px. */
  readonly least: number;
}

/** Type of the rows, px, and what stands beside each text. */
const SIZE = 12;
const PADDING = 16;
/** What stands before the text of a status or a slenderness: a sign, a chip. */
const BESIDE: Readonly<Partial<Record<Column['id'], number>>> = { status: 50, slenderness: 60, mark: 4 };

export function scheduleGrid(
  columns: readonly Column[],
  rows: readonly SeenRow[],
  units: UnitSystem,
): ScheduleGrid {
  const leasts = columns.map((column) =>
    Math.max(column.least, longest(column, rows, units) + PADDING + (BESIDE[column.id] ?? 0)),
  );
  return {
    columns: columns
      .map(({ share }, index) => {
        const least = leasts[index] ?? 0;
        return share === 0 ? `${least}px` : `minmax(${least}px, ${share}fr)`;
      })
      .join(' '),
    least: leasts.reduce((sum, least) => sum + least, 0),
  };
}

/** The columns that the room has, and their grid: spare ones give way before the table scrolls. */
export function fittingGrid(
  columns: readonly Column[],
  rows: readonly SeenRow[],
  units: UnitSystem,
  room: number,
): { readonly columns: readonly Column[]; readonly grid: ScheduleGrid } {
  const grid = scheduleGrid(columns, rows, units);
  const spare = columns
    .filter((column) => column.spare !== undefined)
    .sort((a, b) => (a.spare ?? 0) - (b.spare ?? 0))[0];
  return grid.least <= room || !spare
    ? { columns, grid }
    : fittingGrid(
        columns.filter((column) => column !== spare),
        rows,
        units,
        room,
      );
}

/** Width of a column's widest text, whole px. Only texts of nearly the most letters are measured: there may be a thousand rows. */
function longest(column: Column, rows: readonly SeenRow[], units: UnitSystem): number {
  const texts = new Set(rows.map((row) => cellText(column, row, units)));
  const letters = Math.max(0, ...[...texts].map(({ length }) => length));
  const widths = [...texts]
    .filter(({ length }) => length >= letters - 2)
    .map((text) => sansWidth(text, SIZE, 600));
  return Math.ceil(Math.max(0, ...widths));
}
