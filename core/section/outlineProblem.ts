import type { AngleOutline } from './model.ts';

/** Why dimensions do not make an angle. */
export type OutlineProblem =
  | {
      readonly kind: 'not a size';
      readonly which: Exclude<keyof AngleOutline, 'shape'>;
      readonly value: number;
    }
  | { readonly kind: 'legs swapped'; readonly longLeg: number; readonly shortLeg: number }
  | { readonly kind: 'too thick'; readonly thickness: number; readonly shortLeg: number }
  | { readonly kind: 'toe rounder than thick'; readonly toeRadius: number; readonly thickness: number }
  | { readonly kind: 'radii overlap'; readonly shortLeg: number; readonly needed: number };

/**
 * What is wrong with an outline, or null. Legs and thickness must be above zero, radii zero or more.
 * A toe radius may pass the thickness (thin Australian angles: 5 on 4.6 mm), but not twice the thickness, which no rolled toe has.
 */
export function outlineProblem(outline: AngleOutline): OutlineProblem | null {
  const { longLeg, shortLeg, thickness, rootRadius, toeRadius } = outline;
  for (const which of ['longLeg', 'shortLeg', 'thickness'] as const)
    if (!(Number.isFinite(outline[which]) && outline[which] > 0))
      return { kind: 'not a size', which, value: outline[which] };
  for (const which of ['rootRadius', 'toeRadius'] as const)
    if (!(Number.isFinite(outline[which]) && outline[which] >= 0))
      return { kind: 'not a size', which, value: outline[which] };
  if (shortLeg > longLeg) return { kind: 'legs swapped', longLeg, shortLeg };
  if (thickness >= shortLeg) return { kind: 'too thick', thickness, shortLeg };
  if (toeRadius > 2 * thickness) return { kind: 'toe rounder than thick', toeRadius, thickness };
  const needed = thickness + rootRadius + toeRadius;
  return needed > shortLeg ? { kind: 'radii overlap', shortLeg, needed } : null;
}

const NAMES: Readonly<Record<Exclude<keyof AngleOutline, 'shape'>, string>> = {
  longLeg: 'long leg',
  shortLeg: 'short leg',
  thickness: 'thickness',
  rootRadius: 'root radius',
  toeRadius: 'toe radius',
};

/** The problem in words, with what to do. */
export function outlineProblemText(problem: OutlineProblem): string {
  switch (problem.kind) {
    case 'not a size':
      return `the ${NAMES[problem.which]} is ${problem.value}; give a length in mm ${problem.which.endsWith('Radius') ? 'of zero or more' : 'above zero'}`;
    case 'legs swapped':
      return `the long leg (${problem.longLeg} mm) is shorter than the short leg (${problem.shortLeg} mm); swap them`;
    case 'too thick':
      return `a thickness of ${problem.thickness} mm leaves nothing of the ${problem.shortLeg} mm leg; check thickness and leg`;
    case 'toe rounder than thick':
      return `the toe radius (${problem.toeRadius} mm) is more than twice the thickness (${problem.thickness} mm); check the radius`;
    case 'radii overlap':
      return `thickness and radii take ${problem.needed} mm of a ${problem.shortLeg} mm leg; check the radii`;
    default:
      return problem satisfies never;
  }
}
