/** What each join that makes sense at a crossing would do: the project is marked so and assessed again. */
import type { Assessment } from '../../core/assessment.ts';
import type { BarId, Crossing, CrossingId } from '../../core/layout/model.ts';
import { applyEdit } from '../../core/project/applyEdit.ts';
import type { Join, JoinKind, Project } from '../../core/project/model.ts';
import type { Claim } from '../../core/restraint/model.ts';
import type { BarReading, HoldReading, JoinReading } from './assessApi.ts';
import { isRefusedHold } from './refusedHold.ts';

export function joinReadings(
  assessment: Assessment,
  crossingId: CrossingId,
  assess: (project: Project) => Assessment,
): readonly JoinReading[] {
  const crossing = assessment.layout.crossings.get(crossingId);
  if (crossing === undefined) return [];
  return crossing.choices.map((kind) => {
    const join = joinOf(kind, crossing, assessment);
    const marked = applyEdit(assessment.project, { kind: 'join', crossings: [crossingId], join });
    return { join, bars: barsRead(assess(marked), crossingId) };
  });
}

/** The join of that kind, keeping what is marked already (which bar is cut, how thick the packer is). */
function joinOf(kind: JoinKind, crossing: Crossing, assessment: Assessment): Join {
  const { join } = crossing;
  if (join?.kind === kind) return join;
  switch (kind) {
    case 'none':
    case 'bolted':
    case 'welded':
    case 'hung':
      return { kind };
    case 'packed':
      return { kind, packer: null };
    case 'cut':
      return { kind, cutBar: assessment.layout.bars.get(crossing.b)?.key ?? '' };
    case 'purlin':
      return { kind, boltsAcross: 1 };
    default:
      return kind satisfies never;
  }
}

function barsRead(assessment: Assessment, crossingId: CrossingId): readonly BarReading[] {
  const crossing = assessment.layout.crossings.get(crossingId);
  if (crossing === undefined) return [];
  return [crossing.a, crossing.b].flatMap((bar) => {
    const reading = barRead(assessment, crossingId, bar);
    return reading === null ? [] : [reading];
  });
}

function barRead(assessment: Assessment, crossingId: CrossingId, bar: BarId): BarReading | null {
  const diagonal = assessment.diagonals.get(bar);
  if (diagonal === undefined) return null;
  const station = diagonal.restraint?.stations.find(({ crossings }) => crossings.includes(crossingId));
  const claims = station?.claims.filter(({ source }) => source === crossingId) ?? [];
  const verdict = diagonal.inService;
  return {
    bar,
    inPlane: holdRead(claims, 'in plane'),
    outOfPlane: holdRead(claims, 'out of plane'),
    twist: holdRead(claims, 'twist'),
    slenderness: verdict?.slenderness ?? null,
    limit: diagonal.limit.limit,
    status: diagonal.status,
  };
}

function holdRead(claims: readonly Claim[], direction: 'in plane' | 'out of plane' | 'twist'): HoldReading {
  // What a purlin holds along itself it holds in the plane.
  const made = claims.filter(
    (claim) =>
      claim.direction === direction || (direction === 'in plane' && claim.direction === 'along holder'),
  );
  if (made.some(({ counted }) => counted)) return 'held';
  return made.some(isRefusedHold) ? 'claimed' : 'nothing';
}
