/** AS 4100 clause 7 and 9.1.9. Practice-facts B5, C. */
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { blockOf, netArea } from './boltRows.ts';
import { isWhole, type TensionPack } from './pack.ts';

const STANDARD = 'AS 4100';
const PHI = 0.9;

export const AS: TensionPack = {
  grossYield: ({ section, steel }) => {
    const working = new Working();
    const A = working.given('gross area', 'A_g', section.properties.area, 'area');
    const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
    return resistance(
      {
        kind: 'gross yield',
        title: 'Yield of the gross section',
        against: 'tension',
        resistance: working.step('capacity', 'φN_t', '0.90 A_g f_y', PHI * A * fy, 'force'),
        standard: STANDARD,
        clause: '7.2(1)',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  netRupture: (question, end) => {
    const working = new Working();
    const An =
      end.kind === 'bolted'
        ? netArea(question, end, working)
        : working.given('net area', 'A_n', question.section.properties.area, 'area');
    const { kt, sure } = distribution(question, end);
    working.step('distribution of forces', 'k_t', 'Table 7.3.2', kt, 'factor');
    const fu = working.given('tensile strength', 'f_u', question.steel.fu, 'stress');
    return resistance(
      {
        kind: 'net rupture',
        title: 'Rupture of the net section',
        against: 'tension',
        end: end.end,
        resistance: working.step(
          'capacity',
          'φN_t',
          '0.90 × 0.85 k_t A_n f_u',
          PHI * 0.85 * kt * An * fu,
          'force',
        ),
        standard: STANDARD,
        clause: '7.2(2), 7.3.2',
        confidence: sure ? 'from memory, sure' : 'from memory, verify',
      },
      working,
    );
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { netTension, netShear, grossShear } = blockOf(question, end, working);
    const { fy, fu } = question.steel;
    const rupture = 0.6 * fu * netShear + fu * netTension;
    const yields = 0.6 * fy * grossShear + fu * netTension;
    const R = working.step(
      'nominal capacity',
      'R_bs',
      '0.6 f_u A_nv + k_bs f_u A_nt ≤ 0.6 f_y A_gv + k_bs f_u A_nt, k_bs = 1',
      Math.min(rupture, yields),
      'force',
    );
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: working.step('capacity', 'φR_bs', '0.75 R_bs', 0.75 * R, 'force'),
        standard: STANDARD,
        clause: '9.1.9 (2020; not in 1998)',
        confidence: 'from memory, verify',
      },
      working,
    );
  },
};

/** 0.85 for an angle by one leg, 0.75 where that is the short leg of an unequal one. */
function distribution({ section }: TensionQuestion, end: ResistingEnd): { kt: number; sure: boolean } {
  switch (section.shape) {
    case 'angle':
      if (end.legs === 'both') return { kt: 1, sure: false };
      return { kt: section.connectedLeg < section.outstandingLeg ? 0.75 : 0.85, sure: true };
    case 'angles back to back':
    case 'starred angles':
      return { kt: 1, sure: false };
    case 'channel':
    case 'tee':
      return { kt: 0.85, sure: false };
    default:
      return { kt: isWhole({ section } as TensionQuestion, end) ? 1 : 0.85, sure: false };
  }
}
