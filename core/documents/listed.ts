/** "D1", "D1 and D3", "P1, P2 and P3". */
export function listed(names: readonly string[]): string {
  const unlike = [...new Set(names)];
  const last = unlike.at(-1);
  if (last === undefined) return '';
  return unlike.length === 1 ? last : `${unlike.slice(0, -1).join(', ')} and ${last}`;
}
