/** IS 800:2007 clause 10: bolts and fillet welds. γ_mb = γ_mw = 1.25 (made in the shop). */
import { boltedLength, boltsInLine } from '../tension/boltRows.ts';
import { boltSteel, borneOn, longJoint, sheared, shearedArea, throats } from './givens.ts';
import type { EndPack } from './pack.ts';

const GAMMA = 1.25;
/** Of the usual electrode, N/mm². */
const WELD_STRENGTH = 410;

export const IS_ENDS: EndPack = {
  standard: 'IS 800',
  boltShear: {
    clause: '10.3.3',
    confidence: 'from memory, sure',
    of: (question, end, working) => {
      const n = sheared(question, end, working);
      const fub = boltSteel(question, end, working);
      const A = shearedArea(end, working);
      const beta = working.step(
        'long joint',
        'β_lj',
        '1.075 − l_j/(200 d), 0.75 to 1',
        longJoint(boltedLength(end, question.section), end.boltDiameter),
        'factor',
      );
      return working.step(
        'resistance',
        'V_dsb',
        'n m β_lj f_ub A/(√3 × 1.25)',
        (n * beta * fub * A) / (Math.sqrt(3) * GAMMA),
        'force',
      );
    },
  },
  bearing: {
    clause: '10.3.4',
    confidence: 'from memory, sure',
    of: (question, end, working) => {
      const { t, d, fu } = borneOn(question, end, working);
      const n = working.given('bolts', 'n', end.bolts, 'count');
      const fub = boltSteel(question, end, working);
      const byPitch = boltsInLine(end, question.section) > 1 ? end.pitch / (3 * end.hole) - 0.25 : 1;
      const kb = working.step(
        'factor',
        'k_b',
        'min(e/(3d_0), p/(3d_0) − 0.25, f_ub/f_u, 1)',
        Math.max(0, Math.min(end.endDistance / (3 * end.hole), byPitch, fub / fu, 1)),
        'factor',
      );
      return working.step(
        'resistance',
        'V_dpb',
        '2.5 k_b n d t f_u/1.25',
        (2.5 * kb * n * d * t * fu) / GAMMA,
        'force',
      );
    },
  },
  weld: {
    clause: '10.5.7.1.1',
    confidence: 'from memory, sure',
    least: { sizes: 4, length: 0, clause: '10.5.4.1' },
    of: (question, end, working) => {
      // 10.5.3.2: 0.70 for legs at a right angle.
      const A = throats(question, end, 0.7, working);
      const fu = working.step(
        'the lesser strength',
        'f_u',
        'min(bar, weld metal 410)',
        Math.min(question.steel.fu, WELD_STRENGTH),
        'stress',
      );
      return working.step(
        'resistance',
        'P_dw',
        'f_u A_w/(√3 × 1.25)',
        (fu * A) / (Math.sqrt(3) * GAMMA),
        'force',
      );
    },
  },
};
