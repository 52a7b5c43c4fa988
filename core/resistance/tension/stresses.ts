import type { Steel } from '../model.ts';
import type { Working } from '../working.ts';

/** Yield stress and tensile strength as a check is given them, under the letters of its standard. */
export function givenStresses(
  { fy, fu }: Steel,
  letter: 'f' | 'F',
  working: Working,
): { readonly fy: number; readonly fu: number } {
  working.given('yield stress', `${letter}_y`, fy, 'stress');
  working.given('tensile strength', `${letter}_u`, fu, 'stress');
  return { fy, fu };
}
