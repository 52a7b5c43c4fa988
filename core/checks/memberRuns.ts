import { dot } from '../geometry/vector.ts';
import type { Bar, BayLayout, Layout } from '../layout/model.ts';
import type { MemberLengths } from './model.ts';

/** Cosine of a degree: within it two members run through. */
const IN_LINE = Math.cos(Math.PI / 180);

/** Struts and beams of a bay: what is checked for compression beside its diagonals. */
export function squeezedMembers(bay: BayLayout, layout: Layout): readonly Bar[] {
  return bay.bars.flatMap((id) => {
    const bar = layout.bars.get(id);
    return bar && (bar.role === 'strut' || bar.role === 'beam') ? [bar] : [];
  });
}

/**
 * Lengths between what holds each of them. Out of the plane one runs over its whole line, from end to end of the members that go on in it; so it does in the plane, but where a
 * diagonal counted on both ways ends on it. What stands on it or hangs from it from outside the bay is not counted on.
 */
export function memberLengths(
  bay: BayLayout,
  layout: Layout,
  members: readonly Bar[],
): ReadonlyMap<string, MemberLengths> {
  const holding = new Set(
    bay.diagonals.flatMap((id) => {
      const bar = layout.bars.get(id);
      return bar?.angle?.spec.countedOn === 'both' ? [bar.i, bar.j] : [];
    }),
  );
  const at = new Map<string, Bar[]>();
  for (const bar of members) for (const node of [bar.i, bar.j]) at.set(node, [...(at.get(node) ?? []), bar]);
  const nextAt = (node: string, bar: Bar): Bar | undefined =>
    at.get(node)?.find((other) => other !== bar && Math.abs(dot(other.direction, bar.direction)) > IN_LINE);
  /** How far the line goes on beyond a node, up to what stops it. */
  const beyond = (from: Bar, start: string, stops: (node: string) => boolean): number => {
    const seen = new Set([from]);
    let length = 0;
    let node = start;
    let bar = nextAt(node, from);
    while (bar && !seen.has(bar) && !stops(node)) {
      seen.add(bar);
      length += bar.length;
      node = bar.i === node ? bar.j : bar.i;
      bar = nextAt(node, bar);
    }
    return length;
  };
  const whole = (bar: Bar, stops: (node: string) => boolean): number =>
    bar.length + beyond(bar, bar.i, stops) + beyond(bar, bar.j, stops);
  return new Map(
    members.map((bar) => [
      bar.id,
      {
        inPlane: whole(bar, (node) => holding.has(node)),
        outOfPlane: whole(bar, () => false),
        onEdge: bar.role === 'beam',
      },
    ]),
  );
}
