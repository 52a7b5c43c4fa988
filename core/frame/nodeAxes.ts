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
  for (let triple = 0; triple < axes.length; triple++) {
    const own = axes[triple];
    if (!own) continue;
    const first = 3 * triple;
    for (let k = 0; k < ELEMENT_SIZE; k++) {
      turnThree(K, own, first * ELEMENT_SIZE + k, ELEMENT_SIZE);
    }
    for (let k = 0; k < ELEMENT_SIZE; k++) turnThree(K, own, k * ELEMENT_SIZE + first, 1);
  }
}

/** Three numbers of a row or column, from a place on, so many places apart. */
function turnThree(K: Float64Array, [p, q, r]: NodeAxes, at: number, apart: number): void {
  const x = K[at] ?? 0;
  const y = K[at + apart] ?? 0;
  const z = K[at + 2 * apart] ?? 0;
  K[at] = p[0] * x + p[1] * y + p[2] * z;
  K[at + apart] = q[0] * x + q[1] * y + q[2] * z;
  K[at + 2 * apart] = r[0] * x + r[1] * y + r[2] * z;
}

/** Of each of the four 3 × 3 blocks the size of what stands on its diagonal, in the axes of its triple: twelve numbers. */
export function diagonalIn(axes: readonly (NodeAxes | undefined)[], blocks: Float64Array): Float64Array {
  const diagonal = new Float64Array(3 * axes.length);
  for (let triple = 0; triple < axes.length; triple++)
    for (let k = 0; k < 3; k++)
      diagonal[3 * triple + k] = Math.abs(
        alongWay(blocks, 9 * triple, axes[triple]?.[k] ?? GLOBAL[k] ?? GLOBAL[0]),
      );
  return diagonal;
}

const GLOBAL: NodeAxes = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
];

/** wᵀBw of a block that begins at a place. */
function alongWay(B: Float64Array, at: number, [x, y, z]: Vec3): number {
  return (
    x * ((B[at] ?? 0) * x + (B[at + 1] ?? 0) * y + (B[at + 2] ?? 0) * z) +
    y * ((B[at + 3] ?? 0) * x + (B[at + 4] ?? 0) * y + (B[at + 5] ?? 0) * z) +
    z * ((B[at + 6] ?? 0) * x + (B[at + 7] ?? 0) * y + (B[at + 8] ?? 0) * z)
  );
}
