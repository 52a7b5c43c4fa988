/** The rings of crossings give way to one another. */
import { describe, expect, it } from 'vitest';
import { ringSizes } from '../../../renderer/scene/overlay/ringSize.ts';

describe('the rings of crossings', () => {
  it('are 30 px across where there is room', () => {
    expect(ringSizes([])).toEqual([]);
    expect(
      ringSizes([
        [0, 0],
        [30, 0],
        [0, 45],
      ]),
    ).toEqual([30, 30, 30]);
  });

  it('are as wide as their nearest neighbour is away, and leave others as they were', () => {
    // 15, 20, 25: a right-angled triangle.
    expect(
      ringSizes([
        [300, 0],
        [115, 120],
        [100, 100],
      ]),
    ).toEqual([30, 25, 25]);
  });

  it('stay wide enough to be hit', () => {
    expect(
      ringSizes([
        [0, 0],
        [2, 0],
      ]),
    ).toEqual([18, 18]);
  });
});
