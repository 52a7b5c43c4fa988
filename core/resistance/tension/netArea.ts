/** A hole as the force sees it: its place along the bar and across the flattened section, and the width it takes. mm. */
export interface ChainHole {
  readonly along: number;
  readonly across: number;
  readonly width: number;
}

/** Two holes nearer than this across the section lie on one line along the bar: no chain goes through both. */
const ON_ONE_LINE = 1e-9;

/**
 * Most area that any chain of holes takes from a section: Σ d t − Σ s²t/(4g) (Cochrane), the chain going across the section from hole to hole. mm².
 * The best chain that ends at a hole is its own width with the best of those that can come before it, so one pass over the holes in order is enough.
 */
export function deductionOf(holes: readonly ChainHole[], thickness: number): number {
  const best: { readonly hole: ChainHole; readonly taken: number }[] = [];
  for (const hole of [...holes].sort((a, b) => a.across - b.across)) {
    const before = best.map(({ hole: other, taken }) => {
      const g = hole.across - other.across;
      const s = hole.along - other.along;
      return g < ON_ONE_LINE ? 0 : taken - (s * s * thickness) / (4 * g);
    });
    best.push({ hole, taken: hole.width * thickness + Math.max(0, ...before) });
  }
  return Math.max(0, ...best.map(({ taken }) => taken));
}

/** Most area that a straight cut square to the bar takes, mm²: the first of the two forms of EN 1993-1-1 6.2.2.2. */
export function straightDeductionOf(holes: readonly ChainHole[], thickness: number): number {
  const cuts = holes.map(({ along }) =>
    holes
      .filter((other) => Math.abs(other.along - along) < ON_ONE_LINE)
      .reduce((sum, { width }) => sum + width * thickness, 0),
  );
  return Math.max(0, ...cuts);
}
