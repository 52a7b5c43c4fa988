import type { PracticeId } from '../../project/model.ts';
import { endResistances } from '../connection/endResistances.ts';
import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';
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
 * All that stands against a pull: yield of the bar once; then at each end rupture of the net section, the block that may tear out, and bolts
 * or welds. N. Rules that do not speak of what is there give no resistance and say why.
 */
export function tensionResistances(question: TensionQuestion): readonly Resistance[] {
  const pack = PACKS[question.practice];
  return [pack.grossYield(question), ...question.ends.flatMap((end) => atEnd(pack, question, end))];
}

function atEnd(pack: TensionPack, question: TensionQuestion, end: ResistingEnd): readonly Resistance[] {
  // A rod that is "bolted" has a thread and a nut.
  if (question.section.shape === 'rod' && end.kind === 'bolted') return [pack.threadRupture(question, end)];
  const rupture = pack.netRupture(question, end);
  return end.kind === 'bolted'
    ? [rupture, pack.blockShear(question, end), ...endResistances(question, end)]
    : [rupture, ...endResistances(question, end)];
}
