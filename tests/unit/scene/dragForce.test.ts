import { describe, expect, it } from 'vitest';
import { draggedForce, keyedForce } from '../../../renderer/scene/forces/dragForce.ts';
import type { SheetView } from '../../../renderer/scene/view/sheetView.ts';

/** Seen square on: X to the right, Z up, 0.1 px a mm. */
const view: SheetView = {
  right: [1, 0, 0],
  up: [0, 0, 1],
  towards: [0, -1, 0],
  centre: [0, 0, 0],
  pxPerMm: 0.1,
  width: 800,
  height: 600,
};

describe('a force dragged from a node', () => {
  it('goes along the bay by 3 px a kN where the hand goes mostly across', () => {
    expect(draggedForce(view, [1, 0, 0], [0, 0, 0], [60, 4])).toEqual([20, 0, 0]);
  });

  it('goes down where the hand goes down, on top of what is there', () => {
    expect(draggedForce(view, [1, 0, 0], [5, 0, 0], [2, 30])).toEqual([5, 0, -10]);
  });

  it('is none for a hand that hardly moves', () => {
    expect(draggedForce(view, [1, 0, 0], [0, 0, 0], [3, 3])).toBeNull();
  });
});

describe('a force set by keys', () => {
  it('changes by 1 kN a press, by 10 with shift, and goes with Delete', () => {
    expect(keyedForce('ArrowLeft', false, [1, 0, 0], [3, 0, 0])).toEqual([2, 0, 0]);
    expect(keyedForce('ArrowUp', true, [1, 0, 0], [0, 0, 0])).toEqual([0, 0, 10]);
    expect(keyedForce('Delete', false, [1, 0, 0], [3, 0, 1])).toEqual([0, 0, 0]);
    expect(keyedForce('a', false, [1, 0, 0], [3, 0, 1])).toBeNull();
  });
});
