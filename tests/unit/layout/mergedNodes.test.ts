/** Bays that touch share their nodes. */
import { describe, expect, it } from 'vitest';
import { layOut } from '../../../core/layout/layOut.ts';
import type { Bay } from '../../../core/project/model.ts';
import { bay, project, roof, wall } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';

const layoutOf = (...bays: readonly Bay[]) => layOut(project(bays), stock());
const besides = (x: number, y = 0, z = 0) =>
  layoutOf(
    bay(wall(6000, [[4000, 'crossed']]), { id: 'A' }),
    bay(wall(6000, [[4000, 'crossed']]), { id: 'C', place: { origin: [x, y, z], turn: 0 } }),
  );

describe('nodes of two bays', () => {
  it.each([
    ['in the same place', 6000, 0],
    ['0.9 mm apart', 6000.9, 0],
    ['0.9 mm apart the other way', 5999.1, 0],
    ['0.7 mm apart both ways', 6000.7, 0.7],
  ])('become one when %s', (_, x, y) => {
    // Four and four, two of them shared.
    expect(besides(x, y).nodes.size).toBe(6);
  });

  it.each([
    ['1.1 mm', 6001.1, 0],
    ['0.8 mm both ways, which is 1.13 mm', 6000.8, 0.8],
  ])('stay two when %s apart', (_, x, y) => {
    expect(besides(x, y).nodes.size).toBe(8);
  });

  it('do not move the bars: each keeps its own length', () => {
    const layout = besides(6000.9);
    expect(layout.bars.get('C/t1.rise')?.length).toBeCloseTo(Math.sqrt(52_000_000), 6);
    expect(layout.bars.get('C/t1.rise')?.i).toBe(layout.bars.get('A/t1.fall')?.i);
  });

  it('hold for each bay what that bay says of them', () => {
    const layout = layoutOf(
      bay(wall(6000, [[4000, 'crossed']]), { id: 'A' }),
      bay(roof(6000, 8, [[4000, 'crossed']]), { id: 'R', place: { origin: [0, 0, 4000], turn: 0 } }),
    );
    const shared = layout.nodes.get(layout.bars.get('R/a.p1.rise')?.i ?? '');
    expect(shared?.id).toBe('A/L1');
    expect(shared?.supports).toEqual({ R: { kind: 'eaves' } });
  });

  it('are found across the whole site, a mile from its origin too', () => {
    const far = layoutOf(
      bay(wall(6000, [[4000, 'crossed']]), { id: 'A', place: { origin: [900_000, -900_000, 0], turn: 0 } }),
      bay(wall(6000, [[4000, 'crossed']]), { id: 'C', place: { origin: [906_000.5, -900_000, 0], turn: 0 } }),
    );
    expect(far.nodes.size).toBe(6);
  });
});
