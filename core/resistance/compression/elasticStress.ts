/** Elastic buckling stresses of a bar over its unbraced lengths, K = 1. N/mm². Practice-facts D1, I. */
import type { CompressionQuestion, SectionShape } from '../model.ts';
import type { Working } from '../working.ts';
import { coupledStress } from './coupledStress.ts';

export interface ElasticStress {
  /** The lowest of all. */
  readonly Fe: number;
  /** Twist takes part in the lowest. */
  readonly twists: boolean;
}

/** Shear centre from the centroid along the principal axes u and v, mm. */
export function shearCentreInPrincipal({ section }: CompressionQuestion): readonly [u0: number, v0: number] {
  const { alpha, shearCentre } = section.properties;
  const [x, y] = shearCentre;
  const [c, s] = [Math.cos(alpha), Math.sin(alpha)];
  return [x * c + y * s, -x * s + y * c];
}

/**
 * Bowing about the principal axes, about the axes along the legs where they have longer lengths of their own, and bowing with twist.
 *
 * The area A stands among the steps already.
 *
 * @param twistLeftOut why twist is not looked at; null where it is
 */
export function elasticStress(
  question: CompressionQuestion,
  twistLeftOut: string | null,
  working: Working,
): ElasticStress {
  const { section, steel, unbraced } = question;
  const { rx, ry, ru, rv } = section.properties;
  working.given('modulus', 'E', steel.E, 'stress');
  const bowing = (axis: 'x' | 'y' | 'u' | 'v', r: number): number => {
    const about = aboutAxis(axis, section.shape);
    const L = working.given(`unbraced length ${about}`, `L_${axis}`, unbraced[axis], 'length');
    working.given(`radius ${about}`, `r_${axis}`, r, 'length');
    const formula = `π² E/(L_${axis}/r_${axis})²`;
    return working.step(
      `bowing ${about}`,
      `F_e${axis}`,
      formula,
      (Math.PI ** 2 * steel.E) / (L / r) ** 2,
      'stress',
    );
  };
  const Fv = bowing('v', rv);
  const Fu = bowing('u', ru);
  const stresses = [Fv, Fu];
  // No radius is below r_v, so an axis along a leg can govern only over a longer length.
  if (unbraced.x > unbraced.v) stresses.push(bowing('x', rx));
  if (unbraced.y > unbraced.v) stresses.push(bowing('y', ry));
  const flexural = Math.min(...stresses);
  const coupled = twistLeftOut === null ? withTwist(question, Fu, Fv, working) : Number.POSITIVE_INFINITY;
  const Fe = Math.min(flexural, coupled);
  working.step(
    'elastic stress',
    'F_e',
    twistLeftOut === null ? 'the lowest' : `the lowest; ${twistLeftOut}`,
    Fe,
    'stress',
  );
  return { Fe, twists: Fe < flexural * (1 - 1e-9) };
}

function withTwist(question: CompressionQuestion, Fu: number, Fv: number, working: Working): number {
  const { section, steel, twistLength } = question;
  const { area, ru, rv, J, Iw } = section.properties;
  if (!working.requires('the torsion constant is known', J > 0, 'none is given'))
    return Number.POSITIVE_INFINITY;
  const [u, v] = shearCentreInPrincipal(question);
  const u0 = working.given(
    'shear centre off the centroid, along the major axis',
    'u_0',
    Math.abs(u),
    'length',
  );
  const v0 = working.given('and along the minor axis', 'v_0', Math.abs(v), 'length');
  const polar = u0 * u0 + v0 * v0 + ru * ru + rv * rv;
  working.step('polar radius', 'r̄_0', '√(u_0² + v_0² + r_u² + r_v²)', Math.sqrt(polar), 'length');
  working.given('torsion constant', 'J', J, 'torsion');
  working.given('warping constant', 'C_w', Iw, 'warping');
  working.given('modulus of shear', 'G', steel.G, 'stress');
  const Lz = working.given('length free to twist', 'L_z', twistLength, 'length');
  const Fz = working.step(
    'twist alone',
    'F_ez',
    '(π² E C_w/L_z² + G J)/(A r̄_0²)',
    ((Math.PI ** 2 * steel.E * Iw) / Lz ** 2 + steel.G * J) / (area * polar),
    'stress',
  );
  return working.step(
    'bowing with twist',
    'F_e,uvz',
    '(F − F_eu)(F − F_ev)(F − F_ez) = F²(F − F_ev)(u_0/r̄_0)² + F²(F − F_eu)(v_0/r̄_0)²: smallest F',
    coupledStress(Fu, Fv, Fz, (u0 * u0) / polar, (v0 * v0) / polar),
    'stress',
  );
}

function aboutAxis(axis: 'x' | 'y' | 'u' | 'v', shape: SectionShape): string {
  switch (axis) {
    case 'u':
      return 'about the major axis';
    case 'v':
      return 'about the minor axis';
    case 'x':
      return shape === 'angle' ? 'about the axis along the shorter leg' : 'about x';
    case 'y':
      return shape === 'angle' ? 'about the axis along the longer leg' : 'about y';
    default:
      return axis satisfies never;
  }
}
