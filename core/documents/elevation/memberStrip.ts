import { add, along, cross, dot, length, scale, subtract, unit, type Vec3 } from '../../geometry/vector.ts';
import type { Bar, Plane } from '../../layout/model.ts';
import type { Member } from '../../project/model.ts';
import { type Markup, markup } from '../markup.ts';
import { closedPath, openPath } from './path.ts';
import { acrossOf, type ElevationView, toSheet } from './view.ts';

/** A member that is not a diagonal, to its width as seen, with its flange lines or its hidden web; end-on, its outline. */
export function memberStrip(bar: Bar, view: ElevationView): Markup {
  const { plane } = view;
  const across = acrossOf(plane, bar.direction);
  const member = bar.member;
  if (across === null) return member === null ? markup`` : endOn(bar, member, view);
  const [from, to] = [add(bar.from, bar.offset), add(bar.to, bar.offset)];
  if (member === null)
    return markup`<path class="edl" d="${openPath([toSheet(view, from), toSheet(view, to)])}"/>`;

  const seen = seenWidth(bar, member, plane, across);
  const line = (away: number): string =>
    openPath([toSheet(view, along(from, across, away)), toSheet(view, along(to, across, away))]);
  const corners = [
    along(from, across, -seen / 2),
    along(to, across, -seen / 2),
    along(to, across, seen / 2),
    along(from, across, seen / 2),
  ].map((corner) => toSheet(view, corner));

  // Two lines nearer than this would run into one on paper.
  const flange = Math.max(FLANGE * member.depth, LINES_APART / view.scale);
  const sideOn = Math.abs(dot(depthDirection(bar, plane), across)) > Math.SQRT1_2;
  const edges =
    member.shape !== 'tube' && sideOn
      ? markup`<path class="edl" d="${line(seen / 2 - flange)}"/><path class="edl" d="${line(flange - seen / 2)}"/>`
      : markup`<path class="centre" d="${line(0)}"/>`;
  return markup`<path class="st" d="${closedPath(corners)}"/>${edges}`;
}

const LINES_APART = 2;

/** How wide a member shows in the plane, mm. */
export function seenWidth(bar: Bar, member: Member, plane: Plane, across: Vec3): number {
  const depthWay = depthDirection(bar, plane);
  const widthWay = cross(bar.direction, depthWay);
  return member.depth * Math.abs(dot(depthWay, across)) + member.width * Math.abs(dot(widthWay, across));
}

/** Flange thickness over depth: enough to tell a flange on a drawing, since members carry no thickness. */
const FLANGE = 0.07;

/**
 * The way of a member's depth, a unit vector at right angles to it: columns and rails resist wind across the wall, the members of a
 * roof stand on its slope, all others stand upright.
 */
function depthDirection(bar: Bar, plane: Plane): Vec3 {
  const outOfBay = bar.role === 'column' || bar.role === 'rail' || Math.abs(plane.normal[2]) > Math.SQRT1_2;
  const wanted: Vec3 = outOfBay ? plane.normal : [0, 0, 1];
  const square = subtract(wanted, scale(bar.direction, dot(wanted, bar.direction)));
  return length(square) > 1e-6 ? unit(square) : plane.normal;
}

function endOn(bar: Bar, member: Member, view: ElevationView): Markup {
  const middle = toSheet(view, add(bar.from, bar.offset));
  const [w, d] = [(member.width * view.scale) / 2, (member.depth * view.scale) / 2];
  const flange = Math.max(FLANGE * member.depth * view.scale, 1);
  const [x, y] = middle;
  if (member.shape !== 'I')
    return markup`<rect class="st" x="${x - w}" y="${y - d}" width="${2 * w}" height="${2 * d}"/>`;
  const half = flange / 2;
  return markup`<path class="st" d="${closedPath([
    [x - w, y - d],
    [x + w, y - d],
    [x + w, y - d + flange],
    [x + half, y - d + flange],
    [x + half, y + d - flange],
    [x + w, y + d - flange],
    [x + w, y + d],
    [x - w, y + d],
    [x - w, y + d - flange],
    [x - half, y + d - flange],
    [x - half, y - d + flange],
    [x - w, y - d + flange],
  ])}"/>`;
}
