/** Comma-separated text by RFC 4180, made safe to open in a spreadsheet. */

export type CsvCell = string | number | null;

const LINE_END = '\r\n';

/** Lines of cells: null is an empty cell, numbers stand as they are, text is quoted where it must be. */
export function csvText(lines: readonly (readonly CsvCell[])[]): string {
  return lines.map((cells) => cells.map(csvCell).join(',') + LINE_END).join('');
}

/** The same as a file: spreadsheets take a file for UTF-8 by the byte-order mark before it, and guess without. */
export function csvFile(text: string): string {
  return `\uFEFF${text}`;
}

function csvCell(cell: CsvCell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return Number.isFinite(cell) ? String(cell) : '';
  const guarded = withoutFormula(cell);
  return /[",\r\n]/.test(guarded) ? `"${guarded.replaceAll('"', '""')}"` : guarded;
}

/**
 * A spreadsheet takes text that begins with one of these for a formula and runs it. An apostrophe in front makes it text again.
 * The full-width forms are taken for the same signs by some.
 */
const STARTS_FORMULA = /^\s*[=+\-@\t\r＝＋－＠]/;

function withoutFormula(text: string): string {
  return STARTS_FORMULA.test(text) ? `'${text}` : text;
}
