/** Column curves: what is left of the yield stress at a relative slenderness. Every one is 1 at most, falls, and stays below the elastic stress. */

/** SANS 10162-1 and CSA S16 13.3.1: (1 + λ^2n)^(−1/n). */
export const doublePower = (lambda: number, n: number): number => (1 + lambda ** (2 * n)) ** (-1 / n);

/** EN 1993-1-1 6.3.1.2 and IS 800 7.1.2.1: Perry's formula with imperfection α, Φ = ½[1 + α(λ̄ − 0.2) + λ̄²]. */
export function perry(lambda: number, alpha: number): { readonly phi: number; readonly chi: number } {
  const phi = 0.5 * (1 + alpha * (lambda - 0.2) + lambda * lambda);
  // Below 0.2 the formula would pass 1.
  const chi = lambda <= 0.2 ? 1 : 1 / (phi + Math.sqrt(phi * phi - lambda * lambda));
  return { phi, chi };
}

/** AISC 360 E3: F_n over F_y. (E3-2) up to F_y/F_e = 2.25, (E3-3) above; at the joint they are 0.3900 and 0.3898. */
export const exponential = (FyOverFe: number): number =>
  FyOverFe <= 2.25 ? 0.658 ** FyOverFe : 0.877 / FyOverFe;

/** What AS 4100 6.3.3 works out on the way to its slenderness reduction factor α_c. */
export interface MemberReduction {
  readonly alphaA: number;
  readonly lambda: number;
  readonly eta: number;
  readonly xi: number;
  readonly alphaC: number;
}

/** AS 4100 6.3.3, from the modified slenderness λ_n above 0 and the section constant α_b. */
export function memberReduction(lambdaN: number, alphaB: number): MemberReduction {
  const alphaA = (2100 * (lambdaN - 13.5)) / (lambdaN * lambdaN - 15.3 * lambdaN + 2050);
  const lambda = lambdaN + alphaA * alphaB;
  const eta = Math.max(0, 0.00326 * (lambda - 13.5));
  const ratio = (lambda / 90) ** 2;
  const xi = (ratio + 1 + eta) / (2 * ratio);
  // Up to 13.5 there is no imperfection, and the formula gives 1.
  const alphaC = lambda <= 13.5 ? 1 : xi * (1 - Math.sqrt(1 - (90 / (xi * lambda)) ** 2));
  return { alphaA, lambda, eta, xi, alphaC };
}
