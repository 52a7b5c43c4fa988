/** Reads values out of a catalogue file, naming the place of whatever is wrong. */

/** A catalogue file that cannot be used. The files come with the program, so this is a fault in it, not in what the user did. */
export class CatalogueFileError extends Error {
  constructor(where: string, what: string) {
    super(`stock catalogue, at ${where}: ${what}`);
    this.name = 'CatalogueFileError';
  }
}

export type Fields = Readonly<Record<string, unknown>>;

export function fieldsOf(value: unknown, where: string): Fields {
  if (typeof value !== 'object' || value === null || Array.isArray(value))
    throw new CatalogueFileError(where, 'expected an object');
  return Object.fromEntries(Object.entries(value));
}

export function textOf(fields: Fields, name: string, where: string): string {
  const value = fields[name];
  if (typeof value !== 'string' || value.trim() === '')
    throw new CatalogueFileError(`${where}${name}`, `expected a text, found ${JSON.stringify(value)}`);
  return value;
}

/** A number of zero or more. */
export function numberOf(fields: Fields, name: string, where: string): number {
  const value = fields[name];
  if (typeof value !== 'number' || !Number.isFinite(value) || value < 0)
    throw new CatalogueFileError(
      `${where}${name}`,
      `expected a number of zero or more, found ${JSON.stringify(value)}`,
    );
  return value;
}
