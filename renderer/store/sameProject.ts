import type { Project } from '../../core/project/model.ts';

/** Whether two projects say the same, so that an edit that changes nothing leaves no step to undo. Untouched bays are told by identity. */
export function sameProject(a: Project, b: Project): boolean {
  const { bays: baysA, ...restA } = a;
  const { bays: baysB, ...restB } = b;
  return (
    // Everything but the bays, whatever a project may come to hold.
    same(restA, restB) &&
    baysA.length === baysB.length &&
    baysA.every((bay, index) => same(bay, baysB[index]))
  );
}

function same(a: unknown, b: unknown): boolean {
  return a === b || JSON.stringify(a) === JSON.stringify(b);
}
