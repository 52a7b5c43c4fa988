import type { AngleOutline, SectionProperties } from './model.ts';
import { principal } from './principal.ts';

/** What a table prints of an angle, already in mm. x is parallel to the shorter leg, v the minor principal axis. */
export interface PublishedFigures {
  readonly area: number;
  readonly centroidX: number;
  readonly centroidY: number;
  readonly Ixx: number;
  readonly Iyy: number;
  readonly Iv: number;
  readonly rx: number;
  readonly ry: number;
  readonly rv: number;
  readonly J: number;
  readonly Iw: number;
}

/**
 * Properties carried as a table prints them, for shapes whose outline does not reproduce the table.
 *
 * Printed figures are kept as they stand: A, Ixx, Iyy, Iv, rx, ry, rv, J, Iw. What is not printed follows from them:
 * - Iu = Ixx + Iyy − Iv, and |Ixy| = √((Ixx − Iv)(Iyy − Iv)), since the principal values of the form are Iu and Iv; Ixy is
 *   below zero with the heel on the negative side of both axes;
 * - ru² = rx² + ry² − rv², and alpha from the radii in the same way, so that the radius in any direction (`radiusFor`) agrees with all
 *   the printed radii at once. The table's own Iu and tan alpha then agree within its rounding, which the published checks show.
 *
 * @throws on radii or second moments whose least is not about v
 */
export function publishedProperties(outline: AngleOutline, figures: PublishedFigures): SectionProperties {
  const { rx, ry, rv, Ixx, Iyy, Iv } = figures;
  if (!(rv > 0 && rv <= Math.min(rx, ry)))
    throw new Error('the radius about the minor axis is not the least radius');
  if (!(Iv > 0 && Iv <= Math.min(Ixx, Iyy)))
    throw new Error('the second moment about the minor axis is not the least');
  const product = -Math.sqrt((rx ** 2 - rv ** 2) * (ry ** 2 - rv ** 2));
  const { alpha } = principal(rx ** 2, ry ** 2, product);
  const { thickness } = outline;
  return {
    ...figures,
    Ixy: -Math.sqrt((Ixx - Iv) * (Iyy - Iv)),
    Iu: Ixx + Iyy - Iv,
    alpha,
    ru: Math.sqrt(rx ** 2 + ry ** 2 - rv ** 2),
    shearCentre: [thickness / 2 - figures.centroidX, thickness / 2 - figures.centroidY],
  };
}
