/** The columns of the schedule, with how wide each is and what it is sorted by. */
import type { ScheduleRow } from '../../../core/documents/model.ts';
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
  /** CSS grid width. */
  readonly width: string;
}

export const BRACING_COLUMNS: readonly Column[] = [
  { id: 'mark', head: 'Mark', left: true, width: '54px' },
  { id: 'bay', head: 'Bay', left: true, width: '44px' },
  { id: 'section', head: 'Section', left: true, width: 'minmax(74px, 1.2fr)' },
  { id: 'setOut', head: 'Set-out', unit: 'length', width: 'minmax(56px, 1fr)' },
  { id: 'cut', head: 'Cut', unit: 'length', width: 'minmax(56px, 1fr)' },
  { id: 'mass', head: 'Mass', unit: 'mass', width: 'minmax(50px, 0.9fr)' },
  { id: 'Lx', head: 'L', sub: 'x', unit: 'length', width: 'minmax(52px, 0.9fr)' },
  { id: 'Ly', head: 'L', sub: 'y', unit: 'length', width: 'minmax(52px, 0.9fr)' },
  { id: 'Lu', head: 'L', sub: 'u', unit: 'length', width: 'minmax(52px, 0.9fr)' },
  { id: 'Lv', head: 'L', sub: 'v', unit: 'length', width: 'minmax(52px, 0.9fr)' },
  { id: 'governing', head: 'Governing', unit: 'axis', width: 'minmax(64px, 1fr)' },
  { id: 'slenderness', head: 'Slenderness', width: '118px' },
  { id: 'limit', head: 'Limit', width: '46px' },
  { id: 'status', head: 'Status', left: true, width: 'minmax(86px, 1.2fr)' },
];

export const MAKING_COLUMNS: readonly Column[] = [
  { id: 'mark', head: 'Mark', left: true, width: '54px' },
  { id: 'bay', head: 'Bay', left: true, width: '44px' },
  { id: 'off', head: 'Off', width: '40px' },
  { id: 'hand', head: 'Hand', left: true, width: '56px' },
  { id: 'section', head: 'Section', left: true, width: 'minmax(74px, 1.1fr)' },
  { id: 'grade', head: 'Grade', left: true, width: 'minmax(66px, 0.8fr)' },
  { id: 'setOut', head: 'Set-out', unit: 'exact', width: 'minmax(74px, 1fr)' },
  { id: 'setBackI', head: 'Set-back i', unit: 'small', width: 'minmax(58px, 0.8fr)' },
  { id: 'setBackJ', head: 'Set-back j', unit: 'small', width: 'minmax(58px, 0.8fr)' },
  { id: 'cut', head: 'Cut', unit: 'exact', width: 'minmax(74px, 1fr)' },
  { id: 'holes', head: 'Holes from i', unit: 'exact', width: 'minmax(92px, 1.2fr)' },
  { id: 'leg', head: 'Leg in plane', left: true, width: 'minmax(68px, 0.8fr)' },
  { id: 'placed', head: 'Placed', left: true, width: 'minmax(106px, 1fr)' },
  { id: 'packer', head: 'Packer', unit: 'small', width: '56px' },
  { id: 'mass', head: 'Mass', unit: 'mass', width: 'minmax(50px, 0.8fr)' },
  { id: 'massTotal', head: 'All', unit: 'mass', width: 'minmax(50px, 0.8fr)' },
];

/** By the marks, by critical load, and what lies between. */
export const BOWING_COLUMNS: readonly Column[] = [
  { id: 'mark', head: 'Mark', left: true, width: '54px' },
  { id: 'bay', head: 'Bay', left: true, width: '44px' },
  { id: 'section', head: 'Section', left: true, width: 'minmax(74px, 1.2fr)' },
  { id: 'setOut', head: 'Set-out', unit: 'length', width: 'minmax(56px, 1fr)' },
  { id: 'slenderness', head: 'Slenderness', width: '118px' },
  { id: 'critical', head: 'By critical load', width: 'minmax(92px, 1.1fr)' },
  { id: 'criticalLoad', head: 'N', sub: 'cr', unit: 'force', width: 'minmax(56px, 0.9fr)' },
  { id: 'ruleError', head: 'Rule off by', unit: 'percent', width: 'minmax(66px, 0.9fr)' },
  { id: 'grip', head: 'Least grip', unit: 'percent', width: 'minmax(62px, 0.9fr)' },
  { id: 'twist', head: 'With twist', unit: 'percent', width: 'minmax(64px, 0.9fr)' },
  { id: 'tensionShare', head: 'T/C', width: '46px' },
  { id: 'limit', head: 'Limit', width: '46px' },
  { id: 'status', head: 'Status', left: true, width: 'minmax(86px, 1.2fr)' },
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
