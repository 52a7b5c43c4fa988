import type { JSX } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { ScheduleRow } from '../../../core/schedule/model.ts';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { STATUS_WORDS, StatusGlyph } from '../../glyphs/StatusGlyph.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { beforeAssessment } from '../../store/shown.ts';
import { cellText, slendernessText } from './cellText.ts';
import { ROW_DEEP } from './rowDeep.ts';
import type { Column, ColumnId } from './scheduleColumns.ts';
import type { ScheduleGrid } from './scheduleGrid.ts';
import type { SeenRow } from './seenRow.ts';

interface ScheduleRowProps {
  readonly id: string;
  readonly index: number;
  readonly top: number;
  readonly seen: SeenRow;
  readonly columns: readonly Column[];
  readonly grid: ScheduleGrid;
  readonly units: UnitSystem;
  readonly chosen: boolean;
}

export function ScheduleRowView({
  id,
  index,
  top,
  seen,
  columns,
  grid,
  units,
  chosen,
}: ScheduleRowProps): JSX.Element {
  const actions = useActions();
  const hovered = useWindow((state) => state.hovered === seen.row.bar);
  return (
    // biome-ignore lint/a11y/useSemanticElements: rows that come and go as one scrolls cannot be a table element.
    // biome-ignore lint/a11y/useFocusableInteractive: the grid keeps the focus and tells the row by aria-activedescendant.
    // biome-ignore lint/a11y/useKeyWithClickEvents: the grid takes the keys.
    <div
      id={id}
      role="row"
      aria-rowindex={index + 2}
      aria-selected={chosen}
      className="schedule-row"
      data-hovered={hovered || undefined}
      style={{ transform: `translateY(${top}px)`, height: ROW_DEEP, gridTemplateColumns: grid.columns }}
      onClick={() => actions.selectBar(seen.row.bar)}
      onPointerEnter={() => actions.hover(seen.row.bar)}
      onPointerLeave={() => actions.hover(null)}
    >
      {columns.map((column) => (
        // biome-ignore lint/a11y/useSemanticElements: as above.
        // biome-ignore lint/a11y/useFocusableInteractive: as above.
        <div
          key={column.id}
          role="gridcell"
          data-left={column.left || undefined}
          data-governs={governs(column.id, seen.row) || undefined}
          data-quiet={isLane(column.id) || column.id === 'limit' || undefined}
          className={column.id === 'mark' ? 'schedule-mark' : undefined}
        >
          <Cell column={column} seen={seen} units={units} />
        </div>
      ))}
    </div>
  );
}

interface CellProps {
  readonly column: Column;
  readonly seen: SeenRow;
  readonly units: UnitSystem;
}

function Cell({ column, seen, units }: CellProps): JSX.Element {
  if (column.id === 'slenderness') return <SlendernessCell seen={seen} />;
  if (column.id === 'status') return <StatusCell seen={seen} />;
  return <>{cellText(column, seen, units)}</>;
}

function SlendernessCell({ seen }: { readonly seen: SeenRow }): JSX.Element {
  const { row, ratio } = seen;
  const was = useWindow((state) => beforeAssessment(state)?.diagonals.get(row.bar) ?? null);
  const now = slendernessText(row.inService, row.handling);
  const then = was === null ? now : slendernessText(was.inService, was.handling);
  return (
    <span className="schedule-near">
      {then !== now && <s className="was">{then}</s>}
      <NearnessChip ratio={ratio} />
      <b>{now}</b>
    </span>
  );
}

function StatusCell({ seen: { row, status } }: { readonly seen: SeenRow }): JSX.Element {
  const look = row.findings.some(({ severity }) => severity === 'look into');
  return (
    <span className="schedule-status">
      <StatusGlyph status={status} />
      {STATUS_WORDS[status]}
      {look && (
        <>
          <SeverityGlyph severity="look into" />
          <span className="unseen">, something to look into</span>
        </>
      )}
    </span>
  );
}

const LANES: Readonly<Partial<Record<ColumnId, string>>> = { Lx: 'x', Ly: 'y', Lu: 'u', Lv: 'v' };

function isLane(column: ColumnId): boolean {
  return LANES[column] !== undefined;
}

function governs(column: ColumnId, row: ScheduleRow): boolean {
  return row.governing !== null && LANES[column] === row.governing.axis && row.governing.basis !== 'exact';
}
