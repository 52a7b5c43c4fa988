/** Struts and beams in words. */
import type { MemberChecks } from '../checks/model.ts';
import type { UnitSystem } from '../project/model.ts';
import type { Condition } from '../resistance/model.ts';
import { showLength } from '../units/quantity.ts';

/** "wall 4.6 mm, taken as usual for its size; S355JR. Held over 6000 in the plane and 6000 out of it." */
export function memberPlacing({ member, plates, lengths, grade }: MemberChecks, units: UnitSystem): string {
  const thick = (mm: number): string => showLength(mm, units, 'small');
  const walls =
    member.shape === 'tube' || member.shape === 'zed'
      ? `Wall ${thick(plates.web)}`
      : `Web ${thick(plates.web)}, flange ${thick(plates.flange)}`;
  const between = (mm: number): string => showLength(mm, units, 'spoken');
  return `${walls}${plates.assumed ? ', taken as usual for its size' : ''}; ${grade}. Free to bow over ${between(lengths.inPlane)} in the plane of the bay and ${between(lengths.outOfPlane)} out of it.`;
}

/** What is not met, as a sentence: "Not met: L/r not above 200 (it is 231)." */
export const conditionWords = ({ says, found }: Condition): string =>
  `Not met: ${says}${found === null ? '' : ` (${found})`}.`;
