/** A bar as nodes with what is free at each, and pieces between them. Built once for a problem; loads come later. */
import type { Vec2 } from '../geometry/vector.ts';
import type { BarProblem, Hold } from './model.ts';
import { freeWays, type Spring, type Way } from './ways.ts';

export interface MeshNode {
  readonly at: number;
  /** Ways in which displacements, and slopes, are free: orthonormal weights on the fields. Springs lie along the first of them. */
  readonly displacements: readonly Way[];
  readonly slopes: readonly Way[];
  readonly springs: readonly Spring[];
  readonly slopeSprings: readonly Spring[];
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

/**
 * Places nearer than this share of the length are one: less than a bolt has play in its hole, and a piece as short would be so much stiffer
 * than the bar that the bar is lost beside it in double precision.
 */
const ONE_PLACE = 1e-4;

/** @param split how many parts each piece between stations is cut into: 1 for the load, more for a shape to draw */
export function meshOf(problem: BarProblem, split = 1): Mesh {
  const fields = problem.twist ? 3 : 2;
  const stops = stopsOf(problem);
  const last = stops.length - 1;
  const nodes: MeshNode[] = [];
  const pieces: MeshPiece[] = [];
  stops.forEach((at, k) => {
    const end = k === 0 ? 'i' : k === last ? 'j' : null;
    nodes.push(end ? endNode(problem, fields, at, end) : innerNode(problem, fields, at, stops));
    const to = stops[k + 1];
    if (to === undefined) return;
    const share = shareAt(problem, (at + to) / 2);
    const parts = split === 1 ? 1 : partsOf((to - at) / problem.length, split);
    for (let part = 1; part < parts; part++) nodes.push(freeNode(fields, at + ((to - at) * part) / parts));
    for (let part = 0; part < parts; part++) pieces.push({ length: (to - at) / parts, share });
  });
  return { fields, nodes, pieces };
}

/** No part shorter than twenty places that count as one. */
const partsOf = (share: number, split: number): number =>
  Math.max(1, Math.min(split, Math.floor(share / (20 * ONE_PLACE))));

/** Where something stands or changes, ends included; rising. */
function stopsOf({ length, holds, axial, twist }: BarProblem): readonly number[] {
  const all = [0];
  for (const { at } of holds) all.push(at);
  for (const { from, to } of axial) all.push(from, to);
  if (twist) all.push(...twist.heldAt);
  all.sort((a, b) => a - b);
  const near = length * ONE_PLACE;
  const stops = [0];
  let before = 0;
  for (const at of all)
    if (at - before > near && at < length - near) {
      stops.push(at);
      before = at;
    }
  stops.push(length);
  return stops;
}

function shareAt({ axial }: BarProblem, at: number): number {
  for (const { from, to, share } of axial) if (at >= from && at <= to) return share;
  return 0;
}

const WAYS: Readonly<Record<2 | 3, readonly Way[]>> = { 2: freeWays([], [], 2), 3: freeWays([], [], 3) };
const NONE: readonly never[] = [];

const freeNode = (fields: 2 | 3, at: number): MeshNode => ({
  at,
  displacements: WAYS[fields],
  slopes: WAYS[fields],
  springs: NONE,
  slopeSprings: NONE,
});

/** Ends stay against twist, and in place as far as they are held; their slopes are free, sprung or held along x and along y. */
function endNode(problem: BarProblem, fields: 2 | 3, at: number, end: 'i' | 'j'): MeshNode {
  const { alongX, alongY } = end === 'i' ? problem.endI : problem.endJ;
  const displacements = endDisplacements(problem, fields, end);
  const kept = problem.slopesStay?.[end] ?? NONE;
  if (alongX === 0 && alongY === 0 && kept.length === 0)
    return { at, displacements, slopes: WAYS[fields], springs: NONE, slopeSprings: NONE };
  const { weak, strong } = principalMotions(problem.section.alpha);
  const held: Way[] = kept.map(([x, y]) => {
    const row = [x * weak[0] + y * weak[1], x * strong[0] + y * strong[1]];
    return fields === 3 ? [...row, 0] : row;
  });
  const slopeSprings: Spring[] = [];
  ([alongX, alongY] as const).forEach((stiffness, k) => {
    const row = fields === 3 ? [weak[k] ?? 0, strong[k] ?? 0, 0] : [weak[k] ?? 0, strong[k] ?? 0];
    if (stiffness === 'rigid') held.push(row);
    else if (stiffness > 0) slopeSprings.push({ row, stiffness });
  });
  return { at, displacements, slopes: freeWays(held, slopeSprings, fields), springs: NONE, slopeSprings };
}

function endDisplacements(problem: BarProblem, fields: 2 | 3, end: 'i' | 'j'): readonly Way[] {
  const stays = problem.endsStay?.[end];
  if (!stays) return NONE;
  const held = stays.map((direction) => rowOf(problem, fields, { direction }));
  return freeWays(fields === 3 ? [...held, [0, 0, 1]] : held, [], fields);
}

function innerNode(problem: BarProblem, fields: 2 | 3, at: number, stops: readonly number[]): MeshNode {
  const held: Way[] = [];
  const springs: Spring[] = [];
  for (const hold of problem.holds) {
    if (nearestOf(stops, hold.at) !== at) continue;
    if (hold.stiffness === 'rigid') held.push(rowOf(problem, fields, hold));
    else if (hold.stiffness > 0)
      springs.push({ row: rowOf(problem, fields, hold), stiffness: hold.stiffness });
  }
  if (problem.twist?.heldAt.some((place) => nearestOf(stops, place) === at)) held.push([0, 0, 1]);
  if (held.length === 0 && springs.length === 0) return freeNode(fields, at);
  return {
    at,
    displacements: freeWays(held, springs, fields),
    slopes: WAYS[fields],
    springs,
    slopeSprings: NONE,
  };
}

function nearestOf(stops: readonly number[], at: number): number {
  let best = 0;
  for (const stop of stops) if (Math.abs(stop - at) < Math.abs(best - at)) best = stop;
  return best;
}

/** What the movement in the hold's direction, at the point where it grips, is in terms of the fields. */
export function rowOf(
  { section }: Pick<BarProblem, 'section'>,
  fields: 2 | 3,
  { direction, grip }: Pick<Hold, 'direction' | 'grip'>,
): Way {
  const { weak, strong } = principalMotions(section.alpha);
  const [dx, dy] = direction;
  const a = dx * weak[0] + dy * weak[1];
  const b = dx * strong[0] + dy * strong[1];
  if (fields === 2) return [a, b];
  const [px, py] = grip ?? [0, 0];
  const [sx, sy] = section.shearCentre;
  // Turning by θ about the shear centre moves the point by θ·(−(py − sy), px − sx).
  return [a, b, -dx * (py - sy) + dy * (px - sx)];
}
