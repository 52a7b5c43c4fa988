import type { CaseProblem } from './model.ts';

/**
 * Reads values out of data that may be anything, noting what is wrong and where. A value that is wrong is stood in for, so that reading goes on
 * and all that is wrong is said at once; what was read counts only when nothing was noted.
 */
export class CaseReader {
  readonly #value: unknown;
  readonly path: string;
  readonly #problems: CaseProblem[];

  constructor(value: unknown, path: string, problems: CaseProblem[]) {
    this.#value = value;
    this.path = path;
    this.#problems = problems;
  }

  get value(): unknown {
    return this.#value;
  }

  get isGiven(): boolean {
    return this.#value !== undefined && this.#value !== null;
  }

  get isList(): boolean {
    return Array.isArray(this.#value);
  }

  problem(what: string, todo: string): void {
    this.#problems.push({ path: this.path, what, todo });
  }

  at(name: string): CaseReader {
    const value = isObject(this.#value) ? this.#value[name] : undefined;
    return new CaseReader(value, this.path === '' ? name : `${this.path}.${name}`, this.#problems);
  }

  /** Notes it when this is not an object with names and values. */
  object(what: string): this {
    if (!isObject(this.#value)) this.problem(`${shown(this.#value)} is not ${what}.`, `Give ${what}.`);
    return this;
  }

  /** The entries of a list; none for what is not given. */
  list(): readonly CaseReader[] {
    if (!this.isGiven) return [];
    if (!Array.isArray(this.#value)) {
      this.problem(`${shown(this.#value)} is not a list.`, 'Give a list, [ ].');
      return [];
    }
    return this.#value.map((each: unknown, k) => new CaseReader(each, `${this.path}[${k}]`, this.#problems));
  }

  number(least: 'any' | 'zero or more' | 'above zero' = 'any'): number {
    const value = this.#value;
    const fits =
      typeof value === 'number' &&
      Number.isFinite(value) &&
      (least === 'any' || (least === 'above zero' ? value > 0 : value >= 0));
    if (fits) return value;
    const wanted = least === 'any' ? 'a number' : `a number, ${least}`;
    this.problem(this.isGiven ? `${shown(value)} is not ${wanted}.` : 'It is not given.', `Give ${wanted}.`);
    return 1;
  }

  text(): string {
    return typeof this.#value === 'string' ? this.#value : '';
  }
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** For a message: short, and as it stands in the file. */
export function shown(value: unknown): string {
  if (value === undefined) return 'What is there';
  const text = JSON.stringify(value);
  return text.length > 40 ? `${text.slice(0, 39)}…` : text;
}
