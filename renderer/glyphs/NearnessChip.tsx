import type { JSX } from 'react';
import { nearnessFill, nearnessStep } from '../theme/nearness.ts';

interface NearnessChipProps {
  /** Slenderness over limit; null draws an empty chip. */
  readonly ratio: number | null;
  readonly width?: number;
}

/** How near to the limit, by tone and by length of fill; hatched when over. The number stands beside it in text. */
export function NearnessChip({ ratio, width = 30 }: NearnessChipProps): JSX.Element {
  const step = ratio === null ? null : nearnessStep(ratio);
  return (
    <svg className="glyph nearness" width={width} height="10" aria-hidden="true">
      {step === 'over' ? (
        <rect x=".5" y=".5" width={width - 1} height="9" fill="url(#hatch-fine)" stroke="var(--over)" />
      ) : (
        <>
          <rect x=".5" y=".5" width={width - 1} height="9" fill="var(--sheet)" stroke="var(--ink3)" />
          {ratio !== null && step !== null && (
            <rect x="1" y="1" width={Math.max(1, (width - 2) * ratio)} height="8" fill={nearnessFill(step)} />
          )}
        </>
      )}
    </svg>
  );
}
