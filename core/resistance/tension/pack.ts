import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';

/** What one practice says of a bar that is pulled. */
export interface TensionPack {
  grossYield(question: TensionQuestion): Resistance;
  netRupture(question: TensionQuestion, end: ResistingEnd): Resistance;
  blockShear(question: TensionQuestion, end: ResistingEnd): Resistance;
}

/** A single angle held by one leg: what all the rules for shear lag speak of. */
export const isOneLeg = ({ section }: TensionQuestion, end: ResistingEnd): boolean =>
  section.shape === 'angle' && end.legs === 'one';

/** Every part of the section is connected: no shear lag. */
export function isWhole({ section }: TensionQuestion, end: ResistingEnd): boolean {
  switch (section.shape) {
    case 'flat':
    case 'rod':
      return true;
    case 'angle':
      return end.legs === 'both';
    default:
      return false;
  }
}
