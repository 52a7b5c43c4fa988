import { ShapeUtils, Vector2 } from 'three';
import type { Vec2 } from '../../../core/geometry/vector.ts';

/**
 * The end of a prism cut into triangles.
 *
 * @param outline anticlockwise, need not be convex
 * @param reversed whether the end's corners run the other way round, as they do at the end seen from behind
 * @returns indices into the end's corners, three for each triangle, anticlockwise as the corners are seen
 */
export function capTriangles(outline: readonly Vec2[], reversed: boolean): readonly number[] {
  const cut = triangulated.get(outline) ?? triangulate(outline);
  triangulated.set(outline, cut);
  return reversed ? cut.behind : cut.front;
}

interface Cut {
  readonly front: readonly number[];
  readonly behind: readonly number[];
}

/** Outlines cut so far; bars of one section share theirs. */
const triangulated = new WeakMap<readonly Vec2[], Cut>();

function triangulate(outline: readonly Vec2[]): Cut {
  const triangles = ShapeUtils.triangulateShape(
    outline.map(([x, y]) => new Vector2(x, y)),
    [],
  ).map((triangle) => anticlockwise(outline, triangle));
  const last = outline.length - 1;
  return {
    front: triangles.flat(),
    behind: triangles.flatMap(([a, b, c]) => [last - a, last - c, last - b]),
  };
}

function anticlockwise(
  outline: readonly Vec2[],
  triangle: readonly number[],
): readonly [number, number, number] {
  const [a = 0, b = 0, c = 0] = triangle;
  const [p, q, r] = [outline[a], outline[b], outline[c]];
  if (!p || !q || !r) return [a, b, c];
  const twiceArea = (q[0] - p[0]) * (r[1] - p[1]) - (q[1] - p[1]) * (r[0] - p[0]);
  return twiceArea < 0 ? [a, c, b] : [a, b, c];
}
