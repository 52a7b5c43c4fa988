import { distance, dot, subtract, type Vec3 } from '../geometry/vector.ts';
import type { Plane } from './model.ts';

/** A straight bar as the finder of crossings sees it. */
export interface Segment {
  readonly id: string;
  readonly from: Vec3;
  readonly to: Vec3;
  readonly i: string;
  readonly j: string;
  readonly isDiagonal: boolean;
  /** Purlins and rails are crossed up to their very ends; other bars end in a node there. */
  readonly isLine: boolean;
}

/** Where two bars pass each other, seen along the normal of the plane. */
export interface Meeting {
  readonly a: string;
  readonly b: string;
  /** mm from the first end of each. */
  readonly onA: number;
  readonly onB: number;
  readonly at: Vec3;
  /** From a to b along the normal, mm. */
  readonly separation: number;
  /** Degrees, acute. */
  readonly angle: number;
}

/** A crossing nearer than this to the end of a bar is its end, mm. */
const AT_AN_END = 5;
/** Bars farther apart than this along the normal do not meet, mm. */
const TOO_FAR_APART = 600;

/**
 * All places where a diagonal passes another bar of its plane, in order of the bars given. Sorted along the plane's right,
 * so that a long row of bars costs no more than its neighbours.
 */
export function meetingsIn(plane: Plane, segments: readonly Segment[]): readonly Meeting[] {
  const flat = segments.map((segment, order) => flattened(plane, segment, order));
  const sorted = [...flat].sort((p, q) => p.least - q.least);
  const found: { meeting: Meeting; order: number }[] = [];
  sorted.forEach((first, position) => {
    for (let k = position + 1; k < sorted.length; k++) {
      const second = sorted[k];
      if (!second || second.least > first.most) break;
      if (!first.segment.isDiagonal && !second.segment.isDiagonal) continue;
      const [p, q] = first.order < second.order ? [first, second] : [second, first];
      const meeting = meetingOf(p, q);
      if (meeting) found.push({ meeting, order: p.order * segments.length + q.order });
    }
  });
  return found.sort((p, q) => p.order - q.order).map((each) => each.meeting);
}

interface Flat {
  readonly segment: Segment;
  readonly order: number;
  readonly from: readonly [number, number, number];
  readonly to: readonly [number, number, number];
  readonly least: number;
  readonly most: number;
  readonly length: number;
}

function flattened(plane: Plane, segment: Segment, order: number): Flat {
  const local = (at: Vec3): readonly [number, number, number] => {
    const d = subtract(at, plane.origin);
    return [dot(d, plane.right), dot(d, plane.up), dot(d, plane.normal)];
  };
  const from = local(segment.from);
  const to = local(segment.to);
  return {
    segment,
    order,
    from,
    to,
    least: Math.min(from[0], to[0]),
    most: Math.max(from[0], to[0]),
    length: distance(segment.from, segment.to),
  };
}

/** Of two bars of which one at least is a diagonal. */
function meetingOf(p: Flat, q: Flat): Meeting | null {
  const [a, b] = p.segment.isDiagonal ? [p, q] : [q, p];
  const { i, j } = a.segment;
  if (i === b.segment.i || i === b.segment.j || j === b.segment.i || j === b.segment.j) return null;
  const d: readonly [number, number] = [a.to[0] - a.from[0], a.to[1] - a.from[1]];
  const e: readonly [number, number] = [b.to[0] - b.from[0], b.to[1] - b.from[1]];
  const turn = d[0] * e[1] - d[1] * e[0];
  const seen = Math.hypot(d[0], d[1]) * Math.hypot(e[0], e[1]);
  // Nearly parallel bars lie along each other; they do not cross.
  if (Math.abs(turn) < 0.02 * seen || seen === 0) return null;
  const g: readonly [number, number] = [b.from[0] - a.from[0], b.from[1] - a.from[1]];
  const s = (g[0] * e[1] - g[1] * e[0]) / turn;
  const t = (g[0] * d[1] - g[1] * d[0]) / turn;
  const onA = s * a.length;
  const onB = t * b.length;
  if (onA < AT_AN_END || onA > a.length - AT_AN_END) return null;
  const margin = b.segment.isLine ? -AT_AN_END : AT_AN_END;
  if (onB < margin || onB > b.length - margin) return null;
  const heightA = a.from[2] + s * (a.to[2] - a.from[2]);
  const heightB = b.from[2] + t * (b.to[2] - b.from[2]);
  const separation = heightB - heightA;
  if (Math.abs(separation) > TOO_FAR_APART) return null;
  const { from, to } = a.segment;
  return {
    a: a.segment.id,
    b: b.segment.id,
    onA,
    onB,
    at: [from[0] + s * (to[0] - from[0]), from[1] + s * (to[1] - from[1]), from[2] + s * (to[2] - from[2])],
    separation,
    angle: (Math.asin(Math.min(1, Math.abs(turn) / seen)) * 180) / Math.PI,
  };
}
