import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { dot, subtract } from '../../../core/geometry/vector.ts';

/** A parallel view on the sheet: how the set-out (mm, Z up) falls on the screen (px, y down). */
export interface SheetView {
  /** Unit vectors: to the right on the sheet, up on it, and out of it towards the viewer. */
  readonly right: Vec3;
  readonly up: Vec3;
  readonly towards: Vec3;
  /** The point that falls on the middle of the sheet, mm. */
  readonly centre: Vec3;
  readonly pxPerMm: number;
  /** Of the sheet, px. */
  readonly width: number;
  readonly height: number;
}

/** Where a point falls on the sheet, px from its upper left corner. */
export function onSheet(view: SheetView, point: Vec3): Vec2 {
  const from = subtract(point, view.centre);
  return [
    view.width / 2 + dot(from, view.right) * view.pxPerMm,
    view.height / 2 - dot(from, view.up) * view.pxPerMm,
  ];
}

/** How a direction runs on the sheet: px for each mm along it; both zero when it is seen end on. */
export function directionOnSheet(view: SheetView, direction: Vec3): Vec2 {
  return [dot(direction, view.right) * view.pxPerMm, -dot(direction, view.up) * view.pxPerMm];
}

/** Distance in front of the middle of the sheet, mm; larger is nearer to the viewer. */
export function nearness(view: SheetView, point: Vec3): number {
  return dot(subtract(point, view.centre), view.towards);
}
