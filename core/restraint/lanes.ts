import { dot2, type Vec2 } from '../geometry/vector.ts';
import type { LengthOverride } from '../project/model.ts';
import { motionAbout } from '../section/direction.ts';
import type { Axis, Radii } from '../section/model.ts';
import { HOLDS_FROM } from './claims.ts';
import type { Claim, Held, Lane, LaneCut, Piece, Station } from './model.ts';

/** One section axis as a strip along the bar, cut where a station stops its motion. */
export function laneOf(
  axis: Axis,
  section: Radii,
  stations: readonly Station[],
  overrides: readonly LengthOverride[],
): Lane {
  const motion = motionAbout(section, axis);
  const radius = radiusOf(section, axis);
  const stops = stations.map((station, index) => isEnd(index, stations) || stopsMotion(station.held, motion));
  const pieces = piecesBetween(stations, stops);
  const found = pieces.reduce((most, piece) => Math.max(most, piece.to - piece.from), 0);
  const override = overrides.find((each) => each.axis === axis) ?? null;
  const unbraced = override ? (override.length ?? found) * override.factor : found;
  const cuts = stations.flatMap((station, index): LaneCut[] =>
    isEnd(index, stations)
      ? []
      : [
          {
            at: station.at,
            station: index,
            stops: stops[index] ?? false,
            claim: tellingClaim(station, motion, stops[index] ?? false),
          },
        ],
  );
  return { axis, motion, pieces, cuts, unbraced, found, radius, slenderness: unbraced / radius, override };
}

/** A station stops a motion that is not within 10° of square to what it holds. */
export function stopsMotion(held: Held, motion: Vec2): boolean {
  return held.ways === 2 || (held.ways === 1 && Math.abs(dot2(held.direction, motion)) >= HOLDS_FROM);
}

function radiusOf(section: Radii, axis: Axis): number {
  switch (axis) {
    case 'x':
      return section.rx;
    case 'y':
      return section.ry;
    case 'u':
      return section.ru;
    case 'v':
      return section.rv;
    default:
      return axis satisfies never;
  }
}

const isEnd = (index: number, stations: readonly Station[]): boolean =>
  index === 0 || index === stations.length - 1;

function piecesBetween(stations: readonly Station[], stops: readonly boolean[]): readonly Piece[] {
  const cutAt = stations.filter((_, index) => stops[index]).map((station) => station.at);
  return cutAt.slice(1).map((to, k) => ({ from: cutAt[k] ?? 0, to }));
}

/** The claim that says most about why a motion is stopped, or why it is not: the one most nearly along it. */
function tellingClaim(station: Station, motion: Vec2, stopped: boolean): Claim | null {
  const along = (claim: Claim): number => (claim.vector ? Math.abs(dot2(claim.vector, motion)) : 0);
  const candidates = station.claims.filter((claim) => claim.vector && claim.counted === stopped);
  return candidates.reduce<Claim | null>(
    (best, claim) => (best === null || along(claim) > along(best) + 1e-9 ? claim : best),
    null,
  );
}
