import type { BarChecks } from '../checks/model.ts';
import type { Finding } from '../findings/model.ts';
import { joinNameFor } from '../layout/joinWords.ts';
import type { AngleBar, Bar, BarId, BayLayout, Crossing, Layout } from '../layout/model.ts';
import type { LimitInForce, Verdict } from '../practice/model.ts';
import type { Project } from '../project/model.ts';
import { endsHoldOf } from '../restraint/endWords.ts';
import type { Lane, Restraint } from '../restraint/model.ts';
import type { Axis } from '../section/model.ts';
import type { RowVerdict, ScheduleRow } from './model.ts';

/** What the schedule needs to know of one diagonal; `DiagonalAssessment` has it and more. */
export interface ScheduledDiagonal {
  readonly restraint: Restraint | null;
  readonly limit: LimitInForce;
  readonly handling: Verdict | null;
  readonly inService: Verdict | null;
  readonly reason: string;
  readonly checks: BarChecks | null;
}

export interface ScheduleInput {
  readonly project: Project;
  readonly layout: Layout;
  readonly diagonals: ReadonlyMap<BarId, ScheduledDiagonal>;
  readonly findings: readonly Finding[];
}

/**
 * The bracing schedule: one row for each diagonal, knee and tie, bay by bay in the order of the layout.
 * Lengths mm, masses kg, nothing rounded. A bar without an assessment yet has no row.
 */
export function scheduleRows({ layout, diagonals, findings }: ScheduleInput): readonly ScheduleRow[] {
  const findingsOf = findingsByBar(findings);
  const crossingsOf = crossingsByBar(layout);
  return layout.bays.flatMap((bay) =>
    bay.diagonals.flatMap((id) => {
      const bar = layout.bars.get(id);
      const diagonal = diagonals.get(id);
      if (!bar?.angle || !diagonal) return [];
      return [
        rowOf(bay, bar, bar.angle, diagonal, layout, crossingsOf.get(id) ?? [], findingsOf.get(id) ?? []),
      ];
    }),
  );
}

function rowOf(
  bay: BayLayout,
  bar: Bar,
  angle: AngleBar,
  diagonal: ScheduledDiagonal,
  layout: Layout,
  crossings: readonly Crossing[],
  findings: readonly Finding[],
): ScheduleRow {
  const { spec, cut, mass, ends } = angle;
  const { restraint } = diagonal;
  return {
    mark: bar.mark,
    bay: bay.id,
    bar: bar.id,
    numberOff: bay.numberOff,
    hand: angle.hand,
    section: angle.stock?.designation ?? spec.section,
    grade: spec.grade,
    countedOn: spec.countedOn,
    setOutLength: bar.length,
    setBackI: ends.i.setBack,
    setBackJ: ends.j.setBack,
    cutLength: cut.total,
    pieces: cut.total > 0 ? cut.pieces.map((piece) => piece.to - piece.from) : [],
    crossingHoles: cut.holes.map(({ fromEndA }) => fromEndA),
    shape: angle.stock?.outline.shape?.kind ?? null,
    legInPlane: spec.legInPlane,
    heel: spec.heel,
    side: angle.side,
    packer: packerOf(crossings),
    massEach: mass,
    massTotal: mass === null ? null : mass * bay.numberOff,
    mass,
    joins: crossings.map((crossing) => joinWords(crossing, bar, layout)),
    unbraced: restraint && byAxis(restraint, (lane) => lane.unbraced),
    radius: restraint && byAxis(restraint, (lane) => lane.radius),
    slenderness: restraint && byAxis(restraint, (lane) => lane.slenderness),
    ...(restraint ? governingOf(restraint, diagonal.inService) : { governing: null, bound: null }),
    limit: diagonal.limit.limit,
    handling: rowVerdict(diagonal.handling),
    inService: rowVerdict(diagonal.inService),
    force:
      diagonal.checks && diagonal.checks.status !== 'no load'
        ? {
            tension: diagonal.checks.tension?.force ?? 0,
            compression: diagonal.checks.compression?.force ?? 0,
          }
        : null,
    utilisation:
      diagonal.checks && isShown(diagonal.checks) ? (diagonal.checks.governing?.utilisation ?? null) : null,
    governingCheck: diagonal.checks && checkWords(diagonal.checks),
    endsHold: endsHoldOf(angle),
    overrides: (angle.mark.overrides ?? []).map(({ axis, length, factor, reason }) => ({
      axis,
      length,
      factor,
      reason,
    })),
    reason: diagonal.reason,
    findings: findings.map(({ id, kind, severity, title }) => ({ id, kind, severity, title })),
  };
}

/** What the verdict rests on: the rule's span, a length set by hand, or of mixed holds the exact figure with the rule's bound beside it. */
function governingOf(
  { governing }: Restraint,
  inService: Verdict | null,
): Pick<ScheduleRow, 'governing' | 'bound'> {
  const { axis, angle, length, radius, slenderness, basis } = governing;
  if (basis !== 'mixed bound')
    return { governing: { axis, angle, length, radius, slenderness, basis }, bound: null };
  const exact = inService?.slenderness ?? slenderness;
  return {
    governing: { axis, angle, length: exact * radius, radius, slenderness: exact, basis: 'exact' },
    bound: { length, radius, slenderness },
  };
}

/** A bar whose checks leave something open has no figure for how much of it is used. */
const isShown = ({ status }: BarChecks): boolean => status !== 'unknown';

/** Where something acts, what is used most: "net rupture, end i, 13.2(a)(iii)". */
function checkWords(checks: BarChecks): string | null {
  const check = checks.governing;
  if (check === null || check.utilisation === null) return null;
  if (!isShown(checks)) return 'not checked: a rule gives no figure';
  const { kind, end, clause } = check.resistance;
  return [kind, ...(end === null ? [] : [`end ${end}`]), clause].join(', ');
}

function byAxis(restraint: Restraint, figureOf: (lane: Lane) => number): Readonly<Record<Axis, number>> {
  const { x, y, u, v } = restraint.lanes;
  return { x: figureOf(x), y: figureOf(y), u: figureOf(u), v: figureOf(v) };
}

function rowVerdict(verdict: Verdict | null): RowVerdict | null {
  if (verdict === null) return null;
  const { slenderness, limit, ok, asked } = verdict;
  return { slenderness, limit, ok, asked };
}

/** Thickness of the first packer on the bar, mm, as marked or as the gap asks; null where there is none. */
function packerOf(crossings: readonly Crossing[]): number | null {
  const packed = crossings.find(({ join }) => join?.kind === 'packed');
  return packed?.join?.kind === 'packed' ? (packed.join.packer ?? packed.gap) : null;
}

/** "D1: bolted through": the partner and what is done there, as this bar meets it. */
function joinWords(crossing: Crossing, bar: Bar, layout: Layout): string {
  const partner = crossing.a === bar.id ? crossing.b : crossing.a;
  const name = layout.bars.get(partner)?.mark ?? partner;
  return `${name}: ${joinNameFor(crossing, bar.key)}`;
}

function crossingsByBar(layout: Layout): ReadonlyMap<BarId, readonly Crossing[]> {
  const found = new Map<BarId, Crossing[]>();
  const note = (bar: BarId, crossing: Crossing): void => {
    const list = found.get(bar);
    if (list) list.push(crossing);
    else found.set(bar, [crossing]);
  };
  for (const crossing of layout.crossings.values()) {
    note(crossing.a, crossing);
    note(crossing.b, crossing);
  }
  for (const [bar, list] of found) {
    const along = (crossing: Crossing): number => (crossing.a === bar ? crossing.onA : crossing.onB);
    list.sort((one, other) => along(one) - along(other));
  }
  return found;
}

function findingsByBar(findings: readonly Finding[]): ReadonlyMap<BarId, readonly Finding[]> {
  const found = new Map<BarId, Finding[]>();
  for (const finding of findings) {
    for (const bar of finding.bars) {
      const list = found.get(bar);
      if (list) list.push(finding);
      else found.set(bar, [finding]);
    }
  }
  return found;
}
