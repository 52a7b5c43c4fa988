import { dot2, type Vec2 } from '../geometry/vector.ts';
import type { LengthOverride } from '../project/model.ts';
import { motionAbout } from '../section/direction.ts';
import type { Axis, Radii } from '../section/model.ts';
import { HOLDS_FROM } from './claims.ts';
import type { Claim, Held, Lane, LaneCut, Station } from './model.ts';
import { longestCount, piecesOf } from './pieces.ts';

/** One section axis as a strip along the bar, cut where a station stops its motion. */
export function laneOf(
  axis: Axis,
  section: Radii,
  stations: readonly Station[],
  overrides: readonly LengthOverride[],
): Lane {
  const motion = motionAbout(section, axis);
  const radius = radiusOf(section, axis);
  const cuts = stations.slice(1, -1).map((station, k): LaneCut => {
    const stops = stopsMotion(station.held, motion);
    return { at: station.at, station: k + 1, stops, claim: tellingClaim(station, motion, stops) };
  });
  const [first, last] = [stations[0], stations.at(-1)];
  const endsStop = [stopsAt(first, motion), stopsAt(last, motion)] as const;
  const stops = stations.filter((station) => stopsMotion(station.held, motion)).map(({ at }) => at);
  const pieces = piecesOf(first?.at ?? 0, last?.at ?? 0, stops);
  const found = longestCount(pieces);
  const override = overrides.find((each) => each.axis === axis) ?? null;
  const unbraced = override ? (override.length ?? found) * override.factor : found;
  const slenderness = unbraced / radius;
  return { axis, motion, pieces, endsStop, cuts, unbraced, found, radius, slenderness, override };
}

const stopsAt = (station: Station | undefined, motion: Vec2): boolean =>
  station !== undefined && stopsMotion(station.held, motion);

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

/** The claim that says most about why a motion is stopped, or why it is not: the one most nearly along it. */
function tellingClaim(station: Station, motion: Vec2, stopped: boolean): Claim | null {
  let telling: Claim | null = null;
  let most = Number.NEGATIVE_INFINITY;
  for (const claim of station.claims) {
    if (!claim.vector || claim.counted !== stopped) continue;
    const along = Math.abs(dot2(claim.vector, motion));
    if (along <= most + 1e-9) continue;
    telling = claim;
    most = along;
  }
  return telling;
}
