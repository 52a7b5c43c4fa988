import type { Vec3 } from '../geometry/vector.ts';
import type { Bay, Place } from '../project/model.ts';
import { freeSketch } from './recipes/free.ts';
import { kneeSketch } from './recipes/knee.ts';
import { roofSketch } from './recipes/roof.ts';
import { wallSketch } from './recipes/wall.ts';
import type { BaySketch } from './sketch.ts';

/** The bay in global coordinates: turned about the upright, then moved. */
export function placedSketch(bay: Bay): BaySketch {
  const sketch = sketchOf(bay);
  const { origin, turn } = bay.place;
  if (turn === 0 && origin[0] === 0 && origin[1] === 0 && origin[2] === 0) return sketch;
  const direction = turning(bay.place);
  const point = (p: Vec3): Vec3 => {
    const [x, y, z] = direction(p);
    return [x + origin[0], y + origin[1], z + origin[2]];
  };
  return {
    planes: sketch.planes.map((plane) => ({
      id: plane.id,
      origin: point(plane.origin),
      right: direction(plane.right),
      up: direction(plane.up),
      normal: direction(plane.normal),
    })),
    nodes: sketch.nodes.map((node) => ({ ...node, at: point(node.at) })),
    bars: sketch.bars.map((bar) => ({ ...bar, offset: direction(bar.offset) })),
    dimensions: sketch.dimensions.map((line) => ({
      from: point(line.from),
      to: point(line.to),
      away: direction(line.away),
      value: line.value,
    })),
  };
}

function sketchOf(bay: Bay): BaySketch {
  const { recipe } = bay;
  switch (recipe.kind) {
    case 'wall':
      return wallSketch(recipe);
    case 'roof':
      return roofSketch(recipe);
    case 'knee':
      return kneeSketch(recipe);
    case 'free':
      return freeSketch(recipe);
    default:
      return recipe satisfies never;
  }
}

function turning(place: Place): (v: Vec3) => Vec3 {
  // Quarter turns are exact, so that bays meet without rounding.
  const quarter = place.turn / 90;
  const exact = Number.isInteger(quarter);
  const angle = (place.turn * Math.PI) / 180;
  const c = exact ? ([1, 0, -1, 0][((quarter % 4) + 4) % 4] ?? 1) : Math.cos(angle);
  const s = exact ? ([0, 1, 0, -1][((quarter % 4) + 4) % 4] ?? 0) : Math.sin(angle);
  return ([x, y, z]) => [c * x - s * y, s * x + c * y, z];
}
