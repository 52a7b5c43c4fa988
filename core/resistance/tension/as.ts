/** AS 4100 clause 7 and 9.1.9. Practice-facts B5, C. */
import { stressArea } from '../connection/fasteners.ts';
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { type Block, blocksOf, weakestBlock } from './blocks.ts';
import { netArea } from './boltRows.ts';
import { refuseShape, ruptureTitle, type TensionPack } from './pack.ts';
import { rodDiameter } from './rods.ts';
import { givenStresses } from './stresses.ts';

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
    const correction = correctionFor(question, end);
    if (!correction)
      refuseShape(question, end, 'a flat, an angle, a pair back to back or a channel', working);
    return resistance(
      {
        kind: 'net rupture',
        title: ruptureTitle(question, end),
        against: 'tension',
        end: end.end,
        resistance: correction && rupture(correction.kt, question, end, working),
        standard: STANDARD,
        clause: '7.2(2), 7.3.2',
        confidence: correction?.sure ? 'from memory, sure' : 'from memory, verify',
        note:
          end.kind === 'bolted' && correction && correction.kt < 1
            ? 'The number of bolts has no part in k_t.'
            : null,
      },
      working,
    );
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { fy, fu } = givenStresses(question.steel, 'f', working);
    const tears = ({ netShear, netTension }: Block): number => 0.6 * fu * netShear + fu * netTension;
    const yields = ({ grossShear, netTension }: Block): number => 0.6 * fy * grossShear + fu * netTension;
    const nominal = (block: Block): number => Math.min(tears(block), yields(block));
    const block = weakestBlock(blocksOf(question, end), nominal, working);
    if (block) {
      working.step(
        'with rupture in shear',
        'R_1',
        '0.6 f_u A_nv + k_bs f_u A_nt, k_bs = 1',
        tears(block),
        'force',
      );
      working.step('with yield in shear', 'R_2', '0.6 f_y A_gv + k_bs f_u A_nt', yields(block), 'force');
      working.step('nominal capacity', 'R_bs', 'min(R_1, R_2)', nominal(block), 'force');
    }
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: block && working.step('capacity', 'φR_bs', '0.75 R_bs', 0.75 * nominal(block), 'force'),
        standard: STANDARD,
        clause: '9.1.9 (2020; not in 1998)',
        confidence: 'from memory, verify',
      },
      working,
    );
  },
  threadRupture: ({ section, steel }, end) => {
    const working = new Working();
    const d = working.given('diameter', 'd', rodDiameter(section), 'length');
    const A = working.step('stress area', 'A_s', 'π/4 (d − 0.9382 p)²', stressArea(d), 'area');
    const fu = working.given('tensile strength', 'f_uf', steel.fu, 'stress');
    return resistance(
      {
        kind: 'net rupture',
        title: 'Rupture at the thread',
        against: 'tension',
        end: end.end,
        resistance: working.step('capacity', 'φN_tf', '0.80 A_s f_uf', 0.8 * A * fu, 'force'),
        standard: STANDARD,
        clause: '9.2.2.2 (9.3.2.2 in 1998)',
        confidence: 'from memory, verify',
      },
      working,
    );
  },
};

function rupture(kt: number, question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const An =
    end.kind === 'bolted'
      ? netArea(question, end, working)
      : working.step('net area', 'A_n', 'A_g, nothing taken out', question.section.properties.area, 'area');
  working.step('distribution of forces', 'k_t', 'Table 7.3.2', kt, 'factor');
  const fu = working.given('tensile strength', 'f_u', question.steel.fu, 'stress');
  return working.step('capacity', 'φN_t', '0.90 × 0.85 k_t A_n f_u', PHI * 0.85 * kt * An * fu, 'force');
}

/** k_t of Table 7.3.2; null for what is not held here. 0.75 is the short leg of an unequal angle. */
function correctionFor(
  { section }: TensionQuestion,
  end: ResistingEnd,
): { readonly kt: number; readonly sure: boolean } | null {
  switch (section.shape) {
    case 'angle':
      if (end.legs === 'both') return { kt: 1, sure: false };
      return { kt: section.connectedLeg < section.outstandingLeg ? 0.75 : 0.85, sure: true };
    case 'angles back to back':
      // Either side of the gusset.
      return { kt: 1, sure: false };
    case 'flat':
      return { kt: 1, sure: true };
    case 'channel':
      // By its web; 0.9 in some layouts.
      return { kt: 0.85, sure: false };
    case 'starred angles':
    case 'rod':
    case 'tee':
    case 'I section':
    case 'round tube':
    case 'square tube':
      return null;
    default:
      return section.shape satisfies never;
  }
}
