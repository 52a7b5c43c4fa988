import { areaIntegrals, shifted } from './areaIntegrals.ts';
import type { AngleOutline, SectionProperties } from './model.ts';
import { outlinePath } from './outlinePath.ts';
import { outlineProblem, outlineProblemText } from './outlineProblem.ts';
import { centreLineConstants, principal } from './principal.ts';

/**
 * Properties of an angle from its outline, integrated exactly: mm, mm², mm⁴, mm⁶, rad.
 *
 * @throws on an outline that is no angle; readers of lists ask `outlineProblem` first
 * Source: METHODS.md §1. 70x70x6 with r1 = 9, r2 = 4.5: A = 812.69, Ixx = 368 840, Ixy = −216 161, Iu = 585 000, Iv = 152 679.
 */
export function angleProperties(outline: AngleOutline): SectionProperties {
  const problem = outlineProblem(outline);
  if (problem) throw new Error(`no angle has these dimensions: ${outlineProblemText(problem)}`);
  const aboutHeel = areaIntegrals(outlinePath(outline));
  const { area } = aboutHeel;
  const centroidX = aboutHeel.x / area;
  const centroidY = aboutHeel.y / area;
  const own = shifted(aboutHeel, -centroidX, -centroidY);
  const Ixx = own.yy;
  // An equal angle is its own mirror image: the last digits of the sums must not make one of its axes the weaker.
  const Iyy = outline.longLeg === outline.shortLeg ? Ixx : own.xx;
  const Ixy = own.xy;
  const { major: Iu, minor: Iv, alpha } = principal(Ixx, Iyy, Ixy);
  const { thickness } = outline;
  return {
    area,
    centroidX,
    centroidY,
    Ixx,
    Iyy,
    Ixy,
    Iu,
    Iv,
    alpha,
    rx: Math.sqrt(Ixx / area),
    ry: Math.sqrt(Iyy / area),
    ru: Math.sqrt(Iu / area),
    rv: Math.sqrt(Iv / area),
    shearCentre: [thickness / 2 - centroidX, thickness / 2 - centroidY],
    ...centreLineConstants(outline),
  };
}
