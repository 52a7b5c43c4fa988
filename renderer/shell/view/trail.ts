import type { Assessment } from '../../../core/assessment.ts';
import type { Claim, TrailStep } from '../../../core/restraint/model.ts';
import type { Selection } from '../../store/selection.ts';

/** Steps from which on a purlin's trail is worth lighting up without being asked for. */
const LONG = 3;

/**
 * The way from a hold of the chosen bar to its support, or to what turned out to be free: at the chosen crossing, else the longest
 * that leads away along a purlin. A partner that is simply held explains itself in the drawing.
 */
export function trailToShow(
  assessment: Assessment,
  { bar, crossing }: Selection,
): readonly TrailStep[] | null {
  const restraint = bar === null ? null : (assessment.diagonals.get(bar)?.restraint ?? null);
  if (restraint === null) return null;
  const claims = restraint.stations
    .flatMap((station) => station.claims)
    .filter(({ join, counted }) => join === 'purlin' || !counted);
  if (crossing !== null) return longestOf(claims.filter(({ source }) => source === crossing));
  const longest = longestOf(claims.filter(({ join }) => join === 'purlin'));
  return longest !== null && longest.length > LONG ? longest : null;
}

function longestOf(claims: readonly Claim[]): readonly TrailStep[] | null {
  const longest = claims.reduce<readonly TrailStep[]>(
    (best, { trail }) => (trail.length > best.length ? trail : best),
    [],
  );
  return longest.length === 0 ? null : longest;
}
