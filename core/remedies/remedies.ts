import { assess } from '../assess.ts';
import type { Assessment } from '../assessment.ts';
import { BowingMemory } from '../bowing/memory.ts';
import type { Catalogues } from '../catalogue/model.ts';
import type { Finding, Severity } from '../findings/model.ts';
import { sagOf } from '../findings/sag.ts';
import type { BarId } from '../layout/model.ts';
import { applyEdit } from '../project/applyEdit.ts';
import type { Project } from '../project/model.ts';
import { proposalsFor } from './answers.ts';
import type { Remedy, RemedyEffect } from './model.ts';

const SEVERITIES: readonly Severity[] = ['must fix', 'look into', 'note'];

/** More than this nobody reads. */
const MOST = 4;

/**
 * What answers a finding, each remedy with its effect found by assessing the changed project. Remedies that make
 * nothing better are left out.
 *
 * @param memory of the bays that no remedy touches; given by whoever asks often
 */
export function remediesFor(
  assessment: Assessment,
  finding: Finding,
  catalogues: Catalogues,
  memory: BowingMemory = new BowingMemory(),
): readonly Remedy[] {
  const proposals = proposalsFor(assessment, finding, catalogues);
  const useful = proposals.flatMap((proposal, index): readonly Remedy[] => {
    const after = assess(withRemedy(assessment.project, proposal), catalogues, 'all levels', memory);
    const effect = effectOf(assessment, after, finding);
    const helps = effect.answers || improves(finding, effect) || weighsLess(finding, after);
    return helps ? [{ id: `${finding.id}#${index}`, ...proposal, effect }] : [];
  });
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

/** What changes between two assessments, as seen from one finding. */
export function effectOf(before: Assessment, after: Assessment, finding: Finding): RemedyEffect {
  const had = new Set(before.findings.map(({ id }) => id));
  const has = new Set(after.findings.map(({ id }) => id));
  const closes = [...had].filter((id) => !has.has(id));
  return {
    before: figureOf(before, finding),
    after: figureOf(after, finding),
    limit: limitOf(after, finding),
    massPerMetreChange: heaviest(after, finding.bars) - heaviest(before, finding.bars),
    closes,
    opens: [...has].filter((id) => !had.has(id)),
    answers:
      !has.has(finding.id) && !after.findings.some((each) => !had.has(each.id) && isSame(each, finding)),
  };
}

/** A finding goes by the worst or the first of its bars: when that changes, it is the same finding under another name. */
function isSame(one: Finding, other: Finding): boolean {
  return (
    one.kind === other.kind &&
    one.bay === other.bay &&
    one.crossing === other.crossing &&
    one.bars.some((bar) => other.bars.includes(bar))
  );
}

/** The finding's own figure: least sag ratio for sag, fabricated slenderness for handling, in-service slenderness for the rest. */
function figureOf(assessment: Assessment, finding: Finding): number | null {
  const figures = finding.bars.flatMap((bar) => {
    if (finding.kind === 'sag') return sagRatioOf(assessment, bar);
    const diagonal = assessment.diagonals.get(bar);
    if (finding.kind === 'resistance exceeded') return diagonal?.checks?.governing?.utilisation ?? [];
    const verdict = finding.kind === 'too slender to handle' ? diagonal?.handling : diagonal?.inService;
    return verdict ? [verdict.slenderness] : [];
  });
  if (figures.length === 0) return null;
  return finding.kind === 'sag' ? Math.min(...figures) : Math.max(...figures);
}

function sagRatioOf(assessment: Assessment, id: BarId): readonly number[] {
  const bar = assessment.layout.bars.get(id);
  const restraint = assessment.diagonals.get(id)?.restraint;
  if (!bar?.angle?.stock || !restraint) return [];
  const sag = sagOf(bar, bar.angle, bar.angle.stock.properties, restraint.stations);
  return sag ? [sag.ratio] : [];
}

/** What the figure is held against. */
function limitOf(after: Assessment, finding: Finding): number | null {
  if (finding.kind === 'sag') return after.project.settings.sagRatio;
  if (finding.kind === 'resistance exceeded') return 1;
  return after.diagonals.get(finding.bars[0] ?? '')?.limit.limit ?? finding.limit;
}

function heaviest(assessment: Assessment, bars: readonly BarId[]): number {
  return bars.reduce(
    (most, bar) => Math.max(most, assessment.layout.bars.get(bar)?.angle?.stock?.massPerMetre ?? 0),
    0,
  );
}

/** By more than a half, which is what a reader sees: a smaller slenderness, a larger ratio of length to sag. */
function improves(finding: Finding, { before, after }: RemedyEffect): boolean {
  if (before === null || after === null) return false;
  if (finding.kind === 'resistance exceeded') return after < before - 0.005;
  return finding.kind === 'sag' ? after > before + 0.5 : after < before - 0.5;
}

/** Whether the finding stays, but is no longer as grave: a claim withdrawn is a note where a false one was to be looked into. */
function weighsLess(finding: Finding, after: Assessment): boolean {
  const now = after.findings.find(({ id }) => id === finding.id);
  return now !== undefined && SEVERITIES.indexOf(now.severity) > SEVERITIES.indexOf(finding.severity);
}
