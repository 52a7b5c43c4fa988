import type { Forces } from '../forces/model.ts';
import type { BarId } from '../layout/model.ts';
import type { Demand } from './model.ts';

export interface Demands {
  readonly tension: Demand | null;
  readonly compression: Demand | null;
  readonly slackIn: readonly string[];
}

/** Below this, N, a force is arithmetic. */
const NOTHING = 1;

/** The greatest pull and the greatest squeeze of a bar in the combinations for strength, and where it is slack. */
export function demandsOn(forces: Forces, bar: BarId): Demands {
  let tension: Demand | null = null;
  let compression: Demand | null = null;
  const slackIn: string[] = [];
  for (const state of forces.states) {
    if (state.slack.has(bar)) slackIn.push(state.id);
    if (state.use !== 'strength') continue;
    const force = state.forces.get(bar) ?? 0;
    const { id, name } = state;
    if (force > Math.max(NOTHING, tension?.force ?? 0)) tension = { force, state: id, name };
    if (-force > Math.max(NOTHING, compression?.force ?? 0)) compression = { force: -force, state: id, name };
  }
  return { tension, compression, slackIn };
}
