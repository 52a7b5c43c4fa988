/** SANS 10162-1 and CSA S16: one ancestor, different factors. Practice-facts B1, B2, C. */
import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { blockOf, boltLines, netArea } from './boltRows.ts';
import { isOneLeg, isWhole, type TensionPack } from './pack.ts';
import { weldedArea } from './weldedArea.ts';

const PHI = 0.9;
const PHI_U = 0.75;

interface Member {
  readonly standard: string;
  /** What stands before A′_ne f_u: 0.85 φ of the older rule, φ_u of the newer. */
  readonly rupture: { readonly factor: number; readonly says: string; readonly symbol: string };
  readonly blockShear: (question: TensionQuestion, end: ResistingEnd) => Resistance;
}

function pack({ standard, rupture, blockShear }: Member): TensionPack {
  return {
    grossYield: ({ section, steel }) => {
      const working = new Working();
      const A = working.given('gross area', 'A_g', section.properties.area, 'area');
      const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
      const N = working.step('resistance', 'T_r', '0.90 A_g f_y', PHI * A * fy, 'force');
      return resistance(
        {
          kind: 'gross yield',
          title: 'Yield of the gross section',
          against: 'tension',
          resistance: N,
          standard,
          clause: '13.2(a)(i)',
          confidence: 'from memory, sure',
        },
        working,
      );
    },
    netRupture: (question, end) => {
      const working = new Working();
      const area =
        end.kind === 'bolted'
          ? boltedArea(question, end, working)
          : weldedArea(question.section, end, working);
      const fu = working.given('tensile strength', 'f_u', question.steel.fu, 'stress');
      const N = working.step(
        'resistance',
        'T_r',
        `${rupture.says} A′_ne f_u`,
        rupture.factor * area * fu,
        'force',
      );
      return resistance(
        {
          kind: 'net rupture',
          title: isWhole(question, end) ? 'Rupture of the net section' : 'Rupture with shear lag',
          against: 'tension',
          end: end.end,
          resistance: N,
          standard,
          clause: end.kind === 'bolted' ? '13.2(a)(iii), 12.3.3.2' : '13.2(a)(iii), 12.3.3.3',
          confidence:
            end.kind === 'welded' && standard.startsWith('SANS')
              ? 'from memory, verify'
              : 'from memory, sure',
        },
        working,
      );
    },
    blockShear,
  };
}

/** 0.80 or 0.60 of the net area of an angle by one leg (12.3.3.2(b)); 0.85 or 0.75 of other shapes not wholly connected (c). */
function boltedArea(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const net = netArea(question, end, working);
  if (isWhole(question, end)) return working.step('effective net area', 'A′_ne', 'A_n', net, 'area');
  const lines = working.given('lines of bolts across the force', 'n', boltLines(end), 'count');
  const share =
    isOneLeg(question, end) || question.section.shape.includes('angles')
      ? lines >= 4
        ? 0.8
        : 0.6
      : lines >= 3
        ? 0.85
        : 0.75;
  return working.step('effective net area', 'A′_ne', `${share.toFixed(2)} A_n`, share * net, 'area');
}

export const SANS: TensionPack = pack({
  standard: 'SANS 10162-1',
  rupture: { factor: 0.85 * PHI, says: '0.85 × 0.90', symbol: '0.85 φ' },
  blockShear: (question, end) => {
    const working = new Working();
    const { netTension, netShear, grossShear } = blockOf(question, end, working);
    const { fy, fu } = question.steel;
    const a = working.step(
      'with yield in shear',
      'V_1',
      '0.90 A_nt f_u + 0.60 × 0.90 A_gv f_y',
      PHI * netTension * fu + 0.6 * PHI * grossShear * fy,
      'force',
    );
    const b = working.step(
      'with rupture in shear',
      'V_2',
      '0.90 A_nt f_u + 0.60 × 0.90 A_nv f_u',
      PHI * netTension * fu + 0.6 * PHI * netShear * fu,
      'force',
    );
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: working.step('resistance', 'T_r + V_r', 'the lesser', Math.min(a, b), 'force'),
        standard: 'SANS 10162-1',
        clause: '13.11',
        confidence: 'from memory, verify',
      },
      working,
    );
  },
});

export const CSA: TensionPack = pack({
  standard: 'CSA S16',
  rupture: { factor: PHI_U, says: '0.75', symbol: 'φ_u' },
  blockShear: (question, end) => {
    const working = new Working();
    const { netTension, grossShear } = blockOf(question, end, working);
    const { fy, fu } = question.steel;
    const Ut = working.given('factor for uneven tension', 'U_t', isOneLeg(question, end) ? 0.6 : 1, 'factor');
    const shear = working.step(
      'stress in shear',
      'f_v',
      fy > 460 ? 'F_y' : '(F_y + F_u)/2',
      fy > 460 ? fy : (fy + fu) / 2,
      'stress',
    );
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: working.step(
          'resistance',
          'T_r',
          '0.75 (U_t A_n F_u + 0.60 A_gv f_v)',
          PHI_U * (Ut * netTension * fu + 0.6 * grossShear * shear),
          'force',
        ),
        standard: 'CSA S16',
        clause: '13.11',
        confidence: 'read in a source',
      },
      working,
    );
  },
});
