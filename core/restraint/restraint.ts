import type { AngleBar, Bar, BarId, Crossing, Layout } from '../layout/model.ts';
import type { Settings } from '../project/model.ts';
import { AXES, type Axis, type SectionProperties } from '../section/model.ts';
import type { ClaimContext } from './claims.ts';
import { endings } from './endings.ts';
import { governingOf } from './governing.ts';
import { holdingsOf } from './heldNodes.ts';
import { laneOf } from './lanes.ts';
import type { Lane, Restraint, Station } from './model.ts';
import { type FreeWays, freeWaysOf } from './movable.ts';
import { freeDirectionRule } from './rule.ts';
import { stationsOf } from './stations.ts';

/** Everything about holds that is the same for all bars of a layout: worked out once. */
export interface RestraintContext extends ClaimContext {
  readonly crossingsOf: ReadonlyMap<BarId, readonly Crossing[]>;
  /** Bars that end on another bar between its ends. */
  readonly endingOn: ReadonlyMap<BarId, readonly Bar[]>;
}

export function restraintContext(layout: Layout): RestraintContext {
  const crossingsOf = new Map<BarId, Crossing[]>();
  for (const crossing of layout.crossings.values())
    for (const bar of [crossing.a, crossing.b]) {
      const list = crossingsOf.get(bar);
      if (list) list.push(crossing);
      else crossingsOf.set(bar, [crossing]);
    }
  const endingOn = new Map(
    layout.bays.filter((bay) => bay.kind === 'free').flatMap((bay) => endings(bay, layout)),
  );
  return { layout, holdings: holdingsOf(layout), crossingsOf, endingOn };
}

/** The bar with its own section, as it lies. Null while its section is not in stock, its ends leave no length, or it turns freely. */
export function restraintOf(
  context: RestraintContext,
  bar: Bar,
  basis: Settings['lengthBasis'],
): Restraint | null {
  const { angle } = bar;
  if (!angle?.stock) return null;
  const stations = barStations(context, bar, angle, basis);
  const restraint = stations && restraintWith(bar, angle, stations, angle.stock.properties);
  return restraint && isKept(restraint) ? restraint : null;
}

/** A bar has a length to bow over in every motion, unless an end lets it go and too little else holds it. */
const isKept = ({ lanes, bound }: Restraint): boolean =>
  AXES.every((axis) => Number.isFinite(lanes[axis].found)) && Number.isFinite(bound?.slenderness ?? 0);

/** In which ways a bar turns without resistance, its ends being marked as they are; null where it does not, or has no length to speak of. */
export function turningWaysOf(
  context: RestraintContext,
  bar: Bar,
  basis: Settings['lengthBasis'],
): FreeWays | null {
  const { angle } = bar;
  if (!angle?.stock) return null;
  const stations = barStations(context, bar, angle, basis);
  if (!stations || isKept(restraintWith(bar, angle, stations, angle.stock.properties))) return null;
  return freeWaysOf(stations);
}

/** Stations depend on the bar's place and on how its section is turned, not on the section's size. Null when the ends leave no length. */
export function barStations(
  context: RestraintContext,
  bar: Bar,
  angle: AngleBar,
  basis: Settings['lengthBasis'],
): readonly Station[] | null {
  const crossings = context.crossingsOf.get(bar.id) ?? [];
  const stations = stationsOf(context, bar, angle, crossings, context.endingOn.get(bar.id) ?? [], basis);
  const [first, last] = [stations[0], stations.at(-1)];
  return first && last && last.at > first.at ? stations : null;
}

/** The bar with any section between given stations: what the shortlist tries. */
export function restraintWith(
  bar: Bar,
  angle: AngleBar,
  stations: readonly Station[],
  section: SectionProperties,
): Restraint {
  const overrides = angle.mark.overrides ?? [];
  const lane = (axis: Axis): Lane => laneOf(axis, section, stations, overrides);
  const lanes: Readonly<Record<Axis, Lane>> = { x: lane('x'), y: lane('y'), u: lane('u'), v: lane('v') };
  const rule = freeDirectionRule(section, stations);
  const governing = governingOf(section, rule, lanes, bar.length);
  return { bar: bar.id, stations, lanes, spans: rule.spans, bound: rule.bound, governing };
}
