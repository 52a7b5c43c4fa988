import type { EndConnection } from '../project/model.ts';
import type { CrossingId, CutLength, Hand } from './model.ts';

/** Clear distance from the halves of a cut bar to the bar that runs through, mm (common practice, no source). */
const CLEAR_OF_THROUGH_BAR = 10;

export interface CutInput {
  readonly length: number;
  readonly ends: { readonly i: EndConnection; readonly j: EndConnection };
  /** Where this bar is cut for another, and the acute angle between them, degrees. */
  readonly cuts: readonly { readonly at: number; readonly throughReach: number; readonly angle: number }[];
  /** Farthest that this bar's leg lies to one side of its set-out line, mm; `throughReach` is that of the other. */
  readonly reach: number;
  readonly holes: readonly { readonly crossing: CrossingId; readonly at: number }[];
}

/** The steel of a bar between its set-out points: what the ends leave of it, less what is cut out at a crossing. Lengths mm. */
export function cutLengthOf(input: CutInput): CutLength {
  const startsAt = steelFrom(input.ends.i);
  const endsBefore = steelFrom(input.ends.j);
  const last = input.length - endsBefore;
  const pieces: { from: number; to: number }[] = [];
  let from = startsAt;
  for (const cut of [...input.cuts].sort((a, b) => a.at - b.at)) {
    const half = halfOfTheGap(cut.throughReach, input.reach, cut.angle);
    pieces.push({ from, to: cut.at - half });
    from = cut.at + half;
  }
  pieces.push({ from, to: last });
  return {
    startsAt,
    endsBefore,
    pieces,
    // A piece that comes out negative must not be made good by another.
    total: pieces.some((piece) => piece.to <= piece.from)
      ? 0
      : pieces.reduce((sum, p) => sum + p.to - p.from, 0),
    holes: input.holes.map((hole) => ({ crossing: hole.crossing, fromEndA: hole.at - startsAt })),
  };
}

/**
 * From the crossing to the square-cut end of either half, along the cut bar: its corner, `reach` off the line, still clears the bar that
 * runs through. The same both ways, so that the plate lies in the middle.
 */
function halfOfTheGap(throughReach: number, reach: number, degrees: number): number {
  const angle = (degrees * Math.PI) / 180;
  return (throughReach + CLEAR_OF_THROUGH_BAR + reach * Math.cos(angle)) / Math.sin(angle);
}

/** From the set-out point to where the steel begins, mm: below 0 when the end distance passes the point. */
function steelFrom(end: EndConnection): number {
  return end.kind === 'bolted' ? end.setBack - end.endDistance : end.setBack;
}

/**
 * Which of a mirror pair a bar is. An angle that reads the same from both ends is its own mirror image.
 * @param orientation sign of (bar direction × leg in plane) · standing leg
 */
export function handOf(cut: CutLength, ends: CutInput['ends'], orientation: number): Hand {
  if (endsAlike(ends) && holesMirror(cut)) return 'either';
  return orientation > 0 ? 'right' : 'left';
}

function endsAlike({ i, j }: CutInput['ends']): boolean {
  return i.kind === j.kind && i.kind === 'bolted'
    ? i.bolts === j.bolts &&
        i.boltDiameter === j.boltDiameter &&
        i.pitch === j.pitch &&
        i.endDistance === j.endDistance &&
        i.gauge === j.gauge &&
        i.legs === j.legs
    : i.kind === j.kind;
}

/** Workshop tolerance within which a hole counts as in the middle, mm (common practice, no source). */
const SAME_HOLE = 1;

function holesMirror(cut: CutLength): boolean {
  const first = cut.pieces[0];
  const last = cut.pieces.at(-1);
  if (!first || !last) return true;
  const steel = last.to - first.from;
  const gaps = cut.pieces
    .slice(1)
    .map((piece, k) => (piece.from + (cut.pieces[k]?.to ?? piece.from)) / 2 - first.from);
  const marks = [...cut.holes.map((hole) => hole.fromEndA), ...gaps];
  return marks.every((at) => marks.some((other) => Math.abs(other - (steel - at)) <= SAME_HOLE));
}
