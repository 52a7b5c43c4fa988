/** A bay's plane seen square-on from its near side: from mm in space to px on the sheet, y downwards. 96 px to the inch. */
import { cross, dot, length, subtract, unit, type Vec3 } from '../../geometry/vector.ts';
import type { Plane } from '../../layout/model.ts';

export type Point = readonly [number, number];

export interface ElevationView {
  readonly plane: Plane;
  /** px for one mm. */
  readonly scale: number;
  /** The drawing's scale on paper: 125 stands for 1 to 125. */
  readonly ratio: number;
  /** Of the plane's origin on the sheet, px. */
  readonly origin: Point;
}

export interface Room {
  readonly width: number;
  readonly height: number;
  /** Kept free around the steel for dimensions, px. */
  readonly margins: {
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly bottom: number;
  };
}

export interface Extent {
  readonly left: number;
  readonly right: number;
  readonly bottom: number;
  readonly top: number;
}

const PX_PER_MM_OF_PAPER = 96 / 25.4;
const RATIOS = [10, 20, 25, 40, 50, 75, 100, 125, 150, 175, 200, 250, 300, 400, 500, 750, 1000];

/** mm in the plane: to the right and up from its origin. */
export function inPlane(plane: Plane, at: Vec3): Point {
  const from = subtract(at, plane.origin);
  return [dot(from, plane.right), dot(from, plane.up)];
}

/** What the points take up in the plane, mm; nothing for no points. */
export function extentOf(plane: Plane, points: readonly Vec3[]): Extent {
  const flat = points.map((at) => inPlane(plane, at));
  const [rights, ups] = [flat.map(([right]) => right), flat.map(([, up]) => up)];
  if (flat.length === 0) return { left: 0, right: 0, bottom: 0, top: 0 };
  return {
    left: Math.min(...rights),
    right: Math.max(...rights),
    bottom: Math.min(...ups),
    top: Math.max(...ups),
  };
}

/** The largest usual scale at which the extent fits the room, the steel's lower left corner just inside the margins. */
export function viewOf(plane: Plane, extent: Extent, room: Room): ElevationView {
  const { margins } = room;
  const fits = Math.min(
    (room.width - margins.left - margins.right) / Math.max(extent.right - extent.left, 1),
    (room.height - margins.top - margins.bottom) / Math.max(extent.top - extent.bottom, 1),
  );
  const ratio =
    RATIOS.find((candidate) => PX_PER_MM_OF_PAPER / candidate <= fits) ?? PX_PER_MM_OF_PAPER / fits;
  const pxPerMm = PX_PER_MM_OF_PAPER / ratio;
  return {
    plane,
    scale: pxPerMm,
    ratio,
    origin: [margins.left - extent.left * pxPerMm, margins.top + extent.top * pxPerMm],
  };
}

export function toSheet(view: ElevationView, at: Vec3): Point {
  const [right, up] = inPlane(view.plane, at);
  return [view.origin[0] + right * view.scale, view.origin[1] - up * view.scale];
}

/** The direction in the plane at right angles to a bar's own, a quarter turn anticlockwise on the sheet; null for a bar that is seen end-on. */
export function acrossOf(plane: Plane, direction: Vec3): Vec3 | null {
  const across = cross(plane.normal, direction);
  return length(across) < END_ON ? null : unit(across);
}

/** A bar whose direction is this near to the line of sight shows its section, not its length. */
const END_ON = 0.1;

export function sheetLength(from: Point, to: Point): number {
  return Math.hypot(to[0] - from[0], to[1] - from[1]);
}
