import type { Vec3 } from '../../../core/geometry/vector.ts';
import { add, cross, dot, length, scale, unit } from '../../../core/geometry/vector.ts';
import type { BayLayout } from '../../../core/layout/model.ts';

export type ViewName = 'elevation' | 'plan' | 'side' | 'axonometric';

/** The directions of a view on the sheet, unit vectors. */
export interface ViewDirections {
  readonly right: Vec3;
  readonly up: Vec3;
  readonly towards: Vec3;
}

const UPRIGHT: Vec3 = [0, 0, 1];
const ALONG_X: Vec3 = [1, 0, 0];

/** How far an axonometric turns about the upright and looks down, degrees: walls read best nearly head on, roofs from above. */
const AXONOMETRIC: Readonly<Record<BayLayout['kind'], { readonly turn: number; readonly down: number }>> = {
  wall: { turn: 36, down: 9 },
  roof: { turn: 28, down: 36 },
  knee: { turn: 34, down: 14 },
  free: { turn: 34, down: 20 },
};

/**
 * The directions of a named view of a bay; of the whole project where there is no bay.
 * Elevation looks along the normal of the bay's first plane, plan from above, side along the plane from its right, axonometric from
 * the near side and above. The upright stays upright on the sheet in all of them.
 */
export function namedView(name: ViewName, bay: BayLayout | null): ViewDirections {
  const plane = bay?.planes[0];
  const along = level(plane?.right ?? ALONG_X) ?? level(cross(UPRIGHT, plane?.normal ?? UPRIGHT)) ?? ALONG_X;
  /** Level, from the bay to who stands before it. */
  const front = cross(along, UPRIGHT);
  switch (name) {
    case 'elevation':
      return looking(plane?.normal ?? front, along);
    case 'plan':
      return looking(UPRIGHT, along);
    case 'side':
      return looking(along, front);
    case 'axonometric': {
      const { turn, down } = AXONOMETRIC[bay?.kind ?? 'free'];
      const [a, d] = [radians(turn), radians(down)];
      const levelPart = add(scale(front, Math.cos(a)), scale(along, Math.sin(a)));
      return looking(add(scale(levelPart, Math.cos(d)), scale(UPRIGHT, Math.sin(d))), along);
    }
    default:
      return name satisfies never;
  }
}

/** The same view with the sheet turned a quarter, so that what ran up it runs to the right. */
export function quarterTurned({ right, up, towards }: ViewDirections): ViewDirections {
  return { right: up, up: scale(right, -1), towards };
}

/** The view towards which `towards` points, upright kept upright; seen straight from above or below, `rightWhenLevel` runs to the right. */
function looking(towards: Vec3, rightWhenLevel: Vec3): ViewDirections {
  const out = unit(towards);
  const right = level(cross(UPRIGHT, out)) ?? rightWhenLevel;
  return { right, up: cross(out, right), towards: out };
}

/** The level part of a direction as a unit vector; null when it is as good as upright (within a thousandth). */
function level(direction: Vec3): Vec3 | null {
  const flat: Vec3 = [direction[0], direction[1], 0];
  return length(flat) > 1e-3 * Math.max(length(direction), 1e-9) ? unit(flat) : null;
}

function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}

/** Turn about the upright and angle from it, rad, of a camera that looks so: turn 0 stands at −Y and looks along Y. */
export function cameraAngles(view: ViewDirections): { readonly azimuth: number; readonly polar: number } {
  return {
    azimuth: Math.atan2(view.right[1], view.right[0]),
    polar: Math.acos(Math.min(1, Math.max(-1, dot(view.towards, UPRIGHT)))),
  };
}
