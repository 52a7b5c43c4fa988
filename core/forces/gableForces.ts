import { scale, type Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Layout } from '../layout/model.ts';
import type { Load } from '../project/actions.ts';
import { framingNodes } from './framingNodes.ts';

/** Half of what a gable column carries goes to its head, half to its foot. Common practice, no source: a column pinned at both ends. */
const TO_THE_HEAD = 0.5;

/**
 * Wind on a gable as forces on the panel points of the rafter it leans on: pressure × half the height from the ground to the point × the width halfway to the
 * points on either side, measured on plan. N, along the bay from rafter 1 to rafter 2.
 */
export function gableForces(
  load: Extract<Load, { kind: 'gable' }>,
  bay: BayLayout,
  layout: Layout,
): ReadonlyMap<string, Vec3> {
  const along = bay.planes[0]?.right;
  if (!along) return new Map();
  const points = rafterPoints(bay, layout, load.rafter).map(({ id, at, s }) => ({
    id,
    s,
    height: at[2] - load.ground,
  }));
  const forces = new Map<string, Vec3>();
  points.forEach(({ id, s, height }, k) => {
    const before = points[k - 1]?.s ?? s;
    const after = points[k + 1]?.s ?? s;
    const width = (after - before) / 2;
    const area = width * Math.max(0, height) * TO_THE_HEAD;
    // kN/m² is 10⁻³ N/mm².
    forces.set(id, scale(along, load.pressure * 1e-3 * area));
  });
  return forces;
}

export interface RafterPoint {
  readonly id: string;
  readonly at: Vec3;
  /** mm on plan, across the bay. */
  readonly s: number;
}

/** Panel points of a rafter in order across the bay. */
export function rafterPoints(bay: BayLayout, layout: Layout, rafter: 1 | 2): readonly RafterPoint[] {
  const along = bay.planes[0]?.right ?? [1, 0, 0];
  // Level and square to the bay: the way the gable spreads.
  const across: Vec3 = [-along[1], along[0], 0];
  const onRafter = framingNodes(bay, layout).filter(({ key }) => isOnRafter(key, rafter, bay));
  // Both slopes have the ridge.
  return [...new Map(onRafter.map(({ id, at }) => [id, at]))]
    .map(([id, at]) => ({ id, at, s: at[0] * across[0] + at[1] * across[1] }))
    .sort((a, b) => a.s - b.s);
}

/** Rafter 1 stands at the bay's own X = 0: left on the first slope, right on the second, which is seen from the other side. */
function isOnRafter(key: string, rafter: 1 | 2, bay: BayLayout): boolean {
  const [slope, name] = key.split('.');
  const first = bay.planes[0];
  const own = bay.planes.find(({ id }) => id === slope);
  if (!first || !own || name === undefined) return false;
  const sameWay = own.right[0] * first.right[0] + own.right[1] * first.right[1] > 0;
  const letter = (rafter === 1) === sameWay ? 'L' : 'R';
  return name.startsWith(letter);
}
