/** What the window asks for while someone waits: a shortlist, and remedies with their effect. */
import { assess } from '../../core/assess.ts';
import type { Project } from '../../core/project/model.ts';
import { remediesFor } from '../../core/remedies/remedies.ts';
import { shortlist } from '../../core/shortlist/shortlist.ts';
import { CATALOGUES, fourPanelBays } from './given.ts';
import { timed } from './measured.ts';
import { ms, type Row, row } from './row.ts';

export function choosing(): readonly Row[] {
  return [
    ...choosingIn('one four-panel bay', fourPanelBays(1), 15),
    ...choosingIn('one of 100 four-panel bays', fourPanelBays(100), 5),
  ];
}

function choosingIn(what: string, project: Project, runs: number): readonly Row[] {
  const assessment = assess(project, CATALOGUES);
  const bars = assessment.layout.bays[0]?.diagonals ?? [];
  const finding = assessment.findings.find((each) => each.kind === 'too slender in service');
  if (!finding) throw new Error('the measured bay has nothing to mend');
  const one = timed(() => shortlist(assessment, CATALOGUES, bars.slice(0, 1), { placements: 'both' }), runs);
  const group = timed(() => shortlist(assessment, CATALOGUES, bars, { placements: 'both' }), runs);
  const remedies = timed(() => remediesFor(assessment, finding, CATALOGUES), runs);
  return [
    row(`shortlist of one diagonal, both legs tried, ${what}`, ms(one.median)),
    row(`  of its ${bars.length} diagonals sharing a size`, ms(group.median)),
    row(`remedies of one finding, ${what}`, ms(remedies.median)),
  ];
}
