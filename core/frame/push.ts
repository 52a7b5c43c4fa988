/** The push test: how far a place on a bar moves when it is pushed, with the bar in the frame, and what the rest of the frame offers it. */
import { dot, type Vec2, type Vec3 } from '../geometry/vector.ts';
import type { BarId } from '../layout/model.ts';
import { inverse, principalOf2 } from '../sparse/dense.ts';
import { ELEMENT_SIZE } from './elementStiffness.ts';
import type { FrameElement } from './model.ts';
import { intoAxes } from './nodeAxes.ts';
import type { FrameSolver } from './solver.ts';

/** What the section plane sees of a stiffness: two principal values, N/mm, and the direction of the stiffer. */
export interface StiffnessEllipse {
  readonly stiff: number;
  readonly soft: number;
  /** Unit vector of the stiffer way in the section plane. */
  readonly stiffWay: Vec2;
  /** Stiffness matrix [[xx, xy], [xy, yy]] in the section plane, N/mm. */
  readonly matrix: readonly [number, number, number];
}

/** Displacement, mm, of a node for one newton in a direction, bar in place. */
export function movementUnder(solver: FrameSolver, node: number, direction: Vec3): Vec3 {
  const x = solver.solve(solver.loadOf([{ node, force: direction }]));
  const [a, b, c] = solver.motionOf(x, node);
  return [a, b, c];
}

/** Stiffness of a node against being pushed square to its bar, bar in place. */
export function ellipseInPlace(
  solver: FrameSolver,
  node: number,
  axes: SectionAxes,
): StiffnessEllipse | null {
  const flex = ([axes.x, axes.y] as const).map((way) => movementUnder(solver, node, way));
  const [fx, fy] = flex;
  if (!fx || !fy) return null;
  const F = [dot(fx, axes.x), (dot(fx, axes.y) + dot(fy, axes.x)) / 2, dot(fy, axes.y)] as const;
  return ellipseOf(F);
}

export interface SectionAxes {
  readonly x: Vec3;
  readonly y: Vec3;
}

function ellipseOf([fxx, fxy, fyy]: readonly [number, number, number]): StiffnessEllipse | null {
  const determinant = fxx * fyy - fxy * fxy;
  if (!(determinant > 0)) return null;
  const matrix = [fyy / determinant, -fxy / determinant, fxx / determinant] as const;
  const { larger, smaller, angle } = principalOf2(...matrix);
  return { stiff: larger, soft: smaller, stiffWay: [Math.cos(angle), Math.sin(angle)], matrix };
}

export interface StationStiffness {
  /** mm from end i of the bar. */
  readonly at: number;
  readonly node: number;
  readonly ellipse: StiffnessEllipse;
}

/**
 * What the rest of the frame offers a bar at each place where something is joined to it: the bar's bending left out, its ends held, the other places free.
 * The bar's own axial stiffness stays, since a push across it along a slanting partner also draws on that. METHODS.md, "The push test".
 * Null when the frame cannot say (a mechanism).
 */
export function offeredTo(
  solver: FrameSolver,
  bar: BarId,
  axes: SectionAxes,
): readonly StationStiffness[] | null {
  const along = solver.frame.along.get(bar);
  const elements = solver.frame.elements.filter((element) => element.bar === bar);
  if (!along || elements.length < 2) return [];
  const inner = along.slice(1, -1);
  const unknowns = interfaceUnknowns(solver, along);
  const place = new Map(unknowns.map((unknown, k) => [unknown, k]));
  const full = stiffnessAt(solver, unknowns);
  if (!full) return null;
  const rest = less(full, ownStiffness(solver, elements, place, unknowns.length), unknowns.length);
  const stations = inner.map(({ node }) =>
    [0, 1, 2].map((k) => place.get((solver.displacementOf[node] ?? -1) + k) ?? -1),
  );
  if (stations.some((three) => three.some((k) => k < 0))) return null;
  const K = picked(rest, unknowns.length, stations.flat());
  const into = (node: number, v: Vec3): Vec3 => intoAxes(solver.displacementAxes(node), v);
  const [first] = elements;
  if (first)
    addAxial(
      K,
      along.map(({ at, node }) => ({ at, e: into(node, first.direction) })),
      first.EA,
    );
  const size = stations.length * 3;
  // A cut partner offers nothing out of the plane: a trace of stiffness lets that be said as a number near zero.
  for (let k = 0; k < size; k++) K[k * size + k] = (K[k * size + k] ?? 0) + TRACE;
  const F = inverse(K, size);
  if (!F) return null;
  const offered = inner.map(({ at, node }, s): StationStiffness | null => {
    const [x, y] = [into(node, axes.x), into(node, axes.y)];
    const along2 = (p: Vec3, q: Vec3): number => {
      let sum = 0;
      for (let i = 0; i < 3; i++)
        for (let j = 0; j < 3; j++)
          sum += (p[i] ?? 0) * (F[(3 * s + i) * size + 3 * s + j] ?? 0) * (q[j] ?? 0);
      return sum;
    };
    const ellipse = ellipseOf([along2(x, x), along2(x, y), along2(y, y)]);
    return ellipse && { at, node, ellipse };
  });
  return offered.every((each) => each !== null) ? offered : null;
}

const NO_WAY: Vec3 = [0, 0, 0];

/** N/mm: nothing in steelwork is this soft. */
const TRACE = 1e-6;

/** Displacements of the inner places; displacements and rotations of the ends. */
function interfaceUnknowns(
  solver: FrameSolver,
  along: readonly { readonly node: number }[],
): readonly number[] {
  const found = new Set<number>();
  along.forEach(({ node }, k) => {
    const end = k === 0 || k === along.length - 1;
    for (const first of end
      ? [solver.displacementOf[node] ?? -1, solver.rotationOf[node] ?? -1]
      : [solver.displacementOf[node] ?? -1])
      if (first >= 0) for (let c = 0; c < 3; c++) found.add(first + c);
  });
  return [...found];
}

/** Stiffness of the whole frame as felt at some of its unknowns, all others free. */
function stiffnessAt(solver: FrameSolver, unknowns: readonly number[]): Float64Array | null {
  const n = unknowns.length;
  const F = new Float64Array(n * n);
  unknowns.forEach((unknown, column) => {
    const x = solver.solveUnit(unknown);
    unknowns.forEach((other, row) => {
      F[row * n + column] = x[other] ?? 0;
    });
  });
  return inverse(F, n);
}

/** The bar alone, felt at the interface: its inner rotations follow. */
function ownStiffness(
  solver: FrameSolver,
  elements: readonly FrameElement[],
  place: ReadonlyMap<number, number>,
  size: number,
): Float64Array {
  const extra = new Map<number, number>();
  const indexOf = (unknown: number): number => {
    if (unknown < 0) return -1;
    const known = place.get(unknown) ?? extra.get(unknown);
    if (known !== undefined) return known;
    const index = size + extra.size;
    extra.set(unknown, index);
    return index;
  };
  const blocks = elements.map((element) => ({
    at: solver.unknownsOf(element.i, element.j).map(indexOf),
    K: solver.stiffnessOf(element).K,
  }));
  const n = size + extra.size;
  const K = new Float64Array(n * n);
  for (const { at, K: own } of blocks)
    for (let a = 0; a < ELEMENT_SIZE; a++)
      for (let b = 0; b < ELEMENT_SIZE; b++) {
        const i = at[a] ?? -1;
        const j = at[b] ?? -1;
        if (i >= 0 && j >= 0) K[i * n + j] = (K[i * n + j] ?? 0) + (own[a * ELEMENT_SIZE + b] ?? 0);
      }
  // Eliminate the bar's own rotations from the back.
  for (let k = n - 1; k >= size; k--) {
    const pivot = K[k * n + k] ?? 0;
    if (!(pivot > 0)) continue;
    for (let i = 0; i < k; i++) {
      const factor = (K[i * n + k] ?? 0) / pivot;
      if (factor === 0) continue;
      for (let j = 0; j < k; j++) K[i * n + j] = (K[i * n + j] ?? 0) - factor * (K[k * n + j] ?? 0);
    }
  }
  const condensed = new Float64Array(size * size);
  for (let i = 0; i < size; i++) for (let j = 0; j < size; j++) condensed[i * size + j] = K[i * n + j] ?? 0;
  return condensed;
}

function less(a: Float64Array, b: Float64Array, size: number): Float64Array {
  const result = new Float64Array(size * size);
  for (let i = 0; i < size; i++)
    for (let j = 0; j < size; j++) {
      const p = (a[i * size + j] ?? 0) - (b[i * size + j] ?? 0);
      const q = (a[j * size + i] ?? 0) - (b[j * size + i] ?? 0);
      result[i * size + j] = (p + q) / 2;
    }
  return result;
}

function picked(K: Float64Array, size: number, wanted: readonly number[]): Float64Array {
  const n = wanted.length;
  const result = new Float64Array(n * n);
  wanted.forEach((i, r) => {
    wanted.forEach((j, c) => {
      result[r * n + c] = K[i * size + j] ?? 0;
    });
  });
  return result;
}

/** The bar's axial stiffness between its places, ends held; `e` is its direction in the axes of each. */
function addAxial(
  K: Float64Array,
  along: readonly { readonly at: number; readonly e: Vec3 }[],
  EA: number,
): void {
  const inner = along.length - 2;
  const n = inner * 3;
  along.slice(1).forEach((to, k) => {
    const stiffness = EA / (to.at - (along[k]?.at ?? 0));
    // Piece k runs from place k to k + 1; inner places are counted from 0 at place 1.
    const [a, b] = [k - 1, k];
    const pairs: readonly (readonly [number, number, number])[] = [
      [a, a, 1],
      [b, b, 1],
      [a, b, -1],
      [b, a, -1],
    ];
    for (const [p, q, sign] of pairs) {
      if (p < 0 || q < 0 || p >= inner || q >= inner) continue;
      const [ep, eq] = [along[p + 1]?.e ?? NO_WAY, along[q + 1]?.e ?? NO_WAY];
      for (let i = 0; i < 3; i++)
        for (let j = 0; j < 3; j++) {
          const at = (3 * p + i) * n + 3 * q + j;
          K[at] = (K[at] ?? 0) + sign * stiffness * (ep[i] ?? 0) * (eq[j] ?? 0);
        }
    }
  });
}
