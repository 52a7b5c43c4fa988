import type { Vec3 } from '../../geometry/vector.ts';
import type { KneeRecipe } from '../../project/model.ts';
import type { DimensionLine, Plane } from '../model.ts';
import { type BaySketch, diagonalBar, memberBar, NEAR, type SketchBar, type SketchNode } from '../sketch.ts';

/** The chord runs along the bay's own X; purlins cross above it along Y; each knee stands in a plane across the chord. */
export function kneeSketch(recipe: KneeRecipe): BaySketch {
  const reach = recipe.drop / Math.tan((recipe.angle * Math.PI) / 180);
  const last = recipe.spacing * (recipe.count - 1);
  // The chord runs half a spacing past the outer knees, or it would end in the air at a single knee.
  const overrun = recipe.spacing / 2;
  const chordPlane: Plane = {
    id: 'chord',
    origin: [0, 0, 0],
    right: [1, 0, 0],
    up: [0, 0, 1],
    normal: [0, -1, 0],
  };
  const planes: Plane[] = [chordPlane];
  const nodes: SketchNode[] = [
    { key: 'start', at: [-overrun, 0, 0], label: 'start of the chord', support: { kind: 'vouched' } },
    { key: 'end', at: [last + overrun, 0, 0], label: 'end of the chord', support: { kind: 'vouched' } },
  ];
  const bars: SketchBar[] = [];
  let before = 'start';

  for (let index = 0; index < recipe.count; index++) {
    const id = `k${index + 1}`;
    const x = index * recipe.spacing;
    const plane: Plane = { id, origin: [x, 0, 0], right: [0, 1, 0], up: [0, 0, 1], normal: [1, 0, 0] };
    planes.push(plane);
    const purlin = (y: number): Vec3 => [x, y, recipe.drop];
    nodes.push({
      key: `${id}.chord`,
      at: [x, 0, 0],
      label: `chord at knee ${index + 1}`,
      support: { kind: 'vouched' },
    });
    nodes.push({
      key: `${id}.a`,
      at: purlin(reach),
      label: `purlin ${index + 1}, first side`,
      support: { kind: 'vouched' },
    });
    const purlinEnd = recipe.sides === 'both' ? `${id}.b` : `${id}.over`;
    nodes.push({
      key: purlinEnd,
      at: purlin(recipe.sides === 'both' ? -reach : 0),
      label:
        recipe.sides === 'both' ? `purlin ${index + 1}, second side` : `purlin ${index + 1} over the chord`,
      support: { kind: 'vouched' },
    });
    bars.push(memberBar(`${id}.chord`, 'chord', [before, `${id}.chord`], chordPlane.id, recipe.chord));
    before = `${id}.chord`;
    bars.push(
      memberBar(`${id}.purlin`, 'purlin', [purlinEnd, `${id}.a`], id, recipe.purlin, [
        0,
        0,
        recipe.purlin.depth / 2,
      ]),
    );
    bars.push(diagonalBar(`${id}.knee-a`, 'knee', [`${id}.chord`, `${id}.a`], id, NEAR));
    if (recipe.sides === 'both')
      bars.push(diagonalBar(`${id}.knee-b`, 'knee', [`${id}.chord`, `${id}.b`], id, NEAR));
  }
  bars.push(memberBar('end.chord', 'chord', [before, 'end'], chordPlane.id, recipe.chord));

  const dimensions: DimensionLine[] = [
    { from: [0, 0, 0], to: [0, 0, recipe.drop], away: [-1, 0, 0], value: recipe.drop },
  ];
  if (recipe.count > 1)
    dimensions.push({ from: [0, 0, 0], to: [recipe.spacing, 0, 0], away: [0, 0, -1], value: recipe.spacing });
  return { planes, nodes, bars, dimensions };
}
