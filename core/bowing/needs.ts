import type { Vec2 } from '../geometry/vector.ts';
import { sameDirection } from '../restraint/directions.ts';
import type { Hold } from '../stability/model.ts';
import { type BowingBar, bareBar, innerStations, rigidHolds, type Steel } from './barProblems.ts';
import { loadOf } from './critical.ts';
import { bracesAlong, idealStiffness } from './grips.ts';

/** Stiffness that a hold must have, by three measures, N/mm. */
export interface NeededStiffness {
  /** The planar bar's ideal stiffness (Winter). */
  readonly planarIdeal: number;
  /** For 95 % of the critical load that a rigid hold here would give. */
  readonly for95: number;
  /** For all of it; null where no finite stiffness gives it. */
  readonly forAll: number | null;
}

/** Stiffest that is tried, N/mm. */
const STIFFEST = 1e7;

/** What a hold at a station would need in a direction, with the bar's counted holds elsewhere and in other directions rigid. */
export function neededStiffness(
  bar: BowingBar,
  steel: Steel,
  stationIndex: number,
  way: Vec2,
): NeededStiffness | null {
  const inner = innerStations(bar.restraint);
  const found = inner.find(({ index }) => index === stationIndex);
  if (!found) return null;
  const others = rigidHolds(bar).filter(
    (hold) => !(Math.abs(hold.at - found.at) < 1.5 && sameDirection(hold.direction, way)),
  );
  const loadWith = (stiffness: number | 'rigid'): number => {
    const holds: readonly Hold[] = [...others, { at: found.at, direction: way, stiffness }];
    return loadOf({ ...bareBar(bar, steel), holds });
  };
  const rigid = loadWith('rigid');
  const least = (share: number): number | null => {
    if (loadWith(0) >= share * rigid) return 0;
    if (loadWith(STIFFEST) < share * rigid) return null;
    let [low, high] = [1e-6, STIFFEST];
    while (high / low > 1.0005) {
      const middle = Math.sqrt(low * high);
      if (loadWith(middle) >= share * rigid) high = middle;
      else low = middle;
    }
    return high;
  };
  return {
    planarIdeal: idealStiffness(bar, steel, way, bracesAlong(inner, way)),
    for95: least(0.95) ?? STIFFEST,
    forAll: least(1 - 1e-9),
  };
}
