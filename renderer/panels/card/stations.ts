import type { Restraint, Station } from '../../../core/restraint/model.ts';

export interface InteriorStation {
  readonly station: Station;
  /** In `restraint.stations`. */
  readonly index: number;
}

/** The stations between the ends, in order. */
export function interiorOf(restraint: Restraint): readonly InteriorStation[] {
  return restraint.stations.map((station, index) => ({ station, index })).slice(1, -1);
}
