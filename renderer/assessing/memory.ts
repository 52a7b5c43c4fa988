import type { Assessment } from '../../core/assessment.ts';
import type { Project } from '../../core/project/model.ts';
import type { Snapshot } from './assessApi.ts';

/** Assessments kept in a worker: the project as it stands, one on trial, and a few gone before. */
const KEPT = 4;

/** Assesses each snapshot once, and keeps the last few. */
export function rememberedAssess(
  assess: (project: Project) => Assessment,
): (snapshot: Snapshot) => Assessment {
  const kept = new Map<number, Assessment>();
  return ({ serial, project }) => {
    const known = kept.get(serial);
    if (known !== undefined) return known;
    const fresh = assess(project);
    kept.set(serial, fresh);
    for (const old of [...kept.keys()].slice(0, -KEPT)) kept.delete(old);
    return fresh;
  };
}
