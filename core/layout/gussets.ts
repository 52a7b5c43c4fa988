import { along, dot, type Vec3 } from '../geometry/vector.ts';
import { legInPlaneOf } from './angleBar.ts';
import type { Bar, Gusset, Plane } from './model.ts';

/** Steel of the plate beyond the last bolt and beside the leg, mm: for drawing, not for design. */
const MARGIN = 40;

/** A plate at each end of a diagonal, large enough for its bolts: drawn, not designed. */
export function gussetsOf(bar: Bar, plane: Plane): readonly Gusset[] {
  const { angle } = bar;
  if (!angle || angle.spec.gusset === 0) return [];
  const half = (angle.stock ? legInPlaneOf(angle.stock, angle.spec.legInPlane) : 70) / 2 + MARGIN / 2;
  return (['i', 'j'] as const).map((end) => {
    const at = end === 'i' ? bar.from : bar.to;
    const outwards: Vec3 =
      end === 'i' ? bar.direction : [-bar.direction[0], -bar.direction[1], -bar.direction[2]];
    const connection = angle.ends[end];
    const grip =
      connection.kind === 'bolted'
        ? (connection.bolts - 1) * connection.pitch + MARGIN
        : Math.max(connection.weldLength, MARGIN);
    const reach = connection.setBack + grip;
    const tip = along(at, outwards, reach);
    const { inPlane } = angle.placement;
    const across = dot(outwards, plane.right);
    const upwards = dot(outwards, plane.up);
    const foot = along(at, plane.right, Math.sign(across) * Math.max(Math.abs(across) * reach * 0.75, half));
    const head = along(at, plane.up, Math.sign(upwards) * Math.max(Math.abs(upwards) * reach * 0.75, half));
    const one = along(tip, inPlane, half);
    const other = along(tip, inPlane, -half);
    // Go round the plate: the side of the tip that lies nearer the upright edge comes first.
    const oneIsHigher = dot(inPlane, plane.up) * Math.sign(upwards || 1) > 0;
    return {
      node: end === 'i' ? bar.i : bar.j,
      plane: plane.id,
      corners: [at, head, oneIsHigher ? one : other, oneIsHigher ? other : one, foot],
      thickness: angle.spec.gusset,
      normal: plane.normal,
    };
  });
}
