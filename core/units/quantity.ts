/** Quantities as they are shown. Everything comes in mm and kg; the unit system is always given, never kept. */
import { feetAndInches, tapeInches } from './feetAndInches.ts';
import { grouped } from './figures.ts';
import { parseLength } from './parseLength.ts';
import { KG_PER_METRE_PER_POUND_FOOT, KG_PER_POUND, MM_PER_INCH, type UnitSystem } from './unitSystem.ts';

// What is typed is read in the room that shows it, and callers want both from one place.
export { type LengthProblem, lengthProblemText, type ParsedLength, parseLength } from './parseLength.ts';

/** 'bare' leaves the unit out, for columns that name it in their head. */
export type QuantityStyle = 'full' | 'bare';

/**
 * full: `7 324 mm`, `24'-0 3/8"` (to 1/16 in). bare: the same without "mm".
 * spoken: `7.32 m`, `24'-0 3/8"`: for sentences. small: thicknesses, bolts, packers: `4.5 mm`, `3/8"` or `0.472"` where no sixteenth is meant.
 * tape: set-backs, gussets, gauges in fields: `350 mm`, `13 3/4"` in inches alone, to the nearest sixteenth.
 */
export type LengthStyle = QuantityStyle | 'spoken' | 'small' | 'tape';

const SIXTEENTHS = 16;
/** A size this near to a sixteenth of an inch, in mm, is taken as that sixteenth: less than any rolling tolerance. */
const SAME_ON_TAPE = 0.1;

export function showLength(mm: number, units: UnitSystem, style: LengthStyle = 'full'): string {
  if (units === 'us') {
    if (style === 'tape') return `${mm < 0 ? '−' : ''}${tapeInches(Math.abs(mm) / MM_PER_INCH, SIXTEENTHS)}"`;
    return style === 'small' ? smallInches(mm) : feetAndInches(mm, SIXTEENTHS);
  }
  switch (style) {
    case 'full':
      return `${grouped(mm, 0)} mm`;
    case 'bare':
      return grouped(mm, 0);
    case 'spoken':
      return `${grouped(mm / 1000, 2)} m`;
    case 'small':
    case 'tape':
      return `${grouped(mm, Math.abs(mm - Math.round(mm)) < 0.05 ? 0 : 1)} mm`;
    default:
      return style satisfies never;
  }
}

/** Kilograms to the tenth below 1000, then whole; pounds to the tenth below 100, then whole. */
export function showMass(kg: number, units: UnitSystem, style: QuantityStyle = 'full'): string {
  const value = units === 'us' ? kg / KG_PER_POUND : kg;
  const decimals = Math.abs(value) < (units === 'us' ? 100 : 1000) ? 1 : 0;
  return withUnit(grouped(value, decimals), units === 'us' ? 'lb' : 'kg', style);
}

/** kg/m shown as kg/m or lb/ft, to three figures below 100 as tables print it. */
export function showMassPerMetre(
  kgPerMetre: number,
  units: UnitSystem,
  style: QuantityStyle = 'full',
): string {
  const value = massPerMetreIn(kgPerMetre, units);
  return withUnit(grouped(value, value < 10 ? 2 : 1), units === 'us' ? 'lb/ft' : 'kg/m', style);
}

/** kg/m as a number in kg/m or lb/ft, for charts. */
export function massPerMetreIn(kgPerMetre: number, units: UnitSystem): number {
  return units === 'us' ? kgPerMetre / KG_PER_METRE_PER_POUND_FOOT : kgPerMetre;
}

/** A radius of gyration: mm to the tenth, or inches to the thousandth. */
export function showRadius(mm: number, units: UnitSystem, style: QuantityStyle = 'full'): string {
  return units === 'us'
    ? withUnit(grouped(mm / MM_PER_INCH, 3), 'in', style)
    : withUnit(grouped(mm, 1), 'mm', style);
}

/**
 * A slenderness as a whole number. One just above its limit gets the decimals that show it (300.4 against 300, never "300");
 * beyond three decimals the last one is rounded up.
 *
 * @param limit what it is held against; null when nothing is
 */
export function showSlenderness(slenderness: number, limit: number | null = null): string {
  if (limit === null || slenderness <= limit) return grouped(slenderness, 0);
  for (const decimals of [0, 1, 2]) {
    if (Number(slenderness.toFixed(decimals)) > limit) return grouped(slenderness, decimals);
  }
  return grouped(Math.ceil(slenderness * 1000) / 1000, 3);
}

/** The exact length in mm, where what is shown in inches is only near it; null where it is the same. */
export function exactBehind(mm: number, shown: string): string | null {
  const read = parseLength(shown, 'us');
  if (read.ok && Math.abs(read.mm - mm) < SAME_AS_SHOWN) return null;
  return `${grouped(mm, Math.abs(mm - Math.round(mm)) < 0.005 ? 0 : 2)} mm exactly`;
}

/** Rounding of a length that was typed in inches, mm. */
const SAME_AS_SHOWN = 0.005;

/** A sixteenth where the size is one, otherwise thousandths of an inch. */
function smallInches(mm: number): string {
  const inches = Math.abs(mm) / MM_PER_INCH;
  const nearest = Math.round(inches * SIXTEENTHS) / SIXTEENTHS;
  const sign = mm < 0 ? '−' : '';
  if (Math.abs(inches - nearest) * MM_PER_INCH < SAME_ON_TAPE)
    return `${sign}${tapeInches(nearest, SIXTEENTHS)}"`;
  return `${sign}${grouped(inches, 3)}"`;
}

function withUnit(figure: string, unit: string, style: QuantityStyle): string {
  return style === 'bare' ? figure : `${figure} ${unit}`;
}
