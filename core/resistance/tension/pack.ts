import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';

/** What one practice says of a bar that is pulled. */
export interface TensionPack {
  grossYield(question: TensionQuestion): Resistance;
  netRupture(question: TensionQuestion, end: ResistingEnd): Resistance;
  blockShear(question: TensionQuestion, end: ResistingEnd): Resistance;
  /** A rod with cut threads and a nut at its end: the thread is its net section. */
  threadRupture(question: TensionQuestion, end: ResistingEnd): Resistance;
}

/** An angle held by one leg, or a pair of which each is: what the rules for shear lag speak of. */
export type Held = 'one leg' | 'pair' | 'whole' | 'in part';

export function heldBy({ section }: TensionQuestion, end: ResistingEnd): Held {
  switch (section.shape) {
    case 'angle':
      return end.legs === 'one' ? 'one leg' : 'whole';
    case 'angles back to back':
    case 'starred angles':
      return 'pair';
    case 'flat':
      return 'whole';
    case 'rod':
    case 'tee':
    case 'channel':
    case 'I section':
    case 'round tube':
    case 'square tube':
      return 'in part';
    default:
      return section.shape satisfies never;
  }
}

/** A single angle by one leg. */
export const isOneLeg = (question: TensionQuestion, end: ResistingEnd): boolean =>
  heldBy(question, end) === 'one leg';

/** Every part of the section is connected: no shear lag. */
export const isWhole = (question: TensionQuestion, end: ResistingEnd): boolean =>
  heldBy(question, end) === 'whole';

/** Says that a practice's rule for such an end is not held here. */
export function refuseShape(
  { section }: TensionQuestion,
  end: ResistingEnd,
  covered: string,
  working: Working,
): void {
  const by = section.shape === 'angle' ? ` by ${end.legs === 'one' ? 'one leg' : 'both legs'}` : '';
  working.requires(
    `${covered}: what the rules held here speak of`,
    false,
    `a ${section.shape}${by}, ${end.kind}`,
  );
}

/** Title of a check of the net section. */
export function ruptureTitle(question: TensionQuestion, end: ResistingEnd): string {
  if (end.kind === 'welded')
    return isWhole(question, end) ? 'Rupture at the weld' : 'Rupture at the weld, shear lag';
  return isWhole(question, end) ? 'Rupture of the net section' : 'Rupture of the net section, shear lag';
}
