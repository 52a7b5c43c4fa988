import type { Vec2 } from '../../../core/geometry/vector.ts';
import { along } from '../../../core/geometry/vector.ts';
import type { Bar } from '../../../core/layout/model.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';
import { type BowShape, bowedPoint } from './bowShape.ts';
import { type Ink, line, polyline } from './ink.ts';

/** Straight pieces of the curve, and the ribs from bar to curve. */
const CHORDS = 48;
const RIBS = 12;

/** A bow whose direction is foreshortened to less than this part of its length is seen end on, and drawn as words alone. */
export const END_ON = 0.2;

/** The ghost of the bowed bar: its line dashed, the ground between hatched with ribs. */
export function bowInk(view: SheetView, bar: Bar, bow: BowShape, grown: number): readonly Ink[] {
  if (seenEndOn(view, bow)) return [];
  const curve = Array.from(
    { length: CHORDS + 1 },
    (_, index): Vec2 => onSheet(view, bowedPoint(bar, bow, index / CHORDS, grown)),
  );
  const ribs = Array.from({ length: RIBS - 1 }, (_, index) => {
    const part = (index + 1) / RIBS;
    const on = along(bar.from, bar.direction, bow.from + part * (bow.to - bow.from));
    return line(onSheet(view, on), onSheet(view, bowedPoint(bar, bow, part, grown)));
  }).join('');
  return [
    { kind: 'path', key: 'bow ground', look: 'scene-bow-ground', d: polyline(curve, true) },
    { kind: 'path', key: 'bow ribs', look: 'scene-bow-rib', d: ribs },
    { kind: 'path', key: 'bow line', look: 'scene-bow', d: polyline(curve) },
  ];
}

export function seenEndOn(view: SheetView, bow: BowShape): boolean {
  const run = directionOnSheet(view, bow.direction);
  return Math.hypot(run[0], run[1]) < END_ON * view.pxPerMm;
}
