/** Figures as they stand in a line of working, where the checker repeats the division with the same digits. */
import type { UnitSystem } from '../project/model.ts';

const MM_PER_INCH = 25.4;
/** Between groups of three digits: narrow, and never broken over a line. */
const GROUP = '\u202f';

/** A number with so many decimals, its whole part in groups of three. */
export function figure(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  const [whole = '0', fraction] = text.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, GROUP);
  const sign = value < 0 && Number(text) !== 0 ? '−' : '';
  return sign + grouped + (fraction === undefined ? '' : `.${fraction}`);
}

/** A length in a line of working: whole mm, or inches to the tenth. */
export function workedLength(mm: number, units: UnitSystem): string {
  return units === 'us' ? figure(mm / MM_PER_INCH, 1) : figure(mm, 0);
}

/** A radius of gyration in a line of working: mm to the tenth, or inches to the thousandth, as the tables print them. */
export function workedRadius(mm: number, units: UnitSystem): string {
  return units === 'us' ? figure(mm / MM_PER_INCH, 3) : figure(mm, 1);
}

/** "7 324 / 21.3 = 344": length over radius, mm, and what it comes to. */
export function slendernessWorking(
  length: number,
  radius: number,
  slenderness: number,
  units: UnitSystem,
): string {
  return `${workedLength(length, units)} / ${workedRadius(radius, units)} = ${figure(slenderness, 0)}`;
}

/** A length as it is spoken of in a sentence: metres to the centimetre, or feet and inches to the tenth. */
export function spokenLength(mm: number, units: UnitSystem): string {
  if (units === 'metric') return `${figure(mm / 1000, 2)} m`;
  const inches = Math.round((mm / MM_PER_INCH) * 10) / 10;
  const feet = Math.floor(inches / 12);
  const rest = inches - feet * 12;
  return feet === 0 ? `${figure(rest, 1)}″` : `${feet}′ ${figure(rest, 1)}″`;
}
