import type { Vec3 } from '../../../core/geometry/vector.ts';
import { distance } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import { pointsToShow } from './fit.ts';

/** The middle of a bay and how far it reaches from there, mm. */
export interface Subject {
  readonly middle: Vec3;
  readonly reach: number;
}

export function subjectOf(layout: Layout, bay: BayLayout): Subject | null {
  const points = pointsToShow(layout, bay);
  if (points.length === 0) return null;
  const middle = ([0, 1, 2] as const).map((axis) => {
    const values = points.map((point) => point[axis]);
    return (Math.min(...values) + Math.max(...values)) / 2;
  });
  const centre: Vec3 = [middle[0] ?? 0, middle[1] ?? 0, middle[2] ?? 0];
  return { middle: centre, reach: Math.max(...points.map((point) => distance(point, centre))) };
}
