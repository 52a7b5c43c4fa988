import type { Vec2 } from '../geometry/vector.ts';
import { HOLDS_FROM } from '../restraint/claims.ts';
import { sameDirection } from '../restraint/directions.ts';
import type { Station } from '../restraint/model.ts';
import { inertiaFor } from '../section/direction.ts';
import type { Hold } from '../stability/model.ts';
import {
  type BowingBar,
  bareBar,
  innerStations,
  lengthOf,
  planeWays,
  rigidHolds,
  type Steel,
  stiffnessAlong,
} from './barProblems.ts';
import { loadOf } from './critical.ts';
import type { HoldGrip, OfferedStation } from './model.ts';

/** Each place where something is joined, with what it offers in and out of the plane, and how well a counted hold grips. */
export function offeredStations(bar: BowingBar, steel: Steel, rigidLoad: number): readonly OfferedStation[] {
  const inner = innerStations(bar.restraint);
  const ways = planeWays(bar);
  return bar.offered.flatMap((offered): OfferedStation[] => {
    const found = inner.find(({ station }) => Math.abs(station.at - offered.at) < 1.5);
    if (!found) return [];
    const held = found.station.held;
    const hold = (direction: HoldGrip['direction'], way: Vec2): HoldGrip => {
      const stiffness = stiffnessAlong(offered, way);
      const counted = holdsAlong(held, way);
      return {
        direction,
        counted,
        offered: stiffness,
        ideal: idealStiffness(bar, steel, way, bracesAlong(inner, way)),
        grip: counted ? gripWith(bar, steel, found.at, way, stiffness) / rigidLoad : null,
      };
    };
    return [
      {
        ...offered,
        station: found.index,
        holds: [hold('in plane', ways.inPlane), hold('out of plane', ways.outOfPlane)],
      },
    ];
  });
}

const holdsAlong = (held: Station['held'], way: Vec2): boolean =>
  held.ways === 2 ||
  (held.ways === 1 && Math.abs(held.direction[0] * way[0] + held.direction[1] * way[1]) >= HOLDS_FROM);

/** How many stations hold along `way`; one where none does, for the hold that is asked about. */
export const bracesAlong = (
  inner: readonly { readonly station: Pick<Station, 'held'> }[],
  way: Vec2,
): number => Math.max(1, inner.filter(({ station }) => holdsAlong(station.held, way)).length);

/** Winter's ideal stiffness for n equal spans of a bar that bends only along `way`: β = N P/Lb with N = 2(1 + cos π/(n + 1)) for n braces. */
export function idealStiffness(bar: BowingBar, steel: Steel, way: Vec2, braces: number): number {
  const span = lengthOf(bar.restraint) / (braces + 1);
  const P = (Math.PI ** 2 * steel.E * inertiaFor(bar.section, way)) / span ** 2;
  return (2 * (1 + Math.cos(Math.PI / (braces + 1))) * P) / span;
}

/** N_cr with one hold as stiff as it is and all other counted holds rigid. */
function gripWith(bar: BowingBar, steel: Steel, at: number, way: Vec2, stiffness: number): number {
  const others = rigidHolds(bar).filter(
    (hold) => !(Math.abs(hold.at - at) < 1.5 && sameDirection(hold.direction, way)),
  );
  const holds: readonly Hold[] = [...others, { at, direction: way, stiffness }];
  return loadOf({ ...bareBar(bar, steel), holds });
}
