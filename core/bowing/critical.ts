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
    slenderness: Math.PI * Math.sqrt((E * section.area) / N),
    effectiveLength: {
      x: effective(section.Ixx),
      y: effective(section.Iyy),
      u: effective(section.Iu),
      v: effective(section.Iv),
    },
  };
}
