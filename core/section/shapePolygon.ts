import type { Vec2 } from '../geometry/vector.ts';
import { type BarShape, extentOf } from './barShape.ts';
import type { AngleOutline } from './model.ts';

/** A shape as one closed run of straight pieces for drawing, anticlockwise; tubes solid (see `hollowOf`), the two angles of a pair joined by the gap's width. */
export function shapePolygon(
  shape: BarShape,
  angleOf: (outline: AngleOutline) => readonly Vec2[],
): readonly Vec2[] {
  const [wide, high] = extentOf(shape);
  switch (shape.kind) {
    case 'flat':
    case 'square tube':
      return [
        [0, 0],
        [wide, 0],
        [wide, high],
        [0, high],
      ];
    case 'rod':
    case 'round tube':
      return Array.from({ length: 24 }, (_, k): Vec2 => {
        const turn = (2 * Math.PI * k) / 24;
        return [(wide / 2) * (1 + Math.cos(turn)), (high / 2) * (1 + Math.sin(turn))];
      });
    case 'tee': {
      const { flange: f, web: w } = shape;
      const [a, b] = [(high - w) / 2, (high + w) / 2];
      return [
        [0, 0],
        [f, 0],
        [f, a],
        [wide, a],
        [wide, b],
        [f, b],
        [f, high],
        [0, high],
      ];
    }
    case 'channel': {
      const { web: w, flange: f } = shape;
      return [
        [0, 0],
        [wide, 0],
        [wide, f],
        [w, f],
        [w, high - f],
        [wide, high - f],
        [wide, high],
        [0, high],
      ];
    }
    case 'angles back to back': {
      const { angle, gap } = shape;
      const right = angleOf(angle).map(([x, y]): Vec2 => [wide / 2 + gap / 2 + x, y]);
      const left = angleOf(angle).map(([x, y]): Vec2 => [wide / 2 - gap / 2 - x, y]);
      // Round the right one from its heel, then round the left one the other way: the seam between the heels has no width.
      return [...right, ...left.toReversed()];
    }
    case 'starred angles': {
      const { angle, gap } = shape;
      const upper = angleOf(angle).map(([x, y]): Vec2 => [wide / 2 + gap / 2 + x, high / 2 + gap / 2 + y]);
      const lower = angleOf(angle).map(([x, y]): Vec2 => [wide / 2 - gap / 2 - x, high / 2 - gap / 2 - y]);
      return [...upper, ...lower];
    }
    default:
      return shape satisfies never;
  }
}

/** What a tube leaves empty inside, as a closed run; null for what is solid. */
export function hollowOf(shape: BarShape): readonly Vec2[] | null {
  if (shape.kind !== 'round tube' && shape.kind !== 'square tube') return null;
  const [wide] = extentOf(shape);
  const shrunk = 1 - (2 * shape.wall) / wide;
  const middle = wide / 2;
  return shapePolygon(shape, () => []).map(
    ([x, y]): Vec2 => [middle + (x - middle) * shrunk, middle + (y - middle) * shrunk],
  );
}
