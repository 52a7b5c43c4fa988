/** A bay is as slender wherever it stands, seen in a mirror, and named from its other end. */
import fc from 'fast-check';
import { describe, it } from 'vitest';
import { assess } from '../../core/assess.ts';
import type { Vec3 } from '../../core/geometry/vector.ts';
import type { BarMark, Bay, Join, Pattern, Recipe, Tier } from '../../core/project/model.ts';
import { project } from '../unit/assess/given/bays.ts';
import { CATALOGUES } from '../unit/assess/given/catalogues.ts';
import { type Frame, inSpace, type PlanarBay, planarBay, UPRIGHT } from './given/planarBay.ts';
import { anyProject } from './given/projects.ts';
import { runs } from './given/runs.ts';
import { expectSame } from './given/slendernesses.ts';

const of = (bay: Bay) => assess(project([bay]), CATALOGUES, 'by the marks');

/** A frame turned every way: two steps of Gram and Schmidt on three numbers each. */
const frame: fc.Arbitrary<Frame> = fc
  .tuple(
    fc.tuple(
      fc.integer({ min: -9, max: 9 }),
      fc.integer({ min: -9, max: 9 }),
      fc.integer({ min: -9, max: 9 }),
    ),
    fc.tuple(
      fc.integer({ min: -9, max: 9 }),
      fc.integer({ min: -9, max: 9 }),
      fc.integer({ min: -9, max: 9 }),
    ),
    fc.tuple(
      fc.integer({ min: -9000, max: 9000 }),
      fc.integer({ min: -9000, max: 9000 }),
      fc.integer({ min: -9000, max: 9000 }),
    ),
  )
  .filter(([a, b]) => Math.hypot(...crossOf(a, b)) > 0.5)
  .map(([a, b, origin]) => {
    const right = unitOf(a);
    const normal = unitOf(crossOf(a, b));
    return { origin, right, up: crossOf(normal, right), normal };
  });

function crossOf(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

function unitOf(a: Vec3): Vec3 {
  const l = Math.hypot(...a);
  return [a[0] / l, a[1] / l, a[2] / l];
}

describe('a bay drawn freely', () => {
  it('is as slender turned any way in space and moved', () => {
    fc.assert(
      fc.property(planarBay, frame, (planar, where) => {
        expectSame(of(inSpace(planar, UPRIGHT)), of(inSpace(planar, where)));
      }),
      runs(300),
    );
  });

  it('is as slender in a mirror', () => {
    fc.assert(
      fc.property(planarBay, (planar) => {
        const mirrored: PlanarBay = { ...planar, places: planar.places.map(([a, b]) => [-a, b]) };
        expectSame(of(inSpace(planar, UPRIGHT)), of(inSpace(mirrored, UPRIGHT)));
      }),
      runs(300),
    );
  });

  it('is as slender seen from behind', () => {
    fc.assert(
      fc.property(planarBay, (planar) => {
        const behind: Frame = { ...UPRIGHT, normal: [0, 1, 0] };
        expectSame(of(inSpace(planar, UPRIGHT)), of(inSpace(planar, behind)));
      }),
      runs(200),
    );
  });

  it('is as slender with every bar named from its other end', () => {
    fc.assert(
      fc.property(planarBay, (planar) => {
        const reversed: PlanarBay = {
          ...planar,
          bars: planar.bars.map((bar) => ({ ...bar, from: bar.to, to: bar.from })),
          marks: Object.fromEntries(
            Object.entries(planar.marks).map(([key, mark]) => [key, { endJ: mark.endI ?? {} }]),
          ),
        };
        expectSame(of(inSpace(planar, UPRIGHT)), of(inSpace(reversed, UPRIGHT)));
      }),
      runs(300),
    );
  });

  it('is as slender with its bars drawn in another order', () => {
    fc.assert(
      fc.property(planarBay, (planar) => {
        const other: PlanarBay = { ...planar, bars: [...planar.bars].reverse() };
        expectSame(of(inSpace(planar, UPRIGHT)), of(inSpace(other, UPRIGHT)));
      }),
      runs(200),
    );
  });
});

describe('bays made from a recipe', () => {
  it('are as slender turned about the upright and moved, one and all', () => {
    fc.assert(
      fc.property(
        anyProject,
        fc.constantFrom(90, 180, -90, 37, 300),
        fc.tuple(
          fc.integer({ min: -9000, max: 9000 }),
          fc.integer({ min: -9000, max: 9000 }),
          fc.integer({ min: -9000, max: 9000 }),
        ),
        (made, turn, shift) => {
          // Bays that touch keep touching only when they turn as one; here each stands alone.
          for (const bay of made.bays) {
            const alone = { ...made, bays: [bay] };
            const origin = bay.place.origin;
            const moved: Bay = {
              ...bay,
              place: {
                origin: [origin[0] + shift[0], origin[1] + shift[1], origin[2] + shift[2]],
                turn: Math.max(-360, Math.min(360, turn)),
              },
            };
            expectSame(
              assess(alone, CATALOGUES, 'by the marks'),
              assess({ ...made, bays: [moved] }, CATALOGUES, 'by the marks'),
            );
          }
        },
      ),
      runs(150),
    );
  });

  it('are as slender in a mirror, rising for falling', () => {
    fc.assert(
      fc.property(anyProject, (made) => {
        for (const bay of made.bays) {
          if (bay.recipe.kind === 'free' || bay.recipe.kind === 'knee') continue;
          const mirrored: Bay = {
            ...bay,
            recipe: mirroredRecipe(bay.recipe),
            bars: Object.fromEntries(
              Object.entries(bay.bars).map(([key, mark]) => [otherHand(key), mirroredMark(mark)]),
            ),
            joins: Object.fromEntries(
              Object.entries(bay.joins).map(([key, join]) => [
                key.split('+').map(otherHand).sort().join('+'),
                mirroredJoin(join),
              ]),
            ),
          };
          expectSame(
            assess({ ...made, bays: [bay] }, CATALOGUES, 'by the marks'),
            assess({ ...made, bays: [mirrored] }, CATALOGUES, 'by the marks'),
            otherHand,
          );
        }
      }),
      runs(200),
    );
  });
});

const HANDS: Readonly<Record<string, string>> = { rise: 'fall', fall: 'rise', left: 'right', right: 'left' };

/** "t1.rise" becomes "t1.fall"; what has no hand stays. */
function otherHand(key: string): string {
  const dot = key.lastIndexOf('.');
  const name = key.slice(dot + 1);
  return dot < 0 ? key : `${key.slice(0, dot)}.${HANDS[name] ?? name}`;
}

const mirroredPattern = (pattern: Pattern): Pattern =>
  pattern === 'rising' ? 'falling' : pattern === 'falling' ? 'rising' : pattern;
const mirroredTiers = (tiers: readonly Tier[]): readonly Tier[] =>
  tiers.map((tier) => ({ ...tier, pattern: mirroredPattern(tier.pattern) }));

function mirroredRecipe(recipe: Recipe): Recipe {
  if (recipe.kind === 'wall') return { ...recipe, tiers: mirroredTiers(recipe.tiers) };
  if (recipe.kind === 'roof')
    return {
      ...recipe,
      slopes: recipe.slopes.map((slope) => ({ ...slope, panels: mirroredTiers(slope.panels) })),
    };
  return recipe;
}

/** A roll turns the other way in a mirror. */
const mirroredMark = (mark: BarMark): BarMark =>
  mark.roll === undefined ? mark : { ...mark, roll: -mark.roll };
const mirroredJoin = (join: Join): Join =>
  join.kind === 'cut' ? { ...join, cutBar: otherHand(join.cutBar) } : join;
