import { add, along, dot, scale, type Vec3 } from '../../geometry/vector.ts';
import type { AngleBar, Bar } from '../../layout/model.ts';
import { type Markup, markup } from '../markup.ts';
import { closedPath, openPath } from './path.ts';
import { acrossOf, type ElevationView, toSheet } from './view.ts';

/** Legs of a section that is not in stock are drawn this wide, mm, and dashed. */
const UNKNOWN_LEG = 60;

/**
 * A diagonal as built: its pieces from steel to steel, as wide as its legs show, the edge of the leg that stands out solid where it is seen
 * and dashed where it lies behind. Bars on the far side are hatched.
 *
 * @param widened how many times its true width the angle is drawn, about its set-out line
 */
export function angleStrip(bar: Bar, angle: AngleBar, view: ElevationView, widened: number): Markup {
  const across = acrossOf(view.plane, bar.direction);
  if (across === null) return markup``;
  const { placement, stock, cut } = angle;
  const [shortLeg, longLeg, thickness] = stock
    ? [stock.outline.shortLeg, stock.outline.longLeg, stock.outline.thickness]
    : [UNKNOWN_LEG, UNKNOWN_LEG, UNKNOWN_LEG / 10];
  const heel = dot(placement.heel, across);
  const shortToe = heel + shortLeg * dot(placement.x, across);
  const longToe = heel + longLeg * dot(placement.y, across);
  const edges = [heel, shortToe, longToe].map((away) => away * widened);
  const [low, high] = [Math.min(...edges), Math.max(...edges)];

  // The leg that is seen edge-on stands out of the plane; its inner face runs one thickness from the heel towards the other toe.
  const standsOut =
    Math.abs(dot(placement.x, across)) < Math.abs(dot(placement.y, across)) ? placement.x : placement.y;
  const lies = standsOut === placement.x ? placement.y : placement.x;
  const face = (heel + thickness * Math.sign(dot(lies, across))) * widened;
  const towardsViewer = dot(standsOut, view.plane.normal) > 0;

  const point = (at: number, away: number) =>
    toSheet(view, along(along(bar.from, bar.direction, at), across, away));
  const kind = stock === null ? 'dg unknown' : angle.side === 'far' ? 'dgf' : 'dg';
  const pieces = cut.pieces.length > 0 ? cut.pieces : [{ from: 0, to: bar.length }];
  return markup`${pieces.map(
    ({ from, to }) =>
      markup`<path class="${kind}" d="${closedPath([point(from, low), point(to, low), point(to, high), point(from, high)])}"/><path class="${
        towardsViewer ? 'edl' : 'edh'
      }" d="${openPath([point(from, face), point(to, face)])}"/>`,
  )}`;
}

/** The plate over the joint of a bar that is cut at a crossing, 100 mm past each piece. */
export function jointPlate(bar: Bar, angle: AngleBar, view: ElevationView, widened: number): Markup | null {
  const across = acrossOf(view.plane, bar.direction);
  const [first, second] = angle.cut.pieces;
  if (across === null || !first || !second) return null;
  const leg = angle.stock
    ? angle.spec.legInPlane === 'longer'
      ? angle.stock.outline.longLeg
      : angle.stock.outline.shortLeg
    : UNKNOWN_LEG;
  const half = leg * 0.75 * widened;
  const corner = (at: number, away: number) =>
    toSheet(view, along(along(bar.from, bar.direction, at), across, away));
  const [from, to] = [first.to - 100, second.from + 100];
  return markup`<path class="gu" d="${closedPath([corner(from, -half), corner(to, -half), corner(to, half), corner(from, half)])}"/>`;
}

/** Where the steel of a diagonal ends, a tick across it: the station of its end connection. */
export function endTicks(bar: Bar, angle: AngleBar, view: ElevationView): Markup {
  const across = acrossOf(view.plane, bar.direction);
  if (across === null) return markup``;
  const half = TICK / view.scale;
  const tick = (at: number): string => {
    const middle: Vec3 = along(bar.from, bar.direction, at);
    return openPath([
      toSheet(view, add(middle, scale(across, -half))),
      toSheet(view, add(middle, scale(across, half))),
    ]);
  };
  const { startsAt, endsBefore } = angle.cut;
  return markup`<path class="hld" d="${tick(startsAt)}${tick(bar.length - endsBefore)}"/>`;
}

/** Half the length of an end tick, px. */
const TICK = 8;
