/** The flag of a diagonal on the drawing: its mark, how it stands to its limit, its slenderness. Placed clear of what is there already. */
import { type Markup, markup } from '../markup.ts';
import type { Status } from '../words.ts';
import { statusSign } from './signs.ts';
import type { Point } from './view.ts';

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

/** Flags in order, each at the place along its bar where it covers least of the given boxes and of the flags before it. */
export function placedFlags(
  flags: readonly Flag[],
  occupied: readonly Box[],
): readonly { readonly flag: Flag; readonly box: Box }[] {
  const taken = [...occupied];
  return flags.map((flag) => {
    const width = AROUND + CHARACTER * (flag.mark.length + flag.figure.length);
    const boxes = PLACES.map((place): Box => {
      const x = flag.from[0] + (flag.to[0] - flag.from[0]) * place;
      const y = flag.from[1] + (flag.to[1] - flag.from[1]) * place;
      return { x: x - width / 2, y: y - HEIGHT / 2, width, height: HEIGHT };
    });
    const coveredBy = (box: Box): number => taken.reduce((sum, other) => sum + overlap(box, other), 0);
    const covered = boxes.map(coveredBy);
    const least = covered.indexOf(Math.min(...covered));
    const box = boxes[least] ?? { x: 0, y: 0, width, height: HEIGHT };
    taken.push(box);
    return { flag, box };
  });
}

export function drawnFlag({ mark, status, figure }: Flag, { x, y, width, height }: Box): Markup {
  const base = y + height - 5;
  return markup`<rect class="flag" x="${x}" y="${y}" width="${width}" height="${height}"/><text x="${x + 6}" y="${base}" class="strong">${mark}</text><g transform="translate(${
    x + 12 + CHARACTER * mark.length
  } ${y + 4.5}) scale(.82)">${statusSign(status)}</g><text x="${x + width - 6}" y="${base}" text-anchor="end">${figure}</text>`;
}

function overlap(a: Box, b: Box): number {
  const across = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const down = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  return across > 0 && down > 0 ? across * down : 0;
}
