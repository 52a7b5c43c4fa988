/** Horizontal forces that stand for columns out of plumb: a share of the vertical loads, along each bay. */
import { add, scale, type Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Layout } from '../layout/model.ts';
import type { Confidence } from '../practice/model.ts';
import type { PracticeId } from '../project/model.ts';

export interface LeaningRule {
  readonly share: number;
  readonly clause: string;
  readonly confidence: Confidence;
}

/** All from memory. The reductions that some standards allow for height and number of columns are left out, on the safe side. */
export const LEANING: Readonly<Record<PracticeId, LeaningRule>> = {
  sans10162: { share: 0.005, clause: '8.7.2, notional lateral loads', confidence: 'from memory, verify' },
  csaS16: { share: 0.005, clause: '8.4.1, notional lateral loads', confidence: 'from memory, sure' },
  aisc360: { share: 0.002, clause: 'C2.2b, notional loads', confidence: 'from memory, sure' },
  en1993: { share: 1 / 200, clause: '5.3.2(3), φ₀ with α_h = α_m = 1', confidence: 'from memory, sure' },
  as4100: { share: 0.002, clause: '3.2.4, notional horizontal forces', confidence: 'from memory, verify' },
  is800: { share: 0.005, clause: '4.3.6, notional horizontal forces', confidence: 'from memory, verify' },
};

/** @param loads vertical and other loads on nodes, N; @returns what leans, N, by node, along each bay, the whole building one way: towards greater X, or Y across it, for `way` 1 */
export function leaningForces(
  loads: ReadonlyMap<string, Vec3>,
  bays: readonly BayLayout[],
  layout: Layout,
  share: number,
  way: -1 | 1,
): ReadonlyMap<string, Vec3> {
  const ways = new Map<string, Vec3[]>();
  for (const bay of bays)
    for (const id of bay.bars) {
      const bar = layout.bars.get(id);
      const plane = bar && bay.planes.find((each) => each.id === bar.plane);
      if (!bar || bar.line || !plane) continue;
      for (const node of [bar.i, bar.j]) {
        const known = ways.get(node) ?? [];
        ways.set(node, known);
        // Facing walls, and the second slope of a roof, are seen from the other side: the building leans one way all the same.
        const right = oneSense(plane.right);
        if (!known.some((each) => Math.abs(each[0] * right[0] + each[1] * right[1]) > 0.999))
          known.push(right);
      }
    }
  const forces = new Map<string, Vec3>();
  for (const [node, load] of loads) {
    const down = -load[2];
    if (down <= 0) continue;
    for (const right of ways.get(node) ?? [])
      forces.set(node, add(forces.get(node) ?? [0, 0, 0], scale(right, way * share * down)));
  }
  return forces;
}

/** Of a direction and its opposite the one towards greater X, or greater Y where it has no X to speak of. */
const oneSense = (way: Vec3): Vec3 =>
  (Math.abs(way[0]) > 1e-3 ? way[0] : way[1]) < 0 ? scale(way, -1) : way;
