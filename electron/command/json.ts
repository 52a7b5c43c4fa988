/**
 * A result as JSON text: maps become objects, keys in the order of their making, two spaces of indent, a line feed at the end.
 * Figures keep their full precision.
 */
export function jsonText(value: unknown): string {
  return `${JSON.stringify(value, (_key, each: unknown) => (each instanceof Map ? Object.fromEntries(each) : each), 2)}\n`;
}
