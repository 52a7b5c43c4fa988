/** What each cell of the schedule says, on screen and when the table is copied. */

import { placedText } from '../../../core/documents/placedText.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { ScheduleRow } from '../../../core/schedule/model.ts';
import { grouped } from '../../../core/units/figures.ts';
import { showForce } from '../../../core/units/loads.ts';
import { showLength, showMass, showSlenderness } from '../../../core/units/quantity.ts';
import { columnLength, makingLength, shownSection } from '../../controls/figures.ts';
import { STATUS_WORDS } from '../../glyphs/StatusGlyph.tsx';
import { type BowingColumn, bowingNumber, type Column, numberOf } from './scheduleColumns.ts';
import type { SeenRow } from './seenRow.ts';

export function cellText({ id, unit }: Column, seen: SeenRow, units: UnitSystem): string {
  const { row, status } = seen;
  switch (id) {
    case 'critical':
    case 'criticalLoad':
    case 'ruleError':
    case 'grip':
    case 'twist':
    case 'tensionShare':
      return bowingText(id, seen, units);
    case 'mark':
      return row.mark;
    case 'bay':
      return row.bay;
    case 'section':
      return shownSection(row.section);
    case 'grade':
      return row.grade;
    case 'hand':
      return row.hand;
    case 'leg':
      return row.shape === null ? row.legInPlane : '–';
    case 'placed':
      return placedText(row);
    case 'governing':
      return governingText(row);
    case 'limit':
      return String(row.limit);
    case 'slenderness':
      return slendernessText(row.inService, row.handling);
    case 'status':
      return STATUS_WORDS[status];
    case 'off':
      return String(row.numberOff);
    case 'cut':
      // To judge a bar by, what is cut from it in all; to make it, its pieces.
      return unit === 'exact' && row.pieces.length > 1
        ? row.pieces.map((mm) => makingLength(mm, units)).join(' + ')
        : figure(unit, row.cutLength, units);
    case 'holes':
      return row.crossingHoles.map((mm) => makingLength(mm, units)).join(', ') || '–';
    default: {
      const value = numberOf(id, row);
      return value === null ? '–' : figure(unit, value, units);
    }
  }
}

function bowingText(id: BowingColumn, seen: SeenRow, units: UnitSystem): string {
  const value = bowingNumber(id, seen);
  if (value === null) return '–';
  switch (id) {
    case 'critical':
      return showSlenderness(value, seen.row.limit);
    case 'criticalLoad':
      return showForce(value, units, 'bare');
    case 'ruleError':
      return `${value > 0.05 ? '+' : ''}${grouped(value, 1)}`;
    case 'grip':
    case 'twist':
      return grouped(value, 1);
    case 'tensionShare':
      return grouped(value, 2);
    default:
      return id satisfies never;
  }
}

interface Judged {
  readonly slenderness: number;
  readonly limit: number;
  readonly asked: boolean;
}

/** Of the verdict that the practice asks for. */
export function slendernessText(inService: Judged | null, handling: Judged | null): string {
  const verdict = inService?.asked === false && handling?.asked === true ? handling : inService;
  return verdict === null ? '–' : showSlenderness(verdict.slenderness, verdict.limit);
}

/** The table as it is seen, for a spreadsheet: tabs between cells, a line each row. */
export function tableText(rows: readonly SeenRow[], columns: readonly Column[], units: UnitSystem): string {
  const head = columns.map((column) => `${column.head}${column.sub ?? ''}`);
  const lines = rows.map((row) => columns.map((column) => cellText(column, row, units)));
  return [head, ...lines].map((cells) => cells.join('\t')).join('\n');
}

function figure(unit: Column['unit'], value: number, units: UnitSystem): string {
  switch (unit) {
    case 'mass':
      return showMass(value, units, 'bare');
    case 'small':
      return units === 'us'
        ? makingLength(value, units)
        : showLength(value, units, 'small').replace(/ ?mm$/, '');
    case 'exact':
      return makingLength(value, units);
    case 'length':
      // Inches alone would not do to cut a bar by, nor to check one.
      return units === 'us' ? makingLength(value, units) : columnLength(value, units);
    case 'axis':
    case 'force':
    case 'percent':
    case undefined:
      return String(value);
    default:
      return unit satisfies never;
  }
}

function governingText({ governing }: ScheduleRow): string {
  if (governing === null) return '–';
  if (governing.axis === 'free')
    return governing.angle === null ? 'askew' : `${Math.round(governing.angle)}°`;
  return governing.basis === 'exact' ? 'mixed' : governing.axis;
}
