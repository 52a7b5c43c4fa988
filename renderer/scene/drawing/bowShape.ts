import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, along, dot, scale } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar, Plane } from '../../../core/layout/model.ts';
import type { Restraint } from '../../../core/restraint/model.ts';

/** Height of the drawn bow over its length. A picture of the direction, not of an amount. */
const RISE = 0.1;

/** The governing bow of a bar, as it is drawn: a half sine between two places along the set-out line. */
export interface BowShape {
  /** mm from end i. */
  readonly from: number;
  readonly to: number;
  /** Unit vector in space in which the bar moves. */
  readonly direction: Vec3;
  /** At the middle, mm. */
  readonly rise: number;
}

/**
 * How the bar bows by the marks: over the governing length, in its free direction. Where every way is free it goes over its least radius,
 * the motion of lane v. Where the figure is a bound for mixed holds there is no one span, and the whole bar is drawn.
 */
export function bowShape(
  bar: Bar,
  angle: AngleBar,
  restraint: Restraint,
  plane: Plane | undefined,
): BowShape {
  const { governing, lanes } = restraint;
  const laneMotion = governing.axis === 'free' ? lanes.v.motion : lanes[governing.axis].motion;
  const direction = towardsViewer(inSpace(angle, governing.freeDirection ?? laneMotion), plane);
  const [from, to] = governing.basis === 'mixed bound' ? [0, bar.length] : [governing.from, governing.to];
  return { from, to, direction, rise: RISE * (to - from) };
}

/** A direction of the section plane in space. */
export function inSpace(angle: AngleBar, direction: Vec2): Vec3 {
  return add(scale(angle.placement.x, direction[0]), scale(angle.placement.y, direction[1]));
}

/** A bow goes both ways; it is drawn to the near side of the plane, or up the plane when it stays in it. */
function towardsViewer(direction: Vec3, plane: Plane | undefined): Vec3 {
  if (!plane) return direction;
  const out = dot(direction, plane.normal);
  const side = Math.abs(out) > 0.3 ? out : dot(direction, plane.up);
  return side < 0 ? scale(direction, -1) : direction;
}

/** A point of the bowed line, `part` (0…1) along the bow, with the bow at `grown` (0…1) of its rise. */
export function bowedPoint(bar: Bar, bow: BowShape, part: number, grown: number): Vec3 {
  const at = along(bar.from, bar.direction, bow.from + part * (bow.to - bow.from));
  return along(at, bow.direction, bow.rise * grown * Math.sin(Math.PI * part));
}
