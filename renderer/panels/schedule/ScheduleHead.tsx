import type { JSX } from 'react';
import type { UnitSystem } from '../../../core/project/model.ts';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { columnLengthUnit } from '../../controls/figures.ts';
import type { Column } from './scheduleColumns.ts';
import type { ScheduleGrid } from './scheduleGrid.ts';
import type { ScheduleView } from './scheduleView.ts';

interface ScheduleHeadProps {
  readonly columns: readonly Column[];
  readonly grid: ScheduleGrid;
  readonly view: ScheduleView;
  readonly units: UnitSystem;
  onChange(view: ScheduleView): void;
}

/** Columns that are looked at from the largest first. */
const DOWN_FIRST = new Set([
  'slenderness',
  'status',
  'mass',
  'massTotal',
  'setOut',
  'cut',
  'Lx',
  'Ly',
  'Lu',
  'Lv',
  'critical',
  'ruleError',
]);

export function ScheduleHead({ columns, grid, view, units, onChange }: ScheduleHeadProps): JSX.Element {
  const { column: sorted, down } = view.sort;
  const sortBy = (column: Column): void => {
    const again = column.id === sorted;
    onChange({ ...view, sort: { column: column.id, down: again ? !down : DOWN_FIRST.has(column.id) } });
  };
  return (
    // biome-ignore lint/a11y/useSemanticElements: rows that come and go as one scrolls cannot be a table element.
    // biome-ignore lint/a11y/useFocusableInteractive: the buttons in it take the focus.
    <div
      role="row"
      aria-rowindex={1}
      className="schedule-head"
      style={{ gridTemplateColumns: grid.columns, minWidth: grid.least }}
    >
      {columns.map((column) => (
        // biome-ignore lint/a11y/useSemanticElements: as above.
        // biome-ignore lint/a11y/useFocusableInteractive: as above.
        <div
          key={column.id}
          role="columnheader"
          data-left={column.left || undefined}
          aria-sort={column.id === sorted ? (down ? 'descending' : 'ascending') : undefined}
        >
          <button type="button" onClick={() => sortBy(column)}>
            <span>
              {column.head}
              {column.sub !== undefined && <sub>{column.sub}</sub>}
              {column.id === sorted && <span aria-hidden="true"> {down ? '↓' : '↑'}</span>}
            </span>
            <small>{unitText(column, units)}</small>
          </button>
        </div>
      ))}
    </div>
  );
}

function unitText({ unit }: Column, units: UnitSystem): string {
  switch (unit) {
    case 'length':
      return columnLengthUnit(units);
    case 'exact':
    case 'small':
      return units === 'us' ? 'ft-in' : 'mm';
    case 'mass':
      return unitNames(units).mass;
    case 'axis':
      return 'axis';
    case 'force':
      return unitNames(units).force;
    case 'percent':
      return '%';
    case undefined:
      return '';
    default:
      return unit satisfies never;
  }
}
