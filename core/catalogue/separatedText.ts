/** Rows of text separated by comma, semicolon or tab, as spreadsheets save them. */

export interface SeparatedRow {
  /** Where the row begins, counted from 1. */
  readonly line: number;
  readonly cells: readonly string[];
}

export interface SeparatedText {
  readonly separator: ',' | ';' | '\t';
  readonly rows: readonly SeparatedRow[];
}

/** Splits into trimmed cells; quoted cells may hold separators, doubled quotes and line ends. Blank rows and rows beginning with # are left out. */
export function separatedText(text: string): SeparatedText {
  const clean = text.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n');
  const separator = separatorOf(
    clean.split('\n').find((line) => line.trim() !== '' && !line.startsWith('#')) ?? '',
  );
  const rows: SeparatedRow[] = [];
  let cells: string[] = [];
  let cell = '';
  let quoted = false;
  let line = 1;
  let begins = 1;
  const endRow = (): void => {
    cells.push(cell.trim());
    if (cells.some((c) => c !== '') && !cells[0]?.startsWith('#')) rows.push({ line: begins, cells });
    cells = [];
    cell = '';
    begins = line;
  };
  for (let i = 0; i < clean.length; i += 1) {
    const c = clean.charAt(i);
    if (c === '\n') line += 1;
    if (quoted) {
      if (c !== '"') cell += c;
      else if (clean.charAt(i + 1) === '"') {
        cell += '"';
        i += 1;
      } else quoted = false;
    } else if (c === '"' && cell.trim() === '') quoted = true;
    else if (c === separator) {
      cells.push(cell.trim());
      cell = '';
    } else if (c === '\n') endRow();
    else cell += c;
  }
  endRow();
  return { separator, rows };
}

/** The separator that the first line has most of, outside quotes. */
function separatorOf(line: string): SeparatedText['separator'] {
  const bare = line.replace(/"[^"]*"/g, '');
  const count = (separator: string): number => bare.split(separator).length - 1;
  if (count('\t') > 0) return '\t';
  return count(';') > 0 ? ';' : ',';
}
