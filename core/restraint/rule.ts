/**
 * The free-direction rule: over what length, and which way, a bar can bow. Works on a section and what its stations hold; knows
 * nothing of bays. METHODS.md, "The free-direction rule".
 */
import { dot2, type Vec2 } from '../geometry/vector.ts';
import { radiusFor } from '../section/direction.ts';
import type { Radii } from '../section/model.ts';
import { areOneDirection, sameDirection, singleDirections, squareTo } from './directions.ts';
import type { Held, MixedBound, SpanCheck } from './model.ts';
import { longestCount, piecesOf } from './pieces.ts';

/** A station of the rule: `at` in mm from end i, in order; the first and last are the ends, which hold both ways unless marked otherwise. */
export interface RuleStation {
  readonly at: number;
  readonly held: Held;
}

export interface RuleResult {
  readonly spans: readonly SpanCheck[];
  /** Present when interior stations hold different single directions, or an end does not hold both ways; infinite where nothing is known to keep the bar in place. */
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
  const endsHold = bothEndsHold(stations);
  const asked = endsHold ? stations.slice(1, -1) : stations;
  const directions = singleDirections(asked.map((station) => station.held));
  const bound = endsHold && areOneDirection(directions) ? null : mixedBound(section, stations, directions);
  const worst = spans.reduce((most, span) => Math.max(most, span.slenderness), 0);
  return { spans, bound, slenderness: Math.max(worst, bound?.slenderness ?? 0) };
}

export const bothEndsHold = (stations: readonly RuleStation[]): boolean =>
  stations[0]?.held.ways === 2 && stations.at(-1)?.held.ways === 2;

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
  const endsHold = bothEndsHold(stations);
  const pairs = directions.flatMap((first, k) =>
    directions.slice(k + 1).map((second) => ({ first, second })),
  );
  const square = pairs.filter(({ first, second }) => Math.abs(dot2(first, second)) <= NEARLY_SQUARE);
  const slanting = pairs.filter(({ first, second }) => isSlanting(first, second));
  const routes = [
    // Checks over spans hold between ends that stay in place; beside one that does not, only what follows from the energy is taken.
    ...(endsHold
      ? directions.map((direction) => oneDirectionAlone(section, stations, direction))
      : [bothWaysAlone(section, stations)]),
    ...square.map(({ first, second }) => twoDirections(section, stations, first, second, 0)),
    // There two slanting directions may be all that keeps the bar; no less than its whole length is taken.
    ...(endsHold
      ? []
      : slanting.map(({ first, second }) =>
          twoDirections(section, stations, first, second, wholeLength(stations)),
        )),
  ];
  const [first, ...others] = routes;
  if (!first) throw new Error('a bound for mixed holds wants at least one direction');
  return others.reduce((best, route) => (route.slenderness < best.slenderness ? route : best), first);
}

const isSlanting = (first: Vec2, second: Vec2): boolean =>
  Math.abs(dot2(first, second)) > NEARLY_SQUARE && !sameDirection(first, second);

const wholeLength = (stations: readonly RuleStation[]): number =>
  (stations.at(-1)?.at ?? 0) - (stations[0]?.at ?? 0);

/** (a) The stations that hold both ways and no others. */
function bothWaysAlone(section: Radii, stations: readonly RuleStation[]): MixedBound {
  const length = countedLength(
    stations,
    stations.filter(({ held }) => held.ways === 2),
  );
  return { slenderness: length / section.rv, length, radius: section.rv, route: 'a', freeDirection: null };
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

/**
 * (b) Bending energy is at least E Iv ∫|w″|², and each of two directions' parts of w is a bar over pins.
 *
 * @param least mm, taken where the pieces count as less
 */
function twoDirections(
  section: Radii,
  stations: readonly RuleStation[],
  first: Vec2,
  second: Vec2,
  least: number,
): MixedBound {
  const [one, other] = [first, second].map((direction) =>
    countedLength(
      stations,
      stations.filter(({ held }) => holds(held, direction)),
    ),
  );
  // For directions not square, |w″|² ≥ (a″² + b″²)/(1 + s) and |w′|² ≤ (a′² + b′²)/(1 − s), s the cosine between them.
  const s = Math.abs(dot2(first, second));
  const length = Math.max(least, Math.max(one ?? 0, other ?? 0) * Math.sqrt((1 + s) / (1 - s)));
  return { slenderness: length / section.rv, length, radius: section.rv, route: 'b', freeDirection: null };
}

/** The longest piece of the bar when only some of its stations hold. */
function countedLength(all: readonly RuleStation[], kept: readonly RuleStation[]): number {
  return longestCount(
    piecesOf(
      all[0]?.at ?? 0,
      all.at(-1)?.at ?? 0,
      kept.map(({ at }) => at),
    ),
  );
}

const holds = (held: Held, direction: Vec2): boolean =>
  held.ways === 2 || (held.ways === 1 && sameDirection(held.direction, direction));
