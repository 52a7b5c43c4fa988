import { assess } from '../assess.ts';
import type { Assessment } from '../assessment.ts';
import type { Catalogues } from '../catalogue/model.ts';
import type { Finding } from '../findings/model.ts';
import type { BarId } from '../layout/model.ts';
import { applyEdit } from '../project/applyEdit.ts';
import type { Project } from '../project/model.ts';
import { type Proposal, proposalsFor } from './answers.ts';
import type { Remedy, RemedyEffect } from './model.ts';

/** More than this nobody reads. */
const MOST = 4;

/**
 * What answers a finding, each remedy with its effect found by assessing the changed project. Remedies that make
 * nothing better are left out.
 */
export function remediesFor(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
): readonly Remedy[] {
  const proposals = proposalsFor(assessment, finding, catalogues);
  const remedies = proposals.map((proposal, index) =>
    remedyOf(assessment, finding, catalogues, proposal, index),
  );
  const useful = remedies.filter(({ effect }) => effect.answers || improves(effect));
  // Those that answer come first; within each, the order of the proposals stands.
  return [
    ...useful.filter(({ effect }) => effect.answers),
    ...useful.filter(({ effect }) => !effect.answers),
  ].slice(0, MOST);
}

/** The project with a remedy's edits made. */
export function withRemedy(project: Project, remedy: Pick<Remedy, 'edits'>): Project {
  return remedy.edits.reduce(applyEdit, project);
}

function remedyOf(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
  proposal: Proposal,
  index: number,
): Remedy {
  const after = assess(withRemedy(assessment.project, proposal), catalogues);
  return { id: `${finding.id}#${index}`, ...proposal, effect: effectOf(assessment, after, finding) };
}

/** What changes between two assessments, as seen from one finding. */
export function effectOf(before: Assessment, after: Assessment, finding: Finding): RemedyEffect {
  const had = new Set(before.findings.map(({ id }) => id));
  const has = new Set(after.findings.map(({ id }) => id));
  const closes = [...had].filter((id) => !has.has(id));
  return {
    before: figureOf(before, finding),
    after: figureOf(after, finding),
    limit: after.diagonals.get(finding.bars[0] ?? '')?.limit.limit ?? finding.limit,
    massPerMetreChange: heaviest(after, finding.bars) - heaviest(before, finding.bars),
    closes,
    opens: [...has].filter((id) => !had.has(id)),
    answers: !has.has(finding.id),
  };
}

/** The finding's own figure: sag ratio for sag, fabricated slenderness for handling, in-service slenderness for the rest. */
function figureOf(assessment: Assessment, finding: Finding): number | null {
  if (finding.kind === 'sag') return assessment.findings.find(({ id }) => id === finding.id)?.value ?? null;
  const figures = finding.bars.flatMap((bar) => {
    const diagonal = assessment.diagonals.get(bar);
    const verdict = finding.kind === 'too slender to handle' ? diagonal?.handling : diagonal?.inService;
    return verdict ? [verdict.slenderness] : [];
  });
  return figures.length > 0 ? Math.max(...figures) : null;
}

function heaviest(assessment: Assessment, bars: readonly BarId[]): number {
  return bars.reduce(
    (most, bar) => Math.max(most, assessment.layout.bars.get(bar)?.angle?.stock?.massPerMetre ?? 0),
    0,
  );
}

function improves({ before, after }: RemedyEffect): boolean {
  return before !== null && after !== null && after < before - 0.5;
}
