/** SANS 10162-1 and CSA S16, clause 13: bolts and fillet welds. φ_b = φ_br = 0.80 (φ_br = 0.67 in SANS), φ_w = 0.67. */
import type { TensionQuestion } from '../model.ts';
import { boltedLength } from '../tension/boltRows.ts';
import { bolted } from './fasteners.ts';
import { boltSteel, borneOn, shank, sheared, THROAT, throats } from './givens.ts';
import type { EndPack, EndRule, LeastWeld } from './pack.ts';

/** From this length on, mm, a lap takes 0.50 instead of 0.60. */
const LONG = 760;
/** Of the electrode that goes with the usual grades, N/mm². */
const WELD_STRENGTH = 490;

const shearOf: EndRule['of'] = (question, end, working) => {
  const n = sheared(question, end, working);
  const fub = boltSteel(question, end, working);
  const A = shank(end, working);
  const long = boltedLength(end, question.section) >= LONG;
  const share = long ? 0.5 : 0.6;
  const threads = end.threadsInShear ? 0.7 : 1;
  return working.step(
    'resistance',
    'V_r',
    `${share.toFixed(2)} × 0.80 n m A_b f_ub${end.threadsInShear ? ' × 0.70, threads in shear' : ''}`,
    share * 0.8 * n * A * fub * threads,
    'force',
  );
};

const weldOf: EndRule['of'] = (question, end, working) => {
  const A = throats(question, end, THROAT, working);
  const Xu = working.given('strength of the weld metal', 'X_u', WELD_STRENGTH, 'stress');
  return working.step('resistance', 'V_r', '0.67 × 0.67 A_w X_u', 0.67 * 0.67 * A * Xu, 'force');
};

const LEAST_WELD: LeastWeld = { sizes: 4, length: 40, clause: 'CSA W59, SANS 10162-1 likewise' };

/** Stress along which a bolt tears out, as 13.11 has it. */
const tearing = ({ steel: { fy, fu } }: TensionQuestion): number => (fy > 460 ? fy : (fy + fu) / 2);

export const CSA_ENDS: EndPack = {
  standard: 'CSA S16',
  boltShear: { clause: '13.12.1.2(c)', confidence: 'read in a source', of: shearOf },
  bearing: {
    clause: '13.12.1.2(a), 13.11',
    confidence: 'read in a source',
    of: (question, end, working) => {
      const { t, d, fu } = borneOn(question, end, working);
      const n = working.given('bolts', 'n', end.bolts, 'count');
      const all = working.step(
        'bearing of all',
        'B_1',
        '3 × 0.80 n t d F_u',
        3 * 0.8 * n * t * d * fu,
        'force',
      );
      const { first, behind } = bolted(end, question.section);
      const torn = working.step(
        'bolts at the end tear out',
        'T_e',
        '0.75 × 0.60 × 2 e t n_e (F_y + F_u)/2',
        0.75 * 0.6 * 2 * end.endDistance * t * first * tearing(question),
        'force',
      );
      const mixed = working.step(
        'with bearing of those behind',
        'B_2',
        'T_e + 3 × 0.80 (n − n_e) t d F_u',
        torn + 3 * 0.8 * behind * t * d * fu,
        'force',
      );
      return working.step('resistance', 'B_r', 'min(B_1, B_2)', Math.min(all, mixed), 'force');
    },
  },
  weld: { clause: '13.13.2.2', confidence: 'from memory, sure', of: weldOf, least: LEAST_WELD },
};

export const SANS_ENDS: EndPack = {
  standard: 'SANS 10162-1',
  boltShear: { clause: '13.12.1.1', confidence: 'from memory, verify', of: shearOf },
  bearing: {
    clause: '13.10(c)',
    confidence: 'from memory, verify',
    of: (question, end, working) => {
      const { t, d, fu } = borneOn(question, end, working);
      const n = working.given('bolts', 'n', end.bolts, 'count');
      const bears = working.step('bearing', 'B_1', '3 × 0.67 t d n f_u', 3 * 0.67 * t * d * n * fu, 'force');
      const torn = working.step(
        'towards the end',
        'B_2',
        '0.67 a t n f_u, a the end distance',
        0.67 * end.endDistance * t * n * fu,
        'force',
      );
      return working.step('resistance', 'B_r', 'min(B_1, B_2)', Math.min(bears, torn), 'force');
    },
  },
  weld: { clause: '13.13.2.2', confidence: 'from memory, verify', of: weldOf, least: LEAST_WELD },
};
