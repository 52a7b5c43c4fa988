/** Column curves: what is left of the yield stress at a relative slenderness. */

/** SANS and CSA 13.3.1: (1 + λ^2n)^(−1/n). */
export const doublePower = (lambda: number, n: number): number => (1 + lambda ** (2 * n)) ** (-1 / n);

/** EN 1993-1-1 6.3.1.2, IS 800 7.1.2.1: Perry's formula with imperfection α. */
export function perry(lambda: number, alpha: number): number {
  const phi = 0.5 * (1 + alpha * (lambda - 0.2) + lambda * lambda);
  return Math.min(1, 1 / (phi + Math.sqrt(Math.max(0, phi * phi - lambda * lambda))));
}

/** AISC E3, F_cr over F_y. */
export const exponential = (FyOverFe: number): number =>
  FyOverFe <= 2.25 ? 0.658 ** FyOverFe : 0.877 / FyOverFe;

/** AS 4100 6.3.3, α_c for the modified slenderness λ_n and the section constant α_b. */
export function member(lambdaN: number, alphaB: number): number {
  const alphaA = (2100 * (lambdaN - 13.5)) / (lambdaN * lambdaN - 15.3 * lambdaN + 2050);
  const lambda = lambdaN + alphaA * alphaB;
  const eta = Math.max(0, 0.00326 * (lambda - 13.5));
  const ratio = (lambda / 90) ** 2;
  const xi = (ratio + 1 + eta) / (2 * ratio);
  return Math.min(1, xi * (1 - Math.sqrt(Math.max(0, 1 - (90 / (xi * lambda)) ** 2))));
}
