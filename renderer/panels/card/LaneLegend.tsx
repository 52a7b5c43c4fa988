import type { JSX } from 'react';
import { nearnessFill } from '../../theme/nearness.ts';

const STEPS = [1, 2, 3, 4, 5, 6, 7, 8, 9] as const;

export function LaneLegend({
  limit,
  before,
}: {
  readonly limit: number;
  readonly before: boolean;
}): JSX.Element {
  return (
    <span className="lane-legend">
      {before && (
        <>
          <svg width="22" height="6" aria-hidden="true">
            <rect width="22" height="6" fill="var(--n5)" />
          </svg>
          <span>before</span>
        </>
      )}
      <span>0</span>
      <svg width="81" height="10" aria-hidden="true">
        {STEPS.map((step) => (
          <rect key={step} x={(step - 1) * 9} width="9" height="10" fill={nearnessFill(step)} />
        ))}
      </svg>
      <span>{limit}</span>
      <svg width="22" height="10" aria-hidden="true">
        <rect x=".5" y=".5" width="21" height="9" fill="url(#hatch-fine)" stroke="var(--over)" />
      </svg>
      <span>over</span>
    </span>
  );
}
