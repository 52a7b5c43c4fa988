/** Frames put together by hand, in any position in space. */
import fc from 'fast-check';
import type { Frame, FrameElement, FrameNode, FrameSpring, Release } from '../../../core/frame/model.ts';
import {
  add,
  cross,
  distance,
  dot,
  scale,
  subtract,
  unit,
  type Vec3,
} from '../../../core/geometry/vector.ts';

export const E = 210_000;
export const G = 81_000;

/** N·mm², N: unlike each other, so that no two can be taken for one another. */
export const STIFFNESS = { EIp: 3.1e10, EIq: 1.23e11, EA: 1.7e8, GJ: 7.9e8 };

/** Three unit vectors square to each other, right-handed. */
export interface Axes {
  readonly e: Vec3;
  readonly p: Vec3;
  readonly q: Vec3;
}

/** Any direction and any turn about it. */
export const anyAxes: fc.Arbitrary<Axes> = fc
  .tuple(
    fc.integer({ min: -89, max: 89 }),
    fc.integer({ min: -180, max: 180 }),
    fc.integer({ min: -180, max: 180 }),
  )
  .map(([rise, way, roll]) => {
    const rad = (degrees: number): number => (degrees * Math.PI) / 180;
    const [r, w, t] = [rad(rise), rad(way), rad(roll)];
    const e: Vec3 = [Math.cos(r) * Math.cos(w), Math.cos(r) * Math.sin(w), Math.sin(r)];
    const a = unit(cross([0, 0, 1], e));
    const b = cross(e, a);
    const p = add(scale(a, Math.cos(t)), scale(b, Math.sin(t)));
    return { e, p, q: cross(e, p) };
  });

export const node = (at: Vec3, index: number, fixed = false): FrameNode => ({
  name: `n${index}`,
  at,
  movesWith: index,
  fixed,
});

/** @param releases by end and axis of turning */
export function element(
  nodes: readonly FrameNode[],
  [i, j]: readonly [number, number],
  p: Vec3,
  change: Partial<FrameElement> = {},
  releases: readonly Release[] = [],
): FrameElement {
  const [from, to] = [nodes[i]?.at, nodes[j]?.at];
  if (!from || !to) throw new Error(`no nodes ${i} and ${j}`);
  const direction = unit(subtract(to, from));
  const square = unit(subtract(p, scale(direction, dot(p, direction))));
  return {
    bar: `b${i}-${j}`,
    i,
    j,
    length: distance(from, to),
    direction,
    p: square,
    q: cross(direction, square),
    ...STIFFNESS,
    releases,
    tension: 0,
    ...change,
  };
}

export const frame = (
  nodes: readonly FrameNode[],
  elements: readonly FrameElement[],
  springs: readonly FrameSpring[] = [],
): Frame => ({ nodes, elements, springs, along: new Map() });

/** A straight bar from the origin, with nodes at the given places along it; the first and last fixed or not. */
export function line(
  { e, p }: Axes,
  places: readonly number[],
  fixed: { readonly first: boolean; readonly last: boolean },
  change: Partial<FrameElement> = {},
  releases: { readonly first?: readonly Vec3[]; readonly last?: readonly Vec3[] } = {},
): Frame {
  const last = places.length - 1;
  const nodes = places.map((at, k) =>
    node(scale(e, at), k, (k === 0 && fixed.first) || (k === last && fixed.last)),
  );
  const elements = places.slice(1).map((_, k) => {
    const own: Release[] = [
      ...(k === 0 ? (releases.first ?? []) : []).map((about) => ({ end: 'i', about }) as const),
      ...(k === last - 1 ? (releases.last ?? []) : []).map((about) => ({ end: 'j', about }) as const),
    ];
    return element(nodes, [k, k + 1], p, change, own);
  });
  return frame(nodes, elements);
}
