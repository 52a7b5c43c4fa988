/** A bar and a crossing keep their names, and so their marks, while the bay around them changes. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layOut } from '../../core/layout/layOut.ts';
import type { Layout } from '../../core/layout/model.ts';
import type { Bay, Join, Pattern, RoofRecipe, Tier, WallRecipe } from '../../core/project/model.ts';
import { bay, line, project, roof, wall } from '../unit/assess/given/bays.ts';
import { stock } from '../unit/assess/given/catalogues.ts';
import { runs } from './given/runs.ts';

const pattern = fc.constantFrom<Pattern>('crossed', 'rising', 'falling', 'peaked', 'vee', 'open');
const height = fc.integer({ min: 2000, max: 6000 });
const tiers = fc.array(fc.tuple(height, pattern), { minLength: 1, maxLength: 4 });
const width = fc.integer({ min: 3000, max: 9000 });

const layoutOf = (made: Bay): Layout => layOut(project([made]), stock());

/** Every crossing of two diagonals marked, told apart by how: so that a mark that has wandered is seen. */
function marked(made: Bay): Bay {
  const kinds: readonly Join[] = [
    { kind: 'bolted' },
    { kind: 'welded' },
    { kind: 'packed', packer: 7 },
    { kind: 'none' },
  ];
  const joins: Record<string, Join> = {};
  for (const { key, kind } of layoutOf(made).crossings.values())
    joins[key] =
      kind === 'diagonals'
        ? (kinds[Object.keys(joins).length % kinds.length] ?? { kind: 'none' })
        : { kind: 'purlin', boltsAcross: Object.keys(joins).length % 2 === 0 ? 1 : 2 };
  return { ...made, joins };
}

/** Every crossing of the first layout that the second still has keeps its join; those named must all be there. */
function expectMarksKept(before: Layout, after: Layout, among: (key: string) => boolean): void {
  for (const [id, crossing] of before.crossings) {
    if (!among(crossing.key)) continue;
    expect(after.crossings.get(id)?.join, id).toEqual(crossing.join);
  }
  for (const [id, bar] of before.bars)
    if (bar.angle && among(bar.key)) expect(after.bars.has(id), id).toBe(true);
}

const withRecipe = (made: Bay, change: Partial<WallRecipe>): Bay => ({
  ...made,
  recipe: { ...(made.recipe as WallRecipe), ...change },
});

const LINES = [line('G1', 900), line('G2', 1800)];

describe('marks stay on their crossings', () => {
  it('when a wall bay is made wider or narrower', () => {
    fc.assert(
      fc.property(tiers, width, width, (all, first, second) => {
        const made = marked(bay(wall(first, all)));
        expectMarksKept(layoutOf(made), layoutOf(withRecipe(made, { width: second })), () => true);
      }),
      runs(100),
    );
  });

  it('when the tiers of a wall bay get other heights', () => {
    fc.assert(
      fc.property(tiers, fc.array(height, { minLength: 4, maxLength: 4 }), (all, heights) => {
        const made = marked(bay(wall(6000, all)));
        const changed = (made.recipe as WallRecipe).tiers.map(
          (tier, k): Tier => ({ ...tier, height: heights[k] ?? 3000 }),
        );
        expectMarksKept(layoutOf(made), layoutOf(withRecipe(made, { tiers: changed })), () => true);
      }),
      runs(100),
    );
  });

  it.each(['top', 'bottom'] as const)('of the other tiers when one is added at the %s', (place) => {
    fc.assert(
      fc.property(tiers, height, pattern, (all, high, which) => {
        const made = marked(bay(wall(6000, all, LINES)));
        const added: Tier = { id: 'extra', height: high, pattern: which };
        const before = (made.recipe as WallRecipe).tiers;
        const changed = place === 'top' ? [...before, added] : [added, ...before];
        // Rails stay at their height above the base, so under a new bottom tier they meet other bars.
        expectMarksKept(
          layoutOf(made),
          layoutOf(withRecipe(made, { tiers: changed })),
          (key) => place === 'top' || !key.includes('G'),
        );
      }),
      runs(100),
    );
  });

  it('of the other tiers when the pattern of one changes and changes back', () => {
    fc.assert(
      fc.property(tiers, pattern, (all, which) => {
        const made = marked(bay(wall(6000, all, LINES)));
        const before = (made.recipe as WallRecipe).tiers;
        const changed = before.map((tier, k): Tier => (k === 0 ? { ...tier, pattern: which } : tier));
        const other = withRecipe(made, { tiers: changed });
        expectMarksKept(layoutOf(made), layoutOf(other), (key) => !key.includes('t1'));
        expect(layoutOf(withRecipe(other, { tiers: before })).crossings).toEqual(layoutOf(made).crossings);
      }),
      runs(100),
    );
  });

  it('when the pitch, the width and the rafters of a roof bay change, and a panel is added at the ridge', () => {
    fc.assert(
      fc.property(tiers, width, fc.constantFrom(2, 8, 30), (panels, wide, pitch) => {
        const made = marked(
          bay(roof(6000, 8, panels, [line('P1', 700), line('P2', 1400)], [line('P3', 700)])),
        );
        const recipe = made.recipe as RoofRecipe;
        const changed: Bay = {
          ...made,
          recipe: {
            ...recipe,
            width: wide,
            rafters: { ...recipe.rafters, depth: 500 },
            slopes: recipe.slopes.map((slope) => ({
              ...slope,
              pitch,
              panels: [...slope.panels, { id: 'extra', height: 3000, pattern: 'crossed' as const }],
            })),
          },
        };
        expectMarksKept(layoutOf(made), layoutOf(changed), () => true);
      }),
      runs(60),
    );
  });

  it('whatever other bays the project has, before it or after', () => {
    const made = marked(
      bay(
        wall(6000, [
          [4000, 'crossed'],
          [3000, 'crossed'],
        ]),
      ),
    );
    const other = bay(wall(5000, [[3000, 'crossed']]), { id: 'A', place: { origin: [0, 9000, 0], turn: 0 } });
    const alone = layoutOf(made);
    const among = layOut(project([other, made]), stock());
    for (const [id, crossing] of alone.crossings) expect(among.crossings.get(id)).toEqual(crossing);
  });
});
