/** AS 4100 clause 9: bolts and fillet welds. φ = 0.80 bolts in shear and welds SP, 0.90 ply in bearing. */
import { bolted } from './fasteners.ts';
import { boltSteel, borneOn, sheared, shearedCore, THROAT, throats } from './givens.ts';
import type { EndPack } from './pack.ts';

/** E49, N/mm²; 480 in 1998. */
const WELD_STRENGTH = 490;

export const AS_ENDS: EndPack = {
  standard: 'AS 4100',
  boltShear: {
    clause: '9.2.2.1 (9.3.2.1 in 1998)',
    confidence: 'from memory, sure',
    of: (question, end, working) => {
      const n = sheared(question, end, working);
      const fuf = boltSteel(question, end, working);
      const A = shearedCore(end, working);
      return working.step('capacity', 'φV_f', '0.80 × 0.62 n m f_ub A', 0.8 * 0.62 * n * fuf * A, 'force');
    },
  },
  bearing: {
    clause: '9.2.2.4 (9.3.2.4 in 1998)',
    confidence: 'from memory, verify',
    of: (question, end, working) => {
      const { t, d, fu } = borneOn(question, end, working);
      // a_e runs from the edge of the hole to the next edge, with half a bolt on top.
      const one = (ae: number): number => Math.min(3.2 * d, Math.max(0, ae)) * t * fu;
      const { first, behind } = bolted(end, question.section);
      const lead = working.step(
        'a bolt at the end',
        'V_be',
        'min(3.2 d, a_e) t f_u, a_e = end distance − d_h/2 + d/2',
        one(end.endDistance - end.hole / 2 + d / 2),
        'force',
      );
      const next =
        behind > 0
          ? working.step(
              'a bolt behind it',
              'V_bi',
              'the same, a_e = pitch − d_h + d/2',
              one(end.pitch - end.hole + d / 2),
              'force',
            )
          : 0;
      return working.step(
        'capacity',
        'φV_b',
        '0.90 (n_e V_be + n_i V_bi)',
        0.9 * (first * lead + behind * next),
        'force',
      );
    },
  },
  weld: {
    clause: '9.6.3.10 (9.7.3.10 in 1998)',
    confidence: 'from memory, sure',
    least: { sizes: 4, length: 0, clause: '9.6.3.4, from memory, verify' },
    of: (question, end, working) => {
      const A = throats(question, end, THROAT, working);
      const fuw = working.given('strength of the weld metal', 'f_uw', WELD_STRENGTH, 'stress');
      return working.step(
        'capacity',
        'φV_w',
        '0.80 × 0.6 f_uw A_w, category SP',
        0.8 * 0.6 * fuw * A,
        'force',
      );
    },
  },
};
