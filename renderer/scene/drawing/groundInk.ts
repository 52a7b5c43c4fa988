import type { Vec3 } from '../../../core/geometry/vector.ts';
import { along } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import { footOf } from '../geometry/plateParts.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import { type Ink, line } from './ink.ts';

const DOWN: Vec3 = [0, 0, -1];

/** Half the ground line under a foot, mm, how many hatches it has, and how long they are. */
const HALF = 380;
const HATCHES = 9;
const HATCH = 150;

/** Foot of the base plate below the set-out point, mm. */
const PLATE = 25;

/** The earth under the columns that stand on a foundation. */
export function groundInk(view: SheetView, layout: Layout, bay: BayLayout): readonly Ink[] {
  const plane = bay.planes[0];
  // Seen from straight above the earth line would run across the foot of the column and say nothing.
  if (!plane || bay.kind !== 'wall' || view.up[2] < 0.2) return [];
  const ink: Ink[] = [];
  for (const id of bay.bars) {
    const bar = layout.bars.get(id);
    if (bar?.role !== 'column') continue;
    const foot = footOf(bar);
    if (layout.nodes.get(foot.node)?.supports[bay.id]?.kind !== 'foundation') continue;
    const at = along(foot.at, DOWN, PLATE);
    const place = (right: number, down: number) =>
      onSheet(view, along(along(at, plane.right, right), DOWN, down));
    const hatches = Array.from({ length: HATCHES }, (_, index) => {
      const right = -HALF + ((index + 0.6) / HATCHES) * 2 * HALF;
      return line(place(right, 0), place(right - HATCH * 0.6, HATCH));
    }).join('');
    ink.push({ kind: 'path', key: `earth ${id}`, look: 'scene-earth', d: hatches });
    ink.push({
      kind: 'path',
      key: `ground ${id}`,
      look: 'scene-ground',
      d: line(place(-HALF, 0), place(HALF, 0)),
    });
  }
  return ink;
}
