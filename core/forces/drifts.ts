import { distance, dot, subtract, type Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Layout } from '../layout/model.ts';

export interface LevelDrift {
  readonly bay: string;
  readonly level: string;
  readonly height: number;
  readonly drift: number;
}

/** How far each tier of a wall, and each slope of a roof, moves along its bay; the side that moves more. mm. */
export function driftsOf(
  bay: BayLayout,
  layout: Layout,
  displacements: ReadonlyMap<string, Vec3>,
): readonly LevelDrift[] {
  const moved = (key: string): { readonly at: Vec3; readonly by: Vec3 } | null => {
    const id = bay.nodeOf.get(key);
    const at = id === undefined ? undefined : layout.nodes.get(id)?.at;
    const by = id === undefined ? undefined : displacements.get(id);
    return at && by ? { at, by } : null;
  };
  const level = (name: string, right: Vec3, lower: readonly string[], upper: readonly string[]) => {
    const sides = lower.flatMap((key, k) => {
      const [a, b] = [moved(key), moved(upper[k] ?? '')];
      return a && b ? [{ height: distance(a.at, b.at), drift: dot(right, subtract(b.by, a.by)) }] : [];
    });
    const most = sides.reduce<(typeof sides)[number] | null>(
      (worst, each) => (worst === null || Math.abs(each.drift) > Math.abs(worst.drift) ? each : worst),
      null,
    );
    return most === null ? [] : [{ bay: bay.id, level: name, ...most }];
  };
  switch (bay.kind) {
    case 'wall': {
      const plane = bay.planes[0];
      const tiers = bay.nodeOf.size === 0 || !plane ? 0 : levelCount(bay, 'L');
      return Array.from({ length: Math.max(0, tiers - 1) }, (_, k) =>
        level(`tier ${k + 1}`, plane?.right ?? [1, 0, 0], [`L${k}`, `R${k}`], [`L${k + 1}`, `R${k + 1}`]),
      ).flat();
    }
    case 'roof':
      return bay.planes.flatMap((plane) => {
        const top = levelCount(bay, `${plane.id}.L`) - 1;
        return level(
          `slope ${plane.id}`,
          plane.right,
          [`${plane.id}.L0`, `${plane.id}.R0`],
          [`${plane.id}.L${top}`, `${plane.id}.R${top}`],
        );
      });
    case 'knee':
    case 'free':
      return [];
    default:
      return bay.kind satisfies never;
  }
}

function levelCount(bay: BayLayout, prefix: string): number {
  let count = 0;
  while (bay.nodeOf.has(`${prefix}${count}`)) count += 1;
  return count;
}
