import type { Piece } from './model.ts';

/**
 * A bar between its ends as pieces of one motion, with the length that each counts as.
 *
 * Between two stops it is the piece's own length. A bar that goes on beyond its last stop to an end that does not hold the motion swings
 * out there, and the span before it turns with it: the two are one piece, which counts as the span and twice the part beyond, on the
 * safe side (METHODS.md, "Ends that do not hold"). Infinite where fewer than two places stop the motion: then the bar turns freely.
 *
 * @param first @param last where the bar begins and ends, mm
 * @param stops where the motion is stopped, rising, mm; an end is among them where it holds
 * @returns at least one piece, in order; together they cover the bar
 */
export function piecesOf(first: number, last: number, stops: readonly number[]): readonly Piece[] {
  const [start, end] = [stops[0], stops.at(-1)];
  if (start === undefined || end === undefined || stops.length < 2)
    return [{ from: first, to: last, counts: Number.POSITIVE_INFINITY }];
  const before = start - first;
  const beyond = last - end;
  if (stops.length === 2)
    return [{ from: first, to: last, counts: end - start + 2 * Math.max(before, beyond) }];
  const [foremost, hindmost] = [0, stops.length - 2];
  return stops.slice(1).map((to, k): Piece => {
    const from = stops[k] ?? first;
    const span = to - from;
    if (k === foremost) return { from: first, to, counts: span + 2 * before };
    if (k === hindmost) return { from, to: last, counts: span + 2 * beyond };
    return { from, to, counts: span };
  });
}

export const longestCount = (pieces: readonly Piece[]): number =>
  pieces.reduce((most, { counts }) => Math.max(most, counts), 0);
