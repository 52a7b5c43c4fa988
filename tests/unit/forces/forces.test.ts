/** Forces on the whole framing, against statics by hand. N, mm. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { stockOf } from '../../../core/catalogue/stock.ts';
import { bowLoad, initialBow } from '../../../core/forces/bowForces.ts';
import { combinationStates, turnedInPart } from '../../../core/forces/combinationStates.ts';
import { forcesOf } from '../../../core/forces/forces.ts';
import type { ForceState, Forces } from '../../../core/forces/model.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import type { Layout } from '../../../core/layout/model.ts';
import { practiceFor } from '../../../core/practice/practices.ts';
import type { Actions, Combination, Load, LoadCase } from '../../../core/project/actions.ts';
import type { Bay, Project } from '../../../core/project/model.ts';
import { bay, free, project, roof, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const laidOut = (given: Project): Layout => layOut(given, stockOf('en', [], CATALOGUES));

const wind = (loads: readonly Load[], more: Partial<LoadCase> = {}): LoadCase => ({
  id: 'W',
  name: 'wind',
  kind: 'wind',
  selfWeight: false,
  reverses: false,
  loads,
  ...more,
});
const alone = (id: string, more: Partial<Combination> = {}): Combination => ({
  id: 'C',
  name: 'alone',
  use: 'strength',
  factors: { [id]: 1 },
  leaning: false,
  ...more,
});
const acting = (
  cases: readonly LoadCase[],
  combinations: readonly Combination[],
  carries: Actions['carries'] = [],
): Actions => ({ cases, combinations, carries });

function forces(bays: readonly Bay[], actions: Actions): { readonly found: Forces; readonly layout: Layout } {
  const layout = laidOut(project(bays));
  return { found: forcesOf(actions, layout, practiceFor('sans10162')), layout };
}

function only({ found }: { readonly found: Forces }): ForceState {
  const [state] = found.states;
  if (!state || found.states.length !== 1) throw new Error(`${found.states.length} states`);
  return state;
}

/** Bay 5 m wide, tiers 4 m high. */
const crossed = (tiers = 1): Bay =>
  bay(
    wall(
      5000,
      Array.from({ length: tiers }, () => [4000, 'crossed'] as const),
    ),
  );
const push = (node: string, kN: readonly [number, number, number]): Load => ({
  kind: 'node',
  id: `f${node.replace('/', '')}`,
  node,
  force: kN,
});

describe('a crossed bay pushed at its head', () => {
  it('pulls one diagonal with V/cos θ and leaves the other slack', () => {
    // Statics: L = √41 m, cos θ = 5/√41; 100 kN gives 128.1 kN. The columns' own bending takes none of it: they are pinned at the foot and at the head.
    const state = only(forces([crossed()], acting([wind([push('B/L1', [100, 0, 0])])], [alone('W')])));
    expect(state.forces.get('B/t1.rise')).toBeCloseTo((100_000 * Math.sqrt(41)) / 5, 2);
    expect([...state.slack]).toEqual(['B/t1.fall']);
    // The right column takes the vertical part, 100 × 4/5, in compression; the left one nothing.
    expect(state.forces.get('B/t1.column-right')).toBeCloseTo(-80_000, 2);
    expect(state.forces.get('B/t1.column-left')).toBeCloseTo(0, 2);
    expect(state.forces.get('B/t1.beam')).toBeCloseTo(-100_000, 2);
  });

  it('stands in balance with its supports', () => {
    const state = only(
      forces(
        [crossed(3)],
        acting([wind([push('B/L3', [60, 0, -20]), push('B/R2', [10, 0, 0])])], [alone('W')]),
      ),
    );
    const sum = [...state.reactions.values()].reduce(
      (all, [x, y, z]) => [all[0] + x, all[1] + y, all[2] + z],
      [0, 0, 0] as [number, number, number],
    );
    // Newton's third law; tolerance: the residual goal of 1e-9 of the load.
    expect(sum[0]).toBeCloseTo(-70_000, 3);
    expect(sum[1]).toBeCloseTo(0, 3);
    expect(sum[2]).toBeCloseTo(20_000, 3);
    expect(state.residual).toBeLessThan(1e-9);
  });

  it('answers a push at one place at another as much as the other way about, while every bar works both ways', () => {
    // Maxwell and Betti: displacement along one push under the other is the same as the other way about.
    const built = crossed(3);
    const both = { ...built, diagonals: { ...built.diagonals, countedOn: 'both' as const } };
    const under = (at: string, kN: readonly [number, number, number]) =>
      only(forces([both], acting([wind([push(at, kN)])], [alone('W')]))).displacements;
    const places = [
      ['B/L1', [100, 0, 0]],
      ['B/R2', [0, 0, -100]],
      ['B/L3', [60, 0, 80]],
      ['B/R3', [100, 0, 0]],
    ] as const;
    const along = (moved: ReadonlyMap<string, readonly [number, number, number]>, k: number): number => {
      const [node, [x, , z]] = places[k] ?? places[0];
      const [dx, , dz] = moved.get(node) ?? [0, 0, 0];
      return x * dx + z * dz;
    };
    for (let a = 0; a < places.length; a++)
      for (let b = 0; b < a; b++) {
        const [one, other] = [places[a] ?? places[0], places[b] ?? places[0]];
        const there = along(under(one[0], one[1]), b);
        const back = along(under(other[0], other[1]), a);
        expect(Math.abs(there - back), `${one[0]} ${other[0]}`).toBeLessThan(1e-9 * Math.abs(there) + 1e-9);
        expect(Math.abs(there)).toBeGreaterThan(1e-3);
      }
  });

  it('keeps its pretension in both until V is 2 P₀ cos θ, and works in one beyond', () => {
    // Practice-facts G2: T = P₀ + V/(2 cos θ), then V/cos θ. Shortened by what draws both to P₀ against the members, found with no load.
    const cos = 5 / Math.sqrt(41);
    const drawn = (kN: number) =>
      only(
        forces(
          [crossed()],
          acting(
            [
              wind([
                { kind: 'shortened', id: 'a', bar: 'B/t1.rise', by: 4 },
                { kind: 'shortened', id: 'b', bar: 'B/t1.fall', by: 4 },
                push('B/L1', [kN / 2, 0, 0]),
                push('B/R1', [kN / 2, 0, 0]),
              ]),
            ],
            [alone('W')],
          ),
        ),
      );
    const P0 = (drawn(0).forces.get('B/t1.rise') ?? 0) / 1000;
    expect(P0).toBeGreaterThan(20);
    const held = 1.6 * P0 * cos;
    // Members shorten unlike under the push; to half a per cent the diagonals share it evenly.
    expect((drawn(held).forces.get('B/t1.rise') ?? 0) / 1000 / (P0 + held / (2 * cos))).toBeCloseTo(1, 2);
    expect(drawn(held).slack.size).toBe(0);
    const past = 3 * P0 * cos;
    expect((drawn(past).forces.get('B/t1.rise') ?? 0) / 1000).toBeCloseTo(past / cos, 3);
    expect([...drawn(past).slack]).toEqual(['B/t1.fall']);
  });

  it('is mirrored when the load is turned round', () => {
    const reversing = wind([push('B/L1', [50, 0, 0]), push('B/R1', [50, 0, 0])], { reverses: true });
    const { found } = forces([crossed()], acting([reversing], [alone('W')]));
    const [given, turned] = found.states;
    expect(turned?.turned).toEqual(['W']);
    expect(turned?.forces.get('B/t1.fall')).toBeCloseTo(given?.forces.get('B/t1.rise') ?? 0, 4);
    expect(turned?.forces.get('B/t1.column-left')).toBeCloseTo(
      given?.forces.get('B/t1.column-right') ?? 0,
      4,
    );
  });

  it('would attract half the shear into the slack diagonal if that worked both ways', () => {
    // Equal diagonals share: 64.0 kN each (practice-facts J4), less what the members give; members of ordinary size change it by a few per cent.
    const state = only(
      forces([crossed()], acting([wind([push('B/L1', [50, 0, 0]), push('B/R1', [50, 0, 0])])], [alone('W')])),
    );
    const attracted = state.attracted.get('B/t1.fall') ?? 0;
    expect(attracted).toBeGreaterThan(0.9 * 64_031);
    expect(attracted).toBeLessThan(1.02 * 64_031);
  });
});

describe('a single tension-only diagonal', () => {
  const single = bay(wall(5000, [[4000, 'rising']]));

  it('carries the push that pulls it, and finds no way for the other', () => {
    const { found } = forces(
      [single],
      acting([wind([push('B/L1', [10, 0, 0])], { reverses: true })], [alone('W')]),
    );
    const [given, turned] = found.states;
    expect(given?.noWay).toEqual([]);
    expect(turned?.noWay.map(({ bays }) => bays)).toEqual([['B']]);
    expect(turned?.noWay[0]?.slackened).toEqual(['B/t1.rise']);
    expect(turned?.noWay[0]?.moving.map(({ node }) => node).sort()).toEqual(['B/L1', 'B/R1']);
    // The bay that cannot carry it has no forces, and no figure is made up for it.
    expect(turned?.forces.size).toBe(0);
  });

  it('carries both when it is counted on in compression too', () => {
    const both = { ...single, diagonals: { ...single.diagonals, countedOn: 'both' as const } };
    const { found } = forces(
      [both],
      acting([wind([push('B/L1', [10, 0, 0])], { reverses: true })], [alone('W')]),
    );
    expect(found.states.map(({ noWay }) => noWay.length)).toEqual([0, 0]);
    expect(found.states[1]?.forces.get('B/t1.rise')).toBeCloseTo(-10_000 * (Math.sqrt(41) / 5), 3);
  });
});

describe('a peaked tier in tension only', () => {
  it('bends its beam by what the taut diagonal pulls down at the middle', () => {
    // Half width 2.5 m, height 4 m: V = 100 kN at the beam pulls one diagonal with 100/cos, whose vertical part 100 × 4/2.5 = 160 kN bends the beam at mid-span: M = F l/4 = 200 kN·m,
    // were the head of the diagonals free to take all of it. That is statics: the beam is pinned at both ends.
    const state = only(
      forces(
        [bay(wall(5000, [[4000, 'peaked']]))],
        acting([wind([push('B/L1', [100, 0, 0])])], [alone('W')]),
      ),
    );
    const bent = state.moments.get('B/t1.beam-left') ?? 0;
    expect(bent / (160_000 * 5000 * 0.25)).toBeCloseTo(1, 6);
  });
});

describe('loads', () => {
  it('come from the weight of the bars when asked to', () => {
    const { found, layout } = forces(
      [crossed()],
      acting([wind([], { id: 'G', kind: 'permanent', selfWeight: true })], [alone('G')]),
    );
    const [state] = found.states;
    const down = [...(state?.reactions.values() ?? [])].reduce((sum, [, , z]) => sum + z, 0);
    const angles = [...layout.bars.values()].reduce((sum, { angle }) => sum + (angle?.mass ?? 0), 0);
    // Columns and beam weigh more than the angles; what the reactions carry is the sum of all nodal loads.
    const loads = [...(found.caseLoads.get('G')?.values() ?? [])].reduce((sum, [, , z]) => sum - z, 0);
    expect(loads).toBeGreaterThan(angles * 9.806_65);
    expect(down).toBeCloseTo(loads, 3);
  });

  it('on what is not there are told of and left out', () => {
    const { found } = forces(
      [crossed()],
      acting(
        [
          wind([
            push('B/L9', [1, 0, 0]),
            { kind: 'gable', id: 'g', bay: 'B', pressure: 1, rafter: 1, ground: 0 },
          ]),
        ],
        [alone('W')],
      ),
    );
    expect(found.problems.map(({ path }) => path)).toEqual([
      'actions.cases[0].loads[0]',
      'actions.cases[0].loads[1]',
    ]);
  });

  it('of rafters that are not straight are those of EN 1993-1-1 5.3.3, and balance themselves', () => {
    // Practice-facts J3, a consistency check and not external: m 5, L 24 m, N 300 kN: e₀ 37.18 mm; q_d 0.775, 0.975, 1.275 N/mm for δ 0, 9.6 and 24 mm.
    expect(initialBow(24_000, 5)).toBeCloseTo(37.18, 2);
    for (const [gives, q] of [
      [0, 0.775],
      [9.6, 0.975],
      [24, 1.275],
    ] as const)
      expect(Math.abs(bowLoad(300_000, 5, 24_000, gives) - q)).toBeLessThan(0.0005);
    const R = bay(
      roof(6000, 0, [
        [4000, 'crossed'],
        [4000, 'crossed'],
        [4000, 'crossed'],
      ]),
      { id: 'R' },
    );
    const { found } = forces(
      [R],
      acting(
        [wind([{ kind: 'bowed', id: 'b', bay: 'R', squeeze: 300, rafters: 5, gives: 1000 }])],
        [alone('W')],
      ),
    );
    const loads = found.caseLoads.get('W');
    const q = bowLoad(300_000, 5, 12_000, 12);
    expect(loads?.get('R/a.L1')?.[0]).toBeCloseTo(q * 4000, 6);
    expect(loads?.get('R/a.L0')?.[0]).toBeCloseTo(q * (2000 - 6000), 6);
    expect([...(loads?.values() ?? [])].reduce((sum, [x]) => sum + x, 0)).toBeCloseTo(0, 6);
  });

  it('with a factor for a case that is not there are told of', () => {
    const { found } = forces(
      [crossed()],
      acting([wind([push('B/L1', [1, 0, 0])])], [{ ...alone('W'), factors: { w: 1.5 } }]),
    );
    expect(found.problems.map(({ path }) => path)).toEqual(['actions.combinations[0].factors.w']);
  });

  it('of a wall that leans go to every level by half the heights beside it', () => {
    // 1 kN/m² on 6 m of wall: 1 × 6 × (4 + 4)/2 = 24 kN at the first level, 12 kN at the second.
    const { found } = forces(
      [crossed(2)],
      acting([wind([{ kind: 'side', id: 's', bay: 'B', pressure: 1, width: 6000 }])], [alone('W')]),
    );
    const loads = found.caseLoads.get('W');
    expect(loads?.get('B/L1')?.[0]).toBeCloseTo(24_000, 6);
    expect(loads?.get('B/L2')?.[0]).toBeCloseTo(12_000, 6);
    expect(loads?.has('B/L0')).toBe(false);
  });
});

describe('what leans', () => {
  it('is the practice’s share of the vertical loads, both ways', () => {
    // SANS 10162-1: 0.005 of 200 kN is 1 kN (from memory, verify).
    const { found } = forces(
      [crossed()],
      acting(
        [wind([push('B/L1', [0, 0, -200])], { id: 'G', kind: 'permanent' })],
        [alone('G', { leaning: true })],
      ),
    );
    const across = found.states.map((state) =>
      [...state.reactions.values()].reduce((sum, [x]) => sum + x, 0),
    );
    expect(across[0]).toBeCloseTo(-1000, 3);
    expect(across[1]).toBeCloseTo(1000, 3);
  });

  it('comes on top of the wind whichever way the wind is given', () => {
    // 0.005 × 2000 kN = 10 kN beside 50 kN of wind: 60 kN × √41/5 = 76.8 kN pulls either diagonal in one state, by statics.
    for (const blows of [50, -50]) {
      const { found } = forces(
        [crossed()],
        acting(
          [
            wind([push('B/L1', [0, 0, -1000]), push('B/R1', [0, 0, -1000])], { id: 'G', kind: 'permanent' }),
            wind([push('B/L1', [blows, 0, 0])], { reverses: true }),
          ],
          [{ ...alone('W', { leaning: true }), factors: { G: 1, W: 1 } }],
        ),
      );
      for (const bar of ['B/t1.rise', 'B/t1.fall']) {
        const most = Math.max(...found.states.map((state) => state.forces.get(bar) ?? 0));
        expect(most, `${blows} ${bar}`).toBeCloseTo((60_000 * Math.sqrt(41)) / 5, 0);
      }
      expect(new Set(found.states.map(({ id }) => id)).size).toBe(4);
    }
  });

  it('leans facing walls the same way', () => {
    const facing = bay(wall(5000, [[4000, 'crossed']]), {
      id: 'F',
      place: { origin: [5000, 12_000, 0], turn: 180 },
    });
    const { found } = forces(
      [crossed(), facing],
      acting(
        [wind([push('B/L1', [0, 0, -1000]), push('F/L1', [0, 0, -1000])], { id: 'G', kind: 'permanent' })],
        [alone('G', { leaning: true })],
      ),
    );
    for (const state of found.states) {
      const [one, other] = ['B', 'F'].map((of) =>
        [...state.reactions].reduce((sum, [node, [x]]) => (node.startsWith(of) ? sum + x : sum), 0),
      );
      expect(other).toBeCloseTo(one ?? 0, 3);
    }
  });
});

describe('a roof bay on two unlike walls that share its eaves', () => {
  // Walls of one and of two braced tiers, so that one is twice as stiff as the other.
  const R = bay(
    roof(5000, 0, [
      [5000, 'crossed'],
      [5000, 'crossed'],
    ]),
    { id: 'R', place: { origin: [0, 0, 8000], turn: 0 } },
  );
  const near = bay(wall(5000, [[8000, 'crossed']]), { id: 'N' });
  const far = bay(
    wall(5000, [
      [4000, 'crossed'],
      [4000, 'crossed'],
    ]),
    { id: 'F', place: { origin: [0, 10_000, 0], turn: 0 } },
  );

  it('hands wind at its middle to each by statics, half and half, although one is stiffer', () => {
    const state = only(forces([R, near, far], acting([wind([push('R/a.L1', [20, 0, 0])])], [alone('W')])));
    const at = (of: string): number =>
      [...state.reactions].reduce((sum, [node, [x]]) => (node.startsWith(of) ? sum + x : sum), 0);
    expect(at('N') / -10_000).toBeCloseTo(1, 2);
    expect(at('F') / -10_000).toBeCloseTo(1, 2);
  });

  it('leans on its frames where one wall alone stands under it', () => {
    const state = only(forces([R, near], acting([wind([push('R/a.L1', [20, 0, 0])])], [alone('W')])));
    expect(state.noWay).toEqual([]);
    const x = [...state.reactions.values()].reduce((sum, [each]) => sum + each, 0);
    expect(x).toBeCloseTo(-20_000, 0);
    for (const [node, moved] of state.displacements) expect(Math.hypot(...moved), node).toBeLessThan(200);
  });

  it('leaves what acts across the building to its frames', () => {
    const state = only(forces([R, near, far], acting([wind([push('R/a.L0', [0, 20, 0])])], [alone('W')])));
    for (const [bar, force] of state.forces) expect(Math.abs(force), bar).toBeLessThan(50);
  });
});

describe('loads that act either way', () => {
  const cases = (count: number): readonly LoadCase[] =>
    Array.from({ length: count }, (_, k) => wind([], { id: `W${k + 1}`, reverses: true }));
  const all = (count: number): Actions =>
    acting(cases(count), [
      alone('W1', { factors: Object.fromEntries(cases(count).map(({ id }) => [id, 1])) }),
    ]);
  const turned = (count: number) => combinationStates(all(count)).map((state) => state.turned.length);

  it('are turned round in every choice up to five of them', () => {
    expect(turned(3)).toHaveLength(8);
    expect(turned(5)).toHaveLength(32);
    expect(turnedInPart(all(5))).toEqual([]);
  });

  it('beyond five all together, each by itself and all but each, and it is told that this is not every choice', () => {
    expect([...turned(6)].sort()).toEqual([0, 1, 1, 1, 1, 1, 1, 5, 5, 5, 5, 5, 5, 6]);
    expect(turnedInPart(all(6))).toHaveLength(1);
    const { findings } = assess({ ...project([crossed()]), actions: all(6) }, CATALOGUES);
    expect(findings.filter(({ kind }) => kind === 'turnings left out')).toMatchObject([
      { severity: 'look into', breaksLimit: false },
    ]);
  });
});

describe('a roof bay held along two lines', () => {
  // Two slopes of 6 m at 6°: the ridge at half the width, a.L1 at a quarter of it.
  const slope = {
    ...roof(5000, 6, [
      [3000, 'crossed'],
      [3000, 'crossed'],
    ]),
  };
  const [first] = slope.slopes;
  if (!first) throw new Error('no slope');
  const R = bay(
    { ...slope, slopes: [first, { ...first, id: 'b' }] },
    { id: 'R', place: { origin: [0, 0, 8000], turn: 0 } },
  );
  const span = 12_000 * Math.cos((6 * Math.PI) / 180);
  const near = bay(wall(5000, [[8000, 'crossed']]), { id: 'N' });
  const beside = bay(wall(5000, [[8000, 'crossed']]), {
    id: 'Q',
    place: { origin: [0, 20_000, 0], turn: 0 },
  });
  const drawn = (id: string, y: number): Bay =>
    bay(
      free(
        { a: [0, y, 0], b: [5000, y, 0], c: [0, y, 8000], d: [5000, y, 8000] },
        [
          ['x1', 'a', 'd'],
          ['x2', 'b', 'c'],
          ['c1', 'a', 'c', 'column'],
          ['c2', 'b', 'd', 'column'],
          ['bm', 'c', 'd', 'beam'],
        ],
        { free: ['c', 'd'] },
      ),
      { id },
    );
  const carry = { from: 'R', to: 'Q', eaves: 2 } as const;

  it.each<[string, readonly Bay[], Actions['carries'], string, string]>([
    ['by its own supports alone', [R], [], 'R/a', 'R/b'],
    ['by a wall and by its own supports', [R, near], [], 'N', 'R/b'],
    ['by a wall and by what another carries', [R, near, beside], [carry], 'N', 'R/b'],
    ['by a wall and by one drawn freely', [R, near, drawn('F', span)], [], 'N', 'F'],
    ['by two drawn freely', [R, drawn('E', 0), drawn('F', span)], [], 'E', 'F'],
  ])('%s shares wind by lever arms, three quarters to the nearer', (_, bays, carries, nearer, farther) => {
    const state = only(forces(bays, acting([wind([push('R/a.L1', [20, 0, 0])])], [alone('W')], carries)));
    expect(state.noWay).toEqual([]);
    const at = (of: string): number =>
      [...state.reactions].reduce((sum, [node, [x]]) => (node.startsWith(of) ? sum + x : sum), 0);
    expect(at(nearer) / -15_000).toBeCloseTo(1, 2);
    expect(at(farther) / -5000).toBeCloseTo(1, 2);
    for (const [node, moved] of state.displacements) expect(Math.hypot(...moved), node).toBeLessThan(20);
  });

  it('keeps its eaves from spreading under its own weight, and stands in balance', () => {
    const weight = [push('R/a.L2', [0, 0, -20]), push('R/a.R2', [0, 0, -20])];
    const state = only(forces([R], acting([wind(weight)], [alone('W')])));
    const [x, y, z] = [...state.reactions.values()].reduce(
      ([a, b, c], [p, q, r]) => [a + p, b + q, c + r],
      [0, 0, 0],
    );
    expect(x).toBeCloseTo(0, 3);
    expect(y).toBeCloseTo(0, 3);
    expect(z).toBeCloseTo(40_000, 2);
    // Half of each rafter's 20 kN at its eaves, by a thrust of 10/tan 6° along the level.
    const thrust = [...state.reactions].filter(([node]) => node.startsWith('R/a')).map(([, [, way]]) => way);
    expect(thrust.reduce((sum, each) => sum + each, 0)).toBeCloseTo(
      20_000 / Math.tan((6 * Math.PI) / 180),
      -2,
    );
  });
});

describe('a roof bay on wall bays', () => {
  it('takes wind on its gable by the width halfway to the neighbours and half the height', () => {
    const R = bay(
      roof(5000, 0, [
        [3000, 'crossed'],
        [3000, 'crossed'],
      ]),
      { id: 'R' },
    );
    const { found } = forces(
      [R],
      acting(
        [wind([{ kind: 'gable', id: 'g', bay: 'R', pressure: 0.8, rafter: 1, ground: -6000 }])],
        [alone('W')],
      ),
    );
    const loads = found.caseLoads.get('W');
    // Flat roof 6 m above the ground: 0.8 × 3 × 6/2 = 7.2 kN inside, half of it at the eaves.
    expect(loads?.get('R/a.L1')?.[0]).toBeCloseTo(7200, 6);
    expect(loads?.get('R/a.L0')?.[0]).toBeCloseTo(3600, 6);
  });
});

describe('a roof bay that hands its forces on', () => {
  it('pushes the top of the wall bay with the reaction of its eaves', () => {
    const R = bay(roof(5000, 0, [[3000, 'crossed']]), { id: 'R', place: { origin: [0, 0, 9000], turn: 0 } });
    const loads = wind([push('R/a.L1', [10, 0, 0])]);
    const { found } = forces(
      [crossed(), R],
      acting([loads], [alone('W')], [{ from: 'R', to: 'B', eaves: 1 }]),
    );
    const state = only({ found });
    // All 10 kN reach the only eaves; the wall bay carries them by its one taut diagonal.
    expect(state.forces.get('B/t1.rise')).toBeCloseTo((10_000 * Math.sqrt(41)) / 5, 2);
  });

  it('is told that it cannot be handed to a bay that is not there', () => {
    const { found } = forces([crossed()], acting([], [], [{ from: 'B', to: 'X', eaves: 1 }]));
    expect(found.problems.map(({ path }) => path)).toEqual(['actions.carries[0]']);
  });
});

describe('drift', () => {
  it('is what the taut diagonal and the members give, and more with holes to take up', () => {
    const state = only(
      forces([crossed()], acting([wind([push('B/L1', [10, 0, 0])])], [alone('W', { use: 'service' })])),
    );
    const [drift] = state.drifts;
    // Each bolted end slips 2 mm (18 mm holes for M16) before it bears: 4 mm of stretch, 4/cos θ = 5.12 mm of drift, and the sag to straighten.
    const taken = (drift?.withTakeUp ?? 0) - (drift?.elastic ?? 0);
    expect(taken).toBeGreaterThan((4 * Math.sqrt(41)) / 5);
    expect(taken).toBeLessThan((4.6 * Math.sqrt(41)) / 5);
  });
});

describe('the gables of the example', () => {
  const example = JSON.parse(readFileSync('assets/examples/marrow-lane.json', 'utf8')) as Project;
  const layout = laidOut(example);
  const { states } = forcesOf(
    example.actions ?? { cases: [], combinations: [], carries: [] },
    layout,
    practiceFor('sans10162'),
  );
  const wind1 = states.find(({ id }) => id === 'S2');

  it('push either wall with half of their wind, by statics, and roof and walls move no more than bars stretch and beams bend', () => {
    // 56.32 kN in all at the heads of the gables’ columns, worked out apart from the program.
    const at = (of: string): number =>
      [...(wind1?.reactions ?? [])].reduce((sum, [node, [x]]) => (node.startsWith(of) ? sum + x : sum), 0);
    expect(Math.abs(at('W1') + at('W2'))).toBeGreaterThan(56_300);
    expect(Math.abs(at('W1') + at('W2'))).toBeLessThan(56_340);
    expect(at('W1') / at('W2')).toBeGreaterThan(0.99);
    expect(at('W1') / at('W2')).toBeLessThan(1.01);
    for (const { displacements } of states)
      for (const [node, moved] of displacements) expect(Math.hypot(...moved), node).toBeLessThan(200);
  });
});
