/** Time and memory of `assess`: by the marks, and with stiffness and critical loads beside them. */
import { assess } from '../../core/assess.ts';
import { CATALOGUES, DIAGONALS_EACH, fourPanelBays, freeRow } from './given.ts';
import { heapKept, timed } from './measured.ts';
import { ms, type Row, row } from './row.ts';

const BAYS = 1000;
const MANY = 10_000;
/** Ten times the bays may take ten times as long, and a little for a heap that no longer fits the caches. */
const LINEAR = 12;

export function assessing(): readonly Row[] {
  const thousand = fourPanelBays(BAYS);
  const diagonals = BAYS * DIAGONALS_EACH;
  const marks = timed(() => assess(thousand, CATALOGUES, 'by the marks'), 9);
  const kept = heapKept(() => assess(thousand, CATALOGUES, 'by the marks'));
  const all = timed(() => assess(thousand, CATALOGUES), 3, 1);

  const tenThousand = fourPanelBays(MANY);
  const many = timed(() => assess(tenThousand, CATALOGUES, 'by the marks'), 3, 0);
  const growth = many.least / marks.least;

  const drawn = [500, 5000].map((pairs) => {
    const project = freeRow(pairs);
    return timed(() => assess(project, CATALOGUES, 'by the marks'), 3, 1).least;
  });
  const freeGrowth = (drawn[1] ?? 0) / (drawn[0] ?? 1);

  return [
    row(
      `assess by the marks, 1 000 four-panel bays, median of ${marks.runs}`,
      ms(marks.median),
      'under 1 s',
      marks.median < 1000,
    ),
    row('  the least of them', ms(marks.least)),
    row('  for each diagonal, 8 000 of them', `${((marks.median / diagonals) * 1000).toFixed(0)} µs`),
    row(
      '  heap kept',
      `${(kept / 1e6).toFixed(0)} MB, ${(kept / diagonals / 1000).toFixed(1)} kB a diagonal`,
    ),
    row('  10 000 such bays, least of 3', ms(many.least)),
    row(
      '  growth from 1 000 to 10 000 bays',
      `× ${growth.toFixed(1)}`,
      `about × 10, at most × ${LINEAR}`,
      growth <= LINEAR,
    ),
    row('one bay drawn freely, 10 000 crossed bars, least of 3', ms(drawn[1] ?? 0)),
    row(
      '  growth from 1 000 such bars',
      `× ${freeGrowth.toFixed(1)}`,
      `about × 10, at most × ${LINEAR}`,
      freeGrowth <= LINEAR,
    ),
    row(
      `assess with all levels, 1 000 four-panel bays, median of ${all.runs}`,
      ms(all.median),
      'under 5 s',
      all.median < 5000,
    ),
    row('  for each diagonal', `${((all.median / diagonals) * 1000).toFixed(0)} µs`),
  ];
}
