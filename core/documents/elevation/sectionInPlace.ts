import { add, cross, dot, scale, type Vec3 } from '../../geometry/vector.ts';
import type { AngleBar, Bar, Plane } from '../../layout/model.ts';
import type { Restraint } from '../../restraint/model.ts';
import { outlinePolygon } from '../../section/outlinePath.ts';
import { hollowOf } from '../../section/shapePolygon.ts';
import { type Markup, markup } from '../markup.ts';
import { closedPath } from './path.ts';
import { acrossOf, type Point } from './view.ts';

const SIZE = 196;
const MIDDLE = SIZE / 2;
const RING = 80;
const ARC_STEPS = 6;
/** Longer than any ring is wide, mm. */
const LONG = 1000;
/** Free to either side of the free direction, as the rule has it: METHODS.md §3. */
const FREE_HALF_ANGLE = (10 * Math.PI) / 180;

/**
 * The angle as it sits on its gusset, seen from end i, up the plane upwards, with its four axes and a ring that is heavy where the
 * bar is free to move and hatched where the governing length is held.
 */
export function sectionInPlace(bar: Bar, angle: AngleBar, plane: Plane, restraint: Restraint): Markup | null {
  const { stock, placement } = angle;
  const across = acrossOf(plane, bar.direction);
  if (stock === null || across === null) return null;
  const up = dot(across, plane.up) < 0 ? scale(across, -1) : across;
  const right = cross(bar.direction, up);
  const flat = (at: Vec3): Point => [dot(at, right), dot(at, up)];
  const inSpace = (alongShort: number, alongLong: number): Vec3 =>
    add(scale(placement.x, alongShort), scale(placement.y, alongLong));

  const { centroidX, centroidY, alpha } = stock.properties;
  const outline = outlinePolygon(stock.outline, ARC_STEPS).map(([x, y]) =>
    flat(inSpace(x - centroidX, y - centroidY)),
  );
  const { shape } = stock.outline;
  const hollow = ((shape && hollowOf(shape)) ?? []).map(([x, y]) =>
    flat(inSpace(x - centroidX, y - centroidY)),
  );
  const reach = Math.max(...outline.map(([x, y]) => Math.hypot(x, y)));
  const pxPerMm = (RING - 14) / reach;
  const onSheet = ([x, y]: Point): Point => [MIDDLE + x * pxPerMm, MIDDLE - y * pxPerMm];

  const axes: readonly (readonly [string, Point])[] = [
    ['x', flat(inSpace(1, 0))],
    ['y', flat(inSpace(0, 1))],
    ['u', flat(inSpace(Math.cos(alpha), Math.sin(alpha)))],
    ['v', flat(inSpace(-Math.sin(alpha), Math.cos(alpha)))],
  ];
  const { freeDirection } = restraint.governing;
  const free = freeDirection && flat(inSpace(freeDirection[0], freeDirection[1]));
  const gusset = gussetBeside(angle, plane, flat, inSpace(centroidX, centroidY), onSheet);
  return markup`<svg width="${SIZE}" height="${SIZE}" viewBox="0 0 ${SIZE} ${SIZE}" role="img" aria-label="Section of ${bar.mark} in place">${gusset}<path class="cutnear dotted" fill-rule="evenodd" d="${closedPath(outline.map(onSheet))}${hollow.length === 0 ? '' : closedPath(hollow.map(onSheet))}"/>${axes.map(([name, direction]) => axisLine(name, direction))}<circle cx="${MIDDLE}" cy="${MIDDLE}" r="2"/>${ring(free)}</svg>`;
}

/** What the ring cuts off is left out; all rings are the same, so that one clip serves a document. */
export const RING_CLIP: Markup = markup`<svg class="hatches" width="0" height="0" aria-hidden="true"><defs><clipPath id="ring"><circle cx="${MIDDLE}" cy="${MIDDLE}" r="${RING - 5}"/></clipPath></defs></svg>`;

/** The gusset behind the leg, cut off by the ring. */
function gussetBeside(
  angle: AngleBar,
  plane: Plane,
  flat: (at: Vec3) => Point,
  centroidFromHeel: Vec3,
  onSheet: (at: Point) => Point,
): Markup {
  const centroid = add(angle.placement.heel, centroidFromHeel);
  const half = angle.spec.gusset / 2;
  const corner = (off: number, along: number): Point => {
    const [x, y] = flat(scale(plane.normal, off - dot(centroid, plane.normal)));
    return onSheet([x, y + along * LONG]);
  };
  return markup`<path class="gu" clip-path="url(#ring)" d="${closedPath([corner(-half, -1), corner(half, -1), corner(half, 1), corner(-half, 1)])}"/>`;
}

function axisLine(name: string, [x, y]: Point): Markup {
  const long = RING - 8;
  const [dx, dy] = [x * long, -y * long];
  // The letter stands at the end that is nearer to the upper left, clear of the heavy arcs.
  const sign = dx + dy < 0 ? 1 : -1;
  return markup`<path class="ax" d="M${MIDDLE - dx} ${MIDDLE - dy}L${MIDDLE + dx} ${MIDDLE + dy}"/><text class="strong halo" text-anchor="middle" x="${MIDDLE + sign * dx * 0.84}" y="${MIDDLE + sign * dy * 0.84 + 4}">${name}</text>`;
}

function ring(free: Point | null): Markup {
  if (free === null) return markup`<circle class="free" cx="${MIDDLE}" cy="${MIDDLE}" r="${RING}"/>`;
  const towards = Math.atan2(free[1], free[0]);
  const at = (angle: number, radius: number): Point => [
    MIDDLE + radius * Math.cos(angle),
    MIDDLE - radius * Math.sin(angle),
  ];
  const arc = (from: number, to: number): Markup => {
    const [start, end] = [at(from, RING), at(to, RING)];
    const isLarge = to - from > Math.PI ? 1 : 0;
    return markup`M${start[0]} ${start[1]}A${RING} ${RING} 0 ${isLarge} 0 ${end[0]} ${end[1]}`;
  };
  const ways = [towards, towards + Math.PI];
  const held = ways.map((way) => [way + FREE_HALF_ANGLE, way + Math.PI - FREE_HALF_ANGLE] as const);
  const hatch = held.flatMap(([from, to]) => {
    const strokes = Math.round((to - from) / 0.07);
    return Array.from({ length: strokes + 1 }, (_, index) => {
      const angle = from + ((to - from) * index) / strokes;
      const [inner, outer] = [at(angle, RING), at(angle + 0.05, RING + 6)];
      return markup`M${inner[0]} ${inner[1]}L${outer[0]} ${outer[1]}`;
    });
  });
  const arrows = ways.map((way) => {
    const [tip, left, right] = [at(way, RING + 14), at(way + 0.06, RING + 4), at(way - 0.06, RING + 4)];
    return markup`<path d="${closedPath([tip, left, right])}"/>`;
  });
  return markup`<path class="held" d="${held.map(([from, to]) => arc(from, to))}"/><path class="edl" d="${hatch}"/><path class="free" d="${ways.map((way) => arc(way - FREE_HALF_ANGLE, way + FREE_HALF_ANGLE))}"/>${arrows}`;
}
