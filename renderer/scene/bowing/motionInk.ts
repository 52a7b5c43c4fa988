import { add, scale, type Vec2 } from '../../../core/geometry/vector.ts';
import type { Layout } from '../../../core/layout/model.ts';
import { type Ink, line, polyline } from '../drawing/ink.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import type { DrawnMotion, MotionLine, MovedPoint } from './drawnMotion.ts';

/** What moves less than this on the sheet is not seen to move, px. */
const SEEN = 1.5;
/** A line must move by this to be worth a word, px. */
const WORTH_A_WORD = 14;

/** The bars where they have moved to, over where they were: the chosen one in full, those that go with it dashed. @param part of the drawn displacement, −1 to 1 */
export function motionInk(
  view: SheetView,
  layout: Layout,
  motion: DrawnMotion,
  part: number,
): readonly Ink[] {
  // What goes along lies under the chosen bar.
  const inOrder = [...motion.lines].sort((a, b) => Number(a.chosen) - Number(b.chosen));
  return inOrder.flatMap((moved) => lineInk(view, layout, motion.kind, moved, part));
}

function lineInk(
  view: SheetView,
  layout: Layout,
  kind: DrawnMotion['kind'],
  moved: MotionLine,
  part: number,
): readonly Ink[] {
  const on = moved.points.map((point) => onSheet(view, point.on));
  const to = moved.points.map((point) => onSheet(view, moveTo(point, part)));
  const most = farthest(on, to);
  const from = on[most];
  const tip = to[most];
  if (from === undefined || tip === undefined) return [];
  const far = Math.hypot(tip[0] - from[0], tip[1] - from[1]);
  const key = `motion ${moved.bar}`;
  if (far < SEEN) return moved.chosen ? [curve(key, kind, true, to)] : [];
  if (!moved.chosen) return [curve(key, kind, false, to), ...word(view, layout, kind, moved, far)];
  return [
    {
      kind: 'path',
      key: `${key} ground`,
      look: 'scene-bow-ground',
      d: polyline([...to, ...[...on].reverse()], true),
    },
    { kind: 'path', key: `${key} ribs`, look: 'scene-bow-rib', d: ribs(on, to) },
    curve(key, kind, true, to),
    ...word(view, layout, kind, moved, far),
  ];
}

function moveTo({ on, by }: MovedPoint, part: number): MovedPoint['on'] {
  return add(on, scale(by, part));
}

function curve(key: string, kind: DrawnMotion['kind'], chosen: boolean, to: readonly Vec2[]): Ink {
  const look = chosen ? (kind === 'push' ? 'scene-pushed' : 'scene-bow') : 'scene-along';
  return { kind: 'path', key: `${key} line`, look, d: smooth(to) };
}

/** "D2 follows", "D1 bends": beside the line, between its farthest place and an end. */
function word(
  view: SheetView,
  layout: Layout,
  kind: DrawnMotion['kind'],
  moved: MotionLine,
  far: number,
): readonly Ink[] {
  const bar = layout.bars.get(moved.bar);
  if (kind !== 'push' || far < WORTH_A_WORD || bar === undefined) return [];
  const at = moved.points[Math.round(moved.points.length * (moved.chosen ? 0.78 : 0.24))];
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
      text: `${bar.mark} ${moved.chosen ? 'follows' : 'bends'}`,
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
  let most = 0;
  let best = -1;
  on.forEach(([x, y], k) => {
    const tip = to[k];
    const far = tip === undefined ? -1 : Math.hypot(tip[0] - x, tip[1] - y);
    if (far > best) {
      best = far;
      most = k;
    }
  });
  return most;
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
