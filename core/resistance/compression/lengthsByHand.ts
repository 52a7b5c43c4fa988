import type { CompressionQuestion } from '../model.ts';

/** That a length is the user's own and why, for the note of whatever is worked out with it; null where none is. */
export function lengthsByHand({
  lengthsByHand: own = [],
}: Pick<CompressionQuestion, 'lengthsByHand'>): string | null {
  const said = own.map(({ axis, reason }) => `the length about ${axis} is set by hand, because ${reason}`);
  return said.length === 0 ? null : `Of the lengths, ${said.join('; ')}.`;
}
