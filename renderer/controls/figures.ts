/** Figures as the window's narrow columns show them. */

import type { UnitSystem } from '../../core/project/model.ts';
import { grouped } from '../../core/units/figures.ts';
import { showLength } from '../../core/units/quantity.ts';

/** A bar's length in a column whose head names the unit: metres to the centimetre, or feet and inches. */
export function columnLength(mm: number, units: UnitSystem): string {
  return units === 'us' ? showLength(mm, units, 'bare') : grouped(mm / 1000, 2);
}

/** The unit that stands in the head of such a column. */
export function columnLengthUnit(units: UnitSystem): string {
  return units === 'us' ? 'ft-in' : 'm';
}

/** "70x70x6" as people write it: 70×70×6. */
export function shownSection(designation: string): string {
  return designation.replace(/(?<=[\d/])\s*[xX]\s*(?=\d)/g, '×');
}
