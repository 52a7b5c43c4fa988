import type { Bar, Layout } from '../layout/model.ts';
import type { UnitSystem } from '../project/model.ts';
import { endsHoldOf, endsMarkedFree } from '../restraint/endWords.ts';
import type { Claim, Governing, HoldDirection, Restraint, Station } from '../restraint/model.ts';
import { grouped } from '../units/figures.ts';
import { showLength, showSlenderness } from '../units/quantity.ts';
import { whyItStays, whyItSwings } from './bowingPhrases.ts';
import { listed } from './listed.ts';
import { factorText } from './overrideWords.ts';
import { slendernessWorking } from './working.ts';

/**
 * Why the bar bows where it does, in a sentence or two with the division that gives its slenderness, in the project's units:
 * "Pushed in the plane, D2 meets D1 end-on and stays. Pushed out of the plane, it meets only D1's bending and swings,
 * so all 7.32 m bows about y: 7 324 / 21.3 = 344."
 *
 * @param exact slenderness by the exact critical load, where that is taken in place of the rule's
 */
export function governingSentence(
  bar: Bar,
  restraint: Restraint,
  layout: Layout,
  units: UnitSystem,
  exact: number | null = null,
): string {
  const { governing } = restraint;
  switch (governing.basis) {
    case 'override':
      return overrideSentence(bar, restraint, units);
    case 'mixed bound':
      return boundSentence(bar, restraint, units, exact);
    case 'span': {
      const said = spanSentence(bar, restraint, layout, units);
      return exact === null
        ? said
        : `${said} Bowing both ways at once, worked out exactly, reads ${showSlenderness(exact)}, which is taken.`;
    }
    default:
      return governing.basis satisfies never;
  }
}

function overrideSentence(bar: Bar, restraint: Restraint, units: UnitSystem): string {
  const { governing } = restraint;
  const working = slendernessWorking(governing.length, governing.radius, governing.slenderness, units);
  const lane = governing.axis === 'free' ? null : restraint.lanes[governing.axis];
  const override = lane?.override ?? null;
  if (lane === null || override === null) return `${bar.mark} takes a length set by hand: ${working}.`;
  const found = showLength(lane.found, units, 'spoken');
  const factor = override.factor === 1 ? '' : ` times ${factorText(override.factor)}`;
  const taken =
    override.length === null
      ? `the ${found} found from the marks${factor}`
      : `${showLength(override.length, units, 'spoken')}${factor}, set by hand, in place of the ${found} found from the marks`;
  return `About ${lane.axis}, ${bar.mark} takes ${taken}; reason given: “${override.reason}”. ${working}.`;
}

function boundSentence(bar: Bar, restraint: Restraint, units: UnitSystem, exact: number | null): string {
  const { governing, bound, stations } = restraint;
  const working = slendernessWorking(governing.length, governing.radius, governing.slenderness, units);
  const length = showLength(governing.length, units, 'spoken');
  const ends = bar.angle ? listed(endsMarkedFree({ endsHold: endsHoldOf(bar.angle) })) : '';
  const ways = heldWays(stations).map(([way, labels]) => `${way} only at ${listed(labels)}`);
  const how =
    ends !== ''
      ? `${length} ${aboutAxis(governing)}, with the part beyond a last hold counted twice`
      : bound?.route === 'b'
        ? `the longest gap that either leaves, ${length}, over the least radius`
        : `the holds of one way alone, so that ${length} bows ${aboutAxis(governing)}`;
  const reading =
    exact === null
      ? `A bound on the safe side is taken, ${how}: ${working}.`
      : `Worked out exactly, with these holds rigid, that reads ${showSlenderness(exact)}, which is taken; the rule's bound, on the safe side, is ${how}: ${working}.`;
  if (ends !== '')
    return `${ends.charAt(0).toUpperCase()}${ends.slice(1)}, as marked, so ${bar.mark} swings out beyond the last place that holds it there. ${reading}`;
  return `${bar.mark} is held ${ways.join(', ')}, so between them it can bow both ways at once. ${reading}`;
}

/** The ways in which stations between the ends hold, each with the stations that do. */
function heldWays(stations: readonly Station[]): readonly (readonly [string, readonly string[]])[] {
  const byWay = new Map<string, string[]>();
  for (const { claims, label } of stations.slice(1, -1))
    for (const { counted, direction } of claims) {
      if (!counted || direction === 'twist') continue;
      const way = direction === 'out of plane' ? 'out of the plane' : 'in the plane';
      byWay.set(way, [...(byWay.get(way) ?? []), label]);
    }
  return [...byWay];
}

function spanSentence(bar: Bar, restraint: Restraint, layout: Layout, units: UnitSystem): string {
  const { governing, stations } = restraint;
  const inside = stations.filter(
    ({ at }) => at > governing.from + SAME_PLACE && at < governing.to - SAME_PLACE,
  );
  const claims = inside.flatMap((station) => station.claims).filter(({ direction }) => direction !== 'twist');
  const held = claims.filter(({ counted }) => counted);
  const free = claims.filter((claim) => !claim.counted && bearsOn(claim, governing));
  const working = slendernessWorking(governing.length, governing.radius, governing.slenderness, units);
  const result = (length: string): string => `so ${length} bows ${aboutAxis(governing)}: ${working}.`;

  const nameOf = (holder: string): string => layout.bars.get(holder)?.mark ?? holder;
  const stays = pushes(held).map(
    (push, index) =>
      `${push.pushed}, ${index === 0 ? bar.mark : 'it'} ${whyItStays(push.claims, nameOf)} and stays. `,
  );
  if (free.length === 0) {
    const whole = isWhole(governing, stations);
    const length = showLength(governing.length, units, 'spoken');
    if (held.length > 0)
      return `${stays.join('')}Nothing holds it the other way, ${result(spanName(governing, stations, units))}`;
    const place = whole ? 'its ends' : endNames(governing, stations);
    return `Nothing holds ${bar.mark} between ${place}, ${result(whole ? `all ${length}` : `the ${length} there`)}`;
  }
  const swings =
    held.length === 0 && governing.freeDirection === null
      ? `${bar.mark} ${whyItSwings(free, nameOf)}`
      : pushes(free)
          .map(({ pushed, claims: pushedClaims }, index) => {
            const subject = held.length === 0 && index === 0 ? bar.mark : 'it';
            const start = index === 0 ? pushed : pushed.charAt(0).toLowerCase() + pushed.slice(1);
            return `${start}, ${subject} ${whyItSwings(pushedClaims, nameOf)}`;
          })
          .join('; ');
  return `${stays.join('')}${swings}, ${result(spanName(governing, stations, units))}`;
}

/** Stations nearer to each other than this are one, mm. */
const SAME_PLACE = 1;

/** Below this cosine a hold says nothing of a motion: the 10° of the free-direction rule, METHODS.md §3. */
const BEARS = Math.sin((10 * Math.PI) / 180);

/** Whether a claim, had it counted, would have stopped the motion that governs. */
function bearsOn(claim: Claim, { freeDirection }: Governing): boolean {
  if (freeDirection === null || claim.vector === null) return true;
  return Math.abs(claim.vector[0] * freeDirection[0] + claim.vector[1] * freeDirection[1]) >= BEARS;
}

/** From the first station to the last: from end to end, wherever the ends of the length are taken. */
function isWhole({ from, to }: Governing, stations: readonly Station[]): boolean {
  return from < (stations[0]?.at ?? 0) + SAME_PLACE && to > (stations.at(-1)?.at ?? 0) - SAME_PLACE;
}

function endNames({ from, to }: Governing, stations: readonly Station[]): string {
  const nameAt = (place: number): string => {
    const label = stations.find(({ at }) => Math.abs(at - place) < SAME_PLACE)?.label ?? '';
    return label === 'i' || label === 'j' ? `end ${label}` : label;
  };
  return `${nameAt(from)} and ${nameAt(to)}`;
}

function spanName(governing: Governing, stations: readonly Station[], units: UnitSystem): string {
  const length = showLength(governing.length, units, 'spoken');
  return isWhole(governing, stations)
    ? `all ${length}`
    : `the ${length} between ${endNames(governing, stations)}`;
}

function aboutAxis({ axis, angle, freeDirection }: Governing): string {
  if (axis === 'free') return `about an axis ${grouped(angle ?? 0, 0)}° from x, which is none of the four`;
  return freeDirection === null && axis === 'v' ? 'about v, the axis of least radius' : `about ${axis}`;
}

/** Claims by the way in which the bar is pushed against them, in the order in which they come. */
function pushes(
  claims: readonly Claim[],
): readonly { readonly pushed: string; readonly claims: readonly Claim[] }[] {
  const byWay = new Map<string, Claim[]>();
  for (const claim of claims) {
    const pushed = pushedWay(claim.direction);
    byWay.set(pushed, [...(byWay.get(pushed) ?? []), claim]);
  }
  return [...byWay].map(([pushed, ofThisWay]) => ({ pushed, claims: ofThisWay }));
}

function pushedWay(direction: HoldDirection): string {
  switch (direction) {
    // What runs across a bay runs in its plane.
    case 'in plane':
    case 'along holder':
      return 'Pushed in the plane';
    case 'out of plane':
      return 'Pushed out of the plane';
    case 'twist':
      return 'Twisted';
    default:
      return direction satisfies never;
  }
}
