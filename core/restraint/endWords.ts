import type { AngleBar } from '../layout/model.ts';
import type { EndHolds } from '../project/model.ts';

/** What an end holds, as it is said of the end. */
export const END_HOLDS_WORDS: Readonly<Record<EndHolds, string>> = {
  both: 'holds both ways',
  'in plane only': 'holds in the plane only',
  'out of plane only': 'holds out of the plane only',
  nothing: 'holds nothing across the bar',
};

/** "end j holds in the plane only": each end that is marked as holding less than both ways. */
export function endsMarkedFree({ endsHold }: { readonly endsHold: EndsHold }): readonly string[] {
  return (['i', 'j'] as const)
    .filter((end) => endsHold[end] !== 'both')
    .map((end) => `end ${end} ${END_HOLDS_WORDS[endsHold[end]]}`);
}

export interface EndsHold {
  readonly i: EndHolds;
  readonly j: EndHolds;
}

/** What each end of a bar is taken to hold: both ways where nothing is said. */
export function endsHoldOf({ ends }: Pick<AngleBar, 'ends'>): EndsHold {
  return { i: ends.i.holds ?? 'both', j: ends.j.holds ?? 'both' };
}
