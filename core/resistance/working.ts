import type { Condition, Quantity, Resistance, Step } from './model.ts';

/** Gathers the intermediate values of one check, in order, as they are worked out. */
export class Working {
  readonly steps: Step[] = [];
  readonly conditions: Condition[] = [];
  /** A condition that the rule rests on is not met: it gives no resistance. */
  #refused = false;

  get refused(): boolean {
    return this.#refused;
  }

  given(name: string, symbol: string, value: number, quantity: Quantity): number {
    this.steps.push({ name, symbol, value, quantity });
    return value;
  }

  step(name: string, symbol: string, formula: string, value: number, quantity: Quantity): number {
    this.steps.push({ name, symbol, value, quantity, formula });
    return value;
  }

  /**
   * What the rule rests on: without it there is no resistance.
   *
   * @param found what is there, for when it is not met
   */
  requires(says: string, met: boolean, found: string): boolean {
    this.limits(says, met, found);
    if (!met) this.#refused = true;
    return met;
  }

  /** A least distance and its like: told when it is broken, while the figure still stands. */
  limits(says: string, met: boolean, found: string): void {
    this.conditions.push({ says, met, found: met ? null : found });
  }
}

type Stated = Omit<Resistance, 'conditions' | 'applies' | 'steps' | 'end' | 'note' | 'ownRule'> &
  Partial<Pick<Resistance, 'end' | 'note' | 'ownRule'>>;

/** A check with its working; a rule that rests on what is not there gives no resistance. */
export function resistance(stated: Stated, working: Working): Resistance {
  const { steps, conditions, refused } = working;
  return {
    end: null,
    note: null,
    ownRule: true,
    ...stated,
    resistance: refused ? null : stated.resistance,
    conditions,
    applies: conditions.every(({ met }) => met),
    steps,
  };
}
