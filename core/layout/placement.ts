import { add, cross, dot, length, scale, turned, unit, type Vec3 } from '../geometry/vector.ts';
import type { DiagonalSpec } from '../project/model.ts';
import type { Placement, Plane } from './model.ts';

export interface PlacementInput {
  readonly direction: Vec3;
  readonly plane: Plane;
  readonly spec: Pick<DiagonalSpec, 'legInPlane' | 'heel' | 'gusset'>;
  readonly side: 'near' | 'far';
  /** Degrees. */
  readonly roll: number;
  readonly gauge: number;
  /** From the plane to the face that lies on the gusset, mm; below 0 where the gusset goes through the middle of the shape. */
  readonly standsOff: number;
}

/**
 * Where the section sits: the leg in the plane lies flat on its face of the gusset, heel at the upper or lower edge,
 * the other leg stands out from that face; the line of bolts runs along the set-out line.
 */
export function placementOf(input: PlacementInput): Placement {
  const { direction, plane, spec, side } = input;
  const inPlane = acrossBar(direction, plane);
  const outOfPlane = cross(direction, inPlane);
  const above = dot(inPlane, plane.up);
  // Of a bar straight up the plane neither edge is the upper one: "up" is then the right edge.
  const towardsUp = Math.abs(above) > 1e-6 ? above > 0 : dot(inPlane, plane.right) > 0;
  const legUpwards = spec.heel === 'down';
  const leg = towardsUp === legUpwards ? inPlane : scale(inPlane, -1);
  const standing = side === 'near' ? outOfPlane : scale(outOfPlane, -1);
  const roll = (input.roll * Math.PI) / 180;
  const legTurned = roll === 0 ? leg : turned(leg, direction, roll);
  const standingTurned = roll === 0 ? standing : turned(standing, direction, roll);
  const longerIn = spec.legInPlane === 'longer';
  return {
    x: longerIn ? standingTurned : legTurned,
    y: longerIn ? legTurned : standingTurned,
    inPlane,
    outOfPlane,
    heel: add(scale(legTurned, -input.gauge), scale(standing, input.standsOff)),
    gauge: input.gauge,
  };
}

/** In the plane, across the bar: n × e. A bar that stands out of its plane altogether takes the plane's own right. */
function acrossBar(direction: Vec3, plane: Plane): Vec3 {
  const across = cross(plane.normal, direction);
  return length(across) > 1e-6 ? unit(across) : plane.right;
}
