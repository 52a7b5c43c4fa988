import { isExempt, type Prepared, prepared } from './assess/prepared.ts';
import type { Assessment, BaySummary, DiagonalAssessment } from './assessment.ts';
import { bayBowings } from './bowing/bowings.ts';
import { type BowingMemory, circumstances } from './bowing/memory.ts';
import type { NamedMechanism } from './bowing/model.ts';
import type { Catalogues } from './catalogue/model.ts';
import { barChecks } from './checks/barChecks.ts';
import type { CheckInput } from './checks/input.ts';
import { memberChecks } from './checks/memberChecks.ts';
import { memberLengths, squeezedMembers } from './checks/memberRuns.ts';
import type { MemberChecks } from './checks/model.ts';
import { governingSentence } from './documents/governingSentence.ts';
import { findingsOf } from './findings/findings.ts';
import type { Finding, Severity } from './findings/model.ts';
import type { Judged } from './findings/subject.ts';
import { turningSentence } from './findings/turning.ts';
import type { BarId, BayLayout, Layout } from './layout/model.ts';
import type { Practice } from './practice/model.ts';
import type { Pattern, Project } from './project/model.ts';
import { scheduleRows } from './schedule/scheduleRows.ts';

/** By the marks alone, or with stiffness and critical loads beside them. */
export type AssessmentDepth = 'by the marks' | 'all levels';

/** From this share of the limit on, a bar is near it. */
const NEAR = 0.85;

/**
 * The one road from a project to everything that is derived from it: layout, what holds each bar, verdicts, findings, schedule.
 * Pure and deterministic; the same project and catalogues give the same assessment.
 */
export function assess(
  project: Project,
  catalogues: Catalogues,
  depth: AssessmentDepth = 'all levels',
  memory: BowingMemory | null = null,
): Assessment {
  return assessmentOf(prepared(project, catalogues), depth, memory);
}

/** The rest of that road, from what has been prepared on. */
export function assessmentOf(
  prepared: Prepared,
  depth: AssessmentDepth = 'all levels',
  memory: BowingMemory | null = null,
): Assessment {
  const { project, practice, layout, forces, byMarks } = prepared;
  const { judged, movable } =
    depth === 'all levels'
      ? withBowing(prepared, memory)
      : { judged: byMarks, movable: new Map<string, readonly NamedMechanism[]>() };
  const checked = withChecks({ project, practice, forces }, judged, depth);
  const members = depth === 'all levels' ? membersChecked({ project, practice, forces }, layout) : new Map();
  const { holdings } = prepared.bowingInput.context;
  const findings = findingsOf({
    project,
    practice,
    layout,
    holdings,
    diagonals: checked,
    members,
    forces,
    movable,
  });
  const findingIds = idsByBar(findings);
  const diagonals = new Map(
    [...checked].map(
      ([id, each]) => [id, assessed(each, layout, project, practice, findingIds.get(id) ?? [])] as const,
    ),
  );
  return {
    project,
    practice,
    layout,
    diagonals,
    members,
    forces,
    findings,
    schedule: scheduleRows({ project, layout, diagonals, findings }),
    bays: new Map(
      layout.bays.map((bay, index) => [bay.id, summaryOf(bay, layout, diagonals, project, index)]),
    ),
    counts: countsOf(findings),
    breaksLimit: findings.some((finding) => finding.breaksLimit),
  };
}

/** Resistances, where all levels are asked for: compression rests on the critical loads. */
function withChecks(
  input: CheckInput,
  judged: ReadonlyMap<BarId, Judged>,
  depth: AssessmentDepth,
): ReadonlyMap<BarId, Judged> {
  if (depth === 'by the marks') return judged;
  const remembering = { ...input, tensions: new Map() };
  return new Map([...judged].map(([id, each]) => [id, { ...each, checks: barChecks(remembering, each) }]));
}

/** Struts and beams, bay by bay. */
function membersChecked(input: CheckInput, layout: Layout): ReadonlyMap<BarId, MemberChecks> {
  return new Map(
    layout.bays.flatMap((bay, index) => {
      const grade = input.project.bays[index]?.diagonals.grade ?? '';
      const members = squeezedMembers(bay, layout);
      const lengths = memberLengths(bay, layout, members);
      return members.flatMap((bar) => {
        const between = lengths.get(bar.id);
        return bar.member && between
          ? [[bar.id, memberChecks(input, bar, bar.member, between, bar.member.grade ?? grade)] as const]
          : [];
      });
    }),
  );
}

/** Levels 2 and 3, bay by bay. */
function withBowing(
  { project, layout, byMarks, bowingInput }: Prepared,
  memory: BowingMemory | null,
): {
  readonly judged: ReadonlyMap<BarId, Judged>;
  readonly movable: ReadonlyMap<string, readonly NamedMechanism[]>;
} {
  const judged = new Map(byMarks);
  const movable = new Map<string, readonly NamedMechanism[]>();
  layout.bays.forEach((bay, index) => {
    const source = project.bays[index];
    if (!source) return;
    const find = () => bayBowings(bowingInput, bay, source);
    const found = memory ? memory.recall(circumstances(bowingInput, bay, source, project), find) : find();
    if (found.movable.length > 0) movable.set(bay.id, found.movable);
    for (const [id, bowing] of found.bowings) {
      const known = judged.get(id);
      if (known) judged.set(id, { ...known, bowing });
    }
  });
  memory?.turn();
  return { judged, movable };
}

function assessed(
  judged: Judged,
  layout: Layout,
  project: Project,
  practice: Practice,
  findings: readonly string[],
): DiagonalAssessment {
  const { bar, restraint, turns, limit, handling, inService } = judged;
  const asked = [handling, inService].find((verdict) => verdict?.asked) ?? null;
  const nearness = asked ? asked.slenderness / asked.limit : null;
  return {
    bar: bar.id,
    restraint,
    turns,
    limit,
    handling,
    inService,
    bowing: judged.bowing,
    checks: judged.checks,
    nearness,
    status: turns
      ? 'over'
      : nearness === null && restraint && isExempt(practice, judged.angle)
        ? 'within'
        : nearness === null
          ? 'unknown'
          : nearness > 1
            ? 'over'
            : nearness >= NEAR
              ? 'near'
              : 'within',
    reason: restraint
      ? governingSentence(
          bar,
          restraint,
          layout,
          project.settings.units,
          inService && inService.bound !== null ? inService.slenderness : null,
        )
      : turns
        ? turningSentence(judged)
        : judged.angle.stock
          ? `The ends of ${bar.mark} leave no steel between them.`
          : `${judged.angle.spec.section} is in no stock list, so ${bar.mark} is not assessed.`,
    findings,
  };
}

function idsByBar(findings: readonly Finding[]): ReadonlyMap<BarId, readonly string[]> {
  const ids = new Map<BarId, string[]>();
  for (const finding of findings)
    for (const bar of finding.bars) {
      const list = ids.get(bar);
      if (list) list.push(finding.id);
      else ids.set(bar, [finding.id]);
    }
  return ids;
}

function countsOf(findings: readonly Finding[]): Readonly<Record<Severity, number>> {
  const counts = { 'must fix': 0, 'look into': 0, note: 0 };
  for (const finding of findings) counts[finding.severity] += 1;
  return counts;
}

function summaryOf(
  bay: BayLayout,
  layout: Layout,
  diagonals: ReadonlyMap<BarId, DiagonalAssessment>,
  project: Project,
  index: number,
): BaySummary {
  const all = bay.diagonals.flatMap((id) => diagonals.get(id) ?? []);
  const worst = all.reduce<DiagonalAssessment | null>(
    (most, each) => ((each.nearness ?? -1) > (most?.nearness ?? -1) ? each : most),
    null,
  );
  const verdict = worst ? [worst.handling, worst.inService].find((each) => each?.asked) : null;
  return {
    bay: bay.id,
    bars: bay.bars.length,
    diagonals: all.length,
    worst:
      worst && verdict ? { bar: worst.bar, slenderness: verdict.slenderness, limit: verdict.limit } : null,
    turning: all.filter(({ turns }) => turns !== null).length,
    mass: bay.diagonals.reduce((sum, id) => sum + (layout.bars.get(id)?.angle?.mass ?? 0), 0) * bay.numberOff,
    says: inWords(project, index, all.length),
  };
}

function inWords(project: Project, index: number, diagonals: number): string {
  const recipe = project.bays[index]?.recipe;
  const count = (n: number, one: string) => `${n} ${one}${n === 1 ? '' : 's'}`;
  const patterns = (all: readonly { readonly pattern: Pattern }[]) => {
    const different = [...new Set(all.map(({ pattern }) => pattern))];
    return different.length === 1 ? different[0] : 'mixed';
  };
  switch (recipe?.kind) {
    case 'wall':
      return `${count(recipe.tiers.length, 'tier')}, ${patterns(recipe.tiers)}`;
    case 'roof': {
      const panels = recipe.slopes.flatMap((slope) => slope.panels);
      const lines = recipe.slopes.reduce((sum, slope) => sum + slope.lines.length, 0);
      return `${count(panels.length, 'panel')}, ${lines > 0 ? count(lines, 'purlin') : patterns(panels)}`;
    }
    case 'knee':
      return `${count(recipe.count, recipe.sides === 'both' ? 'pair' : 'knee')}, to purlins`;
    case 'free':
      return `${count(recipe.bars.length, 'bar')}, ${count(diagonals, 'diagonal')}`;
    case undefined:
      return '';
    default:
      return recipe satisfies never;
  }
}
