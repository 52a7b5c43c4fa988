/** Short ways to what an assessment says of one bar, for tests. */
import { assess } from '../../../../core/assess.ts';
import type { Assessment } from '../../../../core/assessment.ts';
import type { Bay, Settings } from '../../../../core/project/model.ts';
import type { Claim, Restraint, Station } from '../../../../core/restraint/model.ts';
import { project } from './bays.ts';
import { CATALOGUES } from './catalogues.ts';

/** By the marks alone: what stiffness and critical loads add has tests of its own. */
export const assessed = (bays: readonly Bay[] | Bay, settings: Partial<Settings> = {}): Assessment =>
  assess(project(Array.isArray(bays) ? bays : [bays as Bay], settings), CATALOGUES, 'by the marks');

export function restraintIn(assessment: Assessment, id: string): Restraint {
  const restraint = assessment.diagonals.get(id)?.restraint;
  if (!restraint) throw new Error(`${id} has no restraint`);
  return restraint;
}

/** Stations between the ends. */
export const between = (restraint: Restraint): readonly Station[] => restraint.stations.slice(1, -1);

/** The only station between the ends. */
export function middleOf(restraint: Restraint): Station {
  const [station, ...more] = between(restraint);
  if (!station || more.length > 0) throw new Error(`${between(restraint).length} stations between the ends`);
  return station;
}

export function claimOf(station: Station, direction: Claim['direction']): Claim {
  const claim = station.claims.find((each) => each.direction === direction);
  if (!claim) throw new Error(`nothing is claimed ${direction}`);
  return claim;
}
