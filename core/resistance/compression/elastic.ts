/** Elastic buckling stresses of a bar with its practice's lengths, N/mm². Practice-facts D1, I. */
import type { CompressionQuestion } from '../model.ts';
import type { Working } from '../working.ts';

export interface ElasticStress {
  /** The lowest, with twist. */
  readonly Fe: number;
  /** The lowest of bowing alone. */
  readonly flexural: number;
}

/** Shear centre from the centroid along the principal axes u and v, mm. */
export function shearCentreInPrincipal({ section }: CompressionQuestion): readonly [number, number] {
  const { alpha, shearCentre } = section.properties;
  const [x, y] = shearCentre;
  const [c, s] = [Math.cos(alpha), Math.sin(alpha)];
  return [x * c + y * s, -x * s + y * c];
}

/**
 * Bowing about u, v and the axes along the legs over their own unbraced lengths, and bowing with twist: the smallest root of
 * (F − F_u)(F − F_v)(F − F_z) − F²(F − F_v)(u₀/r̄₀)² − F²(F − F_u)(v₀/r̄₀)² = 0, u₀ and v₀ the shear centre from the centroid.
 */
export function elasticStress(question: CompressionQuestion, working: Working): ElasticStress {
  const { section, steel, unbraced, twistLength } = question;
  const { area, rx, ry, ru, rv, J, Iw } = section.properties;
  const euler = (L: number, r: number): number => (Math.PI ** 2 * steel.E) / (L / r) ** 2;
  const Fv = working.step('bowing about v', 'F_ev', 'π²E/(L_v/r_v)²', euler(unbraced.v, rv), 'stress');
  const Fu = working.step('bowing about u', 'F_eu', 'π²E/(L_u/r_u)²', euler(unbraced.u, ru), 'stress');
  const Fx = working.step('bowing about x', 'F_ex', 'π²E/(L_x/r_x)²', euler(unbraced.x, rx), 'stress');
  const Fy = working.step('bowing about y', 'F_ey', 'π²E/(L_y/r_y)²', euler(unbraced.y, ry), 'stress');
  const flexural = Math.min(Fv, Fu, Fx, Fy);
  const [u0, v0] = shearCentreInPrincipal(question);
  const r0 = u0 * u0 + v0 * v0 + ru * ru + rv * rv;
  if (J <= 0 || u0 * u0 + v0 * v0 < 1e-6) return { Fe: flexural, flexural };
  working.step('polar radius', 'r̄_0', '√(u_0² + v_0² + r_u² + r_v²)', Math.sqrt(r0), 'length');
  const Fz = working.step(
    'twist',
    'F_ez',
    '(π²E C_w/L_z² + G J)/(A r̄_0²)',
    ((Math.PI ** 2 * steel.E * Iw) / twistLength ** 2 + steel.G * J) / (area * r0),
    'stress',
  );
  const coupled = smallestRoot(Fu, Fv, Fz, (u0 * u0) / r0, (v0 * v0) / r0);
  const Fe = Math.min(flexural, coupled);
  working.step(
    'bowing with twist',
    'F_e',
    'smallest root of the cubic, not above bowing alone',
    Fe,
    'stress',
  );
  return { Fe, flexural };
}

/** Smallest root of (F−a)(F−b)(F−z) − F²(F−b)p − F²(F−a)q: between 0 and the least of a, b, z the left side rises from below zero to zero or above. */
export function smallestRoot(a: number, b: number, z: number, p: number, q: number): number {
  const f = (F: number): number => (F - a) * (F - b) * (F - z) - F * F * (F - b) * p - F * F * (F - a) * q;
  let low = 0;
  let high = Math.min(a, b, z);
  if (f(high) <= 0) return high;
  for (let k = 0; k < 200 && high - low > 1e-13 * high; k++) {
    const middle = (low + high) / 2;
    if (f(middle) <= 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
