import type { PracticeId } from '../../project/model.ts';
import { endResistances } from '../connection/endResistances.ts';
import type { Resistance, TensionQuestion } from '../model.ts';
import { AISC } from './aisc.ts';
import { AS } from './as.ts';
import { EN } from './en.ts';
import { IS } from './is.ts';
import type { TensionPack } from './pack.ts';
import { CSA, SANS } from './sansAndCsa.ts';

const PACKS: Readonly<Record<PracticeId, TensionPack>> = {
  sans10162: SANS,
  csaS16: CSA,
  aisc360: AISC,
  en1993: EN,
  as4100: AS,
  is800: IS,
};

/**
 * All that stands against a pull: yield of the bar; at each end rupture of the net section, the block that may tear out, and bolts or welds. N.
 * Rules that do not apply to what is there give no resistance and say why.
 */
export function tensionResistances(question: TensionQuestion): readonly Resistance[] {
  const pack = PACKS[question.practice];
  return [
    pack.grossYield(question),
    ...question.ends.flatMap((end) => [
      pack.netRupture(question, end),
      ...(end.kind === 'bolted' && question.section.shape !== 'rod' ? [pack.blockShear(question, end)] : []),
      ...endResistances(question, end),
    ]),
  ];
}
