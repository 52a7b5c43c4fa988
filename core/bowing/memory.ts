import type { BayLayout } from '../layout/model.ts';
import type { Bay, Project } from '../project/model.ts';
import { type BayBowings, type BowingInput, shareAt } from './bowings.ts';

/**
 * Bowings of bays that an edit did not touch, kept from one assessment to the next. Given by whoever assesses again and again; the
 * results are the same with and without. Only what the last assessment used is kept.
 */
export class BowingMemory {
  #kept = new Map<string, BayBowings>();
  #used = new Map<string, BayBowings>();

  /** What was found for a bay under the same circumstances, or what `find` finds now. */
  recall(key: string, find: () => BayBowings): BayBowings {
    const found = this.#kept.get(key) ?? find();
    this.#used.set(key, found);
    return found;
  }

  knows(key: string): boolean {
    return this.#kept.has(key);
  }

  /** Keeps what was found elsewhere under the same circumstances. */
  remember(key: string, found: BayBowings): void {
    this.#kept.set(key, found);
  }

  /** Called once an assessment is done. */
  turn(): void {
    this.#kept = this.#used;
    this.#used = new Map();
  }
}

/** Everything that the bowing of a bay depends on, as text. */
export function circumstances(input: BowingInput, layout: BayLayout, bay: Bay, project: Project): string {
  const { settings, ownStock } = project;
  const holds = layout.diagonals.map((id) =>
    (input.restraints.get(id)?.stations ?? []).map(({ at, held, twistHeld, claims }) => [
      at,
      held,
      twistHeld,
      claims.map(({ counted }) => counted),
    ]),
  );
  const holding = input.context.holdings.get(bay.id);
  const supports = layout.nodes.map((node) => holding?.held.get(node)?.kind ?? '');
  const shares = input.forces
    ? layout.crossings.flatMap((crossingId) => {
        const crossing = input.layout.crossings.get(crossingId);
        return crossing?.kind === 'diagonals'
          ? [shareAt(input, crossing.a, crossing), shareAt(input, crossing.b, crossing)]
          : [];
      })
    : null;
  const { id, recipe, diagonals, bars, joins, tensionShares } = bay;
  return JSON.stringify([
    id,
    recipe,
    diagonals,
    bars,
    joins,
    tensionShares ?? null,
    bay.place,
    settings.practice,
    settings.catalogue,
    settings.lengthBasis,
    input.ends,
    ownStock,
    holds,
    supports,
    shares,
  ]);
}
