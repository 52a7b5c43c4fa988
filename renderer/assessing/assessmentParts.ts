/** A large assessment in parts, each small enough to be taken in without holding the window up. */
import type { Assessment } from '../../core/assessment.ts';
import type { Layout } from '../../core/layout/model.ts';
import type { Project } from '../../core/project/model.ts';

/** What is small, or cannot be parted. The project is known to whoever asked. */
export type AssessmentHead = Pick<Assessment, 'practice' | 'forces' | 'findings' | 'counts' | 'breaksLimit'>;

type Entries<M> = M extends ReadonlyMap<infer K, infer V> ? readonly (readonly [K, V])[] : never;

export interface AssessmentPart {
  readonly layoutBays: Layout['bays'];
  readonly nodes: Entries<Layout['nodes']>;
  readonly bars: Entries<Layout['bars']>;
  readonly crossings: Entries<Layout['crossings']>;
  readonly diagonals: Entries<Assessment['diagonals']>;
  readonly members: Entries<Assessment['members']>;
  readonly schedule: Assessment['schedule'];
  readonly bays: Entries<Assessment['bays']>;
}

/** Bays in a part. */
const BAYS_EACH = 20;

export const partsOf = ({ layout }: Assessment): number =>
  Math.max(1, Math.ceil(layout.bays.length / BAYS_EACH));

export function headOf(assessment: Assessment): AssessmentHead {
  const { practice, forces, findings, counts, breaksLimit } = assessment;
  return { practice, forces, findings, counts, breaksLimit };
}

/** Part `k` of `partsOf`: of everything an even share, in order. */
export function partOf(assessment: Assessment, k: number): AssessmentPart {
  const of = partsOf(assessment);
  const share = <T>(all: readonly T[]): readonly T[] =>
    all.slice(Math.floor((k * all.length) / of), Math.floor(((k + 1) * all.length) / of));
  const { layout, diagonals, members, schedule, bays } = assessment;
  return {
    layoutBays: share(layout.bays),
    nodes: share([...layout.nodes]),
    bars: share([...layout.bars]),
    crossings: share([...layout.crossings]),
    diagonals: share([...diagonals]),
    members: share([...members]),
    schedule: share(schedule),
    bays: share([...bays]),
  };
}

export function joinedAssessment(
  project: Project,
  head: AssessmentHead,
  parts: readonly AssessmentPart[],
): Assessment {
  return {
    ...head,
    project,
    layout: {
      bays: parts.flatMap((part) => part.layoutBays),
      nodes: new Map(parts.flatMap((part) => part.nodes)),
      bars: new Map(parts.flatMap((part) => part.bars)),
      crossings: new Map(parts.flatMap((part) => part.crossings)),
    },
    diagonals: new Map(parts.flatMap((part) => part.diagonals)),
    members: new Map(parts.flatMap((part) => part.members)),
    schedule: parts.flatMap((part) => part.schedule),
    bays: new Map(parts.flatMap((part) => part.bays)),
  };
}
