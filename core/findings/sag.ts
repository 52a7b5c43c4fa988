import { dot, scale, subtract, type Vec2, type Vec3 } from '../geometry/vector.ts';
import type { AngleBar, Bar } from '../layout/model.ts';
import { inSection } from '../restraint/claims.ts';
import { stopsMotion } from '../restraint/lanes.ts';
import type { Station } from '../restraint/model.ts';
import { longestCount, piecesOf } from '../restraint/pieces.ts';
import type { SectionProperties } from '../section/model.ts';

/** Weight of steel, N/mm³ (7 850 kg/m³; practice-facts, from memory, sure). */
const STEEL_WEIGHT = 77.0e-6;
/** N/mm². Sag does not need a standard's own third digit. */
const E = 200_000;

export interface Sag {
  /** mm, square to the bar. */
  readonly sag: number;
  /** Length that sags, mm. */
  readonly length: number;
  /** Length over sag. */
  readonly ratio: number;
}

/**
 * Sag of a bar under its own weight, pinned, between the stations that carry it: 5wL⁴/384EI with the weight square to the bar and
 * bending about both principal axes. Null for a bar that stands upright. METHODS.md, "Sag".
 */
export function sagOf(
  bar: Bar,
  angle: AngleBar,
  section: SectionProperties,
  stations: readonly Station[],
): Sag | null {
  const down: Vec3 = [0, 0, -1];
  const square = subtract(down, scale(bar.direction, dot(down, bar.direction)));
  const share = Math.hypot(...square);
  if (share < 1e-3) return null;
  const way = inSection(angle, scale(square, 1 / share));
  const length = longestUncarried(stations, way);
  if (length <= 0) return null;
  const w = STEEL_WEIGHT * section.area * share;
  const sag = (5 * w * length ** 4 * flexibility(section, way)) / (384 * E);
  return { sag, length, ratio: length / sag };
}

/** Movement along n from a load along n: nᵀ I⁻¹ n, 1/mm⁴. */
function flexibility(p: SectionProperties, n: Vec2): number {
  // In the order [along the shorter leg, along the longer leg] the bending stiffness is [[Iyy, Ixy], [Ixy, Ixx]].
  const determinant = p.Ixx * p.Iyy - p.Ixy * p.Ixy;
  return (n[0] * n[0] * p.Ixx - 2 * n[0] * n[1] * p.Ixy + n[1] * n[1] * p.Iyy) / determinant;
}

/** A hanger carries weight although it holds nothing against bowing. Beyond the last support the bar sags as it bows: METHODS.md, "Ends that do not hold". */
function longestUncarried(stations: readonly Station[], way: Vec2): number {
  const carried = stations
    .filter(
      (station) => stopsMotion(station.held, way) || station.claims.some((claim) => claim.join === 'hung'),
    )
    .map(({ at }) => at);
  return longestCount(piecesOf(stations[0]?.at ?? 0, stations.at(-1)?.at ?? 0, carried));
}
