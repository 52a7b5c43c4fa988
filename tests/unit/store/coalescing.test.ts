import { describe, expect, it } from 'vitest';
import type { Edit } from '../../../core/project/edit.ts';
import { newWallBay } from '../../../core/project/newBay.ts';
import { coalescingKey } from '../../../renderer/store/coalescing.ts';

const bay = newWallBay('W1', 'wall');
const recipe = (what: string): Edit => ({ kind: 'recipe', bay: 'W1', recipe: bay.recipe, what });

describe('which edits are one step of undo', () => {
  it('gives one key to edits of the same field of the same bay', () => {
    expect(coalescingKey([recipe('width')])).toBe(coalescingKey([recipe('width')]));
  });

  it('tells fields and bays apart', () => {
    const keys = [
      coalescingKey([recipe('width')]),
      coalescingKey([recipe('tier 1 height')]),
      coalescingKey([{ kind: 'recipe', bay: 'W2', recipe: bay.recipe, what: 'width' }]),
      coalescingKey([{ kind: 'diagonals', bay: 'W1', change: { gusset: 8 } }]),
      coalescingKey([{ kind: 'diagonals', bay: 'W1', change: { grade: 'S275JR' } }]),
      coalescingKey([{ kind: 'tension share', bay: 'W1', crossing: 't1.fall+t1.rise', share: 1 }]),
      coalescingKey([{ kind: 'tension share', bay: 'W1', crossing: 't2.fall+t2.rise', share: 1 }]),
      coalescingKey([{ kind: 'bars', bars: ['W1/t1.rise'], change: { roll: 5 } }]),
    ];
    expect(new Set(keys).size).toBe(keys.length);
  });

  it('lets marks at crossings, whole bays and groups of edits stand alone', () => {
    const alone: readonly (readonly Edit[])[] = [
      [{ kind: 'join', crossings: ['W1/t1.fall+t1.rise'], join: { kind: 'bolted' } }],
      [{ kind: 'add bay', bay, after: null }],
      [{ kind: 'remove bay', bay: 'W1' }],
      [recipe('width'), recipe('width')],
      [],
    ];
    expect(alone.map(coalescingKey)).toEqual(alone.map(() => null));
  });
});
