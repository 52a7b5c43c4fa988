/** A hole as the force sees it: its place along the bar and across the developed section, and the width it takes. mm. */
export interface ChainHole {
  readonly along: number;
  readonly across: number;
  readonly width: number;
}

/**
 * Most area that any chain of holes takes from a section: Σ d t − Σ s²t/(4g) (Cochrane), the chain going across the section from hole to hole. mm².
 * The straight chain through one cross-section is one of them.
 */
export function deductionOf(holes: readonly ChainHole[], thickness: number): number {
  const sorted = [...holes].sort((a, b) => a.across - b.across);
  const best: number[] = [];
  sorted.forEach((hole, k) => {
    let before = 0;
    for (let j = 0; j < k; j++) {
      const other = sorted[j];
      if (!other || hole.across - other.across < 1e-9) continue;
      const s = hole.along - other.along;
      const g = hole.across - other.across;
      before = Math.max(before, (best[j] ?? 0) - (s * s * thickness) / (4 * g));
    }
    best.push(hole.width * thickness + before);
  });
  return best.reduce((most, each) => Math.max(most, each), 0);
}
