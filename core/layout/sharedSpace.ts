import { add, dot, scale, subtract, type Vec3 } from '../geometry/vector.ts';
import type { AngleBar, Bar, BarId, Layout } from './model.ts';

/** Two bars of angle that lie along each other with their steel in one place. */
export interface SharedSpace {
  readonly a: BarId;
  readonly b: BarId;
  /** How far along the bars both are there, mm. */
  readonly along: number;
  /** How deep one lies in the other, mm: the lesser of the two ways. */
  readonly deep: number;
}

/** Sine of the angle up to which bars lie along each other; beyond it they cross. As for crossings. */
const ALONG = 0.02;
/** Steel that shares less than this is only near, mm: gussets and fits take it up (common practice, no source). */
const TOUCHES = 1;
/** Ends may run past each other by this much, mm. */
const AT_AN_END = 5;

/**
 * Bars of angle of the whole project whose steel is in one place, in order. Crossings leave these out, because bars along each other do not
 * cross. Each bar is told of with the next one only, so that a hundred bays in one place make a hundred pairs and not five thousand. Sorted
 * along the direction in which the project is longest, so that a row of bays costs no more than its neighbours.
 */
export function sharedSpaces(layout: Layout): readonly SharedSpace[] {
  const steel = [...layout.bars.values()].flatMap((bar, order) => steelOf(bar, order) ?? []);
  const axis = longestAxis(steel);
  const sorted = steel.toSorted((p, q) => p.low[axis] - q.low[axis] || p.order - q.order);
  const found: { readonly shared: SharedSpace; readonly order: number }[] = [];
  sorted.forEach((first, position) => {
    for (let k = position + 1; k < sorted.length; k++) {
      const second = sorted[k];
      if (!second || second.low[axis] > first.high[axis]) return;
      const [p, q] = first.order < second.order ? [first, second] : [second, first];
      const shared = boxesMeet(p, q) ? sharedBy(p, q) : null;
      if (!shared) continue;
      found.push({ shared, order: p.order });
      return;
    }
  });
  return found.sort((p, q) => p.order - q.order).map(({ shared }) => shared);
}

interface Steel {
  readonly bar: Bar;
  readonly angle: AngleBar;
  readonly order: number;
  /** Heel and both toes of the section, from the set-out line. */
  readonly corners: readonly Vec3[];
  readonly low: Vec3;
  readonly high: Vec3;
}

function steelOf(bar: Bar, order: number): Steel | null {
  const { angle } = bar;
  if (!angle?.stock || angle.cut.total <= 0) return null;
  const { outline } = angle.stock;
  const { heel, x, y } = angle.placement;
  const corners = [heel, add(heel, scale(x, outline.shortLeg)), add(heel, scale(y, outline.longLeg))];
  return {
    bar,
    angle,
    order,
    corners,
    low: reachOf(bar, corners, Math.min),
    high: reachOf(bar, corners, Math.max),
  };
}

/** Least or greatest coordinates of a bar's steel: those of its ends and of its section come together. */
function reachOf(bar: Bar, corners: readonly Vec3[], of: (a: number, b: number) => number): Vec3 {
  const along = (axis: 0 | 1 | 2): number =>
    of(bar.from[axis], bar.to[axis]) +
    corners.reduce((most, corner) => of(most, corner[axis]), corners[0]?.[axis] ?? 0);
  return [along(0), along(1), along(2)];
}

function longestAxis(steel: readonly Steel[]): 0 | 1 | 2 {
  const reach = ([0, 1, 2] as const).map((axis) => {
    let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
    for (const each of steel) {
      low = Math.min(low, each.low[axis]);
      high = Math.max(high, each.high[axis]);
    }
    return { axis, size: high - low };
  });
  return reach.reduce((most, each) => (each.size > most.size ? each : most)).axis;
}

function boxesMeet(p: Steel, q: Steel): boolean {
  return (
    p.low[0] <= q.high[0] &&
    q.low[0] <= p.high[0] &&
    p.low[1] <= q.high[1] &&
    q.low[1] <= p.high[1] &&
    p.low[2] <= q.high[2] &&
    q.low[2] <= p.high[2]
  );
}

function sharedBy(p: Steel, q: Steel): SharedSpace | null {
  const { direction, from } = p.bar;
  const cosine = dot(direction, q.bar.direction);
  if (1 - cosine * cosine > ALONG * ALONG) return null;
  const apart = subtract(q.bar.from, from);
  const starts = dot(apart, direction);
  // Along p; q may run the other way.
  const [qLow, qHigh] = inOrder(
    starts + cosine * q.angle.cut.startsAt,
    starts + cosine * (q.bar.length - q.angle.cut.endsBefore),
  );
  const low = Math.max(p.angle.cut.startsAt, qLow);
  const high = Math.min(p.bar.length - p.angle.cut.endsBefore, qHigh);
  if (high - low < AT_AN_END) return null;
  const middle = (low + high) / 2;
  const between = subtract(
    add(q.bar.from, scale(q.bar.direction, (middle - starts) / cosine)),
    add(from, scale(direction, middle)),
  );
  const { inPlane, outOfPlane } = p.angle.placement;
  const deep = Math.min(
    ...[inPlane, outOfPlane].map((way) => {
      const mine = p.corners.map((corner) => dot(corner, way));
      const other = q.corners.map((corner) => dot(add(corner, between), way));
      return (
        Math.min(Math.max(...mine), Math.max(...other)) - Math.max(Math.min(...mine), Math.min(...other))
      );
    }),
  );
  return deep > TOUCHES ? { a: p.bar.id, b: q.bar.id, along: high - low, deep } : null;
}

const inOrder = (a: number, b: number): readonly [number, number] => (a < b ? [a, b] : [b, a]);
