/**
 * Sections, in mm. Section plane coordinates are [x, y] = [along the shorter leg, along the longer leg];
 * axis x is parallel to the shorter leg and axis y to the longer, both through the centroid; the heel lies on the negative side of both.
 * "Bending about an axis" moves the bar at right angles to that axis: about x along the longer leg, about y along the shorter.
 */

import type { BarShape } from './barShape.ts';

/** Outside dimensions of a rolled angle, mm. */
export interface AngleOutline {
  readonly longLeg: number;
  readonly shortLeg: number;
  readonly thickness: number;
  /** Fillet at the inside of the heel. */
  readonly rootRadius: number;
  /** Rounding at the inside of each toe. */
  readonly toeRadius: number;
  /** Of anything but a single angle: what it is. Its legs are then its extent in the plane of the bay and out of it. */
  readonly shape?: BarShape;
}

export type Axis = 'x' | 'y' | 'u' | 'v';
export const AXES: readonly Axis[] = ['x', 'y', 'u', 'v'];

/** Properties about the centroid: areas mm², second moments mm⁴, radii and distances mm, angles rad. */
export interface SectionProperties {
  readonly area: number;
  /** Centroid from the heel along the shorter leg, mm. */
  readonly centroidX: number;
  /** Centroid from the heel along the longer leg, mm. */
  readonly centroidY: number;
  /** ∫y² dA, bending about x. */
  readonly Ixx: number;
  /** ∫x² dA, bending about y. */
  readonly Iyy: number;
  /** ∫xy dA, negative with the heel on the negative side of both axes. */
  readonly Ixy: number;
  readonly Iu: number;
  readonly Iv: number;
  /** Angle from axis x to axis u, rad, in (−π/2, π/2]; π/4 for an equal angle. */
  readonly alpha: number;
  readonly rx: number;
  readonly ry: number;
  readonly ru: number;
  readonly rv: number;
  /** Shear centre relative to the centroid, mm: the meeting of the legs' centre lines. */
  readonly shearCentre: readonly [number, number];
  /** St-Venant torsion constant Σbt³/3 on centre-line lengths, mm⁴. */
  readonly J: number;
  /** Warping constant about the shear centre Σb³t³/36, mm⁶. */
  readonly Iw: number;
}

/** What slenderness asks of a section. */
export type Radii = Pick<SectionProperties, 'alpha' | 'rx' | 'ry' | 'ru' | 'rv'>;
