/** A table in plain text, for a terminal or a letter in a fixed-width face. */
import { oneLine } from './oneLine.ts';

export interface TextColumn {
  readonly head: string;
  readonly align: 'left' | 'right';
}

/** Heads, a rule, then one line a row; columns two spaces apart, no spaces at the ends of lines. Lines end in a line feed. */
export function textTable(columns: readonly TextColumn[], rows: readonly (readonly string[])[]): string {
  const widths = columns.map(({ head }, column) =>
    Math.max(shownWidth(head), ...rows.map((row) => shownWidth(row[column] ?? ''))),
  );
  const line = (cells: readonly string[]): string =>
    columns
      .map(({ align }, column) => padded(cells[column] ?? '', widths[column] ?? 0, align))
      .join('  ')
      .trimEnd();
  const rule = widths.map((width) => '─'.repeat(width)).join('  ');
  return `${[line(columns.map(({ head }) => head)), rule, ...rows.map(line)].join('\n')}\n`;
}

/** Characters that a terminal shows, each taken as one wide. */
function shownWidth(text: string): number {
  return [...oneLine(text)].length;
}

function padded(text: string, width: number, align: 'left' | 'right'): string {
  const shown = oneLine(text);
  const space = ' '.repeat(Math.max(0, width - shownWidth(text)));
  return align === 'left' ? shown + space : space + shown;
}
