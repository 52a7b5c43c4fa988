/** The stiffness of loaded bars at their nodes, with the count of critical loads below a trial load (Wittrick and Williams, 1971). */
import type { Mesh, MeshPiece } from './mesh.ts';
import type { BarProblem } from './model.ts';
import { fieldsOf, type PieceFields } from './pieceFields.ts';
import { Skyline } from './skyline.ts';
import { clampedLoadsBelow, type MemberStiffness, memberStiffness } from './stabilityFunctions.ts';
import type { Unknown, Unknowns } from './unknowns.ts';
import type { Spring } from './ways.ts';

export interface Trial {
  /** Critical loads below the trial load. */
  readonly below: number;
  /** Of these, those of pieces with clamped ends: while this stays the same, the determinant has no pole. */
  readonly clamped: number;
  readonly logDeterminant: number;
}

/** Where the numbers of a piece's stiffness go: values[place] += weight · number[source]. Worked out once, so that a trial is a short loop. */
interface Scatter {
  readonly place: readonly number[];
  readonly source: readonly number[];
  readonly weight: readonly number[];
}

/** One bar of a system: what it is, its mesh, and which unknowns it has. */
export interface SystemPart {
  readonly problem: BarProblem;
  readonly mesh: Mesh;
  readonly unknowns: Unknowns;
}

/** Bars ready to be tried at one load factor after another: one alone, or several that share unknowns. Not to be used by two that try at once. */
export class LoadedSystem {
  readonly #parts: readonly LoadedPart[];
  readonly #matrix: Skyline;
  /** Springs: the same at every load. */
  readonly #fixed: Float64Array;

  constructor(parts: readonly SystemPart[]) {
    this.#matrix = new Skyline(firstColumns(parts));
    for (const { mesh, unknowns } of parts) addSprings(this.#matrix, mesh, unknowns);
    this.#fixed = this.#matrix.values.slice();
    this.#parts = parts.map((part) => new LoadedPart(part, this.#matrix));
  }

  get size(): number {
    return this.#matrix.size;
  }

  /** Assembles, factors in place and counts. */
  tried(factor: number): Trial {
    const { values } = this.#matrix;
    values.set(this.#fixed);
    let clamped = 0;
    for (const part of this.#parts) clamped += part.addTo(values, factor);
    const { negative, logDeterminant } = this.#matrix.factor();
    return { below: clamped + negative, clamped, logDeterminant };
  }

  /** Solves with the factors of the last trial, in place. */
  solve(rhs: Float64Array): void {
    this.#matrix.solve(rhs);
  }
}

/** Of each unknown the first one that it meets: unknowns at the two ends of a piece meet. */
function firstColumns(parts: readonly SystemPart[]): Int32Array {
  let size = 0;
  for (const { unknowns } of parts)
    for (const list of unknowns.ofNode) for (const { index } of list) size = Math.max(size, index + 1);
  const first = Int32Array.from({ length: size }, (_, k) => k);
  for (const { unknowns } of parts)
    unknowns.ofNode.forEach((list, k) => {
      const next = unknowns.ofNode[k + 1] ?? [];
      let least = size;
      for (const { index } of list) least = Math.min(least, index);
      for (const { index } of next) least = Math.min(least, index);
      for (const { index } of list) first[index] = Math.min(first[index] ?? 0, least);
      for (const { index } of next) first[index] = Math.min(first[index] ?? 0, least);
    });
  return first;
}

/** Kinds of number in a member's stiffness, in the order in which they are kept. */
const FORCE = 0;
const CROSS = 1;
const NEAR = 2;
const FAR = 3;

class LoadedPart {
  readonly #mesh: Mesh;
  readonly #fieldsAt: (N: number) => PieceFields;
  readonly #scatters: readonly Scatter[];
  readonly #numbers: Float64Array;
  readonly #stiffness: MemberStiffness = { force: 0, cross: 0, near: 0, far: 0 };

  constructor({ problem, mesh, unknowns }: SystemPart, matrix: Skyline) {
    this.#mesh = mesh;
    this.#fieldsAt = fieldsOf(problem);
    this.#numbers = new Float64Array(4 * mesh.fields * mesh.fields);
    const mixed = problem.twist !== null;
    this.#scatters = mesh.pieces.map((_, k) => scatterOf(mesh, unknowns, matrix, k, mixed));
  }

  /** Adds the stiffness of all pieces at a load factor and returns the clamped count. */
  addTo(values: Float64Array, factor: number): number {
    const { pieces } = this.#mesh;
    const numbers = this.#numbers;
    let clamped = 0;
    let own = 0;
    let before: MeshPiece | null = null;
    for (let k = 0; k < pieces.length; k++) {
      const piece = pieces[k];
      const scatter = this.#scatters[k];
      if (!piece || !scatter) continue;
      // Pieces that are alike have the same numbers.
      if (piece.length !== before?.length || piece.share !== before.share)
        own = this.#numbersOf(piece.length, piece.share * factor);
      before = piece;
      clamped += own;
      const { place, source, weight } = scatter;
      for (let e = 0; e < place.length; e++) {
        const at = place[e] ?? 0;
        values[at] = (values[at] ?? 0) + (weight[e] ?? 0) * (numbers[source[e] ?? 0] ?? 0);
      }
    }
    return clamped;
  }

  /** Fills the numbers of one piece and returns its clamped count. */
  #numbersOf(length: number, N: number): number {
    const fields = this.#fieldsAt(N);
    const m = fields.count;
    const s = this.#stiffness;
    const numbers = this.#numbers;
    const block = m * m;
    let clamped = 0;
    if (!fields.plain) numbers.fill(0);
    for (let f = 0; f < m; f++) {
      const EI = fields.EI[f] ?? 0;
      const own = fields.N[f] ?? 0;
      memberStiffness(EI, own, length, s);
      clamped += clampedLoadsBelow(EI, own, length);
      if (fields.plain) {
        const at = f * m + f;
        numbers[at] = s.force;
        numbers[CROSS * block + at] = s.cross;
        numbers[NEAR * block + at] = s.near;
        numbers[FAR * block + at] = s.far;
        continue;
      }
      for (let i = 0; i < m; i++)
        for (let j = 0; j < m; j++) {
          const t = (fields.T[f * m + i] ?? 0) * (fields.T[f * m + j] ?? 0);
          const at = i * m + j;
          numbers[at] = (numbers[at] ?? 0) + t * s.force;
          numbers[CROSS * block + at] = (numbers[CROSS * block + at] ?? 0) + t * s.cross;
          numbers[NEAR * block + at] = (numbers[NEAR * block + at] ?? 0) + t * s.near;
          numbers[FAR * block + at] = (numbers[FAR * block + at] ?? 0) + t * s.far;
        }
    }
    return clamped;
  }
}

/** Which number of a piece couples two of its unknowns. */
function kindOf(p: Unknown, atStartP: boolean, q: Unknown, atStartQ: boolean): number {
  if (p.of !== q.of) return CROSS;
  if (p.of === 'displacement') return FORCE;
  return atStartP === atStartQ ? NEAR : FAR;
}

/** And with which sign: as for a beam whose slopes are dw/dz at both ends. */
function signOf(p: Unknown, atStartP: boolean, q: Unknown, atStartQ: boolean): number {
  if (p.of !== q.of) return (p.of === 'displacement' ? atStartP : atStartQ) ? 1 : -1;
  return p.of === 'displacement' && atStartP !== atStartQ ? -1 : 1;
}

/** @param mixed whether the numbers of a piece couple different fields */
function scatterOf(mesh: Mesh, unknowns: Unknowns, matrix: Skyline, k: number, mixed: boolean): Scatter {
  const m = mesh.fields;
  const place: number[] = [];
  const source: number[] = [];
  const weight: number[] = [];
  const start = (unknowns.ofNode[k] ?? []).filter(({ side }) => side !== 'before');
  const ends = [...start, ...(unknowns.ofNode[k + 1] ?? []).filter(({ side }) => side !== 'after')];
  for (let r = 0; r < ends.length; r++)
    for (let c = 0; c < ends.length; c++) {
      const [row, column] = [ends[r], ends[c]];
      if (!row || !column || column.index > row.index) continue;
      const [p, q] = [r < start.length, c < start.length];
      const base = kindOf(row, p, column, q) * m * m;
      const sign = signOf(row, p, column, q);
      const at = matrix.placeOf(row.index, column.index);
      for (let i = 0; i < m; i++)
        for (let j = 0; j < m; j++) {
          if (!mixed && i !== j) continue;
          const share = sign * (row.weights[i] ?? 0) * (column.weights[j] ?? 0);
          if (share === 0) continue;
          place.push(at);
          source.push(base + i * m + j);
          weight.push(share);
        }
    }
  return { place, source, weight };
}

function addSprings(matrix: Skyline, mesh: Mesh, unknowns: Unknowns): void {
  mesh.nodes.forEach(({ springs, slopeSprings }, k) => {
    const list = unknowns.ofNode[k] ?? [];
    for (const spring of springs) addSpring(matrix, spring, list, 'displacement');
    for (const spring of slopeSprings) addSpring(matrix, spring, list, 'slope');
  });
}

/** Each unknown's part in the spring first, then their products: where a stiff spring does nothing, it does nothing to the last digit. */
function addSpring(
  matrix: Skyline,
  { row, stiffness }: Spring,
  unknowns: readonly Unknown[],
  of: Unknown['of'],
): void {
  const parts = unknowns.flatMap(({ index, of: own, weights }) => {
    if (own !== of) return [];
    return [{ index, part: weights.reduce((sum, weight, k) => sum + weight * (row[k] ?? 0), 0) }];
  });
  const { values } = matrix;
  for (const p of parts)
    for (const q of parts) {
      if (q.index > p.index) continue;
      const at = matrix.placeOf(p.index, q.index);
      values[at] = (values[at] ?? 0) + stiffness * p.part * q.part;
    }
}
