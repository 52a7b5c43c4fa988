import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { Box } from '../view/box.ts';

/** One stroke, word or mark of the drawing laid over the steel, in px on the sheet. `look` is the class that the style sheet gives its ink. */
export type Ink =
  | { readonly kind: 'path'; readonly key: string; readonly look: string; readonly d: string }
  | {
      readonly kind: 'words';
      readonly key: string;
      readonly look: string;
      readonly at: Vec2;
      readonly anchor: 'start' | 'middle' | 'end';
      readonly text: string;
    }
  | {
      readonly kind: 'ring';
      readonly key: string;
      readonly look: string;
      readonly at: Vec2;
      readonly radius: number;
    }
  /** A numbered plaque, 15 px square. */
  | { readonly kind: 'plaque'; readonly key: string; readonly at: Vec2; readonly text: string };

/** Half the side of a plaque, px. */
export const PLAQUE_HALF = 7.5;

export const plus = (a: Vec2, b: Vec2): Vec2 => [a[0] + b[0], a[1] + b[1]];
export const minus = (a: Vec2, b: Vec2): Vec2 => [a[0] - b[0], a[1] - b[1]];
export const times = (a: Vec2, k: number): Vec2 => [a[0] * k, a[1] * k];
/** a + k·direction. */
export const from = (a: Vec2, direction: Vec2, k: number): Vec2 => [
  a[0] + direction[0] * k,
  a[1] + direction[1] * k,
];
export const span = (a: Vec2): number => Math.hypot(a[0], a[1]);
/** A quarter turn, towards the left of the direction as seen on the sheet. */
export const across = (a: Vec2): Vec2 => [a[1], -a[0]];

/** Unit vector on the sheet; null for a direction seen (nearly) end on, shorter than `least`. */
export function heading(a: Vec2, least = 1e-9): Vec2 | null {
  const l = span(a);
  return l > least ? [a[0] / l, a[1] / l] : null;
}

/** A tenth of a pixel is as fine as any screen shows. */
const px = (value: number): string => value.toFixed(1);

export function line(a: Vec2, b: Vec2): string {
  return `M${px(a[0])} ${px(a[1])}L${px(b[0])} ${px(b[1])}`;
}

export function polyline(points: readonly Vec2[], closed = false): string {
  return (
    points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${px(x)} ${px(y)}`).join('') +
    (closed ? 'Z' : '')
  );
}

/** A solid arrow head of 9 by 8 px whose point is at `tip`. */
export function arrowHead(tip: Vec2, direction: Vec2): string {
  const back = from(tip, direction, -9);
  const side = across(direction);
  return polyline([tip, from(back, side, 4), from(back, side, -4)], true);
}

/** The room that words take, near enough: px for each letter of the condensed face at 12 px, and a line's height. */
const LETTER = 6;

export function wordsBox(words: Extract<Ink, { readonly kind: 'words' }>): Box {
  const width = LETTER * words.text.length;
  const start = words.anchor === 'start' ? 0 : words.anchor === 'end' ? -width : -width / 2;
  return { left: words.at[0] + start, top: words.at[1] - 11, width, height: 14 };
}
