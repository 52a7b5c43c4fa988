/** EN 1993-1-8: bolts 3.6 to 3.8, fillet welds 4.5. */
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import { boltedLength } from '../tension/boltRows.ts';
import { partialFactors } from '../tension/en.ts';
import type { Working } from '../working.ts';
import { bolted, boltStrength, shankArea, shearPlanes, stressArea } from './fasteners.ts';
import { boltSteel, borneOn, longJoint, sheared, shearedArea, THROAT, throats } from './givens.ts';
import type { EndPack } from './pack.ts';

/** Thread through the plane of shear: 0.5 for the brittler grades. */
const alphaV = ({ threadsInShear, boltGrade }: ResistingEnd): number =>
  threadsInShear && (boltGrade === '10.9' || boltGrade === 'A490') ? 0.5 : 0.6;

const gammaM2 = ({ options }: TensionQuestion, working: Working): number =>
  working.given('partial factor', 'γ_M2', partialFactors(options).M2, 'factor');

const longJointOf = (question: TensionQuestion, end: ResistingEnd): number =>
  longJoint(boltedLength(end, question.section), end.boltDiameter);

/** F_v,Rd of one bolt in all its planes, N. */
function oneInShear(question: TensionQuestion, end: ResistingEnd): number {
  const { practice, section, options } = question;
  const A = end.threadsInShear ? stressArea(end.boltDiameter) : shankArea(end.boltDiameter);
  return (
    (longJointOf(question, end) *
      alphaV(end) *
      boltStrength(practice, end.boltGrade) *
      A *
      shearPlanes(section)) /
    partialFactors(options).M2
  );
}

/** 3.6.1(10): a lap on one side with one row of bolts across the force, which turns under it. N, all bolts. */
function oneRow(
  { steel, section, options }: TensionQuestion,
  end: ResistingEnd,
  bolts: number,
  one: (alpha: number) => number,
  working: Working,
): number {
  const lead = working.step(
    'a bolt at the end',
    'F_b,e',
    'k_1 α_b f_u d t/γ_M2, α_b = min(e_1/(3d_0), f_ub/f_u, 1)',
    one(end.endDistance / (3 * end.hole)),
    'force',
  );
  const most = working.step(
    'at most, one row lapped on one side',
    'F_b,(3.2)',
    '1.5 f_u d t/γ_M2',
    (1.5 * steel.fu * end.boltDiameter * section.thickness) / partialFactors(options).M2,
    'force',
  );
  working.given('bolts', 'n', bolts, 'count');
  return working.step(
    'resistance',
    'F_b,Rd',
    'n min(F_b,e, F_b,(3.2))',
    bolts * Math.min(lead, most),
    'force',
  );
}

export const EN_ENDS: EndPack = {
  standard: 'EN 1993-1-8',
  boltShear: {
    clause: 'Table 3.4, 3.8',
    confidence: 'from memory, sure',
    of: (question, end, working) => {
      const n = sheared(question, end, working);
      const fub = boltSteel(question, end, working);
      const alpha = working.given('factor', 'α_v', alphaV(end), 'factor');
      const A = shearedArea(end, working);
      const beta = working.step(
        'long joint',
        'β_Lf',
        '1 − (L_j − 15 d)/(200 d), 0.75 to 1',
        longJointOf(question, end),
        'factor',
      );
      const gamma = gammaM2(question, working);
      return working.step(
        'resistance',
        'n F_v,Rd',
        'n m β_Lf α_v f_ub A/γ_M2',
        (n * beta * alpha * fub * A) / gamma,
        'force',
      );
    },
  },
  bearing: {
    clause: 'Table 3.4, 3.6.1(10), 3.7',
    confidence: 'from memory, sure',
    of: (question, end, working) => {
      const { t, d, fu } = borneOn(question, end, working);
      const fub = boltSteel(question, end, working);
      const gamma = gammaM2(question, working);
      const byEdge = (2.8 * end.edgeDistance) / end.hole - 1.7;
      const byRow = end.rows === 2 ? (1.4 * end.rowSpacing) / end.hole - 1.7 : 2.5;
      const k1 = working.step(
        'across the force',
        'k_1',
        `min(2.8 e_2/d_0 − 1.7${end.rows === 2 ? ', 1.4 p_2/d_0 − 1.7' : ''}, 2.5)`,
        Math.max(0, Math.min(byEdge, byRow, 2.5)),
        'factor',
      );
      const one = (alpha: number): number =>
        (k1 * Math.max(0, Math.min(alpha, fub / fu, 1)) * fu * d * t) / gamma;
      const { first, behind } = bolted(end, question.section);
      if (behind === 0 && shearPlanes(question.section) === 1)
        return oneRow(question, end, first, one, working);
      const lead = working.step(
        'a bolt at the end',
        'F_b,e',
        'k_1 α_b f_u d t/γ_M2, α_b = min(e_1/(3d_0), f_ub/f_u, 1)',
        one(end.endDistance / (3 * end.hole)),
        'force',
      );
      const next =
        behind > 0
          ? working.step(
              'a bolt behind it',
              'F_b,i',
              'the same, α_b from p_1/(3d_0) − 1/4',
              one(end.pitch / (3 * end.hole) - 0.25),
              'force',
            )
          : lead;
      const v = working.step(
        'shear of one bolt',
        'F_v,Rd',
        'as in the check of shear',
        oneInShear(question, end),
        'force',
      );
      // 3.7: the bolts share as each bears, if each stands in shear what it bears; else the weakest counts for all.
      const ductile = v >= Math.max(lead, next);
      return ductile
        ? working.step('resistance', 'F_b,Rd', 'n_e F_b,e + n_i F_b,i', first * lead + behind * next, 'force')
        : working.step(
            'resistance',
            'F_b,Rd',
            'n min(F_b,e, F_b,i): shear of a bolt is less than what it bears',
            (first + behind) * Math.min(lead, next),
            'force',
          );
    },
  },
  weld: {
    clause: '4.5.3.3',
    confidence: 'from memory, sure',
    least: { sizes: 6 * THROAT, length: 30, clause: '4.5.1(2)' },
    of: (question, end, working) => {
      const A = throats(question, end, THROAT, working);
      const { fu } = question.steel;
      working.given('tensile strength', 'f_u', fu, 'stress');
      // Table 4.1; between its grades the next higher, which is the weaker weld.
      const beta = working.step(
        'correlation factor',
        'β_w',
        'Table 4.1 by f_u',
        fu <= 360 ? 0.8 : fu <= 430 ? 0.85 : fu <= 510 ? 0.9 : 1,
        'factor',
      );
      const gamma = gammaM2(question, working);
      return working.step(
        'resistance',
        'F_w,Rd',
        'f_u A_w/(√3 β_w γ_M2)',
        (fu * A) / (Math.sqrt(3) * beta * gamma),
        'force',
      );
    },
  },
};
