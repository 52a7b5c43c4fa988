import { assess } from '../assess.ts';
import type { Assessment } from '../assessment.ts';
import type { Catalogues } from '../catalogue/model.ts';
import { joinName } from '../layout/joinWords.ts';
import type { BarId, Crossing } from '../layout/model.ts';
import { applyEdit } from '../project/applyEdit.ts';
import type { Reliance } from './model.ts';

/** Each join of a bay taken away in turn, ranked by what it costs the bar that loses most. */
export function relianceOf(assessment: Assessment, bay: string, catalogues: Catalogues): readonly Reliance[] {
  const source = assessment.project.bays.find((each) => each.id === bay);
  const layout = assessment.layout.bays.find((each) => each.id === bay);
  if (!source || !layout) return [];
  return layout.crossings
    .flatMap((id) => assessment.layout.crossings.get(id) ?? [])
    .filter(({ join }) => join !== null && join.kind !== 'none' && join.kind !== 'hung')
    .map((crossing) => without(assessment, crossing, catalogues))
    .sort((a, b) => b.after / b.limit - b.before / b.limit - (a.after / a.limit - a.before / a.limit));
}

function without(assessment: Assessment, crossing: Crossing, catalogues: Catalogues): Reliance {
  const project = applyEdit(assessment.project, {
    kind: 'join',
    crossings: [crossing.id],
    join: { kind: 'none' },
  });
  const after = assess(project, catalogues, 'by the marks');
  const reading = (from: Assessment, bar: BarId): number =>
    from.diagonals.get(bar)?.inService?.slenderness ?? 0;
  const bars = assessment.layout.bays.find(({ id }) => id === crossing.bay)?.diagonals ?? [];
  const limitOf = (bar: BarId): number => assessment.diagonals.get(bar)?.limit.limit ?? 1;
  const loss = (bar: BarId): number => (reading(after, bar) - reading(assessment, bar)) / limitOf(bar);
  const worst = bars.reduce<BarId>((most, bar) => (loss(bar) > loss(most) ? bar : most), crossing.a);
  const had = new Set(assessment.findings.map(({ id }) => id));
  const mark = (id: BarId): string => assessment.layout.bars.get(id)?.mark ?? id;
  return {
    crossing: crossing.id,
    says: `${mark(crossing.a)} × ${mark(crossing.b)}, ${joinName(crossing.join)}`,
    bar: worst,
    before: reading(assessment, worst),
    after: reading(after, worst),
    limit: limitOf(worst),
    opens: after.findings.map(({ id }) => id).filter((id) => !had.has(id)),
  };
}
