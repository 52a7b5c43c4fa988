/** The legs of an angle, or of each angle of a pair, as plates that may buckle on their own. mm. */
import type { ResistingSection } from '../model.ts';
import { pliesOf } from '../tension/boltRows.ts';

export interface Leg {
  readonly name: string;
  /** Subscript of its symbols. */
  readonly index: '1' | '2';
  readonly width: number;
  readonly thickness: number;
  /** How many there are of it: two in a pair. */
  readonly count: 1 | 2;
}

/** Empty for shapes that have no legs. */
export function legsOf(section: ResistingSection): readonly Leg[] {
  const { shape, connectedLeg, outstandingLeg, thickness } = section;
  if (shape !== 'angle' && shape !== 'angles back to back' && shape !== 'starred angles') return [];
  const count = pliesOf(section);
  return [
    { name: 'connected leg', index: '1', width: connectedLeg, thickness, count },
    { name: 'outstanding leg', index: '2', width: outstandingLeg, thickness, count },
  ];
}

/** The longer and the shorter leg. */
export function longAndShort({
  connectedLeg,
  outstandingLeg,
}: ResistingSection): readonly [long: number, short: number] {
  return [Math.max(connectedLeg, outstandingLeg), Math.min(connectedLeg, outstandingLeg)];
}

/** b/t of the most slender leg; 0 for shapes without legs. */
export const slenderest = (section: ResistingSection): number =>
  Math.max(0, ...legsOf(section).map(({ width, thickness }) => width / thickness));
