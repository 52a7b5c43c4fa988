/** The columns of the schedule, with how wide each is and what it is sorted by. */
import type { ScheduleRow } from '../../../core/schedule/model.ts';
import type { SeenRow } from './seenRow.ts';

export type ColumnId =
  | 'mark'
  | 'bay'
  | 'section'
  | 'setOut'
  | 'cut'
  | 'mass'
  | 'Lx'
  | 'Ly'
  | 'Lu'
  | 'Lv'
  | 'governing'
  | 'slenderness'
  | 'limit'
  | 'status'
  | 'off'
  | 'hand'
  | 'grade'
  | 'setBackI'
  | 'setBackJ'
  | 'holes'
  | 'leg'
  | 'placed'
  | 'packer'
  | 'massTotal'
  | BowingColumn;

export type BowingColumn = 'critical' | 'criticalLoad' | 'ruleError' | 'grip' | 'twist' | 'tensionShare';

export interface Column {
  readonly id: ColumnId;
  readonly head: string;
  /** A letter set low beside the head: the x of L_x. */
  readonly sub?: string;
  readonly unit?: 'length' | 'exact' | 'mass' | 'small' | 'axis' | 'force' | 'percent';
  readonly left?: boolean;
  /** Least width, px; wider where its longest text is. */
  readonly least: number;
  /** Share of the room left over; 0 takes none. */
  readonly share: number;
  /** Left out of a table too wide for its room, the first of them first: another set of columns has it. */
  readonly spare?: number;
}

export const BRACING_COLUMNS: readonly Column[] = [
  { id: 'mark', head: 'Mark', left: true, least: 54, share: 0 },
  { id: 'bay', head: 'Bay', left: true, least: 44, share: 0 },
  { id: 'section', head: 'Section', left: true, least: 74, share: 1.2 },
  { id: 'setOut', head: 'Set-out', unit: 'length', least: 56, share: 1, spare: 3 },
  { id: 'cut', head: 'Cut', unit: 'length', least: 56, share: 1, spare: 1 },
  { id: 'mass', head: 'Mass', unit: 'mass', least: 50, share: 0.9, spare: 2 },
  { id: 'Lx', head: 'L', sub: 'x', unit: 'length', least: 52, share: 0.9 },
  { id: 'Ly', head: 'L', sub: 'y', unit: 'length', least: 52, share: 0.9 },
  { id: 'Lu', head: 'L', sub: 'u', unit: 'length', least: 52, share: 0.9 },
  { id: 'Lv', head: 'L', sub: 'v', unit: 'length', least: 52, share: 0.9 },
  { id: 'governing', head: 'Governing', unit: 'axis', least: 64, share: 1 },
  { id: 'slenderness', head: 'Slenderness', least: 118, share: 0 },
  { id: 'limit', head: 'Limit', least: 46, share: 0 },
  { id: 'status', head: 'Status', left: true, least: 86, share: 1.2 },
];

export const MAKING_COLUMNS: readonly Column[] = [
  { id: 'mark', head: 'Mark', left: true, least: 54, share: 0 },
  { id: 'bay', head: 'Bay', left: true, least: 44, share: 0 },
  { id: 'off', head: 'Off', least: 40, share: 0 },
  { id: 'hand', head: 'Hand', left: true, least: 56, share: 0 },
  { id: 'section', head: 'Section', left: true, least: 74, share: 1.1 },
  { id: 'grade', head: 'Grade', left: true, least: 66, share: 0.8 },
  { id: 'setOut', head: 'Set-out', unit: 'exact', least: 74, share: 1 },
  { id: 'setBackI', head: 'Set-back i', unit: 'small', least: 58, share: 0.8 },
  { id: 'setBackJ', head: 'Set-back j', unit: 'small', least: 58, share: 0.8 },
  { id: 'cut', head: 'Cut', unit: 'exact', least: 74, share: 1 },
  { id: 'holes', head: 'Holes from i', unit: 'exact', least: 92, share: 1.2 },
  { id: 'leg', head: 'Leg in plane', left: true, least: 68, share: 0.8 },
  { id: 'placed', head: 'Placed', left: true, least: 106, share: 1 },
  { id: 'packer', head: 'Packer', unit: 'small', least: 56, share: 0 },
  { id: 'mass', head: 'Mass', unit: 'mass', least: 50, share: 0.8 },
  { id: 'massTotal', head: 'All', unit: 'mass', least: 50, share: 0.8 },
];

/** By the marks, by critical load, and what lies between. */
export const BOWING_COLUMNS: readonly Column[] = [
  { id: 'mark', head: 'Mark', left: true, least: 54, share: 0 },
  { id: 'bay', head: 'Bay', left: true, least: 44, share: 0 },
  { id: 'section', head: 'Section', left: true, least: 74, share: 1.2 },
  { id: 'setOut', head: 'Set-out', unit: 'length', least: 56, share: 1 },
  { id: 'slenderness', head: 'Slenderness', least: 96, share: 0.6 },
  { id: 'critical', head: 'By critical load', least: 86, share: 1.1 },
  { id: 'criticalLoad', head: 'N', sub: 'cr', unit: 'force', least: 56, share: 0.9 },
  { id: 'ruleError', head: 'Rule off by', unit: 'percent', least: 66, share: 0.9 },
  { id: 'grip', head: 'Least grip', unit: 'percent', least: 62, share: 0.9 },
  { id: 'twist', head: 'With twist', unit: 'percent', least: 64, share: 0.9 },
  { id: 'tensionShare', head: 'T/C', least: 46, share: 0 },
  { id: 'limit', head: 'Limit', least: 46, share: 0 },
  { id: 'status', head: 'Status', left: true, least: 86, share: 1.2 },
];

/** The sets of columns that the schedule can show. */
export const COLUMN_SETS = {
  bracing: BRACING_COLUMNS,
  making: MAKING_COLUMNS,
  bowing: BOWING_COLUMNS,
} as const;
export type ColumnSet = keyof typeof COLUMN_SETS;

const STATUS_ORDER = { within: 0, near: 1, over: 2, unknown: 3 } as const;

export function sortValue(column: ColumnId, seen: SeenRow): number | string {
  const { row, status, ratio } = seen;
  switch (column) {
    case 'critical':
    case 'criticalLoad':
    case 'ruleError':
    case 'grip':
    case 'twist':
    case 'tensionShare':
      return bowingNumber(column, seen) ?? -1000;
    case 'mark':
      return row.mark;
    case 'bay':
      return row.bay;
    case 'section':
      return row.section;
    case 'hand':
      return row.hand;
    case 'grade':
      return row.grade;
    case 'leg':
      return row.legInPlane;
    case 'placed':
      return `${row.side} ${row.heel}`;
    case 'governing':
      return row.governing?.axis ?? '';
    case 'slenderness':
      return ratio ?? -1;
    case 'limit':
      return row.limit;
    case 'status':
      return STATUS_ORDER[status];
    default:
      return numberOf(column, row) ?? -1;
  }
}

type NumberColumn = Exclude<
  ColumnId,
  | 'mark'
  | 'bay'
  | 'section'
  | 'hand'
  | 'grade'
  | 'leg'
  | 'placed'
  | 'governing'
  | 'slenderness'
  | 'limit'
  | 'status'
  | BowingColumn
>;

/** A slenderness, N, per cent or a ratio; null where there is none to tell. */
export function bowingNumber(column: BowingColumn, { bowing }: SeenRow): number | null {
  if (bowing === null) return null;
  switch (column) {
    case 'critical':
      return bowing.real.slenderness;
    case 'criticalLoad':
      return bowing.real.N;
    case 'ruleError':
      return bowing.ruleError;
    case 'grip': {
      const grips = bowing.stations.flatMap(({ holds }) => holds.flatMap(({ grip }) => grip ?? []));
      return grips.length === 0 ? null : Math.min(...grips) * 100;
    }
    case 'twist':
      return bowing.twist.governs ? bowing.twist.ratio * 100 : null;
    case 'tensionShare':
      return bowing.partner?.tensionShare ?? null;
    default:
      return column satisfies never;
  }
}

/** mm, kg or a count; null where the row has none. */
export function numberOf(column: NumberColumn, row: ScheduleRow): number | null {
  switch (column) {
    case 'setOut':
      return row.setOutLength;
    case 'cut':
      return row.cutLength;
    case 'mass':
      return row.massEach;
    case 'massTotal':
      return row.massTotal;
    case 'Lx':
      return row.unbraced?.x ?? null;
    case 'Ly':
      return row.unbraced?.y ?? null;
    case 'Lu':
      return row.unbraced?.u ?? null;
    case 'Lv':
      return row.unbraced?.v ?? null;
    case 'off':
      return row.numberOff;
    case 'setBackI':
      return row.setBackI;
    case 'setBackJ':
      return row.setBackJ;
    case 'holes':
      return row.crossingHoles[0] ?? null;
    case 'packer':
      return row.packer;
    default:
      return column satisfies never;
  }
}
