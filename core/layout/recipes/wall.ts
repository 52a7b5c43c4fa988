import type { Vec3 } from '../../geometry/vector.ts';
import type { Tier, WallRecipe } from '../../project/model.ts';
import type { DimensionLine, Plane } from '../model.ts';
import { type BaySketch, memberBar, NEAR, type SketchBar, type SketchNode } from '../sketch.ts';
import { tierDiagonals } from './tier.ts';

const RIGHT: Vec3 = [1, 0, 0];
const UP: Vec3 = [0, 0, 1];
const LEFT: Vec3 = [-1, 0, 0];
const DOWN: Vec3 = [0, 0, -1];
/** A wall is seen from the side its normal points to. */
const OUT: Vec3 = [0, -1, 0];
const FACES = {
  first: { opposite: 'far', sameSide: 'near' },
  second: NEAR,
} as const;

/** Columns left and right, a beam at the head of every tier; origin at the left foot, width along the bay's own X. */
export function wallSketch(recipe: WallRecipe): BaySketch {
  const { width, tiers } = recipe;
  const plane: Plane = { id: 'wall', origin: [0, 0, 0], right: RIGHT, up: UP, normal: OUT };
  const levels = levelsOf(tiers);
  const nodes: SketchNode[] = [];
  const bars: SketchBar[] = [];

  levels.forEach((z, level) => {
    const foot = level === 0;
    const where = foot ? 'foot' : `head of tier ${level}`;
    const support = foot ? ({ kind: 'foundation' } as const) : null;
    nodes.push({ key: `L${level}`, at: [0, 0, z], label: `left ${where}`, support });
    nodes.push({ key: `R${level}`, at: [width, 0, z], label: `right ${where}`, support });
    if (hasMiddle(tiers, level))
      nodes.push({ key: `M${level}`, at: [width / 2, 0, z], label: `middle, ${where}`, support });
  });

  tiers.forEach((tier, index) => {
    const [lower, upper] = [index, index + 1];
    bars.push(
      memberBar(`${tier.id}.column-left`, 'column', [`L${lower}`, `L${upper}`], plane.id, recipe.columns),
    );
    bars.push(
      memberBar(`${tier.id}.column-right`, 'column', [`R${lower}`, `R${upper}`], plane.id, recipe.columns),
    );
    if (hasMiddle(tiers, upper)) {
      bars.push(
        memberBar(`${tier.id}.beam-left`, 'beam', [`L${upper}`, `M${upper}`], plane.id, recipe.beams),
      );
      bars.push(
        memberBar(`${tier.id}.beam-right`, 'beam', [`M${upper}`, `R${upper}`], plane.id, recipe.beams),
      );
    } else
      bars.push(memberBar(`${tier.id}.beam`, 'beam', [`L${upper}`, `R${upper}`], plane.id, recipe.beams));
    bars.push(
      ...tierDiagonals(
        tier.id,
        tier.pattern,
        {
          lowerLeft: `L${lower}`,
          lowerRight: `R${lower}`,
          upperLeft: `L${upper}`,
          upperRight: `R${upper}`,
          lowerMiddle: `M${lower}`,
          upperMiddle: `M${upper}`,
        },
        plane.id,
        FACES,
      ),
    );
  });

  // Rails sit on the outer face of the columns.
  const outwards = recipe.columns.depth / 2 + recipe.lineMember.depth / 2;
  for (const line of recipe.lines) {
    nodes.push({
      key: `${line.id}.L`,
      at: [0, 0, line.at],
      label: `${line.id} at the left column`,
      support: null,
    });
    nodes.push({
      key: `${line.id}.R`,
      at: [width, 0, line.at],
      label: `${line.id} at the right column`,
      support: null,
    });
    bars.push({
      key: line.id,
      role: 'rail',
      i: `${line.id}.L`,
      j: `${line.id}.R`,
      plane: plane.id,
      member: recipe.lineMember,
      offset: [0, -outwards, 0],
      line: { id: line.id, heldBy: line.heldBy },
      face: NEAR,
    });
  }

  const heights = tiers.map(
    (tier, index): DimensionLine => ({
      from: [0, 0, levels[index] ?? 0],
      to: [0, 0, levels[index + 1] ?? 0],
      away: LEFT,
      value: tier.height,
    }),
  );
  const across: DimensionLine = { from: [0, 0, 0], to: [width, 0, 0], away: DOWN, value: width };
  return { planes: [plane], nodes, bars, dimensions: [across, ...heights] };
}

/** Distance of each level from the start: one more than there are tiers. */
export function levelsOf(tiers: readonly Tier[]): readonly number[] {
  const levels = [0];
  let sum = 0;
  for (const tier of tiers) {
    sum += tier.height;
    levels.push(sum);
  }
  return levels;
}

/** Whether diagonals meet the middle of the member at a level: peaked below it, or vee above it. */
export function hasMiddle(tiers: readonly Tier[], level: number): boolean {
  return tiers[level - 1]?.pattern === 'peaked' || tiers[level]?.pattern === 'vee';
}
