/** Properties of members put together from plates, fillets left out. mm; y runs along the depth, x along the width, from the corner where both are least. */
import type { SectionProperties } from './model.ts';

export interface PlatedSizes {
  readonly depth: number;
  readonly width: number;
  readonly web: number;
  readonly flange: number;
}

/**
 * A doubly symmetric I: two flanges and a web. Torsion Σbt³/3 on middle lines, warping I_y h²/4 with h between the middles of the flanges.
 * Without fillets area and second moments are up to some 3 % low.
 */
export function iProperties({ depth, width, web, flange }: PlatedSizes): SectionProperties {
  const clear = depth - 2 * flange;
  const h = depth - flange;
  const Ixx = (width * depth ** 3 - (width - web) * clear ** 3) / 12;
  const Iyy = (2 * flange * width ** 3 + clear * web ** 3) / 12;
  return doublySymmetric(depth, width, 2 * width * flange + clear * web, Ixx, Iyy, {
    J: (2 * width * flange ** 3 + h * web ** 3) / 3,
    Iw: (Iyy * h * h) / 4,
  });
}

/** Outer radius of the corners over the wall; the inner one is a wall less. As EN 10219-2 has them for the properties of cold-formed tubes (Annex B, from memory). */
const cornerOf = (wall: number): number => (wall <= 6 ? 2 : wall <= 10 ? 2.5 : 3);

/**
 * A rectangular tube with rounded corners. Torsion by Bredt on the middle line, corners left square: 4A²t/s.
 * Source of the corners: EN 10219-2 Annex B, from memory.
 */
export function boxProperties(depth: number, width: number, wall: number): SectionProperties {
  const [d, b] = [depth - 2 * wall, width - 2 * wall];
  const corner = cornerOf(wall);
  const outer = spandrel(Math.min(corner * wall, depth / 2, width / 2));
  const inner = spandrel(Math.min((corner - 1) * wall, d / 2, b / 2));
  const about = (deep: number, wide: number, deepIn: number, wideIn: number): number =>
    (wide * deep ** 3 - wideIn * deepIn ** 3) / 12 -
    4 * (outer.own + outer.area * (deep / 2 - outer.centroid) ** 2) +
    4 * (inner.own + inner.area * (deepIn / 2 - inner.centroid) ** 2);
  const enclosed = (depth - wall) * (width - wall);
  const around = 2 * (depth + width - 2 * wall);
  return doublySymmetric(
    depth,
    width,
    depth * width - d * b - 4 * outer.area + 4 * inner.area,
    about(depth, width, d, b),
    about(width, depth, b, d),
    { J: (4 * enclosed ** 2 * wall) / around, Iw: 0 },
  );
}

/** What a rounding of radius r takes off a square corner: its area, how far its centroid lies from either side, and its second moment about that. */
function spandrel(r: number): { readonly area: number; readonly centroid: number; readonly own: number } {
  return {
    area: (1 - Math.PI / 4) * r * r,
    centroid: ((10 - 3 * Math.PI) / (12 - 3 * Math.PI)) * r,
    own: (1 / 3 - Math.PI / 16 - 1 / (3 * (12 - 3 * Math.PI))) * r ** 4,
  };
}

function doublySymmetric(
  depth: number,
  width: number,
  area: number,
  Ixx: number,
  Iyy: number,
  twist: { readonly J: number; readonly Iw: number },
): SectionProperties {
  const upright = Ixx >= Iyy;
  const [Iu, Iv] = upright ? [Ixx, Iyy] : [Iyy, Ixx];
  const r = (I: number): number => Math.sqrt(I / area);
  return {
    area,
    centroidX: width / 2,
    centroidY: depth / 2,
    Ixx,
    Iyy,
    Ixy: 0,
    Iu,
    Iv,
    alpha: upright ? 0 : Math.PI / 2,
    rx: r(Ixx),
    ry: r(Iyy),
    ru: r(Iu),
    rv: r(Iv),
    shearCentre: [0, 0],
    ...twist,
  };
}
