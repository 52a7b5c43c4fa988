/** Draw calls and time for the steel of ten thousand bars, by the scene's own builders. */
import { assess } from '../../core/assess.ts';
import { drawPlan, OVERLAY_DRAWS } from '../../renderer/scene/geometry/drawPlan.ts';
import { mergedSteel } from '../../renderer/scene/geometry/mergedSteel.ts';
import { steelwork } from '../../renderer/scene/geometry/steelwork.ts';
import { CATALOGUES, fourPanelBays } from './given.ts';
import { timed } from './measured.ts';
import { ms, type Row, row } from './row.ts';

/** A four-panel bay has eight diagonals, eight columns and four beams. */
const BARS_EACH = 20;
const BARS = 10_000;

export function drawing(): readonly Row[] {
  const { layout } = assess(fourPanelBays(BARS / BARS_EACH), CATALOGUES, 'by the marks');
  const merged = mergedSteel(steelwork(layout, 'true'));
  const middle = layout.bays[Math.floor(layout.bays.length / 2)]?.id ?? null;
  const calls = Math.max(drawPlan(merged, middle).length, drawPlan(merged, null).length) + OVERLAY_DRAWS;
  const time = timed(() => mergedSteel(steelwork(layout, 'true')), 3, 1);
  return [
    row(
      `draw calls for ${layout.bars.size} bars, selection and pointer included`,
      `${calls}`,
      'under 20',
      calls < 20,
    ),
    row('  triangles', `${(merged.triangles.length / 3 / 1000).toFixed(0)} thousand`),
    row('  building the solids', ms(time.median)),
  ];
}
