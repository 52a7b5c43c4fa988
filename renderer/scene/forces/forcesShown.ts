import type { ForceState } from '../../../core/forces/model.ts';
import type { Vec3 } from '../../../core/geometry/vector.ts';

/** What is drawn of forces. */
export interface ForcesShown {
  /** One combination, or all of them: then the greatest of each bar. */
  readonly states: readonly ForceState[];
  /** Loads on nodes in the one combination that is shown, N; nothing for all of them at once. */
  readonly given: ReadonlyMap<string, Vec3>;
  /** Nodes that take an arrow, and the case it goes into; null while none can be placed. */
  readonly placing: Placing | null;
}

export interface Placing {
  readonly loadCase: string;
  readonly nodes: readonly PlacingNode[];
}

export interface PlacingNode {
  /** Of the whole building. */
  readonly id: string;
  /** As a load names it: "W1/L1". */
  readonly place: string;
  readonly label: string;
  /** kN, of the force that the case has on it already. */
  readonly force: Vec3;
}

/** Greatest force of a bar in what is shown, N; null where nothing is known of it. */
export function shownForce({ states }: ForcesShown, bar: string): number | null {
  return states.reduce<number | null>((most, { forces }) => {
    const force = forces.get(bar);
    if (force === undefined) return most;
    return most === null || Math.abs(force) > Math.abs(most) ? force : most;
  }, null);
}

export const isSlack = ({ states }: ForcesShown, bar: string): boolean =>
  states.length > 0 && states.every(({ slack }) => slack.has(bar));
