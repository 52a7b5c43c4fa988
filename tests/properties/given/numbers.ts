/** Where in a structure of plain data, Maps included, a number is not finite: as paths, for a message that says where to look. */
export function notFinite(data: unknown): readonly string[] {
  const seen = new Set<object>();
  const found: string[] = [];
  const walk = (value: unknown, path: string): void => {
    if (typeof value === 'number') {
      if (!Number.isFinite(value)) found.push(`${path} = ${value}`);
      return;
    }
    if (typeof value !== 'object' || value === null || seen.has(value)) return;
    seen.add(value);
    if (value instanceof Map) for (const [key, each] of value) walk(each, `${path}<${String(key)}>`);
    else for (const [key, each] of Object.entries(value)) walk(each, `${path}.${key}`);
  };
  walk(data, '');
  return found;
}

/** Words that only a number gone wrong puts into a sentence. */
export function oddWords(data: unknown): readonly string[] {
  const seen = new Set<object>();
  const found: string[] = [];
  const walk = (value: unknown, path: string): void => {
    if (typeof value === 'string') {
      if (/\b(NaN|Infinity|undefined|\[object)\b/.test(value)) found.push(`${path} = ${value}`);
      return;
    }
    if (typeof value !== 'object' || value === null || seen.has(value)) return;
    seen.add(value);
    if (value instanceof Map) for (const [key, each] of value) walk(each, `${path}<${String(key)}>`);
    else for (const [key, each] of Object.entries(value)) walk(each, `${path}.${key}`);
  };
  walk(data, '');
  return found;
}
