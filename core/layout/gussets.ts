import { along, dot, scale, type Vec3 } from '../geometry/vector.ts';
import { legInPlaneOf } from './angleBar.ts';
import type { AngleBar, Bar, Gusset, Plane } from './model.ts';

/** Steel of the plate beyond the last bolt and beside the leg, mm: for drawing, not for design. */
const MARGIN = 40;
/** A bar nearer than this to level or upright has a strip for a plate, not a corner: the sine of some 3°. */
const ALONG_AN_EDGE = 0.05;

/** A plate at each end of a diagonal, large enough for its bolts: drawn, not designed. */
export function gussetsOf(bar: Bar, plane: Plane): readonly Gusset[] {
  const { angle } = bar;
  if (!angle || angle.spec.gusset === 0) return [];
  return (['i', 'j'] as const).map((end) => ({
    node: end === 'i' ? bar.i : bar.j,
    plane: plane.id,
    thickness: angle.spec.gusset,
    ...plateOf(bar, angle, plane, end),
  }));
}

function plateOf(
  bar: Bar,
  angle: AngleBar,
  plane: Plane,
  end: 'i' | 'j',
): Pick<Gusset, 'corners' | 'normal'> {
  const half = (angle.stock ? legInPlaneOf(angle.stock, angle.spec.legInPlane) : 70) / 2 + MARGIN / 2;
  const at = end === 'i' ? bar.from : bar.to;
  const outwards: Vec3 = end === 'i' ? bar.direction : scale(bar.direction, -1);
  const connection = angle.ends[end];
  const grip =
    connection.kind === 'bolted'
      ? (connection.bolts - 1) * connection.pitch + MARGIN
      : Math.max(connection.weldLength, MARGIN);
  const reach = connection.setBack + grip;
  const tip = along(at, outwards, reach);
  const { inPlane, outOfPlane } = angle.placement;
  const one = along(tip, inPlane, half);
  const other = along(tip, inPlane, -half);
  const across = dot(outwards, plane.right);
  const upwards = dot(outwards, plane.up);
  if (Math.min(Math.abs(across), Math.abs(upwards)) < ALONG_AN_EDGE)
    return { corners: [along(at, inPlane, half), one, other, along(at, inPlane, -half)], normal: outOfPlane };
  const foot = along(at, plane.right, Math.sign(across) * Math.max(Math.abs(across) * reach * 0.75, half));
  const head = along(at, plane.up, Math.sign(upwards) * Math.max(Math.abs(upwards) * reach * 0.75, half));
  // Go round the plate: the side of the tip that lies nearer the upright edge comes first.
  const oneIsHigher = dot(inPlane, plane.up) * upwards > 0;
  return {
    corners: [at, head, oneIsHigher ? one : other, oneIsHigher ? other : one, foot],
    normal: plane.normal,
  };
}
