/** Which combination is shown, and what of it. */
import type { ForceState, Forces } from '../../core/forces/model.ts';
import { shownAssessment } from './shown.ts';
import type { WindowState } from './windowState.ts';

/** Forces of the project as it is shown; null where nothing acts on it. */
export function shownForces(state: WindowState): Forces | null {
  const forces = shownAssessment(state)?.forces ?? null;
  return forces !== null && forces.states.length > 0 ? forces : null;
}

/** The combination that is shown; null while the greatest of all is, or none is there. */
export function shownForceState(state: WindowState): ForceState | null {
  return shownForces(state)?.states.find(({ id }) => id === state.view.forceState) ?? null;
}

/** Steps through the combinations and, between the last and the first, the greatest of all. */
export function steppedState(state: WindowState, step: 1 | -1): string | null {
  const ids = [null, ...(shownForces(state)?.states ?? []).map(({ id }) => id)];
  const at = Math.max(0, ids.indexOf(state.view.forceState));
  return ids[(at + step + ids.length) % ids.length] ?? null;
}
