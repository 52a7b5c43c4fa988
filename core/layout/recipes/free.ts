import { cross, dot, length, scale, subtract, unit, type Vec3 } from '../../geometry/vector.ts';
import type { FreeNode, FreeRecipe } from '../../project/model.ts';
import type { Plane } from '../model.ts';
import { type BaySketch, diagonalBar, memberBar, type SketchBar } from '../sketch.ts';

const ALTERNATE = [
  { opposite: 'far', sameSide: 'near' },
  { opposite: 'near', sameSide: 'near' },
] as const;

/** Nodes and bars as given. The bay has one plane: its normal as given, or of the plane that fits the nodes best. */
export function freeSketch(recipe: FreeRecipe): BaySketch {
  const plane = planeOf(recipe);
  let diagonals = 0;
  const bars = recipe.bars.map((bar): SketchBar => {
    const ends = [bar.from, bar.to] as const;
    if (bar.role === 'diagonal' || bar.role === 'knee' || bar.role === 'tie')
      return diagonalBar(bar.id, bar.role, ends, plane.id, ALTERNATE[diagonals++ % 2] ?? ALTERNATE[0]);
    return memberBar(bar.id, bar.role, ends, plane.id, bar.member);
  });
  return {
    planes: [plane],
    nodes: recipe.nodes.map((node) => ({
      key: node.id,
      at: node.at,
      label: `node ${node.id}`,
      support: node.support ? { kind: 'vouched' } : null,
    })),
    bars,
    dimensions: [],
  };
}

function planeOf(recipe: FreeRecipe): Plane {
  const normal = recipe.normal ? unit(recipe.normal) : bestNormal(recipe);
  const upright: Vec3 = [0, 0, 1];
  const across = cross(upright, normal);
  // A level plane has no upright in it: its "up" is the Y of plans.
  const right = length(across) > 1e-6 ? unit(across) : ([1, 0, 0] as Vec3);
  return { id: 'free', origin: recipe.nodes[0]?.at ?? [0, 0, 0], right, up: cross(normal, right), normal };
}

/** Normal of the largest triangle among bar pairs; of a bay whose bars are all parallel, the level normal of the upright plane through them. */
function bestNormal(recipe: FreeRecipe): Vec3 {
  const at = new Map(recipe.nodes.map((node: FreeNode) => [node.id, node.at]));
  const directions = recipe.bars.flatMap((bar) => {
    const [a, b] = [at.get(bar.from), at.get(bar.to)];
    return a && b ? [subtract(b, a)] : [];
  });
  const first = directions[0];
  if (!first) return [0, -1, 0];
  let best: Vec3 = [0, 0, 0];
  for (const other of directions) {
    const area = cross(first, other);
    if (length(area) > length(best)) best = area;
  }
  if (length(best) < 1e-9 * dot(first, first)) {
    const level = cross(first, [0, 0, 1]);
    best = length(level) > 1e-9 * length(first) ? level : [0, -1, 0];
  }
  const normal = unit(best);
  // Of the two normals take the one that looks towards −Y, or up for a level plane, so that "near" is where one stands.
  const towards =
    Math.abs(normal[1]) > 1e-6 ? -normal[1] : Math.abs(normal[2]) > 1e-6 ? normal[2] : -normal[0];
  return towards < 0 ? scale(normal, -1) : normal;
}
