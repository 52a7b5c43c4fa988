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
  return areOneDirection(vectors) ? { ways: 1, direction: first } : { ways: 2 };
}

/** Sine up to which two directions are the very same but for rounding. */
const ROUNDING = 1e-12;

const verySame = (a: Vec2, b: Vec2): boolean => Math.abs(a[0] * b[1] - a[1] * b[0]) <= ROUNDING;

/** Every single direction among the stations, each once, however near some of them lie to each other. */
export function singleDirections(held: readonly Held[]): readonly Vec2[] {
  const found: Vec2[] = [];
  for (const each of held)
    if (each.ways === 1 && !found.some((known) => verySame(known, each.direction)))
      found.push(each.direction);
  return found;
}

/** Whether all lie within 10° of each other. To be near a common one is not enough: −8°, 0° and 8° hold two ways. */
export const areOneDirection = (directions: readonly Vec2[]): boolean =>
  directions.every((one, k) => directions.slice(k + 1).every((other) => sameDirection(one, other)));
