import type { PracticeId } from '../../project/model.ts';
import type { CompressionQuestion, Resistance, ResistingSection } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { AISC } from './aisc.ts';
import { AS } from './as.ts';
import { elasticStress } from './elasticStress.ts';
import { EN } from './en.ts';
import { IS } from './is.ts';
import { lengthsByHand } from './lengthsByHand.ts';
import type { ColumnRule, CompressionPack } from './pack.ts';
import { CSA, SANS } from './sansAndCsa.ts';
import { plateRemark, requireStoutWall, withStoutPlates } from './walls.ts';

const PACKS: Readonly<Record<PracticeId, CompressionPack>> = {
  sans10162: SANS,
  csaS16: CSA,
  aisc360: AISC,
  en1993: EN,
  as4100: AS,
  is800: IS,
};

/** Note of a concentric check of a bar that is held off its centroid. */
export const ECCENTRICITY_LEFT_OUT =
  'The load is taken through the centroid: eccentricity at the ends is left out, and a beam-column check is still due.';

/** Note where a leg axis with its own longer length governs with twist. */
const ALONG_LEG =
  'It bows about an axis along a leg, over a longer length of its own, and twists: the standard does not speak of that, and its formula for an axis of symmetry is used.';

/**
 * What a bar resists in compression, N: through its centroid by its critical load as found, through its centroid over its unbraced lengths,
 * and, for a single angle, by the practice's rule for one leg. Rules that do not speak of what is there give no resistance and say why.
 */
export function compressionResistances(question: CompressionQuestion): readonly Resistance[] {
  const { column, oneLeg } = PACKS[question.practice];
  const concentric = [byCriticalLoad(question, column), byLengths(question, column)];
  return question.section.shape === 'angle' ? [...concentric, oneLeg(question)] : concentric;
}

function byCriticalLoad(question: CompressionQuestion, column: ColumnRule): Resistance {
  const working = new Working();
  const { criticalLoad, section } = question;
  const known = criticalLoad !== null && criticalLoad > 0 ? criticalLoad : null;
  working.requires('the critical load is known', known !== null, 'the framing gives the bar none');
  requireStoutWall(question, column.walls, working);
  if (known !== null) {
    working.given('area', 'A', section.properties.area, 'area');
    working.given('critical load with the real holds', 'N_cr', known, 'force');
    working.step('elastic stress', 'F_e', 'N_cr/A', known / section.properties.area, 'stress');
  }
  return resistance(
    {
      kind: 'compression, critical load',
      title: 'Compression by the critical load',
      against: 'compression',
      resistance:
        known === null
          ? null
          : column.strength(
              withStoutPlates(question, column.walls, working),
              known / section.properties.area,
              working,
            ),
      standard: column.standard,
      clause: column.clause,
      confidence: hasRemark(question, column) ? 'from memory, verify' : column.confidence,
      note: noteOf(question, column),
    },
    working,
  );
}

function byLengths(question: CompressionQuestion, column: ColumnRule): Resistance {
  const working = new Working();
  const { area } = question.section.properties;
  requireStoutWall(question, column.walls, working);
  working.given('area', 'A', area, 'area');
  const { Fe, twists, beyondStandards } = elasticStress(question, twistLeftOut(question, column), working);
  working.step('elastic critical load', 'N_cr', 'A F_e', area * Fe, 'force');
  const rule = twists ? column.twist : column;
  return resistance(
    {
      kind: 'compression, lengths by the practice',
      title: `Compression over the unbraced lengths${twists ? ', bowing with twist' : ''}`,
      against: 'compression',
      resistance: column.strength(withStoutPlates(question, column.walls, working), Fe, working),
      standard: column.standard,
      clause: rule.clause,
      confidence: beyondStandards || hasRemark(question, column) ? 'from memory, verify' : rule.confidence,
      note: noteOf(question, column, [beyondStandards ? ALONG_LEG : null, lengthsByHand(question)]),
    },
    working,
  );
}

/** Solid and hollow bars longer than they are wide bow before they twist. */
function twistLeftOut(question: CompressionQuestion, column: ColumnRule): string | null {
  switch (question.section.shape) {
    case 'flat':
    case 'rod':
    case 'round tube':
    case 'square tube':
      return 'such a section bows before it twists';
    case 'angle':
    case 'angles back to back':
    case 'starred angles':
    case 'tee':
    case 'channel':
    case 'I section':
      return column.twistLeftOut(question);
    default:
      return question.section.shape satisfies never;
  }
}

/** The rule is used beyond what was read or is surely remembered. */
const hasRemark = (question: CompressionQuestion, column: ColumnRule): boolean =>
  column.remark(question) !== null || question.section.shape !== 'angle';

function noteOf(
  question: CompressionQuestion,
  column: ColumnRule,
  ofLengths: readonly (string | null)[] = [],
): string | null {
  const { section, loadedAcross } = question;
  const notes = [
    isEccentric(question) ? ECCENTRICITY_LEFT_OUT : null,
    loadedAcross ? 'A load acts across the bar: a check with bending is still due.' : null,
    ...ofLengths,
    column.remark(question),
    plateRemark(question, column.walls),
    shapeNote(section),
  ];
  return notes.filter((note) => note !== null).join(' ') || null;
}

/** An angle by one leg, and what lies with a face against the gusset. */
function isEccentric({ section, ends }: CompressionQuestion): boolean {
  if (section.shape === 'angle') return ends.some(({ legs }) => legs === 'one');
  return section.shape === 'flat' || section.shape === 'tee' || section.shape === 'channel';
}

/** What is not looked at in a shape. */
function shapeNote({ shape, plates }: ResistingSection): string | null {
  switch (shape) {
    case 'angle':
    case 'flat':
    case 'rod':
    case 'I section':
    case 'round tube':
    case 'square tube':
      return null;
    case 'angles back to back':
    case 'starred angles':
      return 'The two angles are taken as one bar, joined closely enough by battens or packs to act so: a finding says where they are not.';
    case 'tee':
    case 'channel':
      return plates ? null : 'Whether its plates are too slender to yield is not looked at.';
    default:
      return shape satisfies never;
  }
}
