import type { Candidate } from '../../../core/shortlist/model.ts';

/** One stock angle in one placement. */
export function candidateKey({ designation, legInPlane }: Candidate): string {
  return `${designation} ${legInPlane}`;
}

/** "80×60×7, longer leg out": an unequal angle says which leg is where. */
export function placementText({ kind, legInPlane }: Candidate): string {
  if (kind === 'equal') return '';
  return legInPlane === 'longer' ? 'longer leg in plane' : 'longer leg out';
}
