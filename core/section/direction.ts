import type { Vec2 } from '../geometry/vector.ts';
import type { Axis, Radii, SectionProperties } from './model.ts';

/**
 * Second moment that resists bowing along a direction, ∫(p·n)² dA about the centroid, mm⁴.
 *
 * @param n unit direction of motion, [along the shorter leg, along the longer leg]
 */
export function inertiaFor(p: SectionProperties, n: Vec2): number {
  return n[0] * n[0] * p.Iyy + n[1] * n[1] * p.Ixx + 2 * n[0] * n[1] * p.Ixy;
}

/**
 * Radius of gyration for bowing along a direction, r_n = √(∫(p·n)² dA / A), mm.
 *
 * Put together from the radii, not from I/A, so that a section carried as published gives back, at each of its four axes, the very
 * radius that was printed: with the square's product term −(ru² − rv²) sin α cos α it is rx² for n along the longer leg, ry² along the
 * shorter, and rv², its least, at right angles to v. For a section computed from its outline the two ways are the same.
 *
 * @param n unit direction of motion, [along the shorter leg, along the longer leg]
 */
export function radiusFor(p: Radii, n: Vec2): number {
  const product = -(p.ru * p.ru - p.rv * p.rv) * Math.sin(p.alpha) * Math.cos(p.alpha);
  return Math.sqrt(n[0] * n[0] * p.ry * p.ry + n[1] * n[1] * p.rx * p.rx + 2 * n[0] * n[1] * product);
}

/** Unit vector in which the bar moves when it bends about an axis: at right angles to it. */
export function motionAbout(p: Pick<Radii, 'alpha'>, axis: Axis): Vec2 {
  switch (axis) {
    case 'x':
      return [0, 1];
    case 'y':
      return [1, 0];
    case 'u':
      return [-Math.sin(p.alpha), Math.cos(p.alpha)];
    case 'v':
      return [Math.cos(p.alpha), Math.sin(p.alpha)];
    default:
      return axis satisfies never;
  }
}
