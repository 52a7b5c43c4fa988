/** Forces, stiffnesses and movements as they are shown. They run over many tens, so three figures count, not decimals. */
import { grouped } from './figures.ts';
import type { QuantityStyle } from './quantity.ts';
import { MM_PER_INCH, N_PER_KIP, type UnitSystem, unitNames } from './unitSystem.ts';

/** N as `22.5 kN` or `5.05 kip`. */
export function showForce(newtons: number, units: UnitSystem, style: QuantityStyle = 'full'): string {
  return shown(forceIn(newtons, units), unitNames(units).force, style);
}

/** N as a number in kN or kip, for charts and fields. */
export function forceIn(newtons: number, units: UnitSystem): number {
  return newtons / newtonsPerForceUnit(units);
}

/** N in one kN or kip. */
export function newtonsPerForceUnit(units: UnitSystem): number {
  return units === 'us' ? N_PER_KIP : 1000;
}

/** N·mm as `22.5 kN·m` or `16.6 kip·ft`. */
export function showMoment(
  newtonMillimetres: number,
  units: UnitSystem,
  style: QuantityStyle = 'full',
): string {
  return units === 'us'
    ? shown(newtonMillimetres / (N_PER_KIP * 12 * MM_PER_INCH), 'kip·ft', style)
    : shown(newtonMillimetres / 1e6, 'kN·m', style);
}

/** N/mm as `62 200 N/mm` or `355 kip/in`. */
export function showStiffness(
  newtonsPerMm: number,
  units: UnitSystem,
  style: QuantityStyle = 'full',
): string {
  const value = units === 'us' ? (newtonsPerMm * MM_PER_INCH) / N_PER_KIP : newtonsPerMm;
  return shown(value, unitNames(units).stiffness, style);
}

/** How far something moves under a load, mm as `5.55 mm` or `0.219 in`. */
export function showMovement(mm: number, units: UnitSystem, style: QuantityStyle = 'full'): string {
  return units === 'us' ? shown(mm / MM_PER_INCH, 'in', style) : shown(mm, 'mm', style);
}

/** Below this share of a unit there is nothing to tell: it is a trace of arithmetic. */
const NOTHING = 5e-6;

/** To three figures, in groups of three digits, never in powers of ten. */
export function threeFigures(value: number): string {
  const size = Math.abs(value);
  if (size < NOTHING) return '0';
  const rounded = Number(value.toPrecision(3));
  const decimals = Math.max(0, 2 - Math.floor(Math.log10(Math.abs(rounded))));
  return grouped(rounded, decimals);
}

function shown(value: number, unit: string, style: QuantityStyle): string {
  const figure = threeFigures(value);
  return style === 'bare' ? figure : `${figure} ${unit}`;
}

/** Above it there is next to no resistance, and the figure says no more. */
const MOST_SHOWN = 99;

/** How much of a resistance is used: "0.87", "over 99", and a dash where that is not known. */
export function showUse(used: number | null): string {
  if (used === null) return '–';
  return used > MOST_SHOWN ? `over ${MOST_SHOWN}` : used.toFixed(2);
}

/** "used 87 %"; "nothing to speak of resists". */
export const sayUsed = (used: number): string =>
  used > MOST_SHOWN ? 'nothing to speak of resists' : `used ${(100 * used).toFixed(0)} %`;
