/** AISC 360-16 and -22, chapter J. */
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import { strengthOf } from '../tension/aisc.ts';
import { boltedLength } from '../tension/boltRows.ts';
import type { Working } from '../working.ts';
import { bolted, boltStrength, shankArea, shearPlanes } from './fasteners.ts';
import { boltSteel, borneOn, shank, sheared, THROAT, throats } from './givens.ts';
import type { EndPack } from './pack.ts';

/** 38 in: from there on a lap loaded at its ends takes 83.3 %. */
const LONG = 38 * 25.4;
/** 70 ksi, N/mm². */
const WELD_STRENGTH = 482.6;

const shareOf = (end: ResistingEnd, long: boolean): number =>
  (end.threadsInShear ? 0.45 : 0.563) * (long ? 0.833 : 1);

/** Nominal strength of one bolt in shear, N. */
function oneInShear({ practice, section }: TensionQuestion, end: ResistingEnd): number {
  const long = boltedLength(end, section) > LONG;
  return (
    shareOf(end, long) *
    boltStrength(practice, end.boltGrade) *
    shankArea(end.boltDiameter) *
    shearPlanes(section)
  );
}

function shearStress(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const long = boltedLength(end, question.section) > LONG;
  const fub = boltSteel(question, end, working);
  return working.step(
    'nominal shear stress',
    'F_nv',
    `${end.threadsInShear ? '0.45 f_ub, threads in shear' : '0.563 f_ub'}${long ? ', × 0.833' : ''}`,
    shareOf(end, long) * fub,
    'stress',
  );
}

export const AISC_ENDS: EndPack = {
  standard: 'AISC 360',
  boltShear: {
    clause: 'J3.7 (J3.6 before 2022), Table J3.2',
    confidence: 'from memory, sure',
    of: (question, end, working) => {
      const n = sheared(question, end, working);
      const F = shearStress(question, end, working);
      const A = shank(end, working);
      const Rn = working.step('nominal strength', 'R_n', 'n m F_nv A_b', n * F * A, 'force');
      return strengthOf(Rn, 0.75, 2, question.options, working, 'R_n');
    },
  },
  bearing: {
    clause: 'J3.11 (J3.10 before 2022)',
    confidence: 'from memory, sure',
    // Bolt by bolt the least of bearing, tearing and its own shear, as the user note has it.
    of: (question, end, working) => {
      const { t, d, fu } = borneOn(question, end, working);
      const v = working.step('shear of one bolt', 'r_v', 'm F_nv A_b', oneInShear(question, end), 'force');
      const one = (clear: number): number => Math.min(1.2 * Math.max(0, clear) * t * fu, 2.4 * d * t * fu, v);
      const { first, behind } = bolted(end, question.section);
      const rule = 'min(1.2 l_c t F_u, 2.4 d t F_u, r_v)';
      const lead = working.step(
        'a bolt at the end',
        'r_e',
        `${rule}, l_c = end distance − d_h/2`,
        one(end.endDistance - end.hole / 2),
        'force',
      );
      const next =
        behind > 0
          ? working.step(
              'a bolt behind it',
              'r_i',
              `${rule}, l_c = pitch − d_h`,
              one(end.pitch - end.hole),
              'force',
            )
          : 0;
      const Rn = working.step(
        'nominal strength',
        'R_n',
        'n_e r_e + n_i r_i',
        first * lead + behind * next,
        'force',
      );
      return strengthOf(Rn, 0.75, 2, question.options, working, 'R_n');
    },
  },
  weld: {
    clause: 'J2.4, Table J2.5',
    confidence: 'from memory, sure',
    least: { sizes: 4, length: 0, clause: 'J2.2b' },
    of: (question, end, working) => {
      const A = throats(question, end, THROAT, working);
      const F = working.given('strength of the weld metal', 'F_EXX', WELD_STRENGTH, 'stress');
      const Rn = working.step('nominal strength', 'R_n', '0.60 F_EXX A_w', 0.6 * F * A, 'force');
      return strengthOf(Rn, 0.75, 2, question.options, working, 'R_n');
    },
  },
};
