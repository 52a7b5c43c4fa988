/** SANS 10162-1 and CSA S16, 13.3. Practice-facts D1. */
import type { CompressionQuestion, Resistance } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { doublePower } from './curves.ts';
import { slenderest } from './legs.ts';
import { modifiedSlenderness, wholeLengthNote } from './modifiedSlenderness.ts';
import {
  ONE_LEG,
  requireEvenLegs,
  requireFirmEnds,
  requireNothingAcross,
  requireSameLeg,
} from './oneLegTerms.ts';
import type { CompressionPack } from './pack.ts';

const PHI = 0.9;
/** Hot-rolled sections; hollow ones of class C. */
const N = 1.34;

/** Most slender leg that may yield: beyond it the section is class 4. */
const classLimit = (fy: number): number => 200 / Math.sqrt(fy);

const isClass4 = ({ section, steel }: CompressionQuestion): boolean =>
  slenderest(section) > classLimit(steel.fy) * (1 + 1e-9);

/**
 * Class 4 legs: the yield stress at which the leg would just not be class 4 (CSA S16 13.3.5, from memory, verify). The leg's own buckling then comes before yield, and a slender bar, whose stress is far below, loses little.
 */
function yieldStress(question: CompressionQuestion, working: Working): number {
  const { section, steel } = question;
  const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
  if (!isClass4(question)) return fy;
  const slender = working.given('most slender leg', 'b/t', slenderest(section), 'slenderness');
  return working.step(
    'yield stress that the leg allows, class 4',
    'f_y',
    '(200/(b/t))²',
    (200 / slender) ** 2,
    'stress',
  );
}

function strength(question: CompressionQuestion, Fe: number, working: Working): number {
  const fy = yieldStress(question, working);
  const lambda = working.step('relative slenderness', 'λ', '√(f_y/F_e)', Math.sqrt(fy / Fe), 'ratio');
  working.given('exponent, hot-rolled', 'n', N, 'factor');
  return working.step(
    'resistance',
    'C_r',
    '0.90 A f_y (1 + λ^(2 n))^(−1/n)',
    PHI * question.section.properties.area * fy * doublePower(lambda, N),
    'force',
  );
}

const BORROWED =
  'SANS 10162-1 has no rule of its own for an angle by one leg, as far as is known here: that of CSA S16 is borrowed as an engineering choice.';

function oneLeg(question: CompressionQuestion, own: boolean): Resistance {
  const working = new Working();
  requireSameLeg(question, working);
  requireFirmEnds(question, working);
  requireNothingAcross(question, working);
  requireEvenLegs(question, working);
  const slender = modifiedSlenderness(question, working);
  working.requires('KL/r not above 200', slender <= 200 + 1e-9, slender.toFixed(1));
  const { steel, section, system } = question;
  working.given('area', 'A', section.properties.area, 'area');
  working.given('modulus', 'E', steel.E, 'stress');
  const Fe = working.step(
    'elastic stress',
    'F_e',
    'π² E/(L_c/r)²',
    (Math.PI ** 2 * steel.E) / slender ** 2,
    'stress',
  );
  const notes = [own ? null : BORROWED, wholeLengthNote(question), class4Remark(question, own)];
  return resistance(
    {
      ...ONE_LEG,
      resistance: strength(question, Fe, working),
      standard: 'CSA S16',
      clause: system === 'planar' ? '13.3.3.2' : '13.3.3.3',
      confidence: 'from memory, verify',
      ownRule: own,
      note: notes.filter((note) => note !== null).join(' ') || null,
    },
    working,
  );
}

function class4Remark(question: CompressionQuestion, own: boolean): string | null {
  if (!isClass4(question)) return null;
  const limit = classLimit(question.steel.fy).toFixed(1);
  return `A leg is more slender than 200/√f_y = ${limit} (class 4): its yield stress is lowered to what it allows${
    own ? ', 13.3.5, from memory, verify.' : ', as CSA S16 13.3.5 does, borrowed and from memory, verify.'
  }`;
}

const pack = (standard: string, own: boolean): CompressionPack => ({
  column: {
    standard,
    clause: '13.3.1',
    confidence: 'from memory, sure',
    twist: { clause: '13.3.2, 13.3.1', confidence: 'from memory, sure' },
    walls: {
      round: { most: ({ fy }) => 23_000 / fy, says: '23 000/f_y' },
      square: { most: ({ fy }) => 670 / Math.sqrt(fy), says: '670/√f_y' },
      flange: { most: ({ fy }) => 200 / Math.sqrt(fy), says: '200/√f_y' },
      web: { most: ({ fy }) => 670 / Math.sqrt(fy), says: '670/√f_y' },
      stem: { most: ({ fy }) => 340 / Math.sqrt(fy), says: '340/√f_y' },
    },
    twistLeftOut: () => null,
    remark: (question) => class4Remark(question, own),
    strength,
  },
  oneLeg: (question) => oneLeg(question, own),
});

export const SANS = pack('SANS 10162-1', false);
export const CSA = pack('CSA S16', true);
