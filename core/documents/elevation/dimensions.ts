import { dot, subtract } from '../../geometry/vector.ts';
import type { DimensionLine } from '../../layout/model.ts';
import type { UnitSystem } from '../../project/model.ts';
import { showLength } from '../../units/quantity.ts';
import { type Markup, markup } from '../markup.ts';
import { openPath } from './path.ts';
import { type ElevationView, type Extent, type Point, toSheet } from './view.ts';

/** Clear of the steel to the first dimension line, and from one line to the next, px. */
const FIRST = 34;
const NEXT = 22;
/** Half a stroke across the end of a dimension line, px. */
const STROKE = 3.5;

/** The dimension lines that lie in the plane of the view, outside the steel; those that would cross each other stand one behind the other. */
export function dimensionLines(
  lines: readonly DimensionLine[],
  view: ElevationView,
  extent: Extent,
  units: UnitSystem,
): Markup {
  const taken: {
    readonly side: string;
    readonly rank: number;
    readonly from: number;
    readonly to: number;
  }[] = [];
  return markup`${lines
    .filter((line) => liesInPlane(line, view))
    .map((line) => {
      const [awayX, awayY] = awayOnSheet(line, view);
      const upright = Math.abs(awayX) > Math.abs(awayY);
      const side = upright ? (awayX < 0 ? 'left' : 'right') : awayY < 0 ? 'top' : 'bottom';
      const [from, to] = [toSheet(view, line.from), toSheet(view, line.to)];
      const index = upright ? 1 : 0;
      const span = [Math.min(from[index], to[index]), Math.max(from[index], to[index])] as const;
      let rank = 0;
      const crosses = () =>
        taken.some(
          (other) =>
            other.side === side &&
            other.rank === rank &&
            other.from < span[1] - 0.5 &&
            other.to > span[0] + 0.5,
        );
      while (crosses()) rank++;
      taken.push({ side, rank, from: span[0], to: span[1] });
      const edge =
        edgeOf(side, view, extent) + (side === 'left' || side === 'top' ? -1 : 1) * (FIRST + rank * NEXT);
      return drawn(from, to, edge, upright, showLength(line.value, units, 'bare'));
    })}`;
}

/** A line that stands off towards the viewer goes to the left of what is upright, and below what is level. */
function awayOnSheet({ from, to, away }: DimensionLine, { plane }: ElevationView): Point {
  if (Math.abs(dot(away, plane.normal)) < 0.7) return [dot(away, plane.right), -dot(away, plane.up)];
  const along = subtract(to, from);
  return Math.abs(dot(along, plane.up)) > Math.abs(dot(along, plane.right)) ? [-1, 0] : [0, 1];
}

/** Both ends some 50 mm from the plane. */
function liesInPlane({ from, to }: DimensionLine, { plane }: ElevationView): boolean {
  const off = (at: DimensionLine['from']): number => dot(subtract(at, plane.origin), plane.normal);
  return Math.abs(off(from)) < 50 && Math.abs(off(to)) < 50;
}

function edgeOf(side: string, view: ElevationView, extent: Extent): number {
  const { origin, scale } = view;
  switch (side) {
    case 'left':
      return origin[0] + extent.left * scale;
    case 'right':
      return origin[0] + extent.right * scale;
    case 'top':
      return origin[1] - extent.top * scale;
    default:
      return origin[1] - extent.bottom * scale;
  }
}

function drawn(from: Point, to: Point, edge: number, upright: boolean, value: string): Markup {
  const [start, end]: readonly [Point, Point] = upright
    ? [
        [edge, from[1]],
        [edge, to[1]],
      ]
    : [
        [from[0], edge],
        [to[0], edge],
      ];
  const middle: Point = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2];
  const stroke = ([x, y]: Point) =>
    markup`<path class="dims" d="M${x - STROKE} ${y + STROKE}l${2 * STROKE} ${-2 * STROKE}"/>`;
  const lead = ([x, y]: Point) =>
    upright
      ? markup`<path class="dim" d="M${x - 6} ${y}h12"/>`
      : markup`<path class="dim" d="M${x} ${y - 6}v12"/>`;
  const text = upright
    ? markup`<text class="halo" text-anchor="middle" transform="translate(${middle[0] - 5} ${middle[1]}) rotate(-90)">${value}</text>`
    : markup`<text class="halo" text-anchor="middle" x="${middle[0]}" y="${middle[1] - 5}">${value}</text>`;
  return markup`<path class="dim" d="${openPath([start, end])}"/>${[start, end].map((at) => [lead(at), stroke(at)])}${text}`;
}
