import { useVirtualizer } from '@tanstack/react-virtual';
import { type JSX, type KeyboardEvent, useEffect, useMemo, useRef } from 'react';
import { useFontsLoaded } from '../../controls/useFontsLoaded.ts';
import { useSize } from '../../controls/useSize.ts';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { ROW_DEEP } from './rowDeep.ts';
import { ScheduleFilter } from './ScheduleFilter.tsx';
import { ScheduleHead } from './ScheduleHead.tsx';
import { ScheduleRowView } from './ScheduleRowView.tsx';
import { COLUMN_SETS } from './scheduleColumns.ts';
import { fittingGrid } from './scheduleGrid.ts';
import { type ScheduleView, seenRows } from './scheduleView.ts';
import './schedule.css';

interface SchedulePanelProps {
  readonly view: ScheduleView;
  onChange(view: ScheduleView): void;
}

/** Every diagonal, knee and tie in one table; the chosen row and the chosen bar in the view are one. */
export function SchedulePanel({ view, onChange }: SchedulePanelProps): JSX.Element {
  const actions = useActions();
  const assessment = useWindow(shownAssessment);
  const chosen = useWindow((state) => state.selection.bar);
  const units = useWindow((state) => shownProject(state).settings.units);
  const scroller = useRef<HTMLDivElement>(null);
  const rows = useMemo(() => (assessment === null ? [] : seenRows(assessment, view)), [assessment, view]);
  const [whole, size] = useSize<HTMLDivElement>();
  const room = size?.width ?? Number.POSITIVE_INFINITY;
  const fonts = useFontsLoaded();
  // biome-ignore lint/correctness/useExhaustiveDependencies: what was measured before the typefaces came is measured again.
  const { columns, grid } = useMemo(
    () => fittingGrid(COLUMN_SETS[view.columns], rows, units, room),
    [view.columns, rows, units, room, fonts],
  );
  const at = rows.findIndex(({ row }) => row.bar === chosen);
  const virtual = useVirtualizer({
    count: rows.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW_DEEP,
    overscan: 8,
    scrollPaddingStart: 34,
  });
  useEffect(() => {
    if (at >= 0) virtual.scrollToIndex(at, { align: 'auto' });
  }, [at, virtual]);

  const choose = (index: number): void => {
    const row = rows[Math.min(rows.length - 1, Math.max(0, index))];
    if (row !== undefined) actions.selectBar(row.row.bar);
  };
  const page = Math.max(1, Math.floor((scroller.current?.clientHeight ?? 0) / ROW_DEEP) - 2);
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>): void => {
    const to = rowAfterKey(event.key, at, rows.length, page);
    if (to === null || event.target !== event.currentTarget) return;
    event.preventDefault();
    choose(to);
  };

  return (
    <div ref={whole} className="schedule-whole">
      {view.filtering && (
        <ScheduleFilter
          view={view}
          shown={rows.length}
          all={assessment?.schedule.length ?? 0}
          onChange={onChange}
          onClosed={() => scroller.current?.focus()}
        />
      )}
      {/* biome-ignore lint/a11y/useSemanticElements: rows that come and go as one scrolls cannot be a table element. */}
      <div
        ref={scroller}
        className="schedule"
        role="grid"
        aria-label="Schedule"
        aria-rowcount={rows.length + 1}
        aria-activedescendant={at >= 0 ? `schedule-${at}` : undefined}
        tabIndex={0}
        onKeyDown={onKeyDown}
      >
        <ScheduleHead columns={columns} grid={grid} view={view} units={units} onChange={onChange} />
        {/* biome-ignore lint/a11y/useSemanticElements: as above. */}
        <div
          role="rowgroup"
          style={{ height: virtual.getTotalSize(), minWidth: grid.least, position: 'relative' }}
        >
          {virtual.getVirtualItems().map((item) => {
            const row = rows[item.index];
            return row === undefined ? null : (
              <ScheduleRowView
                key={row.row.bar}
                id={`schedule-${item.index}`}
                index={item.index}
                top={item.start}
                seen={row}
                columns={columns}
                grid={grid}
                units={units}
                chosen={row.row.bar === chosen}
              />
            );
          })}
        </div>
        {assessment !== null && rows.length === 0 && (
          <p className="schedule-none">
            {assessment.schedule.length === 0
              ? 'No diagonals are set out yet.'
              : 'No diagonal fits the filter.'}
          </p>
        )}
      </div>
    </div>
  );
}

/** The row that a key leads to from row `at` (−1: none is chosen); null for a key that moves nothing. */
function rowAfterKey(key: string, at: number, count: number, page: number): number | null {
  switch (key) {
    case 'ArrowDown':
      return at + 1;
    case 'ArrowUp':
      return at < 0 ? count - 1 : at - 1;
    case 'PageDown':
      return at + page;
    case 'PageUp':
      return at - page;
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return null;
  }
}
