import type { Claim } from '../../core/restraint/model.ts';

/** Whether a mark means to hold here and does not, because what would hold is itself free. A join that never holds this way claims nothing. */
export function isRefusedHold({ counted, reason }: Claim): boolean {
  return (
    !counted &&
    (reason.kind === 'line free along itself' ||
      reason.kind === 'line end free' ||
      reason.kind === 'partner half free' ||
      reason.kind === 'bar ends here, itself free')
  );
}
