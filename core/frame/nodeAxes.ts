import { dot, type Vec3 } from '../geometry/vector.ts';
import { ELEMENT_SIZE } from './elementStiffness.ts';
import type { NodeAxes } from './model.ts';

/** A vector of space in a node's axes; as it is where there are none. */
export const intoAxes = (axes: NodeAxes | undefined, v: Vec3): Vec3 =>
  axes ? [dot(axes[0], v), dot(axes[1], v), dot(axes[2], v)] : v;

/** And back into space. */
export function outOfAxes(axes: NodeAxes | undefined, [a, b, c]: Vec3): Vec3 {
  if (!axes) return [a, b, c];
  const [p, q, r] = axes;
  return [a * p[0] + b * q[0] + c * r[0], a * p[1] + b * q[1] + c * r[1], a * p[2] + b * q[2] + c * r[2]];
}

/** Turns the 12 × 12 stiffness of an element, in place, into axes for each of its four triples: displacement and rotation at i, then at j. */
export function turnElement(K: Float64Array, axes: readonly (NodeAxes | undefined)[]): void {
  axes.forEach((own, triple) => {
    if (!own) return;
    const first = 3 * triple;
    for (let c = 0; c < ELEMENT_SIZE; c++) {
      const at = (k: number): number => (first + k) * ELEMENT_SIZE + c;
      turnThree(K, own, at(0), at(1), at(2));
    }
    for (let r = 0; r < ELEMENT_SIZE; r++) {
      const at = r * ELEMENT_SIZE + first;
      turnThree(K, own, at, at + 1, at + 2);
    }
  });
}

/** Of each of the four 3 × 3 blocks the size of what stands on its diagonal, in the axes of its triple: twelve numbers. */
export function diagonalIn(axes: readonly (NodeAxes | undefined)[], blocks: Float64Array): readonly number[] {
  return axes.flatMap((own, triple) => {
    const at = (r: number, c: number): number => blocks[9 * triple + 3 * r + c] ?? 0;
    return [0, 1, 2].map((k) => {
      const way = own?.[k];
      if (!way) return Math.abs(at(k, k));
      let sum = 0;
      for (let r = 0; r < 3; r++) for (let c = 0; c < 3; c++) sum += (way[r] ?? 0) * at(r, c) * (way[c] ?? 0);
      return Math.abs(sum);
    });
  });
}

function turnThree(K: Float64Array, axes: NodeAxes, x: number, y: number, z: number): void {
  const v: Vec3 = [K[x] ?? 0, K[y] ?? 0, K[z] ?? 0];
  K[x] = dot(axes[0], v);
  K[y] = dot(axes[1], v);
  K[z] = dot(axes[2], v);
}
