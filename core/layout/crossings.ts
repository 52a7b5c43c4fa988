import { dot } from '../geometry/vector.ts';
import type { Bay, Join, JoinKind } from '../project/model.ts';
import { type AngleDraft, standingLegOf } from './angleBar.ts';
import type { Meeting } from './meetings.ts';
import type { Crossing, Plane } from './model.ts';
import { PlaceGrid } from './placeGrid.ts';
import type { SketchBar } from './sketch.ts';

/** A bar as a crossing needs to know it. */
export interface CrossingBar {
  readonly sketch: SketchBar;
  readonly angle: AngleDraft | null;
}

const BETWEEN_DIAGONALS: readonly JoinKind[] = ['none', 'bolted', 'packed', 'cut', 'welded'];
/** The most that bolts, a packer, a plate or a weld span between two diagonals, mm (common practice, no source). */
export const MOST_BETWEEN = 60;

const TO_A_LINE: readonly JoinKind[] = ['none', 'purlin', 'hung'];

/** A meeting of bars with the mark that the bay has for it, the distance between the faces, and whether both can pass. */
export function crossingOf(
  bay: Bay,
  plane: Plane,
  meeting: Meeting,
  bars: ReadonlyMap<string, CrossingBar>,
): Crossing | null {
  const a = bars.get(meeting.a);
  const b = bars.get(meeting.b);
  if (!a?.angle || !b) return null;
  const kind = b.angle ? 'diagonals' : b.sketch.line ? 'line' : 'member';
  const key = [meeting.a, meeting.b].sort().join('+');
  const choices = kind === 'diagonals' ? BETWEEN_DIAGONALS : TO_A_LINE;
  const join = joinThatFits(bay.joins[key], choices, meeting);
  const gap = kind === 'member' ? 0 : gapBetween(extentOf(a, plane), extentOf(b, plane), meeting.separation);
  return {
    id: `${bay.id}/${key}`,
    bay: bay.id,
    key,
    a: `${bay.id}/${meeting.a}`,
    b: `${bay.id}/${meeting.b}`,
    kind,
    at: meeting.at,
    onA: meeting.onA,
    onB: meeting.onB,
    angle: meeting.angle,
    gap,
    clash: gap < 0 && join?.kind !== 'cut',
    tooFarApart: kind === 'diagonals' && gap > MOST_BETWEEN,
    join,
    choices,
    point: `${bay.id}/${key}`,
  };
}

/** Crossings at one place share the name of the first. */
export function withSharedPoints(crossings: readonly Crossing[]): readonly Crossing[] {
  const points = new PlaceGrid<Crossing>();
  return crossings.map((crossing) => {
    const known = points.near(crossing.at);
    if (known) return { ...crossing, point: known.id };
    points.put(crossing);
    return crossing;
  });
}

/** A mark of a kind that this crossing cannot have (left from another pattern), or that cuts a bar which does not cross here, is no mark. */
function joinThatFits(join: Join | undefined, choices: readonly JoinKind[], meeting: Meeting): Join | null {
  if (!join || !choices.includes(join.kind)) return null;
  const cutsNone = join.kind === 'cut' && join.cutBar !== meeting.a && join.cutBar !== meeting.b;
  return cutsNone ? null : join;
}

/** From…to along the normal, measured from the bar's own line, mm. */
type Extent = readonly [number, number];

function extentOf(bar: CrossingBar, plane: Plane): Extent {
  if (bar.angle) {
    const { spec, side, stock } = bar.angle;
    const face = spec.gusset / 2;
    const standing = stock ? standingLegOf(stock, spec.legInPlane) : 0;
    return side === 'near' ? [face, face + standing] : [-face - standing, -face];
  }
  const middle = dot(bar.sketch.offset, plane.normal);
  const half = (bar.sketch.member?.depth ?? 0) / 2;
  return [middle - half, middle + half];
}

/** Clear distance; of extents that overlap, minus the overlap. */
function gapBetween(a: Extent, b: Extent, separation: number): number {
  const low = b[0] + separation;
  const high = b[1] + separation;
  return Math.max(low - a[1], a[0] - high);
}
