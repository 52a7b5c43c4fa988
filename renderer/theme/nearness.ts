/** Where a slenderness stands on the nearness scale. */
export type NearnessStep = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9 | 'over';

/** One step a tenth of the limit from 0.2 on; above the limit it leaves the scale. */
export function nearnessStep(ratio: number): NearnessStep {
  if (ratio > 1) return 'over';
  return Math.min(9, Math.max(1, Math.floor(ratio * 10))) as NearnessStep;
}

export function nearnessFill(step: Exclude<NearnessStep, 'over'>): string {
  return `var(--n${step})`;
}

export function nearnessInk(step: Exclude<NearnessStep, 'over'>): string {
  return `var(--t${step})`;
}
