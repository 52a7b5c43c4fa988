import type { Condition, Quantity, Resistance, Step } from './model.ts';

/** Gathers the intermediate values of one check, in order, as they are worked out. */
export class Working {
  readonly steps: Step[] = [];
  readonly conditions: Condition[] = [];

  given(name: string, symbol: string, value: number, quantity: Quantity): number {
    this.steps.push({ name, symbol, value, quantity });
    return value;
  }

  step(name: string, symbol: string, formula: string, value: number, quantity: Quantity): number {
    this.steps.push({ name, symbol, value, quantity, formula });
    return value;
  }

  /** @param found what is there, for when it is not met */
  requires(says: string, met: boolean, found: string): boolean {
    this.conditions.push({ says, met, found: met ? null : found });
    return met;
  }
}

type Stated = Omit<Resistance, 'conditions' | 'applies' | 'steps' | 'end' | 'note' | 'ownRule'> &
  Partial<Pick<Resistance, 'end' | 'note' | 'ownRule'>>;

/** A check with its working; a rule whose conditions are not met gives no resistance. */
export function resistance(stated: Stated, { steps, conditions }: Working): Resistance {
  const applies = conditions.every(({ met }) => met);
  return {
    end: null,
    note: null,
    ownRule: true,
    ...stated,
    resistance: applies ? stated.resistance : null,
    conditions,
    applies,
    steps,
  };
}
