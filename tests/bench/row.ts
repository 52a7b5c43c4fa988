/** One line of the table: what was measured, the figure, and what it is held against. */
export interface Row {
  readonly what: string;
  readonly figure: string;
  /** "under 1 s"; "" where there is no goal. */
  readonly goal: string;
  readonly met: boolean | null;
}

export const row = (what: string, figure: string, goal = '', met: boolean | null = null): Row => ({
  what,
  figure,
  goal,
  met,
});

export const ms = (value: number): string =>
  value < 10
    ? `${value.toFixed(2)} ms`
    : value < 10_000
      ? `${value.toFixed(0)} ms`
      : `${(value / 1000).toFixed(1)} s`;

/** Rows in columns, the goal and whether it is met at the end. */
export function table(rows: readonly Row[]): string {
  const cells = [
    ['measured', 'figure', 'goal', ''],
    ...rows.map(({ what, figure, goal, met }) => [
      what,
      figure,
      goal,
      met === null ? '' : met ? 'met' : 'not met',
    ]),
  ];
  const widths = [0, 1, 2, 3].map((column) =>
    Math.max(...cells.map((each) => [...(each[column] ?? '')].length)),
  );
  const line = (each: readonly string[]): string =>
    each
      .map((cell, column) => cell + ' '.repeat((widths[column] ?? 0) - [...cell].length))
      .join('  ')
      .trimEnd();
  const [heading, ...body] = cells;
  return [line(heading ?? []), widths.map((width) => '─'.repeat(width)).join('  '), ...body.map(line)].join(
    '\n',
  );
}
