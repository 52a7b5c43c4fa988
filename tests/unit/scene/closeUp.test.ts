/** What is seen where the drawing has little room. */
import { describe, expect, it } from 'vitest';
import { layOut } from '../../../core/layout/layOut.ts';
import { closeUpPoints, isCrowded } from '../../../renderer/scene/view/closeUp.ts';
import { bay, line, project, wall } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';

const layout = layOut(project([bay(wall(6000, [[4000, 'crossed']], [line('G1', 1900)]))]), stock());
const [whole = null] = layout.bays;
const at = (pxPerMm: number) => ({
  right: [1, 0, 0] as const,
  up: [0, 0, 1] as const,
  towards: [0, -1, 0] as const,
  centre: [3000, 0, 2000] as const,
  width: 400,
  height: 400,
  pxPerMm,
});

describe('a close-up', () => {
  it('is called for where crossings come nearer to one another than 24 px', () => {
    // The rail at 1900 crosses the diagonals 150 to either side of 3000 and 100 below their own crossing: √(150² + 100²) = 180.3 mm away.
    expect(isCrowded(layout, whole, at(25 / 180.3))).toBe(false);
    expect(isCrowded(layout, whole, at(23 / 180.3))).toBe(true);
  });

  it('shows both diagonals of a crossing, the one that passes a rail, or the chosen bar', () => {
    const rise = [layout.bars.get('B/t1.rise')?.from, layout.bars.get('B/t1.rise')?.to];
    expect(closeUpPoints(layout, 'B/t1.fall+t1.rise', null)).toHaveLength(4);
    expect(closeUpPoints(layout, 'B/G1+t1.rise', 'B/t1.fall')).toEqual(rise);
    expect(closeUpPoints(layout, null, 'B/t1.rise')).toEqual(rise);
    expect(closeUpPoints(layout, null, null)).toEqual([]);
  });
});
