import { stopsMotion } from './lanes.ts';
import type { Station } from './model.ts';
import { bothEndsHold } from './rule.ts';

/** In which ways a bar turns freely although its ends keep it along itself; none where no one way can be named. */
export type FreeWays = readonly ('in plane' | 'out of plane')[];

/**
 * The ways in which fewer than two places hold a bar, so that it turns without resistance. Only a bar with an end that does not hold
 * both ways can have any.
 */
export function freeWaysOf(stations: readonly Station[]): FreeWays {
  if (bothEndsHold(stations)) return [];
  const claims = stations[0]?.claims ?? [];
  return (['in plane', 'out of plane'] as const).filter((way) => {
    const motion = claims.find(({ direction }) => direction === way)?.vector;
    return motion != null && stations.filter(({ held }) => stopsMotion(held, motion)).length < 2;
  });
}
