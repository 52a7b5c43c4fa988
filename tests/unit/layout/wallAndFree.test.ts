/** Lengths and places of diagonals, worked by hand. Lengths mm. */
import { describe, expect, it } from 'vitest';
import { layOut } from '../../../core/layout/layOut.ts';
import type { Layout } from '../../../core/layout/model.ts';
import type { Bay } from '../../../core/project/model.ts';
import { bay, free, line, project, wall } from '../assess/given/bays.ts';
import { stock } from '../assess/given/catalogues.ts';
import { expectAt, expectNear } from '../assess/given/near.ts';

const layoutOf = (...bays: readonly Bay[]): Layout => layOut(project(bays), stock());

describe('a wall bay of 6 m by 4 m, crossed', () => {
  const layout = layoutOf(bay(wall(6000, [[4000, 'crossed']])));
  // √(6000² + 4000²) = √52 000 000.
  const L = Math.sqrt(52_000_000);

  it('has two diagonals of √52 m between set-out points, from the foot up', () => {
    expect(layout.bays[0]?.diagonals).toEqual(['B/t1.rise', 'B/t1.fall']);
    const rise = layout.bars.get('B/t1.rise');
    expectNear(rise?.length, L);
    expectAt(rise?.from, [0, 0, 0]);
    expectAt(rise?.to, [6000, 0, 4000]);
    const fall = layout.bars.get('B/t1.fall');
    expectNear(fall?.length, L);
    expectAt(fall?.from, [6000, 0, 0]);
    expectAt(fall?.to, [0, 0, 4000]);
  });

  it('calls them D1 and D2', () => {
    expect(layout.bars.get('B/t1.rise')?.mark).toBe('D1');
    expect(layout.bars.get('B/t1.fall')?.mark).toBe('D2');
  });

  it('crosses them in the middle, at twice the slope', () => {
    expect(layout.bays[0]?.crossings).toEqual(['B/t1.fall+t1.rise']);
    const crossing = layout.crossings.get('B/t1.fall+t1.rise');
    expectAt(crossing?.at, [3000, 0, 2000]);
    expectNear(crossing?.onA, L / 2);
    expectNear(crossing?.onB, L / 2);
    // 2 atan(4/6) = 67.38°, below 90° and so the acute one.
    expectNear(crossing?.angle, (2 * Math.atan2(4, 6) * 180) / Math.PI);
  });

  it('gives their slope from the level', () => {
    expectNear(layout.bars.get('B/t1.rise')?.angle?.inclination, (Math.atan2(4, 6) * 180) / Math.PI);
    expectNear(layout.bars.get('B/t1.fall')?.angle?.inclination, (Math.atan2(4, 6) * 180) / Math.PI);
  });

  it('stands on two feet, with columns, and a beam at its head', () => {
    const roles = [...layout.bars.values()].map((bar) => bar.role).sort();
    expect(roles).toEqual(['beam', 'column', 'column', 'diagonal', 'diagonal']);
    const feet = [...layout.nodes.values()].filter((node) => node.supports.B?.kind === 'foundation');
    expect(feet.map((node) => node.at[2])).toEqual([0, 0]);
  });
});

describe('the patterns of a tier of 6 m by 4 m', () => {
  const barsOf = (pattern: Parameters<typeof wall>[1][number][1]) => {
    const layout = layoutOf(bay(wall(6000, [[4000, pattern]])));
    return (layout.bays[0]?.diagonals ?? []).map((id) => layout.bars.get(id));
  };

  it.each([
    ['rising', ['B/t1.rise']],
    ['falling', ['B/t1.fall']],
    ['peaked', ['B/t1.left', 'B/t1.right']],
    ['vee', ['B/t1.left', 'B/t1.right']],
    ['open', []],
  ] as const)('%s has its bars and no others', (pattern, ids) => {
    expect(barsOf(pattern).map((bar) => bar?.id)).toEqual(ids);
  });

  it('peaked meets in the middle of the beam above: a 3-4-5 triangle', () => {
    for (const bar of barsOf('peaked')) {
      expectNear(bar?.length, 5000);
      expectAt(bar?.to, [3000, 0, 4000]);
      expectNear(bar?.angle?.inclination, (Math.atan2(4, 3) * 180) / Math.PI);
    }
  });

  it('vee meets in the middle below', () => {
    for (const bar of barsOf('vee')) {
      expectNear(bar?.length, 5000);
      expectAt(bar?.from, [3000, 0, 0]);
    }
  });

  it('has no crossing but in a crossed tier', () => {
    for (const pattern of ['rising', 'falling', 'peaked', 'vee', 'open'] as const)
      expect(layoutOf(bay(wall(6000, [[4000, pattern]]))).crossings.size).toBe(0);
  });

  it('stacks tiers on each other', () => {
    const layout = layoutOf(
      bay(
        wall(6000, [
          [4000, 'crossed'],
          [2500, 'rising'],
          [3000, 'vee'],
        ]),
      ),
    );
    expectAt(layout.bars.get('B/t2.rise')?.from, [0, 0, 4000]);
    expectAt(layout.bars.get('B/t2.rise')?.to, [6000, 0, 6500]);
    expectAt(layout.bars.get('B/t3.left')?.from, [3000, 0, 6500]);
    expectAt(layout.bars.get('B/t3.left')?.to, [0, 0, 9500]);
  });
});

describe('rails across a wall bay', () => {
  it('are crossed by each diagonal where it reaches their height', () => {
    const layout = layoutOf(bay(wall(6000, [[4000, 'crossed']], [line('G1', 1000)])));
    // A quarter of the height is a quarter of the bar.
    const onRise = layout.crossings.get('B/G1+t1.rise');
    expectAt(onRise?.at, [1500, 0, 1000]);
    expectNear(onRise?.onA, Math.sqrt(52_000_000) / 4);
    expectNear(onRise?.onB, 1500);
    expect(onRise?.kind).toBe('line');
    expectAt(layout.crossings.get('B/G1+t1.fall')?.at, [4500, 0, 1000]);
    expect(layout.crossings.size).toBe(3);
  });

  it('that run through the point where diagonals cross share that point with them', () => {
    const layout = layoutOf(bay(wall(6000, [[4000, 'crossed']], [line('G1', 2000)])));
    const points = new Set([...layout.crossings.values()].map((crossing) => crossing.point));
    expect(layout.crossings.size).toBe(3);
    expect(points.size).toBe(1);
  });

  it('that run past a panel point do not cross the bars that end there', () => {
    const layout = layoutOf(
      bay(
        wall(
          6000,
          [
            [4000, 'crossed'],
            [4000, 'crossed'],
          ],
          [line('G1', 4000)],
        ),
      ),
    );
    expect([...layout.crossings.keys()].filter((id) => id.includes('G1'))).toEqual([]);
  });
});

describe('bars drawn freely', () => {
  it('cross off their centres where the lines meet', () => {
    // z = x/2 meets z = 3000 − x at x = 2000, z = 1000.
    const layout = layoutOf(
      bay(
        free({ n1: [0, 0, 0], n2: [3000, 0, 0], n3: [6000, 0, 3000], n4: [0, 0, 3000] }, [
          ['b1', 'n1', 'n3'],
          ['b2', 'n2', 'n4'],
        ]),
      ),
    );
    const crossing = layout.crossings.get('B/b1+b2');
    expectAt(crossing?.at, [2000, 0, 1000]);
    expectNear(crossing?.onA, Math.hypot(2000, 1000));
    expectNear(crossing?.onB, Math.hypot(1000, 1000));
    // tan⁻¹(1/2) + 45°.
    expectNear(crossing?.angle, (Math.atan(0.5) * 180) / Math.PI + 45);
  });

  it('cross three at one point, with three crossings of one point', () => {
    const layout = layoutOf(
      bay(
        free(
          {
            n1: [0, 0, 0],
            n2: [4000, 0, 0],
            n3: [4000, 0, 4000],
            n4: [0, 0, 4000],
            n5: [2000, 0, 0],
            n6: [2000, 0, 4000],
          },
          [
            ['b1', 'n1', 'n3'],
            ['b2', 'n2', 'n4'],
            ['b3', 'n5', 'n6'],
          ],
        ),
      ),
    );
    expect([...layout.crossings.keys()].sort()).toEqual(['B/b1+b2', 'B/b1+b3', 'B/b2+b3']);
    expect(new Set([...layout.crossings.values()].map((crossing) => crossing.point)).size).toBe(1);
    for (const crossing of layout.crossings.values()) expectAt(crossing.at, [2000, 0, 2000]);
  });

  it('do not cross where one ends on the other, nor at a common node, nor when parallel', () => {
    const nodes = {
      n1: [0, 0, 0],
      n2: [4000, 0, 0],
      n3: [2000, 0, 2000],
      n4: [2000, 0, 0],
      n5: [0, 0, 500],
      n6: [4000, 0, 500],
    } as const;
    const layout = layoutOf(
      bay(
        free(nodes, [
          ['b1', 'n1', 'n2'],
          ['b2', 'n3', 'n4'],
          ['b3', 'n1', 'n3'],
          ['b4', 'n5', 'n6'],
        ]),
      ),
    );
    // b4 crosses b2 and b3, 500 up; b2 ends on b1; b1 and b4 are parallel; b1 and b3 share a node.
    expect([...layout.crossings.keys()].sort()).toEqual(['B/b2+b4', 'B/b3+b4']);
  });

  it('in planes a hand apart cross as seen along the normal, and say how far apart they are', () => {
    // The normal looks to −Y, so b2 at y = −200 lies 200 nearer. b1 on the far face: −75 to −5; b2 on the near: 205 to 275.
    const layout = layoutOf(
      bay(
        free({ n1: [0, 0, 0], n2: [4000, -200, 0], n3: [4000, 0, 4000], n4: [0, -200, 4000] }, [
          ['b1', 'n1', 'n3'],
          ['b2', 'n2', 'n4'],
        ]),
      ),
    );
    const crossing = layout.crossings.get('B/b1+b2');
    expectNear(crossing?.gap, 210);
    expect(crossing?.clash).toBe(false);
  });

  it('farther apart than 600 mm do not meet', () => {
    const at = (y: number) =>
      layoutOf(
        bay(
          free({ n1: [0, 0, 0], n2: [4000, y, 0], n3: [4000, 0, 4000], n4: [0, y, 4000] }, [
            ['b1', 'n1', 'n3'],
            ['b2', 'n2', 'n4'],
          ]),
        ),
      ).crossings.size;
    expect([at(-599), at(-601), at(599), at(601)]).toEqual([1, 0, 1, 0]);
  });

  it('take the plane that their own directions give, when none is named', () => {
    const layout = layoutOf(
      bay(
        free(
          { n1: [0, 0, 0], n2: [0, 3000, 0], n3: [0, 3000, 4000], n4: [0, 0, 4000] },
          [
            ['b1', 'n1', 'n3'],
            ['b2', 'n2', 'n4'],
          ],
          { normal: null },
        ),
      ),
    );
    const normal = layout.bays[0]?.planes[0]?.normal ?? [0, 0, 0];
    expectNear(Math.abs(normal[0]), 1);
    expectNear(layout.bars.get('B/b1')?.length, 5000);
    expect(layout.crossings.size).toBe(1);
  });
});

describe('marks of bars', () => {
  it('number on from bay to bay in order', () => {
    const layout = layoutOf(
      bay(wall(6000, [[4000, 'crossed']]), { id: 'A' }),
      bay(wall(6000, [[4000, 'rising']]), { id: 'C', place: { origin: [0, 9000, 0], turn: 0 } }),
    );
    expect(['A/t1.rise', 'A/t1.fall', 'C/t1.rise'].map((id) => layout.bars.get(id)?.mark)).toEqual([
      'D1',
      'D2',
      'D3',
    ]);
  });

  it('of the user stand in their place, and leave those of the others as they were', () => {
    const layout = layoutOf(
      bay(
        wall(6000, [
          [4000, 'crossed'],
          [4000, 'crossed'],
        ]),
        { bars: { 't1.rise': { mark: 'B' } } },
      ),
    );
    const marks = (layout.bays[0]?.diagonals ?? []).map((id) => layout.bars.get(id)?.mark);
    expect(marks).toEqual(['B', 'D2', 'D3', 'D4']);
  });
});
