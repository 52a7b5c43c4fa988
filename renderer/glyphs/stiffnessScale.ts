/** Stiffness by its tens, from a hold that is none to one that is as good as a wall. */

/** N/mm. */
export const SOFTEST = 0.1;
export const STIFFEST = 1e6;

const DECADES = Math.log10(STIFFEST / SOFTEST);

/** 0 at the softest, 1 at the stiffest that is drawn. */
export function stiffnessPart(newtonsPerMm: number): number {
  const part = Math.log10(Math.max(newtonsPerMm, SOFTEST) / SOFTEST) / DECADES;
  return Math.min(1, part);
}

/** Half an axis of the stiffness figure by tens, as a share of the ring: long is soft, short is stiff. */
export function halfAxis(newtonsPerMm: number): number {
  return Math.max(SLIMMEST, 1 - stiffnessPart(newtonsPerMm));
}

/** An axis never shrinks to nothing: the figure is still to be seen. */
const SLIMMEST = 0.02;

/** The tens that get a tick, N/mm. */
export const TENS: readonly number[] = [0.1, 1, 10, 100, 1000, 10_000, 100_000, 1_000_000];
