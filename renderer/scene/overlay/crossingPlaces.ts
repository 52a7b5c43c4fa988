import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { Crossing, CrossingId, Layout } from '../../../core/layout/model.ts';
import { from, heading } from '../drawing/ink.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';

/** How far the glyph of a purlin or rail moves along its diagonal where the crossing of two diagonals is in its place, px. */
const ASIDE = 27;

/**
 * Where the glyphs of crossings stand on the sheet. Where two diagonals and a purlin meet at one point, the diagonals' own glyph keeps
 * the point, and those of the purlin stand a little along the diagonal that each belongs to.
 */
export function crossingPlaces(
  view: SheetView,
  layout: Layout,
  crossings: readonly Crossing[],
): ReadonlyMap<CrossingId, Vec2> {
  const taken = new Set<string>();
  const places = new Map<CrossingId, Vec2>();
  const inOrder = [...crossings].sort((a, b) => RANK[a.kind] - RANK[b.kind]);
  for (const crossing of inOrder) {
    const at = onSheet(view, crossing.at);
    if (!taken.has(crossing.point)) {
      taken.add(crossing.point);
      places.set(crossing.id, at);
      continue;
    }
    const direction = layout.bars.get(crossing.a)?.direction ?? [1, 0, 0];
    const way = upSheet(heading(directionOnSheet(view, direction), 0.05 * view.pxPerMm) ?? [1, 0]);
    places.set(crossing.id, from(at, way, ASIDE));
  }
  return places;
}

const RANK: Readonly<Record<Crossing['kind'], number>> = { diagonals: 0, line: 1, member: 2 };

function upSheet(way: Vec2): Vec2 {
  return way[1] > 0 ? [-way[0], -way[1]] : way;
}
