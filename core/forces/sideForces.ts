import { scale, type Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Layout } from '../layout/model.ts';
import type { Load } from '../project/actions.ts';
import { framingNodes } from './framingNodes.ts';

/**
 * Pressure on a wall that leans on a wall bay as forces on the column it comes from: pressure × width × half the heights above and below each level.
 * The lowest level hands its share to the ground. N, along the bay, on the left column when pushing right, else on the right one.
 */
export function sideForces(
  load: Extract<Load, { kind: 'side' }>,
  bay: BayLayout,
  layout: Layout,
): ReadonlyMap<string, Vec3> {
  const right = bay.planes[0]?.right;
  if (!right) return new Map();
  const column = load.pressure >= 0 ? 'L' : 'R';
  const levels = framingNodes(bay, layout)
    .filter(({ key }) => key.startsWith(column))
    .sort((a, b) => a.at[2] - b.at[2]);
  const forces = new Map<string, Vec3>();
  levels.forEach(({ id, at }, k) => {
    if (k === 0) return;
    const below = levels[k - 1]?.at[2] ?? at[2];
    const above = levels[k + 1]?.at[2] ?? at[2];
    forces.set(id, scale(right, load.pressure * 1e-3 * load.width * ((above - below) / 2)));
  });
  return forces;
}
