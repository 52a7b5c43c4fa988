/** The stiffness of the loaded bar at its nodes, as a band, with the count of critical loads below a trial load (Wittrick and Williams, 1971). */
import type { Mesh } from './mesh.ts';
import type { BarProblem } from './model.ts';
import { fieldsOf, type PieceFields } from './pieceFields.ts';
import { clampedLoadsBelow, type MemberStiffness, memberStiffness } from './stabilityFunctions.ts';
import type { Unknown, Unknowns } from './unknowns.ts';

export interface Trial {
  /** Critical loads below the trial load. */
  readonly below: number;
  /** Of these, those of pieces with clamped ends: while this stays the same, the determinant has no pole. */
  readonly clamped: number;
  readonly logDeterminant: number;
}

/** Where the numbers of a piece's stiffness go: band[place] += weight · number[source]. Worked out once, so that a trial is a short loop. */
interface Scatter {
  readonly place: Int32Array;
  readonly source: Int32Array;
  readonly weight: Float64Array;
}

const KINDS = ['force', 'cross', 'near', 'far'] as const;
type Kind = (typeof KINDS)[number];

/** One bar of a system: what it is, its mesh, and which unknowns it has. */
export interface SystemPart {
  readonly problem: BarProblem;
  readonly mesh: Mesh;
  readonly unknowns: Unknowns;
}

/** Bars ready to be tried at one load factor after another: one alone, or several that share unknowns. Not to be used by two that try at once. */
export class LoadedSystem {
  readonly #parts: readonly LoadedPart[];
  readonly #size: number;
  readonly #width: number;
  /** Springs: the same at every load. */
  readonly #fixed: Float64Array;
  readonly #band: Float64Array;

  constructor(parts: readonly SystemPart[]) {
    this.#size = parts.reduce((most, { unknowns }) => Math.max(most, unknowns.size), 0);
    this.#width = parts.reduce((most, { unknowns }) => Math.max(most, unknowns.width), 1);
    this.#band = new Float64Array(this.#size * this.#width);
    this.#fixed = new Float64Array(this.#size * this.#width);
    for (const { mesh, unknowns } of parts) addSprings(this.#fixed, this.#width, mesh, unknowns);
    this.#parts = parts.map((part) => new LoadedPart(part, this.#width));
  }

  get size(): number {
    return this.#size;
  }

  /** Assembles, factors in place and counts. */
  tried(factor: number): Trial {
    this.#band.set(this.#fixed);
    let clamped = 0;
    for (const part of this.#parts) clamped += part.addTo(this.#band, factor);
    const { negative, logDeterminant } = factorBand(this.#band, this.#size, this.#width);
    return { below: clamped + negative, clamped, logDeterminant };
  }

  /** Solves with the factors of the last trial, in place. */
  solve(rhs: Float64Array): void {
    solveBand(this.#band, this.#size, this.#width, rhs);
  }
}

class LoadedPart {
  readonly #mesh: Mesh;
  readonly #fieldsAt: (N: number) => PieceFields;
  readonly #scatters: readonly Scatter[];
  readonly #numbers: Float64Array;
  readonly #stiffness: MemberStiffness = { force: 0, cross: 0, near: 0, far: 0 };

  constructor({ problem, mesh, unknowns }: SystemPart, width: number) {
    this.#mesh = mesh;
    this.#fieldsAt = fieldsOf(problem);
    this.#numbers = new Float64Array(KINDS.length * mesh.fields * mesh.fields);
    this.#scatters = mesh.pieces.map((_, k) => scatterOf(mesh, unknowns, width, k, problem.twist !== null));
  }

  /** Adds the stiffness of all pieces at a load factor and returns the clamped count. */
  addTo(band: Float64Array, factor: number): number {
    const { pieces } = this.#mesh;
    const numbers = this.#numbers;
    let clamped = 0;
    for (let k = 0; k < pieces.length; k++) {
      const piece = pieces[k];
      const scatter = this.#scatters[k];
      if (!piece || !scatter) continue;
      clamped += this.#numbersOf(piece.length, piece.share * factor);
      const { place, source, weight } = scatter;
      for (let e = 0; e < place.length; e++) {
        const at = place[e] ?? 0;
        band[at] = (band[at] ?? 0) + (weight[e] ?? 0) * (numbers[source[e] ?? 0] ?? 0);
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
        numbers[block + at] = s.cross;
        numbers[2 * block + at] = s.near;
        numbers[3 * block + at] = s.far;
        continue;
      }
      for (let i = 0; i < m; i++)
        for (let j = 0; j < m; j++) {
          const t = (fields.T[f * m + i] ?? 0) * (fields.T[f * m + j] ?? 0);
          const at = i * m + j;
          numbers[at] = (numbers[at] ?? 0) + t * s.force;
          numbers[block + at] = (numbers[block + at] ?? 0) + t * s.cross;
          numbers[2 * block + at] = (numbers[2 * block + at] ?? 0) + t * s.near;
          numbers[3 * block + at] = (numbers[3 * block + at] ?? 0) + t * s.far;
        }
    }
    return clamped;
  }
}

/** Which number of a piece couples two of its unknowns, and with which sign. Signs as for a beam whose slopes are dw/dz at both ends. */
function couplingOf(
  p: Unknown,
  atStartP: boolean,
  q: Unknown,
  atStartQ: boolean,
): { kind: Kind; sign: number } {
  if (p.of === 'displacement' && q.of === 'displacement')
    return { kind: 'force', sign: atStartP === atStartQ ? 1 : -1 };
  if (p.of === 'slope' && q.of === 'slope') return { kind: atStartP === atStartQ ? 'near' : 'far', sign: 1 };
  const displacementAtStart = p.of === 'displacement' ? atStartP : atStartQ;
  return { kind: 'cross', sign: displacementAtStart ? 1 : -1 };
}

function scatterOf(mesh: Mesh, unknowns: Unknowns, width: number, k: number, mixed: boolean): Scatter {
  const m = mesh.fields;
  const place: number[] = [];
  const source: number[] = [];
  const weight: number[] = [];
  const ends = [
    ...(unknowns.ofNode[k] ?? [])
      .filter(({ side }) => side !== 'before')
      .map((unknown) => ({ unknown, atStart: true })),
    ...(unknowns.ofNode[k + 1] ?? [])
      .filter(({ side }) => side !== 'after')
      .map((unknown) => ({ unknown, atStart: false })),
  ];
  for (const row of ends)
    for (const column of ends) {
      if (column.unknown.index > row.unknown.index) continue;
      const { kind, sign } = couplingOf(row.unknown, row.atStart, column.unknown, column.atStart);
      const base = KINDS.indexOf(kind) * m * m;
      for (let i = 0; i < m; i++)
        for (let j = 0; j < m; j++) {
          const share = sign * (row.unknown.weights[i] ?? 0) * (column.unknown.weights[j] ?? 0);
          if (share === 0 || (!mixed && i !== j)) continue;
          place.push(row.unknown.index * width + (row.unknown.index - column.unknown.index));
          source.push(base + i * m + j);
          weight.push(share);
        }
    }
  return {
    place: Int32Array.from(place),
    source: Int32Array.from(source),
    weight: Float64Array.from(weight),
  };
}

function addSprings(band: Float64Array, width: number, mesh: Mesh, unknowns: Unknowns): void {
  const m = mesh.fields;
  mesh.nodes.forEach((node, k) => {
    const list = unknowns.ofNode[k] ?? [];
    for (const [of, springs] of [
      ['displacement', node.springs],
      ['slope', node.slopeSprings],
    ] as const) {
      if (!springs) continue;
      for (const row of list)
        for (const column of list) {
          if (row.of !== of || column.of !== of || column.index > row.index) continue;
          let sum = 0;
          for (let i = 0; i < m; i++)
            for (let j = 0; j < m; j++)
              sum += (row.weights[i] ?? 0) * (springs[i * m + j] ?? 0) * (column.weights[j] ?? 0);
          const at = row.index * width + (row.index - column.index);
          band[at] = (band[at] ?? 0) + sum;
        }
    }
  });
}

/** LDLᵀ within the band, in place: D on the diagonal, L below it. */
function factorBand(
  band: Float64Array,
  size: number,
  width: number,
): { negative: number; logDeterminant: number } {
  let negative = 0;
  let mantissa = 1;
  let logDeterminant = 0;
  for (let i = 0; i < size; i++) {
    const start = Math.max(0, i - width + 1);
    const row = i * width + i;
    for (let j = start; j < i; j++) {
      const other = j * width + j;
      const from = Math.max(start, j - width + 1);
      let sum = band[row - j] ?? 0;
      for (let k = from; k < j; k++) sum -= (band[row - k] ?? 0) * (band[other - k] ?? 0);
      // Holds L·D until the row is done.
      band[row - j] = sum;
    }
    let pivot = band[i * width] ?? 0;
    const scale = Math.abs(pivot);
    for (let j = start; j < i; j++) {
      const held = band[row - j] ?? 0;
      const l = held / (band[j * width] ?? 1);
      pivot -= held * l;
      band[row - j] = l;
    }
    // A pivot that vanishes altogether counts as not yet buckled, by less than rounding.
    if (pivot === 0) pivot = scale * 1e-17 + 1e-300;
    band[i * width] = pivot;
    if (pivot < 0) negative += 1;
    mantissa *= Math.abs(pivot);
    if (mantissa > 1e200 || mantissa < 1e-200) {
      logDeterminant += Math.log(mantissa);
      mantissa = 1;
    }
  }
  return { negative, logDeterminant: logDeterminant + Math.log(mantissa) };
}

function solveBand(band: Float64Array, size: number, width: number, rhs: Float64Array): void {
  for (let i = 0; i < size; i++) {
    let sum = rhs[i] ?? 0;
    for (let j = Math.max(0, i - width + 1); j < i; j++)
      sum -= (band[i * width + (i - j)] ?? 0) * (rhs[j] ?? 0);
    rhs[i] = sum;
  }
  for (let i = 0; i < size; i++) rhs[i] = (rhs[i] ?? 0) / (band[i * width] ?? 1);
  for (let i = size - 1; i >= 0; i--) {
    let sum = rhs[i] ?? 0;
    for (let j = i + 1; j < Math.min(size, i + width); j++)
      sum -= (band[j * width + (j - i)] ?? 0) * (rhs[j] ?? 0);
    rhs[i] = sum;
  }
}
