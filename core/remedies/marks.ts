/** Answers that change what bars are called. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import { barsOf } from './places.ts';
import type { Proposal } from './proposal.ts';

/** Back to the program's own marks, for those of the bars that were called something else. */
export function clearTheMarks(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const named = barsOf(assessment, finding.bars).filter(({ angle }) => angle?.mark.mark !== undefined);
  return named.length === 0
    ? []
    : [
        {
          label: named.length > 1 ? 'Take these marks away' : 'Take this mark away',
          detail: 'back to the numbers that the bars have by their places',
          edits: [{ kind: 'bars', bars: named.map(({ id }) => id), change: {}, clear: ['mark'] }],
        },
      ];
}
