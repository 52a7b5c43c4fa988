import type { PracticeId } from '../../project/model.ts';
import type { CompressionQuestion, Resistance } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { AISC } from './aisc.ts';
import { AS } from './as.ts';
import { elasticStress } from './elastic.ts';
import { EN } from './en.ts';
import { IS } from './is.ts';
import type { CompressionPack } from './pack.ts';
import { CSA, SANS } from './sansAndCsa.ts';

const PACKS: Readonly<Record<PracticeId, CompressionPack>> = {
  sans10162: SANS,
  csaS16: CSA,
  aisc360: AISC,
  en1993: EN,
  as4100: AS,
  is800: IS,
};

const ECCENTRIC =
  'The load is taken through the centroid: eccentricity at the ends is left out, and a check with bending is still due.';

/** What a bar resists in compression: with its critical load as found, with the lengths by the marks, and by the rule for one leg. N. */
export function compressionResistances(question: CompressionQuestion): readonly Resistance[] {
  const pack = PACKS[question.practice];
  return [byCriticalLoad(question, pack), byLengths(question, pack), pack.oneLeg(question)];
}

const isEccentric = ({ section, ends }: CompressionQuestion): boolean =>
  section.shape === 'angle' && ends.some(({ legs }) => legs === 'one');

function byCriticalLoad(question: CompressionQuestion, { column }: CompressionPack): Resistance {
  const working = new Working();
  const { criticalLoad, section } = question;
  const known = working.requires(
    'the critical load is known',
    criticalLoad !== null,
    'the framing gives the bar no critical load',
  );
  const N = known
    ? working.given('critical load with the real holds', 'N_cr', criticalLoad ?? 0, 'force')
    : 0;
  const Fe = known
    ? working.step('elastic stress', 'F_e', 'N_cr/A', N / section.properties.area, 'stress')
    : 1;
  return resistance(
    {
      kind: 'compression, critical load',
      title: 'Compression by the critical load',
      against: 'compression',
      resistance: column.strength(question, Fe, working),
      standard: column.standard,
      clause: column.clause,
      confidence: column.confidence,
      note: isEccentric(question) ? ECCENTRIC : null,
    },
    working,
  );
}

function byLengths(question: CompressionQuestion, { column }: CompressionPack): Resistance {
  const working = new Working();
  const { Fe, flexural } = elasticStress(question, working);
  return resistance(
    {
      kind: 'compression, lengths by the practice',
      title: 'Compression over the unbraced lengths',
      against: 'compression',
      resistance: column.strength(question, Fe, working),
      standard: column.standard,
      clause: Fe < flexural ? column.twistClause : column.clause,
      confidence: column.confidence,
      note: isEccentric(question) ? ECCENTRIC : null,
    },
    working,
  );
}
