/** The flag of a diagonal on the drawing: its mark, how it stands to its limit, its slenderness. Placed clear of what is there already. */
import { type Markup, markup } from '../markup.ts';
import type { Status } from '../words.ts';
import { statusSign } from './signs.ts';
import { type Point, sheetLength } from './view.ts';

export interface Flag {
  readonly mark: string;
  readonly status: Status;
  /** L/r as shown; a dash where there is none. */
  readonly figure: string;
  /** The bar on the sheet. */
  readonly from: Point;
  readonly to: Point;
}

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

const HEIGHT = 18;
/** Room for the sign and the gaps around it, px, and an upper bound on a character's width at 12 px in the condensed face. */
const AROUND = 34;
const CHARACTER = 6.4;
/** Places along the bar, best first. */
const PLACES = [0.72, 0.28, 0.66, 0.34, 0.78, 0.22, 0.6, 0.4, 0.84, 0.16, 0.5];

export interface PlacedFlag {
  readonly flag: Flag;
  readonly box: Box;
  /** Where on the bar a flag beside the drawing points to. */
  readonly pointsTo: Point | null;
}

/**
 * Each flag at the place along its bar where it covers least of the given boxes and of the flags before it. Where the bars are too short for
 * that, all flags stand in a column beside the steel and point to their bars.
 *
 * @param beside x of that column, px
 */
export function placedFlags(
  flags: readonly Flag[],
  occupied: readonly Box[],
  beside: number,
): readonly PlacedFlag[] {
  const isCrowded = flags.some((flag) => sheetLength(flag.from, flag.to) < ROOM_ON_BAR * widthOf(flag));
  return isCrowded ? flagsBeside(flags, beside) : flagsOnBars(flags, occupied);
}

/** Bars at least so many flags long carry their own. */
const ROOM_ON_BAR = 1.4;

function flagsOnBars(flags: readonly Flag[], occupied: readonly Box[]): readonly PlacedFlag[] {
  const taken = [...occupied];
  return flags.map((flag) => {
    const boxes = PLACES.map((place) => boxAround(pointOn(flag, place), widthOf(flag)));
    const covered = boxes.map((box) => taken.reduce((sum, other) => sum + overlap(box, other), 0));
    const best = boxes[covered.indexOf(Math.min(...covered))] ?? boxAround(flag.from, widthOf(flag));
    taken.push(best);
    return { flag, box: best, pointsTo: null };
  });
}

function flagsBeside(flags: readonly Flag[], x: number): readonly PlacedFlag[] {
  const fromTop = flags
    .map((flag) => ({
      flag,
      pointsTo: pointOn(flag, flag.to[0] > flag.from[0] ? TOWARDS_COLUMN : 1 - TOWARDS_COLUMN),
    }))
    .sort((one, other) => one.pointsTo[1] - other.pointsTo[1]);
  let free = Number.NEGATIVE_INFINITY;
  return fromTop.map(({ flag, pointsTo }) => {
    const y = Math.max(free, pointsTo[1] - HEIGHT / 2);
    free = y + HEIGHT + 3;
    return { flag, box: { x, y, width: widthOf(flag), height: HEIGHT }, pointsTo };
  });
}

/** How far along a bar, towards the column of flags, its flag points. */
const TOWARDS_COLUMN = 0.72;

function widthOf({ mark, figure }: Flag): number {
  return AROUND + CHARACTER * (mark.length + figure.length);
}

function pointOn({ from, to }: Flag, place: number): Point {
  return [from[0] + (to[0] - from[0]) * place, from[1] + (to[1] - from[1]) * place];
}

function boxAround([x, y]: Point, width: number): Box {
  return { x: x - width / 2, y: y - HEIGHT / 2, width, height: HEIGHT };
}

export function drawnFlag({ flag, box, pointsTo }: PlacedFlag): Markup {
  const { mark, status, figure } = flag;
  const { x, y, width, height } = box;
  const base = y + height - 5;
  const lead =
    pointsTo &&
    markup`<path class="dim" d="M${x} ${y + height / 2}L${pointsTo[0]} ${pointsTo[1]}"/><circle cx="${pointsTo[0]}" cy="${pointsTo[1]}" r="1.6"/>`;
  return markup`${lead}<rect class="flag" x="${x}" y="${y}" width="${width}" height="${height}"/><text x="${x + 6}" y="${base}" class="strong">${mark}</text><g transform="translate(${
    x + 12 + CHARACTER * mark.length
  } ${y + 4.5}) scale(.82)">${statusSign(status)}</g><text x="${x + width - 6}" y="${base}" text-anchor="end">${figure}</text>`;
}

function overlap(a: Box, b: Box): number {
  const across = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const down = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  return across > 0 && down > 0 ? across * down : 0;
}
