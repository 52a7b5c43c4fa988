/** What people type after options, read and checked. Each throws commander's own error, which ends the command with the exit code for bad input. */
import { InvalidArgumentError } from 'commander';
import { PATTERNS, type Pattern } from '../../core/project/model.ts';
import { lengthProblemText, parseLength } from '../../core/units/parseLength.ts';

/** A length above 0: bare numbers are mm; other units are written ("4 m", "13'-1 1/2\""). */
export function lengthValue(typed: string): number {
  const parsed = parseLength(typed, 'metric');
  if (!parsed.ok) throw new InvalidArgumentError(lengthProblemText(parsed.problem, 'metric'));
  if (!(parsed.mm > 0)) throw new InvalidArgumentError('A length above 0 is wanted, such as 4000 or "4 m".');
  return parsed.mm;
}

export interface TierValue {
  readonly height: number;
  readonly pattern: Pattern;
}

/** "4200:crossed"; the pattern may be left out, and is then crossed. */
export function tierValue(typed: string): TierValue {
  const colon = typed.lastIndexOf(':');
  const [height, pattern] =
    colon < 0 ? [typed, 'crossed'] : [typed.slice(0, colon), typed.slice(colon + 1).trim()];
  const known = PATTERNS.find((candidate) => candidate === pattern);
  if (known === undefined)
    throw new InvalidArgumentError(`“${pattern}” is no pattern; it is one of ${PATTERNS.join(', ')}.`);
  return { height: lengthValue(height), pattern: known };
}

export function slendernessValue(typed: string): number {
  const value = Number(typed);
  if (!(value > 0 && Number.isFinite(value)))
    throw new InvalidArgumentError('A slenderness above 0 is wanted, such as 300.');
  return value;
}

/** Degrees above 0 and below 90. */
export function angleValue(typed: string): number {
  const value = Number(typed);
  if (!(value > 0 && value < 90))
    throw new InvalidArgumentError('An angle in degrees above 0 and below 90 is wanted, such as 45.');
  return value;
}

/** Degrees of a slope, from level up to 75. */
export function pitchValue(typed: string): number {
  const value = Number(typed);
  if (!(typed.trim() !== '' && value >= 0 && value <= 75))
    throw new InvalidArgumentError('An angle in degrees from 0 to 75 is wanted, such as 8.');
  return value;
}

export function countValue(typed: string): number {
  const value = Number(typed);
  if (!(Number.isInteger(value) && value > 0))
    throw new InvalidArgumentError('A whole number from 1 is wanted.');
  return value;
}

/** For options that may be given several times, each adding to what came before. */
export function each<T>(
  read: (typed: string) => T,
): (typed: string, before: readonly T[] | undefined) => readonly T[] {
  return (typed, before) => [...(before ?? []), read(typed)];
}
