import type { Vec3 } from '../../../core/geometry/vector.ts';
import { add, dot, scale } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import type { ViewDirections } from './namedView.ts';

/** Room kept free at the edges of the sheet, px. */
export interface Margins {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** The middle of the sheet and the scale at which a set of points fills it. */
export interface Fit {
  readonly centre: Vec3;
  readonly pxPerMm: number;
}

/** A view is not brought closer than this, so that a single short bar does not fill the sheet, px per mm. */
const CLOSEST = 0.6;

/** The points that a view of a bay must show: all bars with their offsets and the dimension lines; of every bay where there is none. */
export function pointsToShow(layout: Layout, bay: BayLayout | null): readonly Vec3[] {
  const bays = bay === null ? layout.bays : [bay];
  return bays.flatMap((one) => [
    ...one.bars.flatMap((id) => {
      const bar = layout.bars.get(id);
      return bar ? [add(bar.from, bar.offset), add(bar.to, bar.offset)] : [];
    }),
    ...one.dimensions.flatMap((line) => [line.from, line.to]),
  ]);
}

/** The largest view of the points, in the given directions, on a sheet of `width` by `height` px within the margins; null without points. */
export function fit(
  points: readonly Vec3[],
  view: ViewDirections,
  width: number,
  height: number,
  margins: Margins,
): Fit | null {
  const across = spread(points, view.right);
  const upwards = spread(points, view.up);
  const depth = spread(points, view.towards);
  if (across === null || upwards === null || depth === null) return null;
  const roomX = Math.max(80, width - margins.left - margins.right);
  const roomY = Math.max(80, height - margins.top - margins.bottom);
  const pxPerMm = Math.min(
    CLOSEST,
    roomX / Math.max(across.max - across.min, 1),
    roomY / Math.max(upwards.max - upwards.min, 1),
  );
  // The middle of the free room is not the middle of the sheet: shift by half the difference of the margins.
  const x = (across.min + across.max) / 2 + (margins.right - margins.left) / 2 / pxPerMm;
  const y = (upwards.min + upwards.max) / 2 + (margins.top - margins.bottom) / 2 / pxPerMm;
  const z = (depth.min + depth.max) / 2;
  return {
    centre: add(add(scale(view.right, x), scale(view.up, y)), scale(view.towards, z)),
    pxPerMm,
  };
}

function spread(
  points: readonly Vec3[],
  direction: Vec3,
): { readonly min: number; readonly max: number } | null {
  if (points.length === 0) return null;
  let min = Number.POSITIVE_INFINITY;
  let max = Number.NEGATIVE_INFINITY;
  for (const point of points) {
    const at = dot(point, direction);
    if (at < min) min = at;
    if (at > max) max = at;
  }
  return { min, max };
}
