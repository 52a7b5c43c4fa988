import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import {
  add,
  along,
  cross,
  distance,
  dot,
  length,
  scale,
  subtract,
  unit,
} from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar, BayLayout, Crossing, Gusset, Layout } from '../../../core/layout/model.ts';
import { legInPlaneSize } from './angleParts.ts';
import { boxOf, type Prism } from './prism.ts';
import type { AngleScale } from './steelPart.ts';

/** How far the plate of a cut bar laps on each half, and how much wider than the leg it is, mm. */
const PLATE_LAP = 160;
const PLATE_EDGE = 20;
const PLATE_THICKNESS = 10;

/** Side of a packer, and of the cleat or hanger to a purlin, mm. */
const PACKER = 80;
const CLEAT = 60;
const CLEAT_THICKNESS = 8;

/** Side and thickness of a column's base plate beyond the column, mm. */
const BASE_EDGE = 60;
const BASE_THICKNESS = 25;

/** Corners nearer than this are one, mm. */
const ONE_CORNER = 1e-3;

/** A plate of the given thickness, its middle plane through the corners. Null for fewer than three corners apart. */
export function gussetPrism(gusset: Gusset): Prism | null {
  const [first, ...others] = gusset.corners;
  const second = first && others.find((corner) => distance(first, corner) > ONE_CORNER);
  if (!first || !second || others.length < 2) return null;
  const x = unit(subtract(second, first));
  const across = cross(gusset.normal, x);
  if (length(across) < ONE_CORNER) return null;
  const y = unit(across);
  const outline = gusset.corners.map((corner): Vec2 => {
    const from = subtract(corner, first);
    return [dot(from, x), dot(from, y)];
  });
  const half = gusset.thickness / 2;
  return block({
    outline: anticlockwise(outline),
    origin: first,
    x,
    y,
    axis: unit(gusset.normal),
    from: -half,
    to: half,
  });
}

/** What a join adds to the steel: the plate of a cut bar, a packer, the cleat or hanger to a purlin. */
export function joinPrisms(layout: Layout, crossing: Crossing, angleScale: AngleScale): readonly Prism[] {
  const a = layout.bars.get(crossing.a);
  const b = layout.bars.get(crossing.b);
  if (!a?.angle || !b || crossing.join === null) return [];
  switch (crossing.join.kind) {
    case 'cut': {
      const cut = crossing.join.cutBar === b.key ? b : a;
      const angle = cut.angle;
      return angle ? [splicePlate(cut, angle, crossing, angleScale)] : [];
    }
    case 'packed': {
      const thickness = crossing.join.packer ?? crossing.gap;
      return b.angle && thickness > 0 ? [packer(a, a.angle, b, b.angle, crossing, thickness)] : [];
    }
    case 'purlin':
    case 'hung':
      return cleat(a, a.angle, b, crossing);
    case 'none':
    case 'bolted':
    case 'welded':
      return [];
    default:
      return crossing.join satisfies never;
  }
}

/** The single plate that joins the halves of a cut bar, in the plane of the gussets. */
function splicePlate(bar: Bar, angle: AngleBar, crossing: Crossing, angleScale: AngleScale): Prism {
  const { inPlane, outOfPlane } = angle.placement;
  const at = crossing.a === bar.id ? crossing.onA : crossing.onB;
  const [before, after] = angle.cut.pieces;
  const gapFrom = before && after ? before.to : at - 40;
  const gapTo = before && after ? after.from : at + 40;
  const times = angleScale === 'doubled' ? 2 : 1;
  const half = (legInPlaneSize(angle) * times) / 2 + PLATE_EDGE;
  const thickness = Math.max(angle.spec.gusset, PLATE_THICKNESS);
  return block({
    outline: rectangle(-half, half, -thickness / 2, thickness / 2),
    origin: bar.from,
    x: inPlane,
    y: outOfPlane,
    axis: bar.direction,
    from: gapFrom - PLATE_LAP,
    to: gapTo + PLATE_LAP,
  });
}

/** A square piece that fills the room between the legs of two diagonals. */
function packer(
  bar: Bar,
  a: AngleBar,
  other: Bar,
  b: AngleBar,
  crossing: Crossing,
  thickness: number,
): Prism {
  const { inPlane, outOfPlane } = a.placement;
  const fromHere = subtract(along(other.from, other.direction, crossing.onB), crossing.at);
  const heels = [
    dot(a.placement.heel, outOfPlane),
    dot(add(fromHere, b.placement.heel), outOfPlane),
  ] as const;
  const middle = (heels[0] + heels[1]) / 2;
  return block({
    outline: rectangle(-PACKER / 2, PACKER / 2, -PACKER / 2, PACKER / 2),
    origin: along(crossing.at, outOfPlane, middle),
    x: inPlane,
    y: bar.direction,
    axis: outOfPlane,
    from: -thickness / 2,
    to: thickness / 2,
  });
}

/** The upright piece between a diagonal and the purlin or rail that it is bolted to or hung from; none where they touch. */
function cleat(bar: Bar, angle: AngleBar, line: Bar, crossing: Crossing): readonly Prism[] {
  const { outOfPlane } = angle.placement;
  const towards = dot(line.offset, outOfPlane) < 0 ? scale(outOfPlane, -1) : outOfPlane;
  const from = dot(angle.placement.heel, towards);
  const to = dot(line.offset, towards) - (line.member?.depth ?? 0) / 2;
  if (to - from < 1) return [];
  return [
    block({
      outline: rectangle(-CLEAT / 2, CLEAT / 2, -CLEAT_THICKNESS / 2, CLEAT_THICKNESS / 2),
      origin: crossing.at,
      x: bar.direction,
      y: cross(towards, bar.direction),
      axis: towards,
      from,
      to,
    }),
  ];
}

/** The base plate of a column that stands on a foundation. */
export function basePlate(layout: Layout, bay: BayLayout, column: Bar, columnPrism: Prism): Prism | null {
  if (bay.kind !== 'wall' || column.role !== 'column') return null;
  const foot = footOf(column);
  const node = layout.nodes.get(foot.node);
  if (node?.supports[bay.id]?.kind !== 'foundation') return null;
  const box = boxOf(columnPrism.outline);
  return block({
    outline: rectangle(
      box.minX - BASE_EDGE,
      box.maxX + BASE_EDGE,
      box.minY - BASE_EDGE,
      box.maxY + BASE_EDGE,
    ),
    origin: add(foot.at, column.offset),
    x: columnPrism.x,
    y: columnPrism.y,
    axis: columnPrism.axis,
    from: foot.upwards ? -BASE_THICKNESS : 0,
    to: foot.upwards ? 0 : BASE_THICKNESS,
  });
}

/** The lower end of a bar: its node, its place, and whether the bar runs up from it. */
export function footOf(bar: Bar): { readonly node: string; readonly at: Vec3; readonly upwards: boolean } {
  const upwards = bar.direction[2] >= 0;
  return upwards ? { node: bar.i, at: bar.from, upwards } : { node: bar.j, at: bar.to, upwards };
}

function block(solid: Omit<Prism, 'endAtFrom' | 'endAtTo'>): Prism {
  return { ...solid, endAtFrom: true, endAtTo: true };
}

function rectangle(left: number, right: number, below: number, above: number): readonly Vec2[] {
  return [
    [left, below],
    [right, below],
    [right, above],
    [left, above],
  ];
}

function anticlockwise(outline: readonly Vec2[]): readonly Vec2[] {
  let twiceArea = 0;
  for (const [index, p] of outline.entries()) {
    const q = outline[(index + 1) % outline.length] ?? p;
    twiceArea += p[0] * q[1] - p[1] * q[0];
  }
  return twiceArea < 0 ? outline.toReversed() : outline;
}
