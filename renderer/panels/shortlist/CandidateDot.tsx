import type { JSX } from 'react';
import type { Candidate } from '../../../core/shortlist/model.ts';
import { nearnessFill, nearnessStep } from '../../theme/nearness.ts';

interface CandidateDotProps {
  readonly candidate: Candidate;
  readonly x: number;
  readonly y: number;
  readonly chosen: boolean;
  readonly hovered: boolean;
}

/** Circle: equal legs. Square: unequal. Struck through and hollow: over the limit. Dashed: the bolts do not fit its leg. */
export function CandidateDot({ candidate, x, y, chosen, hovered }: CandidateDotProps): JSX.Element {
  const step = nearnessStep(candidate.slenderness / candidate.limit);
  const over = !candidate.passes || step === 'over';
  const paint = over
    ? { fill: 'var(--panel)', stroke: 'var(--over)' }
    : { fill: nearnessFill(step), stroke: 'var(--ink)' };
  const dash = candidate.fit === null ? {} : { strokeDasharray: '2 1.6' };
  return (
    <g transform={`translate(${x} ${y})`}>
      {/* Room for the pointer. */}
      <circle r="8" fill="transparent" />
      {candidate.kind === 'equal' ? (
        <circle r="4.6" strokeWidth="1.3" {...paint} {...dash} />
      ) : (
        <rect x="-4.2" y="-4.2" width="8.4" height="8.4" strokeWidth="1.3" {...paint} {...dash} />
      )}
      {over && <path d="M-4 4 4 -4" stroke="var(--over)" strokeWidth="1.3" />}
      {candidate.isPresent && <circle r="9" fill="none" stroke="var(--ink)" strokeWidth="1.8" />}
      {chosen && (
        <circle r={candidate.isPresent ? 12 : 8.5} fill="none" stroke="var(--accent)" strokeWidth="2" />
      )}
      {hovered && !chosen && <circle r="8.5" fill="none" stroke="var(--ink2)" strokeWidth="1.2" />}
    </g>
  );
}
