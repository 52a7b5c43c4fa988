import type { UnitSystem } from '../project/model.ts';
import { endsMarkedFree } from '../restraint/endWords.ts';
import type { RowVerdict, ScheduleRow } from '../schedule/model.ts';
import { AXES } from '../section/model.ts';
import { forceIn } from '../units/loads.ts';
import { KG_PER_POUND, MM_PER_INCH } from '../units/unitSystem.ts';
import { type CsvCell, csvText } from './csv.ts';
import { overrideWords } from './overrideWords.ts';

/** One column: its head, with the unit where it has one, and what stands under it. */
interface Column {
  readonly head: string;
  readonly cell: (row: ScheduleRow) => CsvCell;
}

/**
 * The bracing schedule for a spreadsheet: one line of heads with their units, then one line a bar.
 * Metric lengths in mm to the tenth and masses in kg to the hundredth; US lengths in inches to the hundredth and masses in lb to the tenth.
 */
export function scheduleCsv(rows: readonly ScheduleRow[], units: UnitSystem): string {
  const columns = columnsFor(units);
  return csvText([
    columns.map(({ head }) => head),
    ...rows.map((row) => columns.map(({ cell }) => cell(row))),
  ]);
}

function columnsFor(units: UnitSystem): readonly Column[] {
  const lengthUnit = units === 'us' ? 'in' : 'mm';
  const massUnit = units === 'us' ? 'lb' : 'kg';
  const length = (mm: number): number => (units === 'us' ? rounded(mm / MM_PER_INCH, 2) : rounded(mm, 1));
  const radius = (mm: number): number => (units === 'us' ? rounded(mm / MM_PER_INCH, 3) : rounded(mm, 2));
  const mass = (kg: number | null): number | null =>
    kg === null ? null : units === 'us' ? rounded(kg / KG_PER_POUND, 1) : rounded(kg, 2);
  const forceUnit = units === 'us' ? 'kip' : 'kN';
  const force = (N: number | null): number | null => (N === null ? null : rounded(forceIn(N, units), 2));
  const several = (lengths: readonly number[]): string => lengths.map((mm) => String(length(mm))).join('; ');

  return [
    { head: 'mark', cell: (row) => row.mark },
    { head: 'bay', cell: (row) => row.bay },
    { head: 'bar', cell: (row) => row.bar },
    { head: 'number off', cell: (row) => row.numberOff },
    { head: 'hand', cell: (row) => row.hand },
    { head: 'section', cell: (row) => row.section },
    { head: 'grade', cell: (row) => row.grade },
    { head: 'counted on', cell: (row) => (row.countedOn === 'both' ? 'tension and compression' : 'tension') },
    { head: `set-out length (${lengthUnit})`, cell: (row) => length(row.setOutLength) },
    { head: `set-back i (${lengthUnit})`, cell: (row) => length(row.setBackI) },
    { head: `set-back j (${lengthUnit})`, cell: (row) => length(row.setBackJ) },
    { head: `cut length (${lengthUnit})`, cell: (row) => length(row.cutLength) },
    { head: `pieces (${lengthUnit})`, cell: (row) => several(row.pieces) },
    { head: `crossing holes from end A (${lengthUnit})`, cell: (row) => several(row.crossingHoles) },
    { head: 'leg in plane', cell: (row) => row.legInPlane },
    { head: 'heel', cell: (row) => row.heel },
    { head: 'side', cell: (row) => row.side },
    { head: `packer (${lengthUnit})`, cell: (row) => (row.packer === null ? null : length(row.packer)) },
    { head: `mass each (${massUnit})`, cell: (row) => mass(row.massEach) },
    { head: `mass total (${massUnit})`, cell: (row) => mass(row.massTotal) },
    { head: 'joins', cell: (row) => row.joins.join('; ') },
    ...AXES.map((axis) => ({
      head: `L${axis} (${lengthUnit})`,
      cell: (row: ScheduleRow) => (row.unbraced === null ? null : length(row.unbraced[axis])),
    })),
    ...AXES.map((axis) => ({
      head: `r${axis} (${lengthUnit})`,
      cell: (row: ScheduleRow) => (row.radius === null ? null : radius(row.radius[axis])),
    })),
    ...AXES.map((axis) => ({
      head: `L/r ${axis}`,
      cell: (row: ScheduleRow) => (row.slenderness === null ? null : rounded(row.slenderness[axis], 1)),
    })),
    { head: 'governing axis', cell: (row) => row.governing?.axis ?? null },
    {
      head: 'angle of a free axis from x (deg)',
      cell: (row) => (row.governing?.angle == null ? null : rounded(row.governing.angle, 1)),
    },
    {
      head: `governing length (${lengthUnit})`,
      cell: (row) => (row.governing === null ? null : length(row.governing.length)),
    },
    {
      head: `governing radius (${lengthUnit})`,
      cell: (row) => (row.governing === null ? null : radius(row.governing.radius)),
    },
    {
      head: 'governing L/r',
      cell: (row) => (row.governing === null ? null : rounded(row.governing.slenderness, 1)),
    },
    { head: 'governing basis', cell: (row) => row.governing?.basis ?? null },
    {
      head: 'bound L/r',
      cell: (row) => (row.bound === null ? null : rounded(row.bound.slenderness, 1)),
    },
    { head: 'limit', cell: (row) => rounded(row.limit, 1) },
    ...verdictColumns('in service', (row) => row.inService),
    ...verdictColumns('handling', (row) => row.handling),
    { head: `pulled (${forceUnit})`, cell: (row) => force(row.force?.tension ?? null) },
    { head: `squeezed (${forceUnit})`, cell: (row) => force(row.force?.compression ?? null) },
    { head: 'used', cell: (row) => (row.utilisation === null ? null : rounded(row.utilisation, 3)) },
    { head: 'governing check', cell: (row) => row.governingCheck },
    {
      head: 'set by hand',
      cell: (row) =>
        [...row.overrides.map((override) => overrideWords(override, units)), ...endsMarkedFree(row)].join(
          '; ',
        ),
    },
    { head: 'reason', cell: (row) => row.reason },
    {
      head: 'findings',
      cell: (row) => row.findings.map(({ severity, title }) => `${severity}: ${title}`).join('; '),
    },
  ];
}

function verdictColumns(name: string, verdictOf: (row: ScheduleRow) => RowVerdict | null): readonly Column[] {
  return [
    {
      head: `${name} L/r`,
      cell: (row) => {
        const verdict = verdictOf(row);
        return verdict === null ? null : rounded(verdict.slenderness, 1);
      },
    },
    {
      head: `${name} verdict`,
      cell: (row) => {
        const verdict = verdictOf(row);
        if (verdict === null) return 'not assessed';
        return `${verdict.ok ? 'within' : 'over'}${verdict.asked ? '' : ', for note'}`;
      },
    },
  ];
}

function rounded(value: number, decimals: number): number {
  return Number(value.toFixed(decimals));
}
