/**
 * Shapes other than a single angle that can be a diagonal. mm. In the section plane y runs in the plane of the bay and x out of it; the origin is the corner
 * where both are least, as the heel is of an angle.
 */

/** Outside dimensions of one angle of a pair. */
export interface AngleSizes {
  readonly longLeg: number;
  readonly shortLeg: number;
  readonly thickness: number;
  readonly rootRadius: number;
  readonly toeRadius: number;
}

export type BarShape =
  | { readonly kind: 'flat'; readonly width: number; readonly thickness: number }
  /** Round bar, threaded at its ends. */
  | { readonly kind: 'rod'; readonly diameter: number }
  | { readonly kind: 'round tube'; readonly diameter: number; readonly wall: number }
  | { readonly kind: 'square tube'; readonly side: number; readonly wall: number }
  /** Flange against the gusset, stem standing out. */
  | {
      readonly kind: 'tee';
      readonly width: number;
      readonly depth: number;
      readonly flange: number;
      readonly web: number;
    }
  /** Web against the gusset, flanges standing out. */
  | {
      readonly kind: 'channel';
      readonly depth: number;
      readonly width: number;
      readonly web: number;
      readonly flange: number;
    }
  /** A leg of each against either face of the gusset. */
  | { readonly kind: 'angles back to back'; readonly angle: AngleSizes; readonly gap: number }
  /** Heel to heel across the gusset. */
  | { readonly kind: 'starred angles'; readonly angle: AngleSizes; readonly gap: number };

/** Extent out of the plane and in it, mm. */
export function extentOf(shape: BarShape): readonly [number, number] {
  switch (shape.kind) {
    case 'flat':
      return [shape.thickness, shape.width];
    case 'rod':
    case 'round tube':
      return [shape.diameter, shape.diameter];
    case 'square tube':
      return [shape.side, shape.side];
    case 'tee':
      return [shape.depth, shape.width];
    case 'channel':
      return [shape.width, shape.depth];
    case 'angles back to back':
      return [2 * shape.angle.shortLeg + shape.gap, shape.angle.longLeg];
    case 'starred angles':
      return [2 * shape.angle.shortLeg + shape.gap, 2 * shape.angle.longLeg + shape.gap];
    default:
      return shape satisfies never;
  }
}

/** Whether the gusset goes through the middle of the shape, or lies against its face. */
export function isCentred({ kind }: Pick<BarShape, 'kind'>): boolean {
  return kind !== 'flat' && kind !== 'tee' && kind !== 'channel';
}

/** Of the parts that shape is made of, the thickness that holes go through. */
export function thicknessOf(shape: BarShape): number {
  switch (shape.kind) {
    case 'flat':
      return shape.thickness;
    case 'rod':
      return shape.diameter;
    case 'round tube':
    case 'square tube':
      return shape.wall;
    case 'tee':
      return shape.flange;
    case 'channel':
      return shape.web;
    case 'angles back to back':
    case 'starred angles':
      return shape.angle.thickness;
    default:
      return shape satisfies never;
  }
}
