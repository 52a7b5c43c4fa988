import { add, along, scale, type Vec2 } from '../../../core/geometry/vector.ts';
import type { Bar } from '../../../core/layout/model.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import { placeMovement } from './drawnMotion.ts';
import type { PushShown } from './pushShown.ts';

/** How near the pointer must come to the bar's line, and to a named place on it to mean that place, px. */
const REACH = 15;
const SNAP = 13;
/** The ends are held: nearer to them than this share of the length there is nothing to push. */
const ENDS = 0.04;

/**
 * The place on the bar under the pointer, mm from end i; null when the pointer is beside the bar.
 * @param places where it would rather be, mm from end i
 */
export function placeUnder(
  view: SheetView,
  bar: Bar,
  pointer: Vec2,
  places: readonly number[],
): number | null {
  const i = onSheet(view, bar.from);
  const j = onSheet(view, bar.to);
  const run: Vec2 = [j[0] - i[0], j[1] - i[1]];
  const long = Math.hypot(...run);
  if (long < 1) return null;
  const part = ((pointer[0] - i[0]) * run[0] + (pointer[1] - i[1]) * run[1]) / long ** 2;
  const beside = Math.abs((pointer[0] - i[0]) * run[1] - (pointer[1] - i[1]) * run[0]) / long;
  if (beside > REACH || part < 0 || part > 1) return null;
  const at = Math.min(1 - ENDS, Math.max(ENDS, part)) * bar.length;
  const near = places.find((place) => (Math.abs(place - at) / bar.length) * long <= SNAP);
  // Whole centimetres: nobody points at a tenth of a millimetre.
  return near ?? Math.round(at / 10) * 10;
}

/** Whether the pointer is on the pushed place as it is drawn, moved away from the bar. */
export function isOnPushedPlace(view: SheetView, bar: Bar, push: PushShown, pointer: Vec2): boolean {
  if (push.test === null) return false;
  const moved = scale(placeMovement(push.test, push.force), push.times);
  const [x, y] = onSheet(view, add(along(bar.from, bar.direction, push.at), moved));
  return Math.hypot(pointer[0] - x, pointer[1] - y) <= REACH;
}
