/** Cases as they stand in a file. */
import type { SolvedBar, SolvedPair } from '../../../core/cases/model.ts';
import { readCases } from '../../../core/cases/readCases.ts';
import { solveCase } from '../../../core/cases/solveCase.ts';

export const SECTION_70 = {
  A: 812.691701,
  Ixx: 368839.682,
  Iyy: 368839.682,
  Ixy: -216160.52,
} as const;

export const GEOMETRY_70 = { h: 70, b: 70, t: 6, root_radius: 9, toe_radius: 4.5 } as const;

export const BAR = {
  id: 'one',
  type: 'bar',
  E: 210_000,
  L: 4000,
  section: SECTION_70,
  stations: [{ z: 2000, direction_deg: 0, k: 'rigid' }],
  axial: [{ z0: 0, z1: 4000, p: 1 }],
} as const;

export const TWISTING = {
  ...BAR,
  type: 'bar-flexural-torsional',
  G: 81_000,
  section: { ...SECTION_70, J: 9648, Iw: 3_609_156, shear_centre_rel_centroid: [-16.2812, -16.2812] },
  stations: [{ z: 2000, direction_deg: 0, k: 'rigid', point_rel_centroid: [-16.2812, -16.2812] }],
  twist_fixed_at: [],
} as const;

export const PAIR = {
  id: 'pair',
  type: 'xbrace-planar',
  considered: { L: 5000, EI: 3e10, at_crossing: 'continuous' },
  partner: { L: 5000, EI: 3e10, at_crossing: 'continuous' },
  crossing: 'at mid of both bars',
  T_over_C: 0,
} as const;

/** What is wrong with a case, as "path: what". */
export function problemsOf(given: unknown): readonly string[] {
  const read = readCases([given]);
  const [first] = read.ok ? read.cases : [];
  if (!first || first.ok) return [];
  return first.problems.map(({ path, what }) => `${path}: ${what}`);
}

export function solvedBar(given: unknown): SolvedBar {
  const read = readCases([given]);
  const [first] = read.ok ? read.cases : [];
  if (!first?.ok) throw new Error(problemsOf(given).join('\n'));
  const solved = solveCase(first.case);
  if (solved.type === 'xbrace-planar') throw new Error('a pair');
  return solved;
}

export function solvedPair(given: unknown): SolvedPair {
  const read = readCases([given]);
  const [first] = read.ok ? read.cases : [];
  if (!first?.ok) throw new Error(problemsOf(given).join('\n'));
  const solved = solveCase(first.case);
  if (solved.type !== 'xbrace-planar') throw new Error('no pair');
  return solved;
}
