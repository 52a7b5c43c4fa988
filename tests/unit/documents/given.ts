/** A crossed tier 3 m by 4 m: diagonals of 5 m that cross at 2.5 m. Angles 70x70x6 unless told otherwise. */
import { assess } from '../../../core/assess.ts';
import type { Assessment } from '../../../core/assessment.ts';
import type { BarMark, DiagonalSpec, Join, Settings } from '../../../core/project/model.ts';
import { bay, project, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

export const RISE = 'B/t1.rise';
export const FALL = 'B/t1.fall';

export interface TierGiven {
  readonly join?: Join;
  readonly bars?: Readonly<Record<string, BarMark>>;
  readonly diagonals?: Partial<DiagonalSpec>;
  readonly settings?: Partial<Settings>;
  readonly name?: string;
  readonly numberOff?: number;
}

export function crossedTier(given: TierGiven = {}): Assessment {
  const joins: Readonly<Record<string, Join>> = given.join ? { 't1.fall+t1.rise': given.join } : {};
  const made = bay(wall(3000, [[4000, 'crossed']]), {
    joins,
    bars: given.bars ?? {},
    diagonals: given.diagonals ?? {},
    numberOff: given.numberOff ?? 1,
    name: given.name ?? 'a bay',
  });
  return assess(project([made], given.settings ?? {}), CATALOGUES);
}
