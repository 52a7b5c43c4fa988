import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, cross, dot, scale } from '../../../core/geometry/vector.ts';

/** A straight solid of constant section: an outline in the plane of x and y, carried along the axis. Lengths mm. */
export interface Prism {
  /** Closed, anticlockwise in [x, y], the first point not repeated. */
  readonly outline: readonly Vec2[];
  /** Where the outline's [0, 0] lies at `from` = 0. */
  readonly origin: Vec3;
  /** Unit vectors; x and y at right angles to each other and to the axis. x × y may run along the axis or against it. */
  readonly x: Vec3;
  readonly y: Vec3;
  readonly axis: Vec3;
  readonly from: number;
  readonly to: number;
  /** Whether the ends are closed and outlined; a member that runs on into the next is open there. */
  readonly endAtFrom: boolean;
  readonly endAtTo: boolean;
}

/** A flat face: corners anticlockwise seen from outside, with the outward unit normal. */
export interface Face {
  readonly corners: readonly Vec3[];
  readonly normal: Vec3;
}

/** An outline of the solid. Fine ones (inner corners) fade when the drawing is too small for them. */
export interface Edge {
  readonly from: Vec3;
  readonly to: Vec3;
  readonly fine: boolean;
}

/** A corner of the outline sharper than this gets a line along the solid; an arc drawn in chords of less gets none. Degrees. */
const LINED_CORNER = 30;

/** A point of the section at a distance along the axis, in space. */
export function pointOf({ origin, x, y, axis }: Prism, [u, v]: Vec2, along: number): Vec3 {
  // Written out: this runs for every corner of every bar, and vectors made on the way would cost more than the sums.
  return [
    origin[0] + x[0] * u + y[0] * v + axis[0] * along,
    origin[1] + x[1] * u + y[1] * v + axis[1] * along,
    origin[2] + x[2] * u + y[2] * v + axis[2] * along,
  ];
}

/** Whether x × y runs along the axis; if not, the outline is clockwise seen from the end `to`. */
function rightHanded(prism: Prism): boolean {
  return dot(cross(prism.x, prism.y), prism.axis) > 0;
}

/** The long faces of a prism, one for each side of the outline. */
export function sideFaces(prism: Prism): readonly Face[] {
  const facing = rightHanded(prism);
  const near = prism.outline.map((p) => pointOf(prism, p, prism.from));
  const far = prism.outline.map((p) => pointOf(prism, p, prism.to));
  return sides(prism.outline).map(([p, q, at, next]) => {
    const [a, b, c, d] = [near[at], near[next], far[next], far[at]];
    if (!a || !b || !c || !d) throw new Error('a side beyond the outline');
    const l = Math.hypot(q[0] - p[0], q[1] - p[1]);
    // Outward is to the right of an anticlockwise side, whichever way x × y runs in space.
    const normal = add(scale(prism.x, (q[1] - p[1]) / l), scale(prism.y, (p[0] - q[0]) / l));
    return { corners: facing ? [a, b, c, d] : [a, d, c, b], normal };
  });
}

/** A closed end: the whole outline, which need not be convex. `reversed`: its corners run against the outline's order. */
export interface EndFace extends Face {
  readonly reversed: boolean;
}

/** The closed ends of a prism. */
export function endFaces(prism: Prism): readonly EndFace[] {
  const facing = rightHanded(prism);
  const end = (along: number, normal: Vec3, reversed: boolean): EndFace => {
    const corners = prism.outline.map((p) => pointOf(prism, p, along));
    return { corners: reversed ? corners.toReversed() : corners, normal, reversed };
  };
  const faces: EndFace[] = [];
  if (prism.endAtFrom) faces.push(end(prism.from, scale(prism.axis, -1), facing));
  if (prism.endAtTo) faces.push(end(prism.to, prism.axis, !facing));
  return faces;
}

/** The lines that outline a prism: along its sharp corners and round its closed ends. */
export function edgesOf(prism: Prism): readonly Edge[] {
  const edges: Edge[] = [];
  for (const { corner, fine } of linedCorners(prism.outline))
    edges.push({ from: pointOf(prism, corner, prism.from), to: pointOf(prism, corner, prism.to), fine });
  const round = (along: number): void => {
    for (const [p, q] of sides(prism.outline))
      edges.push({ from: pointOf(prism, p, along), to: pointOf(prism, q, along), fine: false });
  };
  if (prism.endAtFrom) round(prism.from);
  if (prism.endAtTo) round(prism.to);
  return edges;
}

interface LinedCorner {
  readonly corner: Vec2;
  readonly fine: boolean;
}

/** Corners found so far; bars of one section share an outline. */
const lined = new WeakMap<readonly Vec2[], readonly LinedCorner[]>();

/** The corners of an outline that get a line along the solid: full ones at the corners of its box, fine ones elsewhere. */
function linedCorners(outline: readonly Vec2[]): readonly LinedCorner[] {
  const known = lined.get(outline);
  if (known) return known;
  const box = boxOf(outline);
  const found = outline.flatMap((corner, index): readonly LinedCorner[] => {
    if (turnAt(outline, index) < LINED_CORNER) return [];
    return [{ corner, fine: !(isAt(corner[0], box.minX, box.maxX) && isAt(corner[1], box.minY, box.maxY)) }];
  });
  lined.set(outline, found);
  return found;
}

/** From corner, to corner, and their places in the outline. */
type Side = readonly [Vec2, Vec2, number, number];

function sides(outline: readonly Vec2[]): readonly Side[] {
  return outline.map((p, at): Side => {
    const next = (at + 1) % outline.length;
    return [p, outline[next] ?? p, at, next];
  });
}

/** How much the outline turns at a corner, degrees, whichever way. */
function turnAt(outline: readonly Vec2[], index: number): number {
  const here = outline[index];
  const before = outline[(index + outline.length - 1) % outline.length];
  const after = outline[(index + 1) % outline.length];
  if (!here || !before || !after) return 0;
  const a = Math.atan2(here[1] - before[1], here[0] - before[0]);
  const b = Math.atan2(after[1] - here[1], after[0] - here[0]);
  const turn = Math.abs(((b - a) * 180) / Math.PI) % 360;
  return turn > 180 ? 360 - turn : turn;
}

export interface SectionBox {
  readonly minX: number;
  readonly maxX: number;
  readonly minY: number;
  readonly maxY: number;
}

/** The smallest upright box round an outline. */
export function boxOf(outline: readonly Vec2[]): SectionBox {
  const xs = outline.map((p) => p[0]);
  const ys = outline.map((p) => p[1]);
  return { minX: Math.min(...xs), maxX: Math.max(...xs), minY: Math.min(...ys), maxY: Math.max(...ys) };
}

/** Within a micrometre of either end: coordinates of the same corner differ by rounding alone. */
function isAt(value: number, low: number, high: number): boolean {
  return Math.abs(value - low) < 1e-3 || Math.abs(value - high) < 1e-3;
}
