import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, cross, distance, dot, length, scale, unit } from '../../../core/geometry/vector.ts';
import type { Bar, BayLayout, Layout, Plane } from '../../../core/layout/model.ts';
import type { Member } from '../../../core/project/model.ts';
import { memberOutline } from './memberOutline.ts';
import type { Prism } from './prism.ts';

/** A bar of the bay that names no member is drawn as a slim tube. */
const UNNAMED: Member = { name: '', shape: 'tube', depth: 60, width: 60 };

/** A column is drawn this far past its last set-out point, so that the beam's flange does not stand proud of it, mm. */
const COLUMN_HEAD = 160;

/** Cosine above which two directions count as one line: about 2.5 degrees. */
const IN_LINE = 0.999;

const UPRIGHT: Vec3 = [0, 0, 1];

/** A column, beam, strut, rafter, purlin, rail or chord, drawn to its depth and width between its set-out points. */
export function memberPrism(layout: Layout, bay: BayLayout, bar: Bar): Prism {
  const member = bar.member ?? UNNAMED;
  const plane = bay.planes.find((one) => one.id === bar.plane) ?? bay.planes[0];
  const depthways = acrossBar(bar, depthDirection(bar, bay, plane));
  const runsOnAtFrom = runsOn(layout, bay, bar, bar.i);
  const runsOnAtTo = runsOn(layout, bay, bar, bar.j);
  const head = bar.role === 'column' && !runsOnAtTo && bar.direction[2] > 0 ? COLUMN_HEAD : 0;
  return {
    outline: sharedOutline(member),
    origin: add(bar.from, bar.offset),
    x: cross(bar.direction, depthways),
    y: depthways,
    axis: bar.direction,
    from: 0,
    to: distance(bar.from, bar.to) + head,
    endAtFrom: !runsOnAtFrom,
    endAtTo: !runsOnAtTo,
  };
}

/** Outlines made so far: members of one kind share theirs, and with it what is worked out from it. */
const made = new WeakMap<Member, readonly Vec2[]>();

function sharedOutline(member: Member): readonly Vec2[] {
  const outline = made.get(member) ?? memberOutline(member);
  made.set(member, outline);
  return outline;
}

/**
 * Which way the depth of a member stands. Columns and rafters are deep at right angles to the bracing, as frames are; so are purlins and
 * rails, that carry the cladding. Beams of a wall and chords are deep up and down.
 */
function depthDirection(bar: Bar, bay: BayLayout, plane: Plane | undefined): Vec3 {
  if (!plane || bay.kind === 'knee') return UPRIGHT;
  if (bay.kind === 'free') return bar.role === 'column' ? plane.normal : UPRIGHT;
  if (bay.kind === 'wall' && (bar.role === 'beam' || bar.role === 'strut')) return plane.up;
  return plane.normal;
}

/** The part of a direction at right angles to the bar, as a unit vector; any such vector when the bar runs along it. */
function acrossBar(bar: Bar, wanted: Vec3): Vec3 {
  for (const candidate of [wanted, UPRIGHT, [1, 0, 0] as const]) {
    const part = add(candidate, scale(bar.direction, -dot(candidate, bar.direction)));
    if (length(part) > 0.1) return unit(part);
  }
  throw new Error('no direction at right angles to a bar');
}

/** Whether another member of the same role goes straight on past a node, so that no end is drawn there. */
function runsOn(layout: Layout, bay: BayLayout, bar: Bar, node: string): boolean {
  return bay.bars.some((id) => {
    const other = layout.bars.get(id);
    if (!other || other.id === bar.id || other.role !== bar.role) return false;
    if (other.i !== node && other.j !== node) return false;
    return Math.abs(dot(other.direction, bar.direction)) > IN_LINE;
  });
}
