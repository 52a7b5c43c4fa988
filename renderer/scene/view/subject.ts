import type { Vec3 } from '../../../core/geometry/vector.ts';
import { distance } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import { pointsToShow } from './fit.ts';

/** The middle of a bay, or of a project, and how far it reaches from there, mm. */
export interface Subject {
  readonly middle: Vec3;
  readonly reach: number;
}

/** Null for a bay without bars; of the whole project where there is no bay. */
export function subjectOf(layout: Layout, bay: BayLayout | null): Subject | null {
  const points = pointsToShow(layout, bay);
  if (points.length === 0) return null;
  const middle = ([0, 1, 2] as const).map((axis) => {
    let min = Number.POSITIVE_INFINITY;
    let max = Number.NEGATIVE_INFINITY;
    for (const point of points) {
      min = Math.min(min, point[axis]);
      max = Math.max(max, point[axis]);
    }
    return (min + max) / 2;
  });
  const centre: Vec3 = [middle[0] ?? 0, middle[1] ?? 0, middle[2] ?? 0];
  return { middle: centre, reach: points.reduce((far, point) => Math.max(far, distance(point, centre)), 0) };
}
