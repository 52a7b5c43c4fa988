import type { Vec2 } from '../../../core/geometry/vector.ts';
import { along, scale } from '../../../core/geometry/vector.ts';
import type { Sight } from '../geometry/pick.ts';
import type { SheetView } from '../view/sheetView.ts';

/** Farther in front of the sheet than any project reaches, mm. */
const IN_FRONT = 1e7;

/** Reach of a pointer round its tip, px. */
const REACH = 6;

/** The line of sight through a point of the sheet. */
export function sightAt(view: SheetView, [x, y]: Vec2): Sight {
  const onRight = along(view.centre, view.right, (x - view.width / 2) / view.pxPerMm);
  const on = along(onRight, view.up, (view.height / 2 - y) / view.pxPerMm);
  return { from: along(on, view.towards, IN_FRONT), into: scale(view.towards, -1) };
}

/** The reach of a pointer in the space of the view, mm. */
export function pointerReach(view: SheetView): number {
  return REACH / view.pxPerMm;
}
