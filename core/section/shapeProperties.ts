import type { Vec2 } from '../geometry/vector.ts';
import { angleProperties } from './angleProperties.ts';
import { type BarShape, extentOf } from './barShape.ts';
import type { SectionProperties } from './model.ts';
import { boxProperties } from './plateShapes.ts';
import { principal } from './principal.ts';

/** Shapes that are put together from parts. */
type Parted = Exclude<BarShape, { readonly kind: 'square tube' }>;

/** A part of a section: area, where its centroid lies, and its second moments about its own centroid. */
interface Part {
  readonly area: number;
  readonly at: Vec2;
  readonly Ixx: number;
  readonly Iyy: number;
  readonly Ixy: number;
}

/**
 * Properties of a shape put together from its parts; fillets of tees and channels are left out, corners of square tubes are rounded as cold-formed ones are. mm.
 * Torsion: closed tubes by Bredt, 4A²t/s; open shapes Σbt³/3. Shear centre of a channel by its flanges' shear flow, e = b²h²t_f/(4I) from the web's middle.
 */
export function shapeProperties(shape: BarShape): SectionProperties {
  if (shape.kind === 'square tube') return boxProperties(shape.side, shape.side, shape.wall);
  const parts = partsOf(shape);
  const area = parts.reduce((sum, part) => sum + part.area, 0);
  const centroid: Vec2 = [
    parts.reduce((sum, part) => sum + part.area * part.at[0], 0) / area,
    parts.reduce((sum, part) => sum + part.area * part.at[1], 0) / area,
  ];
  const about = (of: (part: Part, dx: number, dy: number) => number): number =>
    parts.reduce((sum, part) => sum + of(part, part.at[0] - centroid[0], part.at[1] - centroid[1]), 0);
  const Ixx = about((part, _, dy) => part.Ixx + part.area * dy * dy);
  const Iyy = about((part, dx) => part.Iyy + part.area * dx * dx);
  const Ixy = about((part, dx, dy) => part.Ixy + part.area * dx * dy);
  const { major, minor, alpha } = principal(Ixx, Iyy, Ixy);
  const r = (I: number): number => Math.sqrt(I / area);
  return {
    area,
    centroidX: centroid[0],
    centroidY: centroid[1],
    Ixx,
    Iyy,
    Ixy,
    Iu: major,
    Iv: minor,
    alpha,
    rx: r(Ixx),
    ry: r(Iyy),
    ru: r(major),
    rv: r(minor),
    ...twistOf(shape, centroid),
  };
}

function rectangle(x: number, y: number, wide: number, high: number, sign = 1): Part {
  return {
    area: sign * wide * high,
    at: [x + wide / 2, y + high / 2],
    Ixx: (sign * wide * high ** 3) / 12,
    Iyy: (sign * high * wide ** 3) / 12,
    Ixy: 0,
  };
}

function disc(centre: number, diameter: number, sign = 1): Part {
  const I = (sign * Math.PI * diameter ** 4) / 64;
  return { area: (sign * Math.PI * diameter ** 2) / 4, at: [centre, centre], Ixx: I, Iyy: I, Ixy: 0 };
}

/** An angle with its heel at a place, mirrored where a factor is −1. */
function angleAt(outline: Parameters<typeof angleProperties>[0], heel: Vec2, mirror: Vec2): Part {
  const p = angleProperties(outline);
  return {
    area: p.area,
    at: [heel[0] + mirror[0] * p.centroidX, heel[1] + mirror[1] * p.centroidY],
    Ixx: p.Ixx,
    Iyy: p.Iyy,
    Ixy: p.Ixy * mirror[0] * mirror[1],
  };
}

function partsOf(shape: Parted): readonly Part[] {
  switch (shape.kind) {
    case 'flat':
      return [rectangle(0, 0, shape.thickness, shape.width)];
    case 'rod':
      return [disc(shape.diameter / 2, shape.diameter)];
    case 'round tube': {
      const { diameter: d, wall: t } = shape;
      return [disc(d / 2, d), disc(d / 2, d - 2 * t, -1)];
    }
    case 'tee': {
      const { width: b, depth: h, flange: f, web: w } = shape;
      return [rectangle(0, 0, f, b), rectangle(f, (b - w) / 2, h - f, w)];
    }
    case 'channel': {
      const { depth: h, width: b, web: w, flange: f } = shape;
      return [rectangle(0, 0, w, h), rectangle(w, 0, b - w, f), rectangle(w, h - f, b - w, f)];
    }
    case 'angles back to back': {
      const [wide] = extentOf(shape);
      const { angle, gap } = shape;
      return [
        angleAt(angle, [wide / 2 + gap / 2, 0], [1, 1]),
        angleAt(angle, [wide / 2 - gap / 2, 0], [-1, 1]),
      ];
    }
    case 'starred angles': {
      const [wide, high] = extentOf(shape);
      const { angle, gap } = shape;
      return [
        angleAt(angle, [wide / 2 + gap / 2, high / 2 + gap / 2], [1, 1]),
        angleAt(angle, [wide / 2 - gap / 2, high / 2 - gap / 2], [-1, -1]),
      ];
    }
    default:
      return shape satisfies never;
  }
}

function twistOf(shape: Parted, centroid: Vec2): Pick<SectionProperties, 'shearCentre' | 'J' | 'Iw'> {
  const none: Vec2 = [0, 0];
  switch (shape.kind) {
    case 'flat':
      return { shearCentre: none, J: (shape.width * shape.thickness ** 3) / 3, Iw: 0 };
    case 'rod':
      return { shearCentre: none, J: (Math.PI * shape.diameter ** 4) / 32, Iw: 0 };
    case 'round tube': {
      const { diameter: d, wall: t } = shape;
      return { shearCentre: none, J: (Math.PI * (d ** 4 - (d - 2 * t) ** 4)) / 32, Iw: 0 };
    }
    case 'tee': {
      const { width: b, depth: h, flange: f, web: w } = shape;
      const stem = h - f / 2;
      return {
        // Where flange and stem meet.
        shearCentre: [f / 2 - centroid[0], 0],
        J: (b * f ** 3 + stem * w ** 3) / 3,
        Iw: (b ** 3 * f ** 3) / 144 + (stem ** 3 * w ** 3) / 36,
      };
    }
    case 'channel': {
      const { depth, width, web, flange: f } = shape;
      const [h, b] = [depth - f, width - web / 2];
      // Thin walls on middle lines.
      const I = (web * h ** 3) / 12 + (b * f * h ** 2) / 2;
      const e = (b * b * h * h * f) / (4 * I);
      return {
        shearCentre: [web / 2 - e - centroid[0], 0],
        J: (h * web ** 3 + 2 * b * f ** 3) / 3,
        Iw: ((f * b ** 3 * h ** 2) / 12) * ((3 * b * f + 2 * h * web) / (6 * b * f + h * web)),
      };
    }
    case 'angles back to back':
    case 'starred angles': {
      const one = angleProperties(shape.angle);
      const t = shape.angle.thickness;
      // Of a pair back to back where the legs' middle lines meet; of a star the centroid.
      const y = shape.kind === 'starred angles' ? 0 : t / 2 - centroid[1];
      return { shearCentre: [0, y], J: 2 * one.J, Iw: 2 * one.Iw };
    }
    default:
      return shape satisfies never;
  }
}
