import type { SectionProperties } from '../section/model.ts';
import { criticalLoad } from '../stability/criticalLoad.ts';
import type { BarProblem } from '../stability/model.ts';
import type { Critical } from './model.ts';

/** Critical load of one bar under a single compression, N. A bar under compression always has one. */
export function loadOf(problem: BarProblem): number {
  const { N } = criticalLoad(problem, { second: false });
  if (N === null) throw new Error('a bar without compression has no critical load');
  return N;
}

export function criticalOf(N: number, section: SectionProperties, E: number): Critical {
  const effective = (I: number): number => Math.PI * Math.sqrt((E * I) / N);
  return {
    N,
    slenderness: slendernessAtLoad(N, section.area, E),
    effectiveLength: {
      x: effective(section.Ixx),
      y: effective(section.Iyy),
      u: effective(section.Iu),
      v: effective(section.Iv),
    },
  };
}

/** The load at which a bar of a slenderness buckles, N: π²EA/λ². */
export function loadAtSlenderness(slenderness: number, area: number, E: number): number {
  return (Math.PI ** 2 * E * area) / slenderness ** 2;
}

/** π√(EA/N). */
export function slendernessAtLoad(N: number, area: number, E: number): number {
  return Math.PI * Math.sqrt((E * area) / N);
}
