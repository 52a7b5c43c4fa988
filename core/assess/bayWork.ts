/** The costly part of an assessment, bay by bay, so that several can share it: each works some bays out, one remembers all and assesses. */
import { type BayBowings, bayBowings } from '../bowing/bowings.ts';
import { type BowingMemory, circumstances } from '../bowing/memory.ts';
import type { Prepared } from './prepared.ts';

/** What was found for one bay, and the circumstances under which it holds. Plain data. */
export interface FoundBowings {
  readonly key: string;
  readonly bowings: BayBowings;
}

/** Places in the project of the bays whose critical loads are not remembered. */
export function unremembered(prepared: Prepared, memory: BowingMemory): readonly number[] {
  return prepared.layout.bays.flatMap((_, index) => {
    const key = keyOf(prepared, index);
    return key === null || memory.knows(key) ? [] : [index];
  });
}

/** Critical loads of some bays, by their places in the project. */
export function bowingsOfBays(prepared: Prepared, bays: readonly number[]): readonly FoundBowings[] {
  return bays.flatMap((index): readonly FoundBowings[] => {
    const key = keyOf(prepared, index);
    const [layout, bay] = [prepared.layout.bays[index], prepared.project.bays[index]];
    if (key === null || !layout || !bay) return [];
    return [{ key, bowings: bayBowings(prepared.bowingInput, layout, bay) }];
  });
}

function keyOf({ project, layout, bowingInput }: Prepared, index: number): string | null {
  const [bayLayout, bay] = [layout.bays[index], project.bays[index]];
  return bayLayout && bay ? circumstances(bowingInput, bayLayout, bay, project) : null;
}
