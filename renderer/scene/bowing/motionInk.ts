import { add, scale, type Vec2 } from '../../../core/geometry/vector.ts';
import type { Layout } from '../../../core/layout/model.ts';
import { type Ink, line, polyline, wordsBox } from '../drawing/ink.ts';
import { type Box, overlap } from '../view/box.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import type { DrawnMotion, MotionLine, MovedPoint } from './drawnMotion.ts';

/** What moves less than this on the sheet is not seen to move, px. */
const SEEN = 1.5;
/** A line must move by this to be worth a word, px. */
const WORTH_A_WORD = 14;

/**
 * The bars where they have moved to, over where they were: the chosen one in full, those that go with it dashed.
 *
 * @param part of the drawn displacement, −1 to 1
 * @param inTheWay where words of the motion cannot be read
 */
export function motionInk(
  view: SheetView,
  layout: Layout,
  motion: DrawnMotion,
  part: number,
  inTheWay: readonly Box[] = [],
): readonly Ink[] {
  // What goes along lies under the chosen bar.
  const inOrder = [...motion.lines].sort((a, b) => Number(a.chosen) - Number(b.chosen));
  return [
    ...inOrder.flatMap((moved) => lineInk(view, motion.kind, moved, part)),
    ...(motion.kind === 'push' ? wordsOf(view, layout, inOrder, part, inTheWay) : []),
  ];
}

function lineInk(
  view: SheetView,
  kind: DrawnMotion['kind'],
  moved: MotionLine,
  part: number,
): readonly Ink[] {
  const { on, to, far } = seenMotion(view, moved, part);
  const key = `motion ${moved.bar}`;
  if (far < SEEN) return moved.chosen ? [curve(key, kind, true, to)] : [];
  if (!moved.chosen) return [curve(key, kind, false, to)];
  return [
    {
      kind: 'path',
      key: `${key} ground`,
      look: 'scene-bow-ground',
      d: polyline([...to, ...[...on].reverse()], true),
    },
    { kind: 'path', key: `${key} ribs`, look: 'scene-bow-rib', d: ribs(on, to) },
    curve(key, kind, true, to),
  ];
}

/** A bar's line as it was and as it has moved, and the most that a place of it has moved, px. */
function seenMotion(view: SheetView, { points }: MotionLine, part: number) {
  const on = points.map((point) => onSheet(view, point.on));
  const to = points.map((point) => onSheet(view, moveTo(point, part)));
  return { on, to, far: farthest(on, to) };
}

function moveTo({ on, by }: MovedPoint, part: number): MovedPoint['on'] {
  return add(on, scale(by, part));
}

function curve(key: string, kind: DrawnMotion['kind'], chosen: boolean, to: readonly Vec2[]): Ink {
  const look = chosen ? (kind === 'push' ? 'scene-pushed' : 'scene-bow') : 'scene-along';
  return { kind: 'path', key: `${key} line`, look, d: smooth(to) };
}

/** Shares of a bar's points beside which its word may stand, the likeliest first. */
const BESIDE = { chosen: [0.78, 0.22, 0.9, 0.1], along: [0.24, 0.76, 0.1, 0.9] } as const;

/** "D2 follows", "D1 bends": beside the line, between its farthest place and an end; left out where there is no room. */
function wordsOf(
  view: SheetView,
  layout: Layout,
  lines: readonly MotionLine[],
  part: number,
  inTheWay: readonly Box[],
): readonly Ink[] {
  const words: Words[] = [];
  for (const moved of lines) {
    const mark = layout.bars.get(moved.bar)?.mark;
    if (mark === undefined || seenMotion(view, moved, part).far < WORTH_A_WORD) continue;
    const taken = [...inTheWay, ...words.map(wordsBox)];
    const text = `${mark} ${moved.chosen ? 'follows' : 'bends'}`;
    const found = BESIDE[moved.chosen ? 'chosen' : 'along']
      .flatMap((share) => wordBeside(view, moved, share, text))
      .find((word) => taken.every((box) => overlap(wordsBox(word), box) === 0));
    if (found !== undefined) words.push(found);
  }
  return words;
}

type Words = Extract<Ink, { readonly kind: 'words' }>;

function wordBeside(view: SheetView, moved: MotionLine, share: number, text: string): readonly Words[] {
  const at = moved.points[Math.round(moved.points.length * share)];
  if (at === undefined) return [];
  const [x, y] = onSheet(view, moveTo(at, 1));
  const [ox, oy] = onSheet(view, at.on);
  const left = x < ox || (x === ox && y < oy);
  return [
    {
      kind: 'words',
      key: `motion ${moved.bar} word`,
      look: 'scene-words motion',
      at: [x + (left ? -9 : 9), y + 4],
      anchor: left ? 'end' : 'start',
      text,
    },
  ];
}

function ribs(on: readonly Vec2[], to: readonly Vec2[]): string {
  // About a dozen, whatever the number of points.
  const step = Math.max(1, Math.round(on.length / 12));
  return on
    .flatMap((from, k) => {
      const tip = to[k];
      return k % step !== 0 || tip === undefined ? [] : [line(from, tip)];
    })
    .join('');
}

function farthest(on: readonly Vec2[], to: readonly Vec2[]): number {
  return on.reduce((most, [x, y], k) => {
    const tip = to[k];
    return tip === undefined ? most : Math.max(most, Math.hypot(tip[0] - x, tip[1] - y));
  }, 0);
}

/** A curve through all its points: cubic pieces whose slopes are those between the neighbours. */
function smooth(points: readonly Vec2[]): string {
  const at = (k: number): Vec2 => points[Math.min(points.length - 1, Math.max(0, k))] ?? [0, 0];
  const px = (value: number): string => value.toFixed(1);
  const [x0, y0] = at(0);
  const pieces = points.slice(1).map((_, k) => {
    const [a, b, c, d] = [at(k - 1), at(k), at(k + 1), at(k + 2)];
    const one = along2(b, [(c[0] - a[0]) / 6, (c[1] - a[1]) / 6]);
    const two = along2(c, [(b[0] - d[0]) / 6, (b[1] - d[1]) / 6]);
    return `C${px(one[0])} ${px(one[1])} ${px(two[0])} ${px(two[1])} ${px(c[0])} ${px(c[1])}`;
  });
  return `M${px(x0)} ${px(y0)}${pieces.join('')}`;
}

const along2 = (a: Vec2, by: Vec2): Vec2 => [a[0] + by[0], a[1] + by[1]];
