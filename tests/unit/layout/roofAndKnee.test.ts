/** Roof bays and knees, worked by hand. Lengths mm. */
import { describe, expect, it } from 'vitest';
import { layOut } from '../../../core/layout/layOut.ts';
import type { Layout } from '../../../core/layout/model.ts';
import type { Bay } from '../../../core/project/model.ts';
import { bay, knee, line, project, roof } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';
import { expectAt, expectNear } from '../assess/given/near.ts';

const layoutOf = (...bays: readonly Bay[]): Layout => layOut(project(bays), stock());
const [C10, S10] = [Math.cos(Math.PI / 18), Math.sin(Math.PI / 18)];

describe('a roof bay of two slopes at 10°, two panels of 4 m each', () => {
  const layout = layoutOf(
    bay(
      roof(
        6000,
        10,
        [
          [4000, 'crossed'],
          [4000, 'rising'],
        ],
        [line('P1', 1000), line('P2', 2000), line('P3', 3000)],
        [line('P4', 1000)],
      ),
    ),
  );

  it('puts the ridge 8 m up the slope, and the other eaves as far beyond it', () => {
    expectAt(layout.bars.get('B/a.p2.rise')?.to, [6000, 8000 * C10, 8000 * S10]);
    // The second slope is seen from its own eaves: its left is at the far rafter.
    expectAt(layout.bars.get('B/b.p1.rise')?.from, [6000, 16_000 * C10, 0]);
    expectAt(layout.bars.get('B/b.p1.rise')?.to, [0, 12_000 * C10, 4000 * S10]);
    expectAt(layout.bars.get('B/b.p2.rise')?.to, [0, 8000 * C10, 8000 * S10]);
  });

  it('measures panels along the slope, so a pitch does not change a diagonal', () => {
    expectNear(layout.bars.get('B/a.p1.rise')?.length, Math.sqrt(52_000_000));
    expectNear(layout.bars.get('B/b.p1.fall')?.length, Math.sqrt(52_000_000));
    // Against the line of the eaves, not the level.
    expectNear(layout.bars.get('B/a.p1.rise')?.angle?.inclination, (Math.atan2(4, 6) * 180) / Math.PI);
  });

  it('lets the two slopes share the nodes of the ridge', () => {
    const ridge = [...layout.nodes.values()].filter((node) => Math.abs(node.at[2] - 8000 * S10) < 0.01);
    expect(ridge).toHaveLength(2);
    expect(ridge.map((node) => node.at[0]).sort((p, q) => p - q)).toEqual([0, 6000]);
  });

  it('has one strut along the ridge, not two', () => {
    const struts = [...layout.bars.values()].filter((bar) => bar.role === 'strut');
    const onRidge = struts.filter((bar) => Math.abs(bar.from[2] - 8000 * S10) < 0.01);
    expect(onRidge).toHaveLength(1);
    // Eaves, panel point and ridge on the first slope; eaves and panel point on the second.
    expect(struts).toHaveLength(5);
  });

  it('passes each diagonal of the panel under its three purlins, a quarter of the bar apart', () => {
    const L = Math.sqrt(52_000_000);
    (['P1', 'P2', 'P3'] as const).forEach((purlin, k) => {
      const crossing = layout.crossings.get(`B/${purlin}+a.p1.rise`);
      expectNear(crossing?.onA, ((k + 1) * L) / 4);
      expectAt(crossing?.at, [1500 * (k + 1), 1000 * (k + 1) * C10, 1000 * (k + 1) * S10]);
      expect(crossing?.kind).toBe('line');
    });
  });

  it('lets P2 and both diagonals meet in one point', () => {
    const at = ['B/a.p1.fall+a.p1.rise', 'B/P2+a.p1.rise', 'B/P2+a.p1.fall'].map(
      (id) => layout.crossings.get(id)?.point,
    );
    expect(new Set(at).size).toBe(1);
    expect(at[0]).toBeDefined();
  });

  it('keeps the purlins of each slope to it', () => {
    expect([...layout.crossings.keys()].filter((id) => id.includes('P4')).sort()).toEqual([
      'B/P4+b.p1.fall',
      'B/P4+b.p1.rise',
    ]);
  });

  it('lays the purlins on the rafters: half a rafter and half a purlin above', () => {
    // Rafter 300, purlin 150: 225 along the normal of the slope.
    expectAt(layout.bars.get('B/P1')?.offset, [0, -225 * S10, 225 * C10]);
    expectAt(layout.bars.get('B/P4')?.offset, [0, 225 * S10, 225 * C10]);
  });

  it('takes the four eaves as carried by what stands below', () => {
    const eaves = [...layout.nodes.values()].filter((node) => node.supports.B?.kind === 'eaves');
    expect(eaves).toHaveLength(4);
    for (const node of eaves) expectNear(node.at[2], 0);
  });

  it('leaves out the struts that the recipe says are not there', () => {
    const recipe = { ...roof(6000, 10, [[4000, 'crossed']]), eavesStrut: false, ridgeStrut: false };
    expect([...layoutOf(bay(recipe)).bars.values()].filter((bar) => bar.role === 'strut')).toEqual([]);
  });
});

describe('knees at 45° under purlins 1.2 m above the chord', () => {
  const layout = layoutOf(bay(knee()));

  it('are two to a purlin, 1.2 √2 m long, from the chord up to either side', () => {
    expect(layout.bays[0]?.diagonals).toEqual(['B/k1.knee-a', 'B/k1.knee-b', 'B/k2.knee-a', 'B/k2.knee-b']);
    for (const id of layout.bays[0]?.diagonals ?? []) {
      const bar = layout.bars.get(id);
      expectNear(bar?.length, 1200 * Math.SQRT2);
      expectNear(bar?.angle?.inclination, 45);
    }
    expectAt(layout.bars.get('B/k2.knee-a')?.from, [1500, 0, 0]);
    expectAt(layout.bars.get('B/k2.knee-a')?.to, [1500, 1200, 1200]);
    expectAt(layout.bars.get('B/k2.knee-b')?.to, [1500, -1200, 1200]);
  });

  it('reach less far when steeper: 1200 / tan 60°', () => {
    const steep = layoutOf(bay(knee({ angle: 60, sides: 'one', count: 1 })));
    expect(steep.bays[0]?.diagonals).toEqual(['B/k1.knee-a']);
    expectAt(steep.bars.get('B/k1.knee-a')?.to, [0, 1200 / Math.sqrt(3), 1200]);
    expectNear(steep.bars.get('B/k1.knee-a')?.length, 1200 / (Math.sqrt(3) / 2));
  });

  it('do not cross one another', () => {
    expect(layout.crossings.size).toBe(0);
  });
});

describe('a bay in its place', () => {
  it('is turned about its origin, anticlockwise from above, and then moved', () => {
    const turned = layoutOf(
      bay(roof(6000, 0, [[4000, 'rising']]), { place: { origin: [1000, 2000, 300], turn: 90 } }),
    );
    // Width along X goes to Y, the slope along Y goes to −X.
    expectAt(turned.bars.get('B/a.p1.rise')?.from, [1000, 2000, 300]);
    expectAt(turned.bars.get('B/a.p1.rise')?.to, [1000 - 4000, 2000 + 6000, 300]);
  });

  it('is turned by any angle', () => {
    const turned = layoutOf(
      bay(knee({ count: 1, sides: 'one' }), { place: { origin: [0, 0, 0], turn: 30 } }),
    );
    // [0, 1200, 1200] turned by 30°: [−1200 sin 30°, 1200 cos 30°, 1200].
    expectAt(turned.bars.get('B/k1.knee-a')?.to, [-600, 600 * Math.sqrt(3), 1200]);
  });

  it('turns its planes with it, and keeps the upright', () => {
    const [plane] =
      layoutOf(bay(roof(6000, 10, [[4000, 'rising']]), { place: { origin: [0, 0, 0], turn: 90 } })).bays[0]
        ?.planes ?? [];
    expectAt(plane?.right, [0, 1, 0]);
    expectAt(plane?.up, [-C10, 0, S10]);
    expectAt(plane?.normal, [S10, 0, C10]);
  });

  it('in the middle of one quarter turn more or less comes to the same place exactly', () => {
    const at = (turn: number) =>
      layoutOf(bay(knee({ count: 1 }), { place: { origin: [7, 8, 9], turn } })).bars.get('B/k1.knee-a')?.to;
    expect(at(-90)).toEqual(at(270));
    expect(at(180)).toEqual(at(-180));
    expect(at(360)).toEqual(at(0));
  });
});
