import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import { type Ink, line, polyline } from './ink.ts';

/** Half the arm of the cross at a set-out point, px. */
const ARM = 5;

/** The set-out of a bay: a chain line along each diagonal and a cross at each point that one ends at. */
export function setOutInk(view: SheetView, layout: Layout, bay: BayLayout): readonly Ink[] {
  const ink: Ink[] = [];
  const crossed = new Set<string>();
  for (const id of bay.diagonals) {
    const bar = layout.bars.get(id);
    if (!bar) continue;
    ink.push({
      kind: 'path',
      key: `set-out ${id}`,
      look: 'scene-chain',
      d: line(onSheet(view, bar.from), onSheet(view, bar.to)),
    });
    for (const node of [bar.i, bar.j]) {
      const at = layout.nodes.get(node)?.at;
      if (!at || crossed.has(node)) continue;
      crossed.add(node);
      const [x, y] = onSheet(view, at);
      ink.push({
        kind: 'path',
        key: `point ${node}`,
        look: 'scene-point',
        d:
          polyline([
            [x - ARM, y],
            [x + ARM, y],
          ]) +
          polyline([
            [x, y - ARM],
            [x, y + ARM],
          ]),
      });
    }
  }
  return ink;
}
