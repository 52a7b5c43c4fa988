import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { directionOnSheet, type SheetView } from '../view/sheetView.ts';

/** px of dragging for each kN. */
const PX_PER_KN = 3;
/** A drag shorter than this places nothing, px. */
const STILL = 6;

/**
 * The force that a drag from a node gives, kN: along the bay or upright, whichever the hand follows more, in whole kN on top of what is there.
 *
 * @param right along the bay, unit vector
 */
export function draggedForce(view: SheetView, right: Vec3, before: Vec3, drag: Vec2): Vec3 | null {
  if (Math.hypot(...drag) < STILL) return null;
  const along = on(drag, directionOnSheet(view, right));
  const up = on(drag, directionOnSheet(view, [0, 0, 1]));
  const step = Math.round((Math.abs(along) >= Math.abs(up) ? along : up) / PX_PER_KN);
  return Math.abs(along) >= Math.abs(up) ? moved(before, right, step) : moved(before, [0, 0, 1], step);
}

/** Arrow keys on a node: 1 kN a press, 10 with shift. Null for other keys. */
export function keyedForce(key: string, shift: boolean, right: Vec3, before: Vec3): Vec3 | null {
  const step = shift ? 10 : 1;
  switch (key) {
    case 'ArrowRight':
      return moved(before, right, step);
    case 'ArrowLeft':
      return moved(before, right, -step);
    case 'ArrowUp':
      return moved(before, [0, 0, 1], step);
    case 'ArrowDown':
      return moved(before, [0, 0, 1], -step);
    case 'Delete':
    case 'Backspace':
      return [0, 0, 0];
    default:
      return null;
  }
}

/** How far a drag goes along a direction on the sheet, px. */
function on(drag: Vec2, direction: Vec2): number {
  const size = Math.hypot(...direction);
  return size < 1e-9 ? 0 : (drag[0] * direction[0] + drag[1] * direction[1]) / size;
}

const tidy = (kN: number): number => Math.round(kN * 1000) / 1000;
const moved = (force: Vec3, way: Vec3, step: number): Vec3 => [
  tidy(force[0] + way[0] * step),
  tidy(force[1] + way[1] * step),
  tidy(force[2] + way[2] * step),
];
