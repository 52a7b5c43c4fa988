/** Figures as the window's narrow columns show them. */

import type { UnitSystem } from '../../core/project/model.ts';
import { feetAndInches } from '../../core/units/feetAndInches.ts';
import { grouped } from '../../core/units/figures.ts';
import { showLength } from '../../core/units/quantity.ts';

/** A bar's length to judge it by, in a column whose head names the unit: metres to the centimetre, or feet to the inch. */
export function columnLength(mm: number, units: UnitSystem): string {
  return units === 'us' ? feetAndInches(mm, 1) : grouped(mm / 1000, 2);
}

/** A bar's length to make it by, in such a column: whole mm, or feet and inches to the sixteenth. */
export function makingLength(mm: number, units: UnitSystem): string {
  return showLength(mm, units, 'bare');
}

/** The unit that stands in the head of such a column. */
export function columnLengthUnit(units: UnitSystem): string {
  return units === 'us' ? 'ft-in' : 'm';
}

/** "70x70x6" as people write it: 70×70×6. */
export function shownSection(designation: string): string {
  return designation.replace(/(?<=[\d/])\s*[xX]\s*(?=\d)/g, '×');
}
