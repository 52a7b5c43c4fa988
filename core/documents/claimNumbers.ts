import type { Claim, Restraint } from '../restraint/model.ts';

/** One line of the holds table: a claim at a station, with the number by which the lanes point to it. */
export interface NumberedClaim {
  readonly number: number;
  readonly station: number;
  readonly claim: Claim;
}

/** The claims of a bar between its ends, numbered from 1 in the order of its stations. */
export function numberedClaims(restraint: Restraint): readonly NumberedClaim[] {
  return restraint.stations
    .flatMap(({ claims }, station) => claims.map((claim) => ({ station, claim })))
    .filter(({ claim }) => claim.join !== 'end')
    .map(({ station, claim }, index) => ({ number: index + 1, station, claim }));
}

/** The number of a claim that a lane's cut names; null where it is not between the ends. Told by content, so that copies are found too. */
export function numberOf(claims: readonly NumberedClaim[], station: number, claim: Claim): number | null {
  const found = claims.find(
    (candidate) =>
      candidate.station === station &&
      candidate.claim.source === claim.source &&
      candidate.claim.direction === claim.direction &&
      candidate.claim.holder === claim.holder,
  );
  return found?.number ?? null;
}
