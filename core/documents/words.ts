/** The words that every document and screen uses for joins, statuses and reasons. Chosen here once. */
import type { CatalogueId } from '../catalogue/model.ts';
import type { Bar, Crossing, Layout } from '../layout/model.ts';
import type { Join, JoinKind, UnitSystem } from '../project/model.ts';
import type {
  Claim,
  Governing,
  HoldDirection,
  HoldReason,
  Restraint,
  Station,
  TrailStep,
} from '../restraint/model.ts';
import { grouped } from '../units/figures.ts';
import { showLength } from '../units/quantity.ts';
import { listed } from './listed.ts';
import { factorText } from './overrideWords.ts';
import { slendernessWorking } from './working.ts';

/** What a join is called. */
export const JOIN_NAMES: Readonly<Record<JoinKind, string>> = {
  none: 'not joined',
  bolted: 'bolted through',
  packed: 'bolted with packer',
  cut: 'one bar cut and plated',
  welded: 'welded',
  purlin: 'bolted to purlin',
  hung: 'hung, sag only',
};

/** The same for what a claim stands on, which may also be an end of the bar or another bar that ends on it. */
export function joinKindName(join: Claim['join']): string {
  if (join === 'end') return 'end connection';
  return join === 'bar end' ? 'end of another bar' : JOIN_NAMES[join];
}

export const UNMARKED = 'unmarked, taken as not joined';

/** The name of a crossing's join; "unmarked…" where the user has marked nothing. */
export function joinName(join: Join | null): string {
  return join === null ? UNMARKED : JOIN_NAMES[join.kind];
}

/** The join as one of its two bars meets it: of a cut join, whether this bar is the one that is cut. */
export function joinNameFor(crossing: Crossing, barKey: string): string {
  if (crossing.join?.kind !== 'cut') return joinName(crossing.join);
  return crossing.join.cutBar === barKey ? 'cut and plated' : 'runs through, partner cut';
}

export type Status = 'over' | 'near' | 'within' | 'unknown';

export const STATUS_NAMES: Readonly<Record<Status, string>> = {
  over: 'over the limit',
  near: 'near the limit',
  within: 'within the limit',
  unknown: 'not assessed',
};

export const DIRECTION_NAMES: Readonly<Record<HoldDirection, string>> = {
  'in plane': 'in the plane, across',
  'out of plane': 'out of the plane',
  'along holder': 'along the holder',
  twist: 'twist',
};

export const CATALOGUE_NAMES: Readonly<Record<CatalogueId, string>> = {
  en: 'EN 10056-1',
  us: 'ASTM A6 (US)',
  au: 'AS/NZS 3679.1',
};

/** Why a hold counts or does not, as one sentence. Lengths do not occur in it. */
export function reasonText(reason: HoldReason, _units?: UnitSystem): string {
  switch (reason.kind) {
    case 'end':
      return 'The end connection holds every way.';
    case 'partner end-on':
      return `${reason.partner} is met end-on, and both its halves reach held points.`;
    case 'partner half free':
      return `${reason.partner} is met end-on, but the half of it that ends at ${reason.node} reaches nothing held.`;
    case 'partner only bends':
      return `${reason.partner} offers only its bending, which holds nothing by the marks.`;
    case 'single plate hinges':
      return `The single plate on ${reason.partner} is a hinge, and holds nothing out of the plane.`;
    case 'not joined':
      return reason.marked
        ? `Not joined to ${reason.partner}.`
        : `The crossing with ${reason.partner} is unmarked, and is taken as not joined.`;
    case 'hung':
      return `Hung from ${reason.line}: that stops sag, and holds nothing.`;
    case 'line held along itself':
      return `${reason.line} is itself held along its length by ${reason.by}.`;
    case 'line free along itself':
      return `${reason.line} is free to move along itself: ${reason.why}.`;
    case 'line stiff across':
      return `${reason.line} is stiff across itself, out of the plane of the bay.`;
    case 'bar ends here':
      return `${reason.bar} ends here and holds along itself.`;
    case 'bar ends here, itself free':
      return `${reason.bar} ends here, but its other end at ${reason.node} is itself free.`;
    case 'twist held':
      return `Two bolts across ${reason.line} hold the twist.`;
    case 'nearly along the bar':
      return `${reason.holder} runs within 10° of the bar, and holds nothing across it.`;
    default:
      return reason satisfies never;
  }
}

/** The steps from a hold to a support, or to what turned out to be free: "D2 → D1 → node 1 (held)". */
export function trailText(trail: readonly TrailStep[]): string {
  return trail
    .map((step) => (step.state === 'on the way' ? step.text : `${step.text} (${step.state})`))
    .join(' → ');
}

/**
 * Why the bar bows where it does, in a sentence or two with the division that gives its slenderness, in the project's units:
 * "Pushed in the plane, D2 meets D1 end-on and stays. Pushed out of the plane, it meets only D1's bending and swings,
 * so all 7.32 m bows about y: 7 324 / 21.3 = 344."
 */
export function governingSentence(bar: Bar, restraint: Restraint, layout: Layout, units: UnitSystem): string {
  const { governing } = restraint;
  switch (governing.basis) {
    case 'override':
      return overrideSentence(bar, restraint, units);
    case 'mixed bound':
      return boundSentence(bar, restraint, units);
    case 'span':
      return spanSentence(bar, restraint, layout, units);
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

function boundSentence(bar: Bar, restraint: Restraint, units: UnitSystem): string {
  const { governing, bound, stations } = restraint;
  const working = slendernessWorking(governing.length, governing.radius, governing.slenderness, units);
  const length = showLength(governing.length, units, 'spoken');
  const ways = heldWays(stations).map(([way, labels]) => `${way} only at ${listed(labels)}`);
  const how =
    bound?.route === 'b'
      ? `the longest gap that either leaves, ${length}, over the least radius`
      : `the holds of one way alone, so that ${length} bows ${aboutAxis(governing)}`;
  return (
    `${bar.mark} is held ${ways.join(', ')}, so between them it can bow both ways at once. ` +
    `A bound on the safe side is taken, ${how}: ${working}.`
  );
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
  const span = `${spanName(governing, stations, units)} bows ${aboutAxis(governing)}`;
  const result = `so ${span}: ${slendernessWorking(governing.length, governing.radius, governing.slenderness, units)}.`;

  const nameOf = (holder: string): string => layout.bars.get(holder)?.mark ?? holder;
  const stays = pushes(held).map(
    (push, index) =>
      `${push.pushed}, ${index === 0 ? bar.mark : 'it'} ${whyItStays(push.claims, nameOf)} and stays. `,
  );
  if (free.length === 0) {
    const place = isWhole(governing, stations)
      ? ' between its ends'
      : ` between ${endNames(governing, stations)}`;
    const nothing =
      held.length === 0 ? `Nothing holds ${bar.mark}${place}` : 'Nothing holds it the other way';
    return `${stays.join('')}${nothing}, ${result}`;
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
  return `${stays.join('')}${swings}, ${result}`;
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
    case 'in plane':
      return 'Pushed in the plane';
    case 'out of plane':
      return 'Pushed out of the plane';
    case 'along holder':
      return 'Pushed along what holds it';
    case 'twist':
      return 'Twisted';
    default:
      return direction satisfies never;
  }
}

type NameOf = (holder: string) => string;

/** "meets D1 end-on": what stops the push, each kind of reason once with all its names. */
function whyItStays(claims: readonly Claim[], nameOf: NameOf): string {
  return phrases(claims, nameOf, (reason, names) => {
    switch (reason.kind) {
      case 'partner end-on':
        return `meets ${names} end-on`;
      case 'line held along itself':
        return `meets ${names}, which cannot move along itself,`;
      case 'line stiff across':
        return `meets ${names}, stiff across,`;
      case 'bar ends here':
        return `meets ${names}, which ends on it,`;
      default:
        return `is held at ${names}`;
    }
  });
}

/** "meets only D1's bending and swings": why the push is not stopped. */
function whyItSwings(claims: readonly Claim[], nameOf: NameOf): string {
  return phrases(claims, nameOf, (reason, names) => {
    switch (reason.kind) {
      case 'partner only bends':
        return `meets only ${possessive(names)} bending and swings`;
      case 'partner half free':
        return `meets ${names}, half of which reaches nothing held,`;
      case 'single plate hinges':
        return `finds at ${names} only a plate, which is a hinge`;
      case 'not joined':
        return reason.marked
          ? `is not joined to ${names}`
          : `has an unmarked crossing with ${names}, taken as not joined`;
      case 'hung':
        return `only hangs from ${names}`;
      case 'line free along itself':
        return `takes ${names} along, free to move along itself`;
      case 'bar ends here, itself free':
        return `takes ${names} along, itself free`;
      case 'nearly along the bar':
        return `finds ${names} within 10° of its own line`;
      default:
        return `is not held at ${names}`;
    }
  });
}

/** "D1's", and "D1 and D3's" for several: they are told apart by the marks. */
function possessive(names: string): string {
  return `${names}'s`;
}

function phrases(
  claims: readonly Claim[],
  nameOf: NameOf,
  say: (reason: HoldReason, names: string) => string,
): string {
  const byPhrase = new Map<string, { readonly reason: HoldReason; readonly names: string[] }>();
  for (const { reason } of claims) {
    const key = reason.kind === 'not joined' ? `${reason.kind} ${reason.marked}` : reason.kind;
    const group = byPhrase.get(key) ?? { reason, names: [] };
    group.names.push(nameOf(holderNamed(reason)));
    byPhrase.set(key, group);
  }
  return [...byPhrase.values()].map(({ reason, names }) => say(reason, listed(names))).join(' and ');
}

function holderNamed(reason: HoldReason): string {
  switch (reason.kind) {
    case 'end':
      return 'the end';
    case 'partner end-on':
    case 'partner half free':
    case 'partner only bends':
    case 'single plate hinges':
    case 'not joined':
      return reason.partner;
    case 'hung':
    case 'line held along itself':
    case 'line free along itself':
    case 'line stiff across':
    case 'twist held':
      return reason.line;
    case 'bar ends here':
    case 'bar ends here, itself free':
      return reason.bar;
    case 'nearly along the bar':
      return reason.holder;
    default:
      return reason satisfies never;
  }
}
