import type { Finding } from '../findings/model.ts';
import type { UnitSystem } from '../project/model.ts';
import { endsMarkedFree } from '../restraint/endWords.ts';
import type { RowVerdict, ScheduleRow } from '../schedule/model.ts';
import { AXES } from '../section/model.ts';
import { grouped } from '../units/figures.ts';
import { showForce, showUse } from '../units/loads.ts';
import { showLength, showSlenderness } from '../units/quantity.ts';
import { KG_PER_POUND, unitNames } from '../units/unitSystem.ts';
import { oneLine } from './oneLine.ts';
import { overrideWords } from './overrideWords.ts';
import { type TextColumn, textTable } from './textTable.ts';

const ABSENT = '–';

/** Stands behind a figure that a length or factor set by hand has made. */
const BY_HAND = '*';

/**
 * The schedule as a table for the terminal: metres to the centimetre and kg, or feet and inches to the sixteenth and lb.
 * The verdict that the practice asks for stands without brackets, the other within them.
 * What is set by hand follows below with its reason, then the findings, one a line, those of no bar last.
 *
 * @param findings of the whole project: those that name no diagonal are told too
 */
export function scheduleTable(
  rows: readonly ScheduleRow[],
  units: UnitSystem,
  findings: readonly Finding[] = [],
): string {
  if (rows.length === 0) return 'No diagonals.\n';
  const loaded = rows.some((row) => row.force !== null);
  const table = textTable(
    [...columnsFor(units), ...(loaded ? loadColumns(units) : [])],
    rows.map((row) => [...cellsOf(row, units), ...(loaded ? loadCells(row, units) : [])]),
  );
  const massTotal = rows.reduce((sum, row) => sum + (row.massTotal ?? 0), 0);
  const pieces = rows.reduce((sum, row) => sum + row.numberOff * Math.max(1, row.pieces.length), 0);
  const total = `${pieces} pieces, ${mass(massTotal, units)} ${units === 'us' ? 'lb' : 'kg'} in all`;
  const below = [handLines(rows, units), [...findingLines(rows), ...barlessLines(rows, findings)]].filter(
    (lines) => lines.length > 0,
  );
  return [table, total, ...below.flatMap((lines) => ['', ...lines])].join('\n').concat('\n');
}

function columnsFor(units: UnitSystem): readonly TextColumn[] {
  const [lengthUnit, massUnit] = units === 'us' ? ['ft-in', 'lb'] : ['m', 'kg'];
  const right = (head: string): TextColumn => ({ head, align: 'right' });
  const left = (head: string): TextColumn => ({ head, align: 'left' });
  return [
    left('bay'),
    left('mark'),
    right('off'),
    left('section'),
    right(`set-out ${lengthUnit}`),
    right(`cut ${lengthUnit}`),
    right(`each ${massUnit}`),
    ...AXES.map((axis) => right(`L${axis} ${lengthUnit}`)),
    left('axis'),
    right('L/r'),
    right('limit'),
    left('in service'),
    left('handling'),
  ];
}

function loadColumns(units: UnitSystem): readonly TextColumn[] {
  const unit = unitNames(units).force;
  return [
    { head: `pulled ${unit}`, align: 'right' },
    { head: `squeezed ${unit}`, align: 'right' },
    { head: 'used', align: 'right' },
    { head: 'by', align: 'left' },
  ];
}

function loadCells(row: ScheduleRow, units: UnitSystem): readonly string[] {
  const force = (N: number | undefined): string => (N ? showForce(N, units, 'bare') : ABSENT);
  return [
    force(row.force?.tension),
    force(row.force?.compression),
    showUse(row.utilisation),
    row.governingCheck ?? ABSENT,
  ];
}

function cellsOf(row: ScheduleRow, units: UnitSystem): readonly string[] {
  const { unbraced, governing } = row;
  return [
    row.bay,
    row.mark,
    String(row.numberOff),
    row.section,
    length(row.setOutLength, units),
    length(row.cutLength, units),
    row.massEach === null ? ABSENT : mass(row.massEach, units),
    ...AXES.map((axis) => {
      if (unbraced === null) return ABSENT;
      const byHand = row.overrides.some((override) => override.axis === axis);
      return `${length(unbraced[axis], units)}${byHand ? BY_HAND : ''}`;
    }),
    governing === null ? ABSENT : axisCell(governing),
    governing === null ? ABSENT : showSlenderness(governing.slenderness, row.limit),
    showSlenderness(row.limit),
    verdictCell(row.inService),
    verdictCell(row.handling),
  ];
}

function axisCell({ axis, angle, basis }: NonNullable<ScheduleRow['governing']>): string {
  const name = axis === 'free' ? `free, ${grouped(angle ?? 0, 0)}°` : axis;
  if (basis === 'span') return name;
  return basis === 'override' ? `${name}, by hand` : `${name}, exact`;
}

function verdictCell(verdict: RowVerdict | null): string {
  if (verdict === null) return 'not assessed';
  const said = `${showSlenderness(verdict.slenderness, verdict.limit)} ${verdict.ok ? 'within' : 'OVER'}`;
  return verdict.asked ? said : `(${said})`;
}

/** Each length or factor set by hand, once a bar and axis, with its reason; and each end marked as holding less than both ways. */
function handLines(rows: readonly ScheduleRow[], units: UnitSystem): readonly string[] {
  return rows.flatMap((row) => [
    ...row.overrides.map((override) =>
      oneLine(`${BY_HAND} ${row.bay} ${row.mark}, set by hand: ${overrideWords(override, units)}`),
    ),
    ...endsMarkedFree(row).map((said) => oneLine(`${BY_HAND} ${row.bay} ${row.mark}, marked: ${said}`)),
  ]);
}

/** Each finding once, with the marks of the bars it names. */
function findingLines(rows: readonly ScheduleRow[]): readonly string[] {
  const lines = new Map<string, string>();
  for (const row of rows)
    for (const { id, severity, title } of row.findings)
      lines.set(id, oneLine(`${severity}: ${row.bay}: ${title}`));
  return [...lines.values()];
}

/** "must fix: W1: …" of each finding that no row of the schedule tells, as one of a load or of a whole bay. */
export function barlessLines(rows: readonly ScheduleRow[], findings: readonly Finding[]): readonly string[] {
  const told = new Set(rows.flatMap((row) => row.findings.map(({ id }) => id)));
  return findings
    .filter(({ id }) => !told.has(id))
    .map(({ severity, bay, title }) => oneLine(`${severity}: ${bay === '' ? '' : `${bay}: `}${title}`));
}

function length(mm: number, units: UnitSystem): string {
  return units === 'us' ? showLength(mm, units, 'bare') : grouped(mm / 1000, 2);
}

function mass(kg: number, units: UnitSystem): string {
  return grouped(units === 'us' ? kg / KG_PER_POUND : kg, 1);
}
