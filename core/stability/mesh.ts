/** A bar as nodes with what is free at each, and pieces between them. Built once for a problem; loads come later. */
import type { Vec2 } from '../geometry/vector.ts';
import type { BarProblem, EndRotation, Hold } from './model.ts';

export interface MeshNode {
  readonly at: number;
  /** Free directions of the displacements: `fields` numbers for each, one after the other. */
  readonly basis: Float64Array;
  readonly free: number;
  /** Spring stiffness on the displacements, fields × fields, row by row; null when there is none. */
  readonly springs: Float64Array | null;
  /** Same for slopes, only at ends. */
  readonly slopeSprings: Float64Array | null;
  /** Fields whose slope is held; one bit each. */
  readonly slopesHeld: number;
}

export interface MeshPiece {
  readonly length: number;
  readonly share: number;
}

/**
 * Displacements are counted in principal directions: field 0 weak (bending about v), field 1 strong (about u), field 2 the twist where
 * it is looked at; with twist, displacements are those of the shear centre.
 */
export interface Mesh {
  readonly fields: 2 | 3;
  readonly nodes: readonly MeshNode[];
  readonly pieces: readonly MeshPiece[];
}

/** Directions of the weak and the strong motion. */
export function principalMotions(alpha: number): { readonly weak: Vec2; readonly strong: Vec2 } {
  return { weak: [Math.cos(alpha), Math.sin(alpha)], strong: [-Math.sin(alpha), Math.cos(alpha)] };
}

/** Holds whose directions are this nearly dependent count as one: cosine of the part left over. */
const DEPENDENT = 1e-9;

/** @param split how many parts each piece between stations is cut into: 1 for the load, more for a shape to draw */
export function meshOf(problem: BarProblem, split = 1): Mesh {
  const fields = problem.twist ? 3 : 2;
  const places = placesOf(problem, split);
  const nodes = places.map((at, index): MeshNode => {
    if (index === 0) return endNode(at, fields, problem.endI, problem.section.alpha);
    if (index === places.length - 1) return endNode(at, fields, problem.endJ, problem.section.alpha);
    return innerNode(problem, fields, at);
  });
  const pieces = places.slice(1).map((to, k): MeshPiece => {
    const from = places[k] ?? 0;
    const middle = (from + to) / 2;
    const piece = problem.axial.find((each) => middle >= each.from && middle <= each.to);
    return { length: to - from, share: piece?.share ?? 0 };
  });
  return { fields, nodes, pieces };
}

function placesOf(problem: BarProblem, split: number): readonly number[] {
  const { length } = problem;
  const near = length * 1e-9;
  const all = [
    0,
    length,
    ...problem.holds.map(({ at }) => at),
    ...problem.axial.flatMap(({ from, to }) => [from, to]),
    ...(problem.twist?.heldAt ?? []),
  ]
    .filter((at) => at >= 0 && at <= length)
    .sort((a, b) => a - b);
  const distinct = all.filter((at, k) => k === 0 || at - (all[k - 1] ?? 0) > near);
  if (length - (distinct.at(-1) ?? 0) < near) distinct[distinct.length - 1] = length;
  if (split === 1) return distinct;
  return distinct.flatMap((at, k) => {
    const next = distinct[k + 1];
    if (next === undefined) return [at];
    return Array.from({ length: split }, (_, part) => at + ((next - at) * part) / split);
  });
}

function endNode(at: number, fields: 2 | 3, end: EndRotation, alpha: number): MeshNode {
  const { weak, strong } = principalMotions(alpha);
  const rigidX = end.alongX === 'rigid';
  const rigidY = end.alongY === 'rigid';
  const kx = end.alongX === 'rigid' ? 0 : end.alongX;
  const ky = end.alongY === 'rigid' ? 0 : end.alongY;
  // One slope held and the other free only makes sense along the axes of the section; a very stiff spring stands in for it.
  const stiff = rigidX !== rigidY;
  const springX = stiff && rigidX ? VERY_STIFF : kx;
  const springY = stiff && rigidY ? VERY_STIFF : ky;
  const any = springX > 0 || springY > 0;
  const slopeSprings = any ? new Float64Array(fields * fields) : null;
  if (slopeSprings) {
    const motions = [weak, strong];
    motions.forEach((p, i) => {
      motions.forEach((q, j) => {
        slopeSprings[i * fields + j] = p[0] * q[0] * springX + p[1] * q[1] * springY;
      });
    });
  }
  return {
    at,
    basis: new Float64Array(0),
    free: 0,
    springs: null,
    slopeSprings,
    slopesHeld: rigidX && rigidY ? 0b11 : 0,
  };
}

/** N·mm/rad: a thousand times stiffer than any bar of steel turns. */
const VERY_STIFF = 1e16;

function innerNode(problem: BarProblem, fields: 2 | 3, at: number): MeshNode {
  const near = problem.length * 1e-9;
  const here = problem.holds.filter((hold) => Math.abs(hold.at - at) <= near);
  const rows = here
    .filter(({ stiffness }) => stiffness === 'rigid')
    .map((hold) => rowOf(problem, fields, hold));
  if (problem.twist?.heldAt.some((held) => Math.abs(held - at) <= near)) rows.push([0, 0, 1]);
  const basis = freeBasis(rows, fields);
  const elastic = here.filter((hold) => typeof hold.stiffness === 'number' && hold.stiffness > 0);
  const springs = elastic.length > 0 ? new Float64Array(fields * fields) : null;
  if (springs)
    for (const hold of elastic) {
      const row = rowOf(problem, fields, hold);
      const k = typeof hold.stiffness === 'number' ? hold.stiffness : 0;
      for (let i = 0; i < fields; i++)
        for (let j = 0; j < fields; j++)
          springs[i * fields + j] = (springs[i * fields + j] ?? 0) + k * (row[i] ?? 0) * (row[j] ?? 0);
    }
  return { at, basis: basis.vectors, free: basis.count, springs, slopeSprings: null, slopesHeld: 0 };
}

/** What the movement in the hold's direction, at the point where it grips, is in terms of the fields. */
function rowOf(problem: BarProblem, fields: 2 | 3, hold: Hold): number[] {
  const { weak, strong } = principalMotions(problem.section.alpha);
  const [dx, dy] = hold.direction;
  const row = [dx * weak[0] + dy * weak[1], dx * strong[0] + dy * strong[1]];
  if (fields === 3) {
    const [px, py] = hold.grip ?? [0, 0];
    const [sx, sy] = problem.section.shearCentre;
    // Turning by θ about the shear centre moves the point by θ·(−(py − sy), px − sx).
    row.push(-dx * (py - sy) + dy * (px - sx));
  }
  return row;
}

/** Orthonormal vectors square to all rows, with rows that say nothing new left out. */
function freeBasis(
  rows: readonly (readonly number[])[],
  fields: number,
): { vectors: Float64Array; count: number } {
  const held: number[][] = [];
  for (const row of rows) {
    const left = lessAlong(row, held);
    const size = Math.hypot(...left);
    if (size > DEPENDENT * Math.hypot(...row)) held.push(left.map((value) => value / size));
  }
  const free: number[][] = [];
  for (let k = 0; k < fields && held.length + free.length < fields; k++) {
    // Begin with the unit vector that is least held; a second sweep makes it square to working accuracy.
    const best = bestUnit(fields, [...held, ...free]);
    const once = lessAlong(best, [...held, ...free]);
    const twice = lessAlong(once, [...held, ...free]);
    const size = Math.hypot(...twice);
    free.push(twice.map((value) => value / size));
  }
  return { vectors: Float64Array.from(free.flat()), count: free.length };
}

function bestUnit(fields: number, known: readonly (readonly number[])[]): number[] {
  const left = Array.from({ length: fields }, (_, axis) =>
    known.reduce((rest, vector) => rest - (vector[axis] ?? 0) ** 2, 1),
  );
  const axis = left.indexOf(Math.max(...left));
  return Array.from({ length: fields }, (_, k) => (k === axis ? 1 : 0));
}

function lessAlong(vector: readonly number[], known: readonly (readonly number[])[]): number[] {
  return known.reduce<number[]>(
    (rest, unit) => {
      const share = rest.reduce((sum, value, k) => sum + value * (unit[k] ?? 0), 0);
      return rest.map((value, k) => value - share * (unit[k] ?? 0));
    },
    [...vector],
  );
}
