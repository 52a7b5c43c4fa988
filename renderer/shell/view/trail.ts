import type { Assessment } from '../../../core/assessment.ts';
import type { Claim, TrailStep } from '../../../core/restraint/model.ts';
import type { Selection } from '../../store/selection.ts';

/** A trail that leaves the bar's own bay is worth lighting up without being asked for. */
const LONG = 3;

/** The way from a hold of the chosen bar to its support: of the chosen crossing, else the longest that leads on past its partner. */
export function trailToShow(
  assessment: Assessment,
  { bar, crossing }: Selection,
): readonly TrailStep[] | null {
  const restraint = bar === null ? null : (assessment.diagonals.get(bar)?.restraint ?? null);
  if (restraint === null) return null;
  const claims = restraint.stations.flatMap((station) => station.claims);
  const here = crossing === null ? [] : claims.filter(({ source }) => source === crossing);
  const longest = longestOf(here.length > 0 ? here : claims);
  if (longest === null || longest.trail.length === 0) return null;
  return here.length > 0 || longest.trail.length > LONG ? longest.trail : null;
}

function longestOf(claims: readonly Claim[]): Claim | null {
  return claims.reduce<Claim | null>(
    (best, claim) => (best === null || claim.trail.length > best.trail.length ? claim : best),
    null,
  );
}
