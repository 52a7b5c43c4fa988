/** How far a computed figure may be from one printed to three significant figures: half a unit in the third. */
export function halfThirdFigure(printed: number): number {
  // The hair added keeps powers of ten, which log10 may put just below a whole number, in their decade.
  return 0.5 * 10 ** (Math.floor(Math.log10(Math.abs(printed)) + 1e-12) - 2);
}

/** Half a unit of the last digit that a literal shows: 13.7 → 0.05. Only for figures written with all the digits that were printed. */
export function halfLastDigit(printed: string): number {
  const [, decimals = ''] = printed.split('.');
  return 0.5 * 10 ** -decimals.length;
}

/** Rounding of binary arithmetic beside a tie, relative to the figure. */
export const ARITHMETIC = 1e-9;
