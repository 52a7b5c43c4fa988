import { along, distance, dot, subtract, unit2 } from '../geometry/vector.ts';
import type { AngleBar, Bar, Crossing, Layout } from '../layout/model.ts';
import type { EndConnection, EndHolds, Settings } from '../project/model.ts';
import { type ClaimContext, claimsAt, HOLDS_FROM, inSection } from './claims.ts';
import { heldBy } from './directions.ts';
import { endsHoldOf } from './endWords.ts';
import type { Claim, Station } from './model.ts';
import { labelOf, trailFromNode } from './trails.ts';

/** Marks nearer than this along a bar make one station, mm. */
const ONE_STATION = 1;

/**
 * The stations of a bar in order, both ends included; `at` in mm from the set-out point i.
 * Lengths run between set-out points or between the centres of the end connections, as the project says.
 */
export function stationsOf(
  context: ClaimContext,
  bar: Bar,
  angle: AngleBar,
  crossings: readonly Crossing[],
  ending: readonly Bar[],
  basis: Settings['lengthBasis'],
): readonly Station[] {
  const first = basis === 'set-out' ? 0 : centreOf(angle.ends.i);
  const last = bar.length - (basis === 'set-out' ? 0 : centreOf(angle.ends.j));
  const marks = [
    ...crossings.map((crossing) => ({
      at: crossing.a === bar.id ? crossing.onA : crossing.onB,
      label: labelAcross(context.layout, crossing, bar),
      crossing: crossing.id,
      claims: claimsAt(context, crossing, bar, angle),
    })),
    ...ending.flatMap((other) => endMark(context, bar, angle, other)),
  ]
    .filter((mark) => mark.at > first + ONE_STATION && mark.at < last - ONE_STATION)
    .sort((p, q) => p.at - q.at);

  const inner: Station[] = [];
  for (const mark of marks) {
    const before = inner.at(-1);
    const joins = before !== undefined && mark.at - before.at <= ONE_STATION;
    const claims = joins ? [...before.claims, ...mark.claims] : mark.claims;
    const station: Station = {
      at: joins ? before.at : mark.at,
      label: joins ? `${before.label}·${mark.label}` : mark.label,
      crossings: [...(joins ? before.crossings : []), ...(mark.crossing ? [mark.crossing] : [])],
      claims,
      held: heldBy(claims.flatMap((claim) => (claim.counted && claim.vector ? [claim.vector] : []))),
      twistHeld: claims.some((claim) => claim.counted && claim.direction === 'twist'),
    };
    if (joins) inner[inner.length - 1] = station;
    else inner.push(station);
  }
  return [endStation(angle, 'i', first), ...inner, endStation(angle, 'j', last)];
}

function centreOf(end: EndConnection): number {
  return end.kind === 'bolted'
    ? end.setBack + ((end.bolts - 1) * end.pitch) / 2
    : end.setBack + end.weldLength / 2;
}

function endStation(angle: AngleBar, end: 'i' | 'j', at: number): Station {
  const marked = endsHoldOf(angle)[end];
  const claim = (direction: 'in plane' | 'out of plane'): Claim => {
    const counted = endHolds(marked, direction);
    return {
      source: 'end',
      join: 'end',
      holder: null,
      direction,
      vector: unit2(
        inSection(angle, direction === 'in plane' ? angle.placement.inPlane : angle.placement.outOfPlane),
      ),
      counted,
      reason: counted ? { kind: 'end' } : { kind: 'end marked free', end },
      trail: [],
    };
  };
  const claims = [claim('in plane'), claim('out of plane')];
  return {
    at,
    label: end,
    crossings: [],
    claims,
    held: heldBy(claims.flatMap(({ counted, vector }) => (counted && vector ? [vector] : []))),
    twistHeld: true,
  };
}

/** Whether an end that is marked so stops the bar from moving across itself this way. */
export function endHolds(marked: EndHolds, direction: 'in plane' | 'out of plane'): boolean {
  switch (marked) {
    case 'both':
      return true;
    case 'in plane only':
      return direction === 'in plane';
    case 'out of plane only':
      return direction === 'out of plane';
    case 'nothing':
      return false;
    default:
      return marked satisfies never;
  }
}

function labelAcross(layout: Layout, crossing: Crossing, bar: Bar): string {
  const other = layout.bars.get(crossing.a === bar.id ? crossing.b : crossing.a);
  if (!other) return '?';
  const named = other.angle || other.line || other.role === 'purlin' || other.role === 'rail';
  return named ? other.mark : other.role;
}

/** A bar that ends on this one holds it along itself, if its other end is held: a knee or fly brace, "as its geometry gives". */
function endMark(context: ClaimContext, bar: Bar, angle: AngleBar, other: Bar) {
  const touches = [other.i, other.j].find((node) => nodeLiesOn(context.layout, node, bar));
  const node = context.layout.nodes.get(touches ?? '');
  const holding = context.holdings.get(bar.bay);
  if (touches === undefined || !node || !holding) return [];
  const at = dot(subtract(node.at, bar.from), bar.direction);
  const far = touches === other.i ? other.j : other.i;
  const square = subtract(
    other.direction,
    along([0, 0, 0], bar.direction, dot(other.direction, bar.direction)),
  );
  const seen = inSection(angle, square);
  const near = Math.hypot(seen[0], seen[1]) < HOLDS_FROM;
  const held = holding.held.has(far);
  const claim: Claim = {
    source: other.id,
    join: 'bar end',
    holder: other.id,
    direction: 'along holder',
    vector: near ? null : unit2(seen),
    counted: held && !near,
    reason: near
      ? { kind: 'nearly along the bar', holder: other.mark }
      : held
        ? { kind: 'bar ends here', bar: other.mark }
        : { kind: 'bar ends here, itself free', bar: other.mark, node: labelOf(context.layout, far) },
    trail: [
      { text: `along ${other.mark}`, bar: other.id, node: null, state: 'on the way' },
      ...trailFromNode(context.layout, holding, far),
    ],
  };
  return [{ at, label: other.mark, crossing: null, claims: [claim] }];
}

/** A node is on a bar when it is within this of its line, mm. */
export const ON_THE_BAR = 5;

export function nodeLiesOn(layout: Layout, node: string, bar: Bar): boolean {
  const at = layout.nodes.get(node)?.at;
  if (!at) return false;
  const s = dot(subtract(at, bar.from), bar.direction);
  if (s < ON_THE_BAR || s > bar.length - ON_THE_BAR) return false;
  return distance(at, along(bar.from, bar.direction, s)) <= ON_THE_BAR;
}
