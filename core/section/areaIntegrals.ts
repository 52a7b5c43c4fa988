/** Areas and moments of plane outlines made of straight lines and circular arcs, by Green's theorem: exact, no grid and no facets. */
import type { Vec2 } from '../geometry/vector.ts';

/** One piece of an outline, mm. `sweep` of an arc in rad, positive anticlockwise. */
export type Segment =
  | { readonly kind: 'line'; readonly from: Vec2; readonly to: Vec2 }
  | {
      readonly kind: 'arc';
      readonly from: Vec2;
      readonly to: Vec2;
      readonly centre: Vec2;
      readonly radius: number;
      /** Direction from the centre to `from`, rad from the first coordinate. */
      readonly start: number;
      readonly sweep: number;
    };

/** ∫ over the area, about the origin of the coordinates: mm², mm³, mm⁴. */
export interface AreaIntegrals {
  readonly area: number;
  /** ∫x dA. */
  readonly x: number;
  /** ∫y dA. */
  readonly y: number;
  readonly xx: number;
  readonly yy: number;
  readonly xy: number;
}

const NOTHING: AreaIntegrals = { area: 0, x: 0, y: 0, xx: 0, yy: 0, xy: 0 };

/**
 * Integrals over the area that a closed path goes round; negative for a path that runs clockwise.
 *
 * @param path pieces end to end, the last ending where the first begins
 * Source: Green's theorem, ∫∫(∂Q/∂x − ∂P/∂y) dA = ∮ P dx + Q dy; an arc is its sector plus the two radii.
 */
export function areaIntegrals(path: readonly Segment[]): AreaIntegrals {
  return path.reduce((sum, segment) => plus(sum, ofSegment(segment)), NOTHING);
}

/** The same area, its integrals taken about the origin moved by (−dx, −dy): every point gains (dx, dy). */
export function shifted(a: AreaIntegrals, dx: number, dy: number): AreaIntegrals {
  return {
    area: a.area,
    x: a.x + dx * a.area,
    y: a.y + dy * a.area,
    xx: a.xx + 2 * dx * a.x + dx * dx * a.area,
    yy: a.yy + 2 * dy * a.y + dy * dy * a.area,
    xy: a.xy + dx * a.y + dy * a.x + dx * dy * a.area,
  };
}

function ofSegment(segment: Segment): AreaIntegrals {
  if (segment.kind === 'line') return ofLine(segment.from, segment.to);
  const { centre, radius, start, sweep } = segment;
  const sector = shifted(ofSector(radius, start, sweep), centre[0], centre[1]);
  return plus(sector, plus(ofLine(segment.from, centre), ofLine(centre, segment.to)));
}

/** Of the triangle from the origin over a straight piece, signed. */
function ofLine(p: Vec2, q: Vec2): AreaIntegrals {
  const c = p[0] * q[1] - q[0] * p[1];
  return {
    area: c / 2,
    x: (c * (p[0] + q[0])) / 6,
    y: (c * (p[1] + q[1])) / 6,
    xx: (c * (p[0] * p[0] + p[0] * q[0] + q[0] * q[0])) / 12,
    yy: (c * (p[1] * p[1] + p[1] * q[1] + q[1] * q[1])) / 12,
    xy: (c * (2 * p[0] * p[1] + p[0] * q[1] + q[0] * p[1] + 2 * q[0] * q[1])) / 24,
  };
}

/** Of a circular sector about its own centre, signed as its sweep. */
function ofSector(r: number, start: number, sweep: number): AreaIntegrals {
  const end = start + sweep;
  const doubled = (Math.sin(2 * end) - Math.sin(2 * start)) / 4;
  return {
    area: (r ** 2 * sweep) / 2,
    x: (r ** 3 * (Math.sin(end) - Math.sin(start))) / 3,
    y: (r ** 3 * (Math.cos(start) - Math.cos(end))) / 3,
    xx: (r ** 4 / 4) * (sweep / 2 + doubled),
    yy: (r ** 4 / 4) * (sweep / 2 - doubled),
    xy: (r ** 4 / 8) * (Math.sin(end) ** 2 - Math.sin(start) ** 2),
  };
}

function plus(a: AreaIntegrals, b: AreaIntegrals): AreaIntegrals {
  return {
    area: a.area + b.area,
    x: a.x + b.x,
    y: a.y + b.y,
    xx: a.xx + b.xx,
    yy: a.yy + b.yy,
    xy: a.xy + b.xy,
  };
}
