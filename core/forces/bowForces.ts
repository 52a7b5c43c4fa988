/** What rafters that are not straight push the bracing of a roof with. */
import { scale, type Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Layout } from '../layout/model.ts';
import type { Load } from '../project/actions.ts';
import { rafterPoints } from './gableForces.ts';

/** EN 1993-1-1 5.3.3(1), from memory, sure: initial bow of one member over the span of the bracing. Other practices have rules for single restraints; they borrow this one. */
const BOW = 1 / 500;

/** α_m √½(1 + 1/m) L/500, mm. */
export const initialBow = (span: number, members: number): number =>
  Math.sqrt(0.5 * (1 + 1 / members)) * BOW * span;

/** q_d = m N 8 (e₀ + δ)/L², N/mm. */
export const bowLoad = (force: number, members: number, span: number, gives: number): number =>
  (members * force * 8 * (initialBow(span, members) + gives)) / span ** 2;

/**
 * q_d on the panel points of rafter 1, each over the slope halfway to its neighbours, and half of the whole back at either end: the rafters' own ends push the other way, so that
 * nothing of it reaches the walls. N, along the bay from rafter 1 to rafter 2.
 */
export function bowForces(
  load: Extract<Load, { kind: 'bowed' }>,
  bay: BayLayout,
  layout: Layout,
): ReadonlyMap<string, Vec3> {
  const along = bay.planes[0]?.right;
  const points = rafterPoints(bay, layout, 1);
  if (!along || points.length < 2) return new Map();
  const places = points.reduce<readonly number[]>((found, { at }, k) => {
    const before = points[k - 1]?.at ?? at;
    return [
      ...found,
      (found.at(-1) ?? 0) + Math.hypot(at[0] - before[0], at[1] - before[1], at[2] - before[2]),
    ];
  }, []);
  const span = places.at(-1) ?? 0;
  const q = bowLoad(load.squeeze * 1000, load.rafters, span, span / load.gives);
  const last = points.length - 1;
  return new Map(
    points.map(({ id }, k) => {
      const s = places[k] ?? 0;
      const share = ((places[k + 1] ?? s) - (places[k - 1] ?? s)) / 2;
      const back = k === 0 || k === last ? span / 2 : 0;
      return [id, scale(along, q * (share - back))];
    }),
  );
}
