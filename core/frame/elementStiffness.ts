import { dot, type Vec3 } from '../geometry/vector.ts';
import { clampedLoadsBelow, type MemberStiffness, memberStiffness } from '../stability/stabilityFunctions.ts';
import type { FrameElement } from './model.ts';

/** Unknowns of one element: displacement and rotation at i, then at j, in global axes. */
export const ELEMENT_SIZE = 12;

/**
 * Stiffness of a piece in global axes, 12 × 12 row by row: axial, bending in two principal planes with the exact functions of its axial force, St-Venant torsion;
 * released rotations condensed out. Rotations are vectors, so the slope of the motion along p is θ·q, and along q it is −θ·p.
 */
export function elementStiffness(element: FrameElement): Float64Array {
  return elementWithCount(element).K;
}

export interface CountedStiffness {
  readonly K: Float64Array;
  readonly hidden: number;
  /** The four 3 × 3 blocks on the diagonal before releases: displacement and rotation at i, then at j. */
  readonly gross: Float64Array;
}

/** The same with the part of a count of critical loads that the ends do not see: clamped pieces, and released rotations that have lost their stiffness. */
export function elementWithCount(element: FrameElement): CountedStiffness {
  const K = new Float64Array(ELEMENT_SIZE * ELEMENT_SIZE);
  const { direction, p, q, length } = element;
  const none: Vec3 = [0, 0, 0];
  addLine(K, element.EA / length, row(direction, none, -1), 1);
  addLine(K, element.GJ / length, row(none, direction, -1), 1);
  addBending(K, element, p, q, element.EIp);
  addBending(K, element, q, [-p[0], -p[1], -p[2]], element.EIq);
  let hidden =
    clampedLoadsBelow(element.EIp, -element.tension, length) +
    clampedLoadsBelow(element.EIq, -element.tension, length);
  // What is left on the diagonal after letting turns free is noise below a share of what stood there before.
  const gross = diagonalBlocks(K);
  for (const { end, about } of element.releases) if (release(K, end === 'i' ? 3 : 9, about) < 0) hidden += 1;
  return { K, hidden, gross };
}

function diagonalBlocks(K: Float64Array): Float64Array {
  const blocks = new Float64Array(4 * 9);
  for (let first = 0, at = 0; first < ELEMENT_SIZE; first += 3)
    for (let r = first; r < first + 3; r++)
      for (let c = first; c < first + 3; c++) blocks[at++] = K[r * ELEMENT_SIZE + c] ?? 0;
  return blocks;
}

/** Displacement and rotation at i, and `other` times the same at j. */
function row(displacement: Vec3, rotation: Vec3, other: number): readonly number[] {
  return [
    ...displacement,
    ...rotation,
    ...displacement.map((v) => other * v),
    ...rotation.map((v) => other * v),
  ];
}

function addLine(K: Float64Array, k: number, a: readonly number[], sign: number): void {
  for (let i = 0; i < ELEMENT_SIZE; i++) {
    const ai = a[i] ?? 0;
    if (ai === 0) continue;
    for (let j = 0; j < ELEMENT_SIZE; j++) {
      const at = i * ELEMENT_SIZE + j;
      K[at] = (K[at] ?? 0) + sign * k * ai * (a[j] ?? 0);
    }
  }
}

const stiffness: MemberStiffness = { force: 0, cross: 0, near: 0, far: 0 };

/** Bending that moves the bar along `way`; its slope is the rotation about `turn`. */
function addBending(K: Float64Array, element: FrameElement, way: Vec3, turn: Vec3, EI: number): void {
  memberStiffness(EI, -element.tension, element.length, stiffness);
  const { force, cross: c, near, far } = stiffness;
  const local = [
    [force, c, -force, c],
    [c, near, -c, far],
    [-force, -c, force, -c],
    [c, far, -c, near],
  ];
  const rows = [
    [...way, 0, 0, 0, 0, 0, 0, 0, 0, 0],
    [0, 0, 0, ...turn, 0, 0, 0, 0, 0, 0],
    [0, 0, 0, 0, 0, 0, ...way, 0, 0, 0],
    [0, 0, 0, 0, 0, 0, 0, 0, 0, ...turn],
  ];
  rows.forEach((a, r) => {
    rows.forEach((b, s) => {
      const k = local[r]?.[s] ?? 0;
      for (let i = 0; i < ELEMENT_SIZE; i++) {
        const ai = a[i] ?? 0;
        if (ai === 0) continue;
        for (let j = 0; j < ELEMENT_SIZE; j++) {
          const at = i * ELEMENT_SIZE + j;
          K[at] = (K[at] ?? 0) + k * ai * (b[j] ?? 0);
        }
      }
    });
  });
}

/** The rotation about an axis at one end follows by itself, so that it takes no moment. Returns the stiffness it had. */
function release(K: Float64Array, first: number, about: Vec3): number {
  const Ka = new Float64Array(ELEMENT_SIZE);
  for (let i = 0; i < ELEMENT_SIZE; i++)
    Ka[i] =
      (K[i * ELEMENT_SIZE + first] ?? 0) * about[0] +
      (K[i * ELEMENT_SIZE + first + 1] ?? 0) * about[1] +
      (K[i * ELEMENT_SIZE + first + 2] ?? 0) * about[2];
  const own = dot([Ka[first] ?? 0, Ka[first + 1] ?? 0, Ka[first + 2] ?? 0], about);
  let scale = 0;
  for (let i = 3; i < 6; i++) scale = Math.max(scale, K[i * ELEMENT_SIZE + i] ?? 0);
  // A rotation that nothing resists is free already.
  if (Math.abs(own) <= 1e-12 * scale) return 0;
  addLine(K, 1 / own, Array.from(Ka), -1);
  return own;
}
