/** Lines of working, where the checker repeats the division with the digits that stand there. */
import type { UnitSystem } from '../project/model.ts';
import { grouped } from '../units/figures.ts';
import { showLength, showRadius, showSlenderness } from '../units/quantity.ts';
import { MM_PER_INCH } from '../units/unitSystem.ts';

/**
 * "7 324 / 21.3 = 344": length over radius and what it comes to. In US units "288.3 / 0.839 = 344", both in inches,
 * since feet and sixteenths do not divide.
 */
export function slendernessWorking(
  length: number,
  radius: number,
  slenderness: number,
  units: UnitSystem,
): string {
  const over = showRadius(radius, units, 'bare');
  return `${workedLength(length, units)} / ${over} = ${showSlenderness(slenderness)}`;
}

/** Whole mm, or inches to the tenth, without the unit. */
export function workedLength(mm: number, units: UnitSystem): string {
  return units === 'us' ? grouped(mm / MM_PER_INCH, 1) : showLength(mm, units, 'bare');
}
