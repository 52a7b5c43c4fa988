/**
 * The free-direction rule: over what length, and which way, a bar can bow. Works on a section and what its stations hold; knows
 * nothing of bays. METHODS.md, "The free-direction rule".
 */
import { dot2, type Vec2 } from '../geometry/vector.ts';
import { radiusFor } from '../section/direction.ts';
import type { Radii } from '../section/model.ts';
import { areOneDirection, sameDirection, singleDirections, squareTo } from './directions.ts';
import type { Held, MixedBound, SpanCheck } from './model.ts';

/** A station of the rule: `at` in mm from end i, in order; the first and last are the ends, which hold both ways. */
export interface RuleStation {
  readonly at: number;
  readonly held: Held;
}

export interface RuleResult {
  readonly spans: readonly SpanCheck[];
  /** Present when interior stations hold different single directions. */
  readonly bound: MixedBound | null;
  /** Largest of the spans and the bound. */
  readonly slenderness: number;
}

/** How far two directions may be from square and still be "perpendicular": sin 10°. The bound allows for it. */
const NEARLY_SQUARE = Math.sin((10 * Math.PI) / 180);

/**
 * @param stations in order along the bar, both ends included
 * @returns every span check between two stations, the bound for mixed holds if there is one, and the largest slenderness
 */
export function freeDirectionRule(section: Radii, stations: readonly RuleStation[]): RuleResult {
  const spans = spanChecks(section, stations);
  const directions = singleDirections(stations.slice(1, -1).map((station) => station.held));
  const bound = areOneDirection(directions) ? null : mixedBound(section, stations, directions);
  const worst = spans.reduce((most, span) => Math.max(most, span.slenderness), 0);
  return { spans, bound, slenderness: Math.max(worst, bound?.slenderness ?? 0) };
}

/** Between every two stations: free every way, in one direction, or not at all. */
export const spanChecks = (section: Radii, stations: readonly RuleStation[]): readonly SpanCheck[] =>
  spansWhile(section, stations, areOneDirection);

/** Spans from every station on, for as long as the holds between pass for one direction. */
function spansWhile(
  section: Radii,
  stations: readonly RuleStation[],
  isOne: (between: readonly Vec2[]) => boolean,
): readonly SpanCheck[] {
  const checks: SpanCheck[] = [];
  stations.forEach((start, i) => {
    let between: readonly Vec2[] = [];
    for (let j = i + 1; j < stations.length; j++) {
      const end = stations[j];
      if (!end) break;
      if (end.at > start.at) checks.push(spanCheck(section, start.at, end.at, between));
      const { held } = end;
      if (held.ways === 2) break;
      if (held.ways === 1) between = [...between, held.direction];
      if (!isOne(between)) break;
    }
  });
  return checks;
}

function spanCheck(section: Radii, from: number, to: number, held: readonly Vec2[]): SpanCheck {
  const length = to - from;
  if (held.length === 0)
    return { from, to, freeDirection: null, radius: section.rv, slenderness: length / section.rv };
  // Holds that are nearly one direction: leaving all but one out is safe, so the best of them may be taken.
  return held
    .map((direction): SpanCheck => {
      const free = squareTo(direction);
      const radius = radiusFor(section, free);
      return { from, to, freeDirection: free, radius, slenderness: length / radius };
    })
    .reduce((best, each) => (each.slenderness < best.slenderness ? each : best));
}

function mixedBound(
  section: Radii,
  stations: readonly RuleStation[],
  directions: readonly Vec2[],
): MixedBound {
  const routes = [
    ...directions.map((direction) => oneDirectionAlone(section, stations, direction)),
    ...directions.flatMap((first, k) =>
      directions
        .slice(k + 1)
        .filter((second) => Math.abs(dot2(first, second)) <= NEARLY_SQUARE)
        .map((second) => twoSquareDirections(section, stations, first, second)),
    ),
  ];
  const [first, ...others] = routes;
  if (!first) throw new Error('a bound for mixed holds wants at least one direction');
  return others.reduce((best, route) => (route.slenderness < best.slenderness ? route : best), first);
}

/** (a) The holds of one direction, and the stations that hold both ways: leaving the others out is safe. */
function oneDirectionAlone(section: Radii, stations: readonly RuleStation[], direction: Vec2): MixedBound {
  const kept = stations.filter(({ held }) => holds(held, direction));
  // All that is kept lies within 10° of the one direction, and counts as one with it, even where two of them lie farther apart.
  const spans = spansWhile(section, kept, () => true);
  const worst = spans.reduce((most, span) => (span.slenderness > most.slenderness ? span : most));
  return {
    slenderness: worst.slenderness,
    length: worst.to - worst.from,
    radius: worst.radius,
    route: 'a',
    freeDirection: worst.freeDirection,
  };
}

/** (b) Bending energy is at least E Iv ∫|w″|², and each of two perpendicular parts of w is a bar over pins at most g apart. */
function twoSquareDirections(
  section: Radii,
  stations: readonly RuleStation[],
  first: Vec2,
  second: Vec2,
): MixedBound {
  const gap = Math.max(longestGap(stations, first), longestGap(stations, second));
  // For directions not quite square, |w″|² ≥ (a″² + b″²)/(1 + s) and |w′|² ≤ (a′² + b′²)/(1 − s), s the cosine between them.
  const s = Math.abs(dot2(first, second));
  const length = gap * Math.sqrt((1 + s) / (1 - s));
  return { slenderness: length / section.rv, length, radius: section.rv, route: 'b', freeDirection: null };
}

function longestGap(stations: readonly RuleStation[], direction: Vec2): number {
  const at = stations.filter(({ held }) => holds(held, direction)).map((station) => station.at);
  return at.slice(1).reduce((most, value, k) => Math.max(most, value - (at[k] ?? value)), 0);
}

const holds = (held: Held, direction: Vec2): boolean =>
  held.ways === 2 || (held.ways === 1 && sameDirection(held.direction, direction));
