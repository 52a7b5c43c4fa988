/** The words for the join at a crossing. */
import { JOIN_NAMES } from '../project/joinNames.ts';
import type { Join } from '../project/model.ts';
import type { Crossing } from './model.ts';

export const UNMARKED = 'unmarked, taken as not joined';

/** The name of a crossing's join; "unmarked…" where the user has marked nothing. */
export function joinName(join: Join | null): string {
  return join === null ? UNMARKED : JOIN_NAMES[join.kind];
}

/** The join as one of its two bars meets it: of a cut join, whether this bar is the one that is cut. */
export function joinNameFor(crossing: Crossing, barKey: string): string {
  if (crossing.join?.kind !== 'cut') return joinName(crossing.join);
  return crossing.join.cutBar === barKey ? 'cut and plated' : 'runs through, partner cut';
}
