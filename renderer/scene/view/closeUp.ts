import type { Vec3 } from '../../../core/geometry/vector.ts';
import type { BarId, BayLayout, CrossingId, Layout } from '../../../core/layout/model.ts';
import { ringSizes } from '../overlay/ringSize.ts';
import { onSheet, type SheetView } from './sheetView.ts';

/** A sheet narrower than this shares its place with a docked panel, px. */
export const NARROW = 460;

/** Rings narrower than this are too close to one another to be marked in comfort, px. */
const COMFORTABLE = 24;

/** Whether the crossings of a bay stand too close together in a view. */
export function isCrowded(layout: Layout, bay: BayLayout | null, view: SheetView): boolean {
  const crossings = (bay?.crossings ?? []).flatMap((id) => layout.crossings.get(id) ?? []);
  const places = new Map(crossings.map(({ point, at }) => [point, onSheet(view, at)]));
  return ringSizes([...places.values()]).some((size) => size < COMFORTABLE);
}

/** The ends of the diagonals that meet at the chosen crossing, or of the chosen bar: what is to be seen where the whole bay is too small. */
export function closeUpPoints(
  layout: Layout,
  crossing: CrossingId | null,
  bar: BarId | null,
): readonly Vec3[] {
  const met = crossing === null ? undefined : layout.crossings.get(crossing);
  const bars = met ? [met.a, met.b] : bar === null ? [] : [bar];
  return bars.flatMap((id) => {
    const found = layout.bars.get(id);
    return found?.angle ? [found.from, found.to] : [];
  });
}
