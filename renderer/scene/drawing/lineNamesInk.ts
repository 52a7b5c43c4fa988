import { add } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';
import { from, heading, type Ink } from './ink.ts';

/** From the end of the purlin to the middle of its name, px. */
const OFF = 14;

/** Names whose middles are nearer than this lie on one another, px. */
const APART: readonly [number, number] = [20, 12];

/** The names of purlins and rails past their right-hand ends on the sheet; none where they are seen end on, or where another's stands already. */
export function lineNamesInk(view: SheetView, layout: Layout, bay: BayLayout): readonly Ink[] {
  const named: (readonly [number, number])[] = [];
  return bay.bars.flatMap((id): readonly Ink[] => {
    const bar = layout.bars.get(id);
    if (!bar?.line) return [];
    const way = heading(directionOnSheet(view, bar.direction), 0.3 * view.pxPerMm);
    if (way === null) return [];
    const [end, out] = way[0] >= 0 ? [bar.to, way] : [bar.from, [-way[0], -way[1]] as const];
    const [x, y] = from(onSheet(view, add(end, bar.offset)), out, OFF);
    if (named.some((other) => Math.abs(other[0] - x) < APART[0] && Math.abs(other[1] - y) < APART[1]))
      return [];
    named.push([x, y]);
    return [
      {
        kind: 'words',
        key: `line ${id}`,
        look: 'scene-words quiet',
        at: [x, y + 4],
        anchor: 'middle',
        text: bar.line.id,
      },
    ];
  });
}
