/**
 * The free-direction rule written afresh from METHODS.md, for tests alone: nothing of core/restraint is called. A hold is an angle in the
 * section plane, degrees from the shorter leg towards the longer; 'both' holds every way, null nothing.
 */
import type { SectionProperties } from '../../../core/section/model.ts';

export type Hold = number | 'both' | null;

export interface BruteStation {
  readonly at: number;
  readonly hold: Hold;
}

export interface BruteRule {
  readonly spans: number;
  /** Null where all single holds are of one direction. */
  readonly bound: number | null;
  readonly slenderness: number;
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/** Between two undirected directions, 0 to 90°. */
function angleBetween(a: number, b: number): number {
  const turned = (((a - b) % 180) + 180) % 180;
  return Math.min(turned, 180 - turned);
}

const alike = (a: number, b: number): boolean => angleBetween(a, b) <= 10;

/** r_n = √(∫(p·n)² dA / A), of motion at an angle from the shorter leg, from the three second moments. */
export function radiusAlong(section: SectionProperties, degrees: number): number {
  const [c, s] = [Math.cos(radians(degrees)), Math.sin(radians(degrees))];
  return Math.sqrt((c * c * section.Iyy + s * s * section.Ixx + 2 * c * s * section.Ixy) / section.area);
}

/** Largest length/r over all pairs of stations with what lies between them: nothing, one direction, or more. */
function worstSpan(section: SectionProperties, stations: readonly BruteStation[]): number {
  const least = Math.sqrt(section.Iv / section.area);
  let worst = 0;
  for (let i = 0; i < stations.length; i++)
    for (let j = i + 1; j < stations.length; j++) {
      const between = stations.slice(i + 1, j).map((station) => station.hold);
      if (between.includes('both')) continue;
      const singles = between.filter((hold): hold is number => typeof hold === 'number');
      const [first] = singles;
      const length = (stations[j]?.at ?? 0) - (stations[i]?.at ?? 0);
      if (first === undefined) worst = Math.max(worst, length / least);
      else if (singles.every((hold) => alike(hold, first)))
        worst = Math.max(worst, length / radiusAlong(section, first + 90));
    }
  return worst;
}

/** Stations must hold directions that are equal or more than 10° apart: of nearly equal ones the rule does not say which to take. */
export function bruteRule(section: SectionProperties, stations: readonly BruteStation[]): BruteRule {
  const spans = worstSpan(section, stations);
  const interior = stations.slice(1, -1).map((station) => station.hold);
  const directions = [...new Set(interior.filter((hold): hold is number => typeof hold === 'number'))];
  if (directions.length < 2) return { spans, bound: null, slenderness: spans };

  const holding = (direction: number) =>
    stations.filter(({ hold }) => hold === 'both' || (hold !== null && alike(hold, direction)));
  const routes: number[] = directions.map((direction) => worstSpan(section, holding(direction)));
  const longestGap = (direction: number): number => {
    const at = holding(direction).map((station) => station.at);
    return Math.max(...at.slice(1).map((value, k) => value - (at[k] ?? 0)));
  };
  for (const first of directions)
    for (const second of directions)
      if (second > first && angleBetween(first, second) > 90 - 1e-9)
        routes.push(Math.max(longestGap(first), longestGap(second)) / Math.sqrt(section.Iv / section.area));
  const bound = Math.min(...routes);
  return { spans, bound, slenderness: Math.max(spans, bound) };
}
