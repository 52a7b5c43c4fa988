import type { Vec2 } from '../../../core/geometry/vector.ts';

/** Across the ring of a crossing where there is room for it, px. */
export const WIDEST_RING = 30;
/** Less than this no hand hits, px. */
const LEAST_RING = 18;

/**
 * Across the rings of crossings that stand at these places on the sheet, px, in the order given: each as wide as its nearest neighbour is
 * away, so that no two cover one another, within what can be read and hit. Sorted along the sheet, so that each place is held against its
 * neighbours alone.
 */
export function ringSizes(places: readonly Vec2[]): readonly number[] {
  const sorted = places.map((at, order) => ({ at, order })).sort((a, b) => a.at[0] - b.at[0]);
  const nearest = places.map(() => WIDEST_RING);
  sorted.forEach(({ at, order }, position) => {
    for (let k = position + 1; k < sorted.length; k++) {
      const other = sorted[k];
      if (!other || other.at[0] - at[0] >= WIDEST_RING) return;
      const apart = Math.hypot(other.at[0] - at[0], other.at[1] - at[1]);
      for (const one of [order, other.order]) nearest[one] = Math.min(nearest[one] ?? apart, apart);
    }
  });
  return nearest.map((size) => Math.max(LEAST_RING, Math.floor(size)));
}
