import { MM_PER_INCH, type UnitSystem } from './unitSystem.ts';

export type LengthProblem =
  | { readonly kind: 'empty' }
  /** "6,000": six thousand to one reader and six to another. */
  | { readonly kind: 'ambiguous comma'; readonly typed: string }
  | { readonly kind: 'unknown unit'; readonly typed: string; readonly unit: string }
  | { readonly kind: 'not a length'; readonly typed: string };

export type ParsedLength =
  | { readonly ok: true; readonly mm: number }
  | { readonly ok: false; readonly problem: LengthProblem };

const PER_METRIC_UNIT: Readonly<Record<string, number>> = { mm: 1, cm: 10, m: 1000 };

/** Read lengths are kept to a millionth of a mm, so that 3 1/2" is 88.9 and not 88.89999999999999. */
const PER_MM = 1e6;

const NUMBER = String.raw`\d+(?:\.\d*)?|\.\d+`;
const INCHES = String.raw`(?:(\d+)[ -]+)?(\d+)\/(\d+)|(${NUMBER})`;
const METRIC = new RegExp(`^(${NUMBER}) ?(mm|cm|m)$`);
const FEET = new RegExp(`^(${NUMBER}) ?(?:'|ft|feet|foot)$`);
const FEET_AND_INCHES = new RegExp(`^(\\d+) ?(?:'|ft|feet|foot) ?-? ?(?:${INCHES}) ?(?:"|in|inch|inches)?$`);
const ONLY_INCHES = new RegExp(`^(?:${INCHES}) ?(?:"|in|inch|inches)$`);
// Without marks `24-6 1/8` is feet and inches, but `3-1/2` is how three and a half inches are written: feet need whole inches after them.
const BARE_FEET_INCHES = /^(\d+) ?- ?(\d+)(?: (\d+)\/(\d+))?$/;
const BARE_INCHES = new RegExp(`^(?:${INCHES})$`);
const BARE = new RegExp(`^(${NUMBER})$`);

/**
 * Reads a length as people type it, into mm. Units that are written win: metres in a US project, feet in a metric one.
 * A bare number is mm in metric and inches in US; `24-0 1/8` is feet and inches in US.
 *
 * @returns mm of any sign, or why not; whether the length makes sense where it was typed is for the caller
 */
export function parseLength(typed: string, units: UnitSystem): ParsedLength {
  const whole = normalised(typed);
  if (whole === '') return refuse({ kind: 'empty' });
  if (/\d,\d{3}(?!\d)/.test(whole)) return refuse({ kind: 'ambiguous comma', typed });
  const minus = whole.startsWith('-');
  const text = whole.replace(/^[-+] ?/, '').replace(/(\d),(\d)/g, '$1.$2');
  const mm = positiveLength(text, units);
  if (mm !== null) {
    if (!Number.isFinite(mm)) return refuse({ kind: 'not a length', typed });
    const clean = Math.round(mm * PER_MM) / PER_MM;
    return { ok: true, mm: minus ? -clean : clean };
  }
  const unit = /^(?:\d+(?:\.\d*)?|\.\d+) ?([a-z°µ]+)$/.exec(text)?.[1];
  return refuse(unit === undefined ? { kind: 'not a length', typed } : { kind: 'unknown unit', typed, unit });
}

/** The problem in words, with what to do. */
export function lengthProblemText(problem: LengthProblem, units: UnitSystem): string {
  const example = units === 'us' ? `24'-0 1/8"` : '7320, or 7.32 m';
  switch (problem.kind) {
    case 'empty':
      return `Type a length, such as ${example}.`;
    case 'ambiguous comma':
      return `“${problem.typed}” can be read in two ways; write it without the comma.`;
    case 'unknown unit':
      return `“${problem.unit}” is not a unit of length known here; use mm, m, ft or in.`;
    case 'not a length':
      return `“${problem.typed}” is not a length; type it like ${example}.`;
    default:
      return problem satisfies never;
  }
}

function refuse(problem: LengthProblem): ParsedLength {
  return { ok: false, problem };
}

/** One kind of space, of quote and of minus; digits grouped by spaces closed up ("6 000" → "6000"). */
function normalised(typed: string): string {
  return typed
    .toLowerCase()
    .replace(/\s+/g, ' ')
    .replace(/[−–—]/g, '-')
    .replace(/''|[″”“]/g, '"')
    .replace(/[′’‘]/g, "'")
    .replace(/(\d) (?=\d{3}(?:\D|$))/g, '$1')
    .replace(/\b(mm|cm|m|ft|in)\./g, '$1')
    .trim();
}

function positiveLength(text: string, units: UnitSystem): number | null {
  const metric = METRIC.exec(text);
  if (metric) return Number(metric[1]) * (PER_METRIC_UNIT[metric[2] ?? ''] ?? Number.NaN);
  const feet = FEET.exec(text);
  if (feet) return Number(feet[1]) * 12 * MM_PER_INCH;
  const both = FEET_AND_INCHES.exec(text);
  if (both) return (Number(both[1]) * 12 + inchesOf(both.slice(2))) * MM_PER_INCH;
  const bareBoth = units === 'us' ? BARE_FEET_INCHES.exec(text) : null;
  if (bareBoth) {
    const [, feetTyped, whole, top = '0', bottom = '1'] = bareBoth;
    return (Number(feetTyped) * 12 + Number(whole) + Number(top) / Number(bottom)) * MM_PER_INCH;
  }
  const inches = ONLY_INCHES.exec(text) ?? (units === 'us' ? BARE_INCHES.exec(text) : null);
  if (inches) return inchesOf(inches.slice(1)) * MM_PER_INCH;
  const bare = units === 'metric' ? BARE.exec(text) : null;
  return bare ? Number(bare[1]) : null;
}

/** Inches from the groups of INCHES: whole, top, bottom of a fraction, or a plain number. A fraction over 0 is not finite. */
function inchesOf(groups: readonly (string | undefined)[]): number {
  const [whole, top, bottom, plain] = groups;
  if (plain !== undefined) return Number(plain);
  return Number(whole ?? 0) + Number(top) / Number(bottom);
}
