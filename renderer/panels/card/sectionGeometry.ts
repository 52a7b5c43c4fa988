/** The angle in place, seen from end i along the bar, as points of a picture: right and up, mm from the centroid. */

import type { StockAngle } from '../../../core/catalogue/model.ts';
import { cross, dot, scale, subtract, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import { outlinePolygon } from '../../../core/section/outlinePath.ts';
import { hollowOf } from '../../../core/section/shapePolygon.ts';

export interface SeenSection {
  /** Outline of the angle. */
  readonly outline: readonly Vec2[];
  /** What a tube leaves empty inside; null for what is solid. */
  readonly hollow: readonly Vec2[] | null;
  /** Directions of the axes x, y, u, v in the picture, unit length. */
  readonly axes: Readonly<Record<'x' | 'y' | 'u' | 'v', Vec2>>;
  /** Unit vectors of "in plane, across the bar" and "out of plane" in the picture. */
  readonly inPlane: Vec2;
  readonly outOfPlane: Vec2;
  /** Centre line of the plane of the gusset: its distance from the centroid along `outOfPlane`, mm. */
  readonly gussetAt: number;
  /** A direction of the section plane, [along x, along y], in the picture. */
  inPicture(direction: Vec2): Vec2;
}

const STEPS_PER_ARC = 6;

export function seenSection(bar: Bar, angle: AngleBar, stock: StockAngle): SeenSection {
  const { placement } = angle;
  const { centroidX, centroidY, alpha } = stock.properties;
  const frame = pictureFrame(bar, angle);
  const flat = (v: Vec3): Vec2 => [dot(v, frame.right), dot(v, frame.up)];
  const inPicture = ([x, y]: Vec2): Vec2 => flat(mixed(placement.x, x, placement.y, y));
  const heelToCentroid = mixed(placement.x, centroidX, placement.y, centroidY);
  const centroid = subtract(placement.heel, scale(heelToCentroid, -1));
  const fromCentroid = ([x, y]: Vec2): Vec2 => inPicture([x - centroidX, y - centroidY]);
  const { shape } = stock.outline;
  return {
    outline: outlinePolygon(stock.outline, STEPS_PER_ARC).map(fromCentroid),
    hollow: (shape && hollowOf(shape)?.map(fromCentroid)) ?? null,
    axes: {
      x: inPicture([1, 0]),
      y: inPicture([0, 1]),
      u: inPicture([Math.cos(alpha), Math.sin(alpha)]),
      v: inPicture([-Math.sin(alpha), Math.cos(alpha)]),
    },
    inPlane: flat(placement.inPlane),
    outOfPlane: flat(placement.outOfPlane),
    gussetAt: -dot(centroid, placement.outOfPlane),
    inPicture,
  };
}

/** The outline of a partner beside this one, each at its own distance from the gusset, mm from this centroid. */
export function seenPartner(
  bar: Bar,
  angle: AngleBar,
  stock: StockAngle,
  other: Bar,
): readonly Vec2[] | null {
  const partner = other.angle;
  if (partner?.stock == null) return null;
  const mine = seenSection(bar, angle, stock);
  const { placement } = partner;
  const { outOfPlane, inPlane } = placement;
  // The partner runs another way; it is drawn by how far it stands off the gusset and how it lies in the plane.
  const planesApart = dot(subtract(other.from, bar.from), angle.placement.outOfPlane);
  const sameSide = dot(outOfPlane, angle.placement.outOfPlane) < 0 ? -1 : 1;
  const points = outlinePolygon(partner.stock.outline, STEPS_PER_ARC).map(([x, y]): Vec2 => {
    const at = subtract(placement.heel, scale(mixed(placement.x, x, placement.y, y), -1));
    return [planesApart + dot(at, outOfPlane) * sameSide, dot(at, inPlane)];
  });
  const heights = points.map(([, along]) => along);
  const middle = (Math.max(...heights) + Math.min(...heights)) / 2;
  const flip = partner.spec.heel === angle.spec.heel ? heelSign(partner) * heelSign(angle) : 1;
  return points.map(([off, along]): Vec2 => {
    const o = mine.gussetAt + off;
    const p = (along - middle) * flip;
    return [mine.outOfPlane[0] * o + mine.inPlane[0] * p, mine.outOfPlane[1] * o + mine.inPlane[1] * p];
  });
}

interface PictureFrame {
  readonly right: Vec3;
  readonly up: Vec3;
}

/** A wall is seen with its plane upright, a roof with its slope level. */
function pictureFrame(bar: Bar, angle: AngleBar): PictureFrame {
  const { inPlane, outOfPlane } = angle.placement;
  const along = Math.abs(outOfPlane[2]) > Math.abs(inPlane[2]) ? outOfPlane : inPlane;
  const up = along[2] < 0 ? scale(along, -1) : along;
  return { right: cross(bar.direction, up), up };
}

function heelSign({ placement }: AngleBar): 1 | -1 {
  const leg =
    Math.abs(dot(placement.y, placement.inPlane)) > Math.abs(dot(placement.x, placement.inPlane))
      ? placement.y
      : placement.x;
  return dot(leg, placement.inPlane) < 0 ? -1 : 1;
}

function mixed(a: Vec3, ka: number, b: Vec3, kb: number): Vec3 {
  return [a[0] * ka + b[0] * kb, a[1] * ka + b[1] * kb, a[2] * ka + b[2] * kb];
}
