import type { Bay, Join, JoinKind } from '../project/model.ts';
import { besideMember, betweenDiagonals, type CrossingBar } from './between.ts';
import type { Meeting } from './meetings.ts';
import type { Crossing, Plane } from './model.ts';
import { PlaceGrid } from './placeGrid.ts';

const BETWEEN_DIAGONALS: readonly JoinKind[] = ['none', 'bolted', 'packed', 'cut', 'welded'];
/** The most that bolts, a packer, a plate or a weld span between two diagonals, mm (common practice, no source). */
const MOST_BETWEEN_DIAGONALS = 60;
/** The most that a cleat to a purlin, a rail or another member spans and still holds, mm (common practice, no source). */
const MOST_TO_A_MEMBER = 400;

/** The most that a join spans there, mm. */
export const mostBetween = (kind: Crossing['kind']): number =>
  kind === 'diagonals' ? MOST_BETWEEN_DIAGONALS : MOST_TO_A_MEMBER;

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
  const gap = b.angle
    ? betweenDiagonals(a.angle, b.angle, meeting.separation)
    : besideMember(a.angle, b.sketch, plane, meeting.separation);
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
    tooFarApart: gap > mostBetween(kind),
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
