/** What the table says of several combinations at once. Picks out of what core has found; works nothing out. */
import type { Assessment } from '../../../core/assessment.ts';
import type { ForceState } from '../../../core/forces/model.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';

/** Greatest compression of a member that is no diagonal, N; null when none is squeezed. */
export function greatestOf(states: readonly ForceState[], bay: BayLayout, layout: Layout): number | null {
  let most = 0;
  for (const state of states)
    for (const id of bay.bars) {
      const bar = layout.bars.get(id);
      if (bar && !bar.angle) most = Math.max(most, -(state.forces.get(id) ?? 0));
    }
  return most > 1 ? most : null;
}

/** Least upward push of a support, N: below 0 the footing must hold down. Null where the bay stands on no support. */
export function leastReaction(states: readonly ForceState[], bay: BayLayout, layout: Layout): number | null {
  let least: number | null = null;
  for (const state of states)
    for (const node of bay.nodes) {
      if (layout.nodes.get(node)?.supports[bay.id] === undefined) continue;
      const reaction = state.reactions.get(node);
      if (reaction) least = Math.min(least ?? reaction[2], reaction[2]);
    }
  return least;
}

/** The most that any check of the bay's diagonals is used; of one state only where that state is the one that demands it. */
export function mostUsedIn(
  state: ForceState | null,
  bay: BayLayout,
  { diagonals }: Assessment,
): number | null {
  const used = bay.diagonals.flatMap((id) =>
    (diagonals.get(id)?.checks?.checks ?? []).flatMap(({ utilisation, demand }) =>
      utilisation !== null && (state === null || demand?.state === state.id) ? [utilisation] : [],
    ),
  );
  return used.length === 0 ? null : Math.max(...used);
}
