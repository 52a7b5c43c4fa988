import type { Vec3 } from '../../../core/geometry/vector.ts';
import type { LoadCase } from '../../../core/project/actions.ts';
import type { Edit } from '../../../core/project/edit.ts';

/** The edit that leaves this force, kN, on the node in the case: placed, changed, or taken away when it is nothing. */
export function forceEdit(loadCase: LoadCase, place: string, force: Vec3): Edit {
  const known = loadCase.loads.find((each) => each.kind === 'node' && each.node === place);
  const id = known?.id ?? freeId(loadCase);
  const nothing = force.every((part) => part === 0);
  return {
    kind: 'load',
    loadCase: loadCase.id,
    id,
    load: nothing ? null : { kind: 'node', id, node: place, force },
  };
}

function freeId({ loads }: LoadCase): string {
  const taken = new Set(loads.map(({ id }) => id));
  let number = 1;
  while (taken.has(`f${number}`)) number += 1;
  return `f${number}`;
}
