/** A wall bay that stands on another one is held as that one holds it, and hands its forces down through it. */
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { Bay, Pattern, Project } from '../../../core/project/model.ts';
import { bay, project, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const W = 5000;
const LOWER = 3500;
const UPPER = 4000;
const parted = (below: Pattern): readonly Bay[] => [
  bay(wall(W, [[LOWER, below]]), { id: 'W1' }),
  bay(wall(W, [[UPPER, 'crossed']]), {
    id: 'W2',
    place: { origin: [0, 0, LOWER], turn: 0 },
    joins: { 't1.fall+t1.rise': { kind: 'bolted' } },
    diagonals: { section: '90x90x7' },
  }),
];
const whole = (below: Pattern): Bay =>
  bay(
    wall(W, [
      [LOWER, below],
      [UPPER, 'crossed'],
    ]),
    {
      id: 'W',
      joins: { 't2.fall+t2.rise': { kind: 'bolted' } },
      diagonals: { section: '90x90x7' },
    },
  );
const pushed = (made: Project, node: string): Project => ({
  ...made,
  actions: {
    cases: [
      {
        id: 'H',
        name: 'wind',
        kind: 'wind',
        selfWeight: false,
        reverses: false,
        loads: [{ kind: 'node', id: 'h', node, force: [50, 0, 0] }],
      },
    ],
    combinations: [{ id: 'C', name: 'C', use: 'strength', factors: { H: 1 }, leaning: false }],
    carries: [],
  },
});

describe('a wall bay on a wall bay', () => {
  const slenderness = (bays: readonly Bay[], bar: string) => {
    const found = assess(project(bays), CATALOGUES).diagonals.get(bar)?.inService?.slenderness;
    if (found === undefined) throw new Error(`${bar} is not assessed`);
    return found;
  };

  it('reads as the same steel in one bay, braced below or not', () => {
    for (const below of ['crossed', 'rising', 'open'] as const)
      expect(slenderness(parted(below), 'W2/t1.rise'), below).toBeCloseTo(
        slenderness([whole(below)], 'W/t2.rise'),
        6,
      );
  });

  it('has no foundation in the air: on an open bay its crossing holds nothing, and that is told', () => {
    const { findings, layout } = assess(project(parted('open')), CATALOGUES);
    const foot = layout.nodes.get(layout.bays[1]?.nodeOf.get('L0') ?? '');
    expect(foot?.supports.W2).toEqual({ kind: 'standing' });
    expect(
      findings.filter(({ kind, bay: of }) => kind === 'hold without a holder' && of === 'W2'),
    ).not.toEqual([]);
    // Whole length over the least radius of 90 × 90 × 7 (17.7 mm, r_v of SCI P363: 1.77 cm).
    expect(slenderness(parted('open'), 'W2/t1.rise')).toBeCloseTo(Math.hypot(W, UPPER) / 17.7, -1);
  });

  it('takes its feet for foundations where nothing below has them, and where both stand on the ground', () => {
    const apart = project([
      bay(wall(W, [[LOWER, 'crossed']]), { id: 'W1' }),
      bay(wall(W, [[UPPER, 'crossed']]), { id: 'W2', place: { origin: [W, 0, 0], turn: 0 } }),
      bay(wall(W, [[UPPER, 'crossed']]), { id: 'W3', place: { origin: [0, 9000, LOWER], turn: 0 } }),
    ]);
    const { layout } = assess(apart, CATALOGUES);
    for (const each of layout.bays) {
      const feet = each.nodes.flatMap((id) => layout.nodes.get(id)?.supports[each.id]?.kind ?? []);
      expect(feet, each.id).toEqual(['foundation', 'foundation']);
    }
  });

  it('brings its forces down through the bay below to the ground', () => {
    const stacked = assess(pushed(project(parted('crossed')), 'W2/L1'), CATALOGUES);
    const single = assess(pushed(project([whole('crossed')]), 'W/L2'), CATALOGUES);
    const forces = (of: typeof stacked) => of.forces?.states[0]?.forces;
    // Columns that run through in one bay bend a little with it; those of two bays meet in a hinge: 0.06 %.
    for (const [there, here] of [
      ['W1/t1.rise', 'W/t1.rise'],
      ['W2/t1.rise', 'W/t2.rise'],
    ] as const)
      expect((forces(stacked)?.get(there) ?? 0) / (forces(single)?.get(here) ?? 1)).toBeCloseTo(1, 2);
    // By hand: 50 kN along the beam, over 5 m, up a diagonal of √(5² + 3.5²): 61.0 kN.
    expect(forces(stacked)?.get('W1/t1.rise') ?? 0).toBeCloseTo((50_000 * Math.hypot(5, 3.5)) / 5, -3);
    for (const node of stacked.forces?.states[0]?.reactions.keys() ?? [])
      expect(stacked.layout.nodes.get(node)?.at[2]).toBe(0);
  });
});
