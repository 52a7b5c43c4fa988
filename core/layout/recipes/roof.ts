import { along, type Vec3 } from '../../geometry/vector.ts';
import type { RoofRecipe, Slope } from '../../project/model.ts';
import type { DimensionLine, Plane } from '../model.ts';
import { type BaySketch, memberBar, NEAR, type SketchBar, type SketchNode } from '../sketch.ts';
import { tierDiagonals } from './tier.ts';
import { hasMiddle, levelsOf } from './wall.ts';

/** Seen from above, so the far side is underneath; a single face means hanging under the gusset, clear of the purlins. */
const UNDER = { opposite: 'far', sameSide: 'far' } as const;
const FACES = { first: UNDER, second: { opposite: 'near', sameSide: 'far' } } as const;

/** Rafters 1 and 2 across the width along the bay's own X, eaves of the first slope at the origin, rising along Y; the second slope comes back down from the ridge. */
export function roofSketch(recipe: RoofRecipe): BaySketch {
  const [first, second] = recipe.slopes;
  if (!first) throw new Error('a roof bay without a slope');
  const firstPlane = planeOf(first, [0, 0, 0], [1, 0, 0], [0, 1, 0]);
  const parts = [slopeSketch(recipe, first, firstPlane)];
  if (second) {
    const ridge = along([0, 0, 0], firstPlane.up, lengthOf(first));
    const rise = lengthOf(second) * Math.sin(radians(second.pitch));
    const run = lengthOf(second) * Math.cos(radians(second.pitch));
    const eaves: Vec3 = [recipe.width, ridge[1] + run, ridge[2] - rise];
    parts.push(slopeSketch(recipe, second, planeOf(second, eaves, [-1, 0, 0], [0, -1, 0])));
  }
  return {
    planes: parts.flatMap((part) => part.planes),
    nodes: parts.flatMap((part) => part.nodes),
    bars: parts.flatMap((part) => part.bars),
    dimensions: parts.flatMap((part) => part.dimensions),
  };
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;
const lengthOf = (slope: Slope): number => slope.panels.reduce((sum, panel) => sum + panel.height, 0);

function planeOf(slope: Slope, origin: Vec3, right: Vec3, inwards: Vec3): Plane {
  const c = Math.cos(radians(slope.pitch));
  const s = Math.sin(radians(slope.pitch));
  return {
    id: slope.id,
    origin,
    right,
    up: [inwards[0] * c, inwards[1] * c, s],
    normal: [-inwards[0] * s, -inwards[1] * s, c],
  };
}

function slopeSketch(recipe: RoofRecipe, slope: Slope, plane: Plane): BaySketch {
  const { width } = recipe;
  const levels = levelsOf(slope.panels);
  const top = levels.length - 1;
  const twoSlopes = recipe.slopes.length > 1;
  const at = (x: number, s: number): Vec3 => along(along(plane.origin, plane.right, x), plane.up, s);
  const key = (name: string) => `${slope.id}.${name}`;
  // Rafter 1 stands at the bay's own X = 0 on both slopes.
  const [leftRafter, rightRafter] = plane.right[0] > 0 ? ['1', '2'] : ['2', '1'];
  const nodes: SketchNode[] = [];
  const bars: SketchBar[] = [];

  levels.forEach((s, level) => {
    const where =
      level === 0 ? 'at the eaves' : level === top && twoSlopes ? 'at the ridge' : `panel point ${level}`;
    const support = level === 0 ? ({ kind: 'eaves' } as const) : null;
    nodes.push({ key: key(`L${level}`), at: at(0, s), label: `rafter ${leftRafter}, ${where}`, support });
    nodes.push({
      key: key(`R${level}`),
      at: at(width, s),
      label: `rafter ${rightRafter}, ${where}`,
      support,
    });
    const middle = hasMiddle(slope.panels, level);
    if (middle)
      nodes.push({ key: key(`M${level}`), at: at(width / 2, s), label: `middle, ${where}`, support });
    // The ridge strut belongs to the first slope alone.
    const wanted =
      level === 0
        ? recipe.eavesStrut
        : level === top
          ? recipe.ridgeStrut && (!twoSlopes || slope === recipe.slopes[0])
          : true;
    if (!wanted) return;
    const strut = (name: string, i: string, j: string) =>
      bars.push(memberBar(key(name), 'strut', [key(i), key(j)], plane.id, recipe.struts));
    if (middle) {
      strut(`strut${level}-left`, `L${level}`, `M${level}`);
      strut(`strut${level}-right`, `M${level}`, `R${level}`);
    } else strut(`strut${level}`, `L${level}`, `R${level}`);
  });

  slope.panels.forEach((panel, index) => {
    const [lower, upper] = [index, index + 1];
    const rafter = (side: 'left' | 'right', letter: 'L' | 'R') =>
      bars.push(
        memberBar(
          key(`${panel.id}.rafter-${side}`),
          'rafter',
          [key(`${letter}${lower}`), key(`${letter}${upper}`)],
          plane.id,
          recipe.rafters,
        ),
      );
    rafter('left', 'L');
    rafter('right', 'R');
    bars.push(
      ...tierDiagonals(
        key(panel.id),
        panel.pattern,
        {
          lowerLeft: key(`L${lower}`),
          lowerRight: key(`R${lower}`),
          upperLeft: key(`L${upper}`),
          upperRight: key(`R${upper}`),
          lowerMiddle: key(`M${lower}`),
          upperMiddle: key(`M${upper}`),
        },
        plane.id,
        FACES,
      ),
    );
  });

  // Purlins sit on the rafters.
  const above = recipe.rafters.depth / 2 + recipe.purlin.depth / 2;
  const offset: Vec3 = [plane.normal[0] * above, plane.normal[1] * above, plane.normal[2] * above];
  for (const line of slope.lines) {
    nodes.push({
      key: `${line.id}.L`,
      at: at(0, line.at),
      label: `${line.id} over rafter ${leftRafter}`,
      support: null,
    });
    nodes.push({
      key: `${line.id}.R`,
      at: at(width, line.at),
      label: `${line.id} over rafter ${rightRafter}`,
      support: null,
    });
    bars.push({
      key: line.id,
      role: 'purlin',
      i: `${line.id}.L`,
      j: `${line.id}.R`,
      plane: plane.id,
      member: recipe.purlin,
      offset,
      line: { id: line.id, heldBy: line.heldBy },
      face: NEAR,
    });
  }

  const left: Vec3 = [-plane.right[0], -plane.right[1], -plane.right[2]];
  const down: Vec3 = [-plane.up[0], -plane.up[1], -plane.up[2]];
  const panels = slope.panels.map(
    (panel, index): DimensionLine => ({
      from: at(0, levels[index] ?? 0),
      to: at(0, levels[index + 1] ?? 0),
      away: left,
      value: panel.height,
    }),
  );
  return {
    planes: [plane],
    nodes,
    bars,
    dimensions: [{ from: at(0, 0), to: at(width, 0), away: down, value: width }, ...panels],
  };
}
