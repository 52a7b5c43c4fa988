/**
 * A bar under load by cubic Hermite elements, its eigenproblem solved by ml-matrix: another way to critical loads, which shares nothing with
 * the exact one but what a bar problem is. Displacements along the legs (not in principal directions), rigid holds by the null space of
 * what they say, consistent geometric stiffness. A conforming model, so its loads come out too high and fall to the exact ones.
 */
import {
  CholeskyDecomposition,
  EigenvalueDecomposition,
  Matrix,
  SingularValueDecomposition,
} from 'ml-matrix';
import type { BarProblem, Hold } from '../../../core/stability/model.ts';

/**
 * Positive load factors of the model, rising; the first two within 0.03 % or so, since a coarse model says how fine the mesh must be.
 */
export function hermiteLoads(problem: BarProblem): readonly number[] {
  const stops = stopsOf(problem);
  const coarse = solvedOn(
    problem,
    spread(stops, (from, to) => evenly(from, to, 4)),
  );
  const load = coarse[1] ?? coarse[0] ?? 0;
  return solvedOn(
    problem,
    spread(stops, (from, to) => graded(problem, load, from, to)),
  );
}

/** The same with so many equal elements to a span. */
export function hermiteLoadsOn(problem: BarProblem, elementsToSpan: number): readonly number[] {
  return solvedOn(
    problem,
    spread(stopsOf(problem), (from, to) => evenly(from, to, elementsToSpan)),
  );
}

function solvedOn(problem: BarProblem, places: readonly number[]): readonly number[] {
  const { K, G } = assembled(problem, places);
  const free = freeUnknowns(problem, places);
  return loadsOf(
    symmetric(free.transpose().mmul(K).mmul(free)),
    symmetric(free.transpose().mmul(G).mmul(free)),
  );
}

/** Rounding makes two of the two triangles; the solver wants one. */
const symmetric = (A: Matrix): Matrix => A.clone().add(A.transpose()).mul(0.5);

/** G x = (1/λ) K x: K is positive, while tension makes G indefinite. */
function loadsOf(K: Matrix, G: Matrix): readonly number[] {
  const L = new CholeskyDecomposition(K).lowerTriangularMatrix;
  const A = symmetric(forward(L, forward(L, G).transpose()));
  const { realEigenvalues } = new EigenvalueDecomposition(A, { assumeSymmetric: true });
  const most = Math.max(...realEigenvalues);
  return realEigenvalues
    .filter((value) => value > 1e-9 * most)
    .map((value) => 1 / value)
    .sort((a, b) => a - b);
}

/** L⁻¹ B. */
function forward(L: Matrix, B: Matrix): Matrix {
  const X = B.clone();
  for (let i = 0; i < L.rows; i++) {
    const row = X.getRow(i);
    for (let k = 0; k < i; k++) {
      const l = L.get(i, k);
      if (l !== 0) for (let j = 0; j < row.length; j++) row[j] = (row[j] ?? 0) - l * X.get(k, j);
    }
    X.setRow(
      i,
      row.map((value) => value / L.get(i, i)),
    );
  }
  return X;
}

/** Where something changes: ends, stations, steps of the force. */
function stopsOf({ length, holds, axial, twist }: BarProblem): readonly number[] {
  const given = [
    0,
    length,
    ...holds.map(({ at }) => at),
    ...axial.flatMap(({ from, to }) => [from, to]),
    ...(twist?.heldAt ?? []),
  ];
  return [...new Set(given)].sort((a, b) => a - b);
}

function spread(
  stops: readonly number[],
  between: (from: number, to: number) => readonly number[],
): readonly number[] {
  return [0, ...stops.slice(1).flatMap((to, k) => [...between(stops[k] ?? 0, to), to])];
}

const evenly = (from: number, to: number, parts: number): readonly number[] =>
  Array.from({ length: parts - 1 }, (_, k) => from + ((to - from) * (k + 1)) / parts);

/** Half the length over which a wave turns by one radian: a cubic element's load is then about (1/2)⁴/720 too high. */
const PART_OF_WAVE = 0.5;
/** Towards the middle of a span, where layers at its ends have died away, elements grow by this. */
const GROWTH = 1.6;

/** Fine at both ends, where a pulled bar and a twisted one have layers as short as 1/κ; no element longer than a wave allows. */
function graded(problem: BarProblem, load: number, from: number, to: number): readonly number[] {
  const middle = (from + to) / 2;
  const share = shareAt(problem, middle);
  const { wave, layer } = lengthsOf(problem, share * load);
  const longest = share > 0 ? Math.min(wave, (to - from) / 4) : (to - from) / 4;
  const half: number[] = [];
  let step = Math.min(wave, layer, longest);
  for (let at = step; at < middle - from - step / 2; at += step) {
    half.push(at);
    step = Math.min(step * GROWTH, longest);
  }
  return [...half.map((d) => from + d), middle, ...half.reverse().map((d) => to - d)];
}

/** Elements that follow a wave, and a layer at an end, under a force: of bowing about v, and of twist by itself. */
function lengthsOf({ E, section, twist }: BarProblem, N: number): { wave: number; layer: number } {
  const part = (stiffness: number, force: number): number =>
    PART_OF_WAVE / Math.sqrt(Math.abs(force) / stiffness + 1e-12);
  const bowing = part(E * section.Iv, N);
  if (!twist) return { wave: bowing, layer: bowing };
  const [sx, sy] = section.shearCentre;
  const turning = N * ((section.Iu + section.Iv) / section.area + sx * sx + sy * sy) - twist.G * section.J;
  const twisting = part(E * section.Iw, turning);
  // Where torsion resists there is no wave of twist, only a layer. Bowing and twist together make somewhat shorter waves than either.
  return { wave: Math.min(bowing, turning > 0 ? twisting : bowing) / 1.5, layer: twisting };
}

const shareAt = ({ axial }: BarProblem, at: number): number =>
  axial.find((piece) => at > piece.from && at < piece.to)?.share ?? 0;

/** ∫N″ᵢN″ⱼ and ∫N′ᵢN′ⱼ of the cubics of [w₁, w₁′, w₂, w₂′] over a length h. */
const curvature = (h: number): number[][] => [
  [12 / h ** 3, 6 / h ** 2, -12 / h ** 3, 6 / h ** 2],
  [6 / h ** 2, 4 / h, -6 / h ** 2, 2 / h],
  [-12 / h ** 3, -6 / h ** 2, 12 / h ** 3, -6 / h ** 2],
  [6 / h ** 2, 2 / h, -6 / h ** 2, 4 / h],
];
const slope = (h: number): number[][] => [
  [36 / (30 * h), 3 / 30, -36 / (30 * h), 3 / 30],
  [3 / 30, (4 * h) / 30, -3 / 30, -h / 30],
  [-36 / (30 * h), -3 / 30, 36 / (30 * h), -3 / 30],
  [3 / 30, -h / 30, -3 / 30, (4 * h) / 30],
];

const fieldsOf = ({ twist }: BarProblem): 2 | 3 => (twist ? 3 : 2);

/** Unknowns node by node: [displacement, slope] of each field, the fields being along x, along y (both of the shear centre) and the twist. */
function assembled(problem: BarProblem, places: readonly number[]): { K: Matrix; G: Matrix } {
  const m = fieldsOf(problem);
  const size = 2 * m * places.length;
  const [K, G] = [Matrix.zeros(size, size), Matrix.zeros(size, size)];
  const { bending, torsion, force } = sectionMatrices(problem);
  places.slice(1).forEach((to, e) => {
    const from = places[e] ?? 0;
    const middle = (from + to) / 2;
    const share = shareAt(problem, middle);
    const [c, s] = [curvature(to - from), slope(to - from)];
    for (let p = 0; p < m; p++)
      for (let q = 0; q < m; q++)
        for (let a = 0; a < 4; a++)
          for (let b = 0; b < 4; b++) {
            const i = 2 * m * (e + (a >> 1)) + 2 * p + (a & 1);
            const j = 2 * m * (e + (b >> 1)) + 2 * q + (b & 1);
            const bend = (bending[p]?.[q] ?? 0) * (c[a]?.[b] ?? 0);
            const turn = p === 2 && q === 2 ? torsion * (s[a]?.[b] ?? 0) : 0;
            K.set(i, j, K.get(i, j) + bend + turn);
            G.set(i, j, G.get(i, j) + share * (force[p]?.[q] ?? 0) * (s[a]?.[b] ?? 0));
          }
  });
  addSprings(problem, places, K);
  return { K, G };
}

/** Bending by the second moments about the legs' axes; the force works through the slope of every fibre of the section. */
function sectionMatrices({ E, section, twist }: BarProblem) {
  const Ixy = -(section.Iu - section.Iv) * Math.sin(section.alpha) * Math.cos(section.alpha);
  const [sx, sy] = twist ? section.shearCentre : [0, 0];
  const polar = (section.Ixx + section.Iyy) / section.area + sx * sx + sy * sy;
  return {
    bending: [
      [E * section.Iyy, E * Ixy, 0],
      [E * Ixy, E * section.Ixx, 0],
      [0, 0, E * section.Iw],
    ],
    torsion: twist ? twist.G * section.J : 0,
    // A fibre at (x, y) moves by u − (y − sy)θ and v + (x − sx)θ; the means of x and y are zero.
    force: [
      [1, 0, sy],
      [0, 1, -sx],
      [sy, -sx, polar],
    ],
  };
}

function rowOf({ section, twist }: BarProblem, { direction: [dx, dy], grip }: Hold): number[] {
  if (!twist) return [dx, dy];
  const [px, py] = grip ?? [0, 0];
  const [sx, sy] = section.shearCentre;
  return [dx, dy, dy * (px - sx) - dx * (py - sy)];
}

function addSprings(problem: BarProblem, places: readonly number[], K: Matrix): void {
  const m = fieldsOf(problem);
  const add = (i: number, j: number, value: number) => void K.set(i, j, K.get(i, j) + value);
  for (const hold of problem.holds) {
    if (hold.stiffness === 'rigid') continue;
    const row = rowOf(problem, hold);
    const first = 2 * m * places.indexOf(hold.at);
    for (let p = 0; p < m; p++)
      for (let q = 0; q < m; q++)
        add(first + 2 * p, first + 2 * q, hold.stiffness * (row[p] ?? 0) * (row[q] ?? 0));
  }
  [problem.endI, problem.endJ].forEach((end, k) => {
    const first = k === 0 ? 0 : 2 * m * (places.length - 1);
    if (end.alongX !== 'rigid') add(first + 1, first + 1, end.alongX);
    if (end.alongY !== 'rigid') add(first + 3, first + 3, end.alongY);
  });
}

/** Columns: the ways that the holds leave free, node by node. */
function freeUnknowns(problem: BarProblem, places: readonly number[]): Matrix {
  const m = fieldsOf(problem);
  const blocks = places.map((at, k) => nullSpace(heldRows(problem, places, at, k), 2 * m));
  const columns = blocks.reduce((sum, block) => sum + block.columns, 0);
  const free = Matrix.zeros(2 * m * places.length, columns);
  let column = 0;
  blocks.forEach((block, k) => {
    free.setSubMatrix(block, 2 * m * k, column);
    column += block.columns;
  });
  return free;
}

function heldRows(problem: BarProblem, places: readonly number[], at: number, k: number): number[][] {
  const m = fieldsOf(problem);
  const unit = (index: number) => Array.from({ length: 2 * m }, (_, i) => (i === index ? 1 : 0));
  const end = k === 0 ? problem.endI : k === places.length - 1 ? problem.endJ : null;
  if (end)
    return [
      ...Array.from({ length: m }, (_, p) => unit(2 * p)),
      ...(end.alongX === 'rigid' ? [unit(1)] : []),
      ...(end.alongY === 'rigid' ? [unit(3)] : []),
    ];
  const rows = problem.holds
    .filter((hold) => hold.at === at && hold.stiffness === 'rigid')
    .map((hold) => rowOf(problem, hold).flatMap((value) => [value, 0]));
  return problem.twist?.heldAt.includes(at) ? [...rows, unit(4)] : rows;
}

function nullSpace(rows: readonly number[][], size: number): Matrix {
  if (rows.length === 0) return Matrix.eye(size, size);
  // Square, with rows of zeros: then the right-hand vectors are all there.
  const square = Matrix.zeros(size, size);
  rows.forEach((row, i) => {
    const length = Math.hypot(...row);
    square.setRow(
      i % size,
      row.map((value) => value / length),
    );
  });
  const { diagonal, rightSingularVectors } = new SingularValueDecomposition(square);
  const free = diagonal.flatMap((value, k) => (value < 1e-9 ? [k] : []));
  return new Matrix(Array.from({ length: size }, (_, i) => free.map((k) => rightSingularVectors.get(i, k))));
}
