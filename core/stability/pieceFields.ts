/**
 * A piece of the bar under load, taken apart into independent bars. In the principal planes bowing is two of them already. With twist, the three fields
 * (weak, strong, twist) obey M q⁗ + S q″ = 0 with M = diag(EIv, EIu, EIw) and S from the force and the torsion stiffness, both constant along
 * the piece: the eigenvectors of S against M make them three bars with EI = 1 and forces equal to the eigenvalues. Exact, as long as the
 * force and the section do not change along the piece. Source: the shear-centre form of the flexural–torsional equations (Vlasov; Timoshenko and Gere).
 */

import { principalMotions } from './mesh.ts';
import type { BarProblem } from './model.ts';

export interface PieceFields {
  readonly count: 2 | 3;
  /** Bending stiffness and compression of each independent bar. */
  readonly EI: Float64Array;
  readonly N: Float64Array;
  /** Own coordinate of bar i from the fields: row i. Identity where there is nothing to take apart. */
  readonly T: Float64Array;
  /** Whether T is the identity. */
  readonly plain: boolean;
}

export type FieldsAt = (N: number) => PieceFields;

/** Makes the fields for one problem; the result is overwritten at each call. */
export function fieldsOf(problem: BarProblem): FieldsAt {
  return problem.twist ? twistFields(problem, problem.twist.G) : bowingFields(problem);
}

function bowingFields({ E, section }: BarProblem): FieldsAt {
  const fields = {
    count: 2,
    EI: Float64Array.of(E * section.Iv, E * section.Iu),
    N: new Float64Array(2),
    T: Float64Array.of(1, 0, 0, 1),
    plain: true,
  } as const;
  return (N) => {
    fields.N[0] = N;
    fields.N[1] = N;
    return fields;
  };
}

/**
 * Solid bars and tubes hardly warp: their warping constant is 0 in the tables, and without any the twist is no bar that bends. So much of their torsion stiffness stands in
 * for it, over the length squared, that it adds π² of these parts to what resists a half-wave of twist.
 */
const LEAST_WARPING = 1e-6;

function twistFields({ E, length, section }: BarProblem, G: number): FieldsAt {
  const { weak, strong } = principalMotions(section.alpha);
  const [sx, sy] = section.shearCentre;
  // Shear centre in principal directions: a along the weak motion, b along the strong.
  const a = sx * weak[0] + sy * weak[1];
  const b = sx * strong[0] + sy * strong[1];
  const polar = a * a + b * b + (section.Iu + section.Iv) / section.area;
  const torsion = G * section.J;
  const warping = Math.max(E * section.Iw, LEAST_WARPING * torsion * length * length);
  const root = [Math.sqrt(E * section.Iv), Math.sqrt(E * section.Iu), Math.sqrt(warping)] as const;
  const fields = {
    count: 3,
    EI: Float64Array.of(1, 1, 1),
    N: new Float64Array(3),
    T: new Float64Array(9),
    plain: false,
  } as const;
  const S = new Float64Array(9);
  const V = new Float64Array(9);
  return (N) => {
    // The centroid moves by (−(0 − b), 0 − a)·θ relative to the shear centre, which couples the slopes.
    S.set([
      N / (root[0] * root[0]),
      0,
      (N * b) / (root[0] * root[2]),
      0,
      N / (root[1] * root[1]),
      (-N * a) / (root[1] * root[2]),
      (N * b) / (root[0] * root[2]),
      (-N * a) / (root[1] * root[2]),
      (N * polar - torsion) / (root[2] * root[2]),
    ]);
    jacobi3(S, V);
    for (let i = 0; i < 3; i++) {
      fields.N[i] = S[4 * i] ?? 0;
      for (let j = 0; j < 3; j++) fields.T[3 * i + j] = (V[3 * j + i] ?? 0) * (root[j] ?? 0);
    }
    return fields;
  };
}

/** Eigenvalues on the diagonal of S, eigenvectors in the columns of V; S symmetric 3 × 3, row by row. Jacobi's rotations. */
export function jacobi3(S: Float64Array, V: Float64Array): void {
  V.set([1, 0, 0, 0, 1, 0, 0, 0, 1]);
  const at = (m: Float64Array, i: number, j: number): number => m[3 * i + j] ?? 0;
  for (let sweep = 0; sweep < 30; sweep++) {
    const off = Math.abs(at(S, 0, 1)) + Math.abs(at(S, 0, 2)) + Math.abs(at(S, 1, 2));
    const size = Math.abs(at(S, 0, 0)) + Math.abs(at(S, 1, 1)) + Math.abs(at(S, 2, 2));
    if (off <= 1e-17 * size || off === 0) return;
    for (const [p, q] of PAIRS) {
      const apq = at(S, p, q);
      if (apq === 0) continue;
      const theta = (at(S, q, q) - at(S, p, p)) / (2 * apq);
      const t = Math.sign(theta || 1) / (Math.abs(theta) + Math.sqrt(theta * theta + 1));
      const c = 1 / Math.sqrt(t * t + 1);
      const s = t * c;
      for (let k = 0; k < 3; k++) {
        const kp = at(S, k, p);
        const kq = at(S, k, q);
        S[3 * k + p] = c * kp - s * kq;
        S[3 * k + q] = s * kp + c * kq;
      }
      for (let k = 0; k < 3; k++) {
        const pk = at(S, p, k);
        const qk = at(S, q, k);
        S[3 * p + k] = c * pk - s * qk;
        S[3 * q + k] = s * pk + c * qk;
        const vp = at(V, k, p);
        const vq = at(V, k, q);
        V[3 * k + p] = c * vp - s * vq;
        V[3 * k + q] = s * vp + c * vq;
      }
    }
  }
}

const PAIRS = [
  [0, 1],
  [0, 2],
  [1, 2],
] as const;
