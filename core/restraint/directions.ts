/** Directions in the section plane, as undirected unit vectors: d and −d are the same hold. */
import { dot2, type Vec2 } from '../geometry/vector.ts';
import type { Held } from './model.ts';

/** Directions within 10° of each other count as one (METHODS.md, "The free-direction rule"). */
const ONE_DIRECTION = Math.cos((10 * Math.PI) / 180);

export const sameDirection = (a: Vec2, b: Vec2): boolean => Math.abs(dot2(a, b)) >= ONE_DIRECTION;

/** The unit vector square to d. */
export const squareTo = (d: Vec2): Vec2 => [-d[1], d[0]];

/** What several holds at one station hold together. */
export function heldBy(vectors: readonly Vec2[]): Held {
  const [first] = vectors;
  if (!first) return { ways: 0 };
  return vectors.every((vector) => sameDirection(first, vector))
    ? { ways: 1, direction: first }
    : { ways: 2 };
}

/** Different single directions among the stations, one for each group within 10°. */
export function distinctDirections(held: readonly Held[]): readonly Vec2[] {
  const found: Vec2[] = [];
  for (const each of held)
    if (each.ways === 1 && !found.some((known) => sameDirection(known, each.direction)))
      found.push(each.direction);
  return found;
}
