/** Elastic buckling stresses of a bar over its unbraced lengths, K = 1. N/mm². Practice-facts D1, I. */
import type { Axis } from '../../section/model.ts';
import type { CompressionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { aboutAxis } from './axisNames.ts';
import { type AlongLeg, bowingWithTwist, NO_TWIST } from './bowingWithTwist.ts';

/** More than rounding. */
const CLEARLY_BELOW = 1 - 1e-9;

export interface ElasticStress {
  /** The lowest of all. */
  readonly Fe: number;
  /** Twist takes part in the lowest. */
  readonly twists: boolean;
  /** The lowest is a way to bow with twist that the standards do not speak of. */
  readonly beyondStandards: boolean;
}

/**
 * Bowing about the principal axes, about the axes along the legs where they have longer lengths of their own, and each of these with twist.
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
  const bowing = (axis: Axis, r: number): number => {
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
  // No radius is below r_v, so an axis along a leg can govern only over a longer length.
  const alongLegs: AlongLeg[] = [];
  if (unbraced.x > unbraced.v) alongLegs.push({ axis: 'x', F: bowing('x', rx) });
  if (unbraced.y > unbraced.v) alongLegs.push({ axis: 'y', F: bowing('y', ry) });
  const flexural = Math.min(Fv, Fu, ...alongLegs.map(({ F }) => F));
  const coupled =
    twistLeftOut === null ? bowingWithTwist(question, { Fu, Fv, alongLegs }, working) : NO_TWIST;
  const Fe = Math.min(flexural, coupled.aboutBoth, coupled.aboutOne);
  working.step(
    'elastic stress',
    'F_e',
    twistLeftOut === null ? 'the lowest' : `the lowest; ${twistLeftOut}`,
    Fe,
    'stress',
  );
  return {
    Fe,
    twists: Fe < flexural * CLEARLY_BELOW,
    beyondStandards: Fe < Math.min(flexural, coupled.aboutBoth) * CLEARLY_BELOW,
  };
}
