/**
 * A result as JSON text: maps become objects, sets lists, keys in the order of their making, two spaces of indent, a line feed at the end.
 * Figures keep their full precision.
 */
export function jsonText(value: unknown): string {
  return `${JSON.stringify(value, (_key, each: unknown) => plain(each), 2)}\n`;
}

function plain(each: unknown): unknown {
  if (each instanceof Map) return Object.fromEntries(each);
  return each instanceof Set ? [...each] : each;
}
