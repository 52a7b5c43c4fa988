import type { Project } from '../../core/project/model.ts';

/** Whether two projects say the same, so that an edit that changes nothing leaves no step to undo. Untouched bays are told by identity. */
export function sameProject(a: Project, b: Project): boolean {
  return (
    a.name === b.name &&
    same(a.settings, b.settings) &&
    same(a.ownStock, b.ownStock) &&
    a.bays.length === b.bays.length &&
    a.bays.every((bay, index) => same(bay, b.bays[index]))
  );
}

function same(a: unknown, b: unknown): boolean {
  return a === b || JSON.stringify(a) === JSON.stringify(b);
}
