/** IS 800:2007 clause 6. Practice-facts B6, C. */
import { stressArea } from '../connection/fasteners.ts';
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { type Block, blocksOf, weakestBlock } from './blocks.ts';
import { boltedLength, netArea, netOf } from './boltRows.ts';
import { isOneLeg, isWhole, refuseShape, ruptureTitle, type TensionPack } from './pack.ts';
import { rodDiameter } from './rods.ts';
import { givenStresses } from './stresses.ts';

const STANDARD = 'IS 800';
export const GAMMA_M0 = 1.1;
export const GAMMA_M1 = 1.25;

export const IS: TensionPack = {
  grossYield: ({ section, steel }) => {
    const working = new Working();
    const A = working.given('gross area', 'A_g', section.properties.area, 'area');
    const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
    return resistance(
      {
        kind: 'gross yield',
        title: 'Yield of the gross section',
        against: 'tension',
        resistance: working.step('resistance', 'T_dg', 'A_g f_y/1.10', (A * fy) / GAMMA_M0, 'force'),
        standard: STANDARD,
        clause: '6.2',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  netRupture: (question, end) => {
    const working = new Working();
    const lag = isOneLeg(question, end);
    return resistance(
      {
        kind: 'net rupture',
        title: ruptureTitle(question, end),
        against: 'tension',
        end: end.end,
        resistance: lag ? oneLeg(question, end, working) : whole(question, end, working),
        standard: STANDARD,
        clause: lag ? '6.3.3' : '6.3.1',
        confidence: lag && end.kind === 'bolted' ? 'read in a source' : 'from memory, sure',
      },
      working,
    );
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { fy, fu } = givenStresses(question.steel, 'f', working);
    const root = Math.sqrt(3);
    const yields = ({ grossShear, netTension }: Block): number =>
      (grossShear * fy) / (root * GAMMA_M0) + (0.9 * netTension * fu) / GAMMA_M1;
    const tears = ({ netShear, grossTension }: Block): number =>
      (0.9 * netShear * fu) / (root * GAMMA_M1) + (grossTension * fy) / GAMMA_M0;
    const lesser = (block: Block): number => Math.min(yields(block), tears(block));
    const block = weakestBlock(blocksOf(question, end), lesser, working);
    if (block) {
      working.step(
        'yield in shear, rupture in tension',
        'T_1',
        'A_gv f_y/(√3 × 1.10) + 0.9 A_nt f_u/1.25',
        yields(block),
        'force',
      );
      working.step(
        'rupture in shear, yield in tension',
        'T_2',
        '0.9 A_nv f_u/(√3 × 1.25) + A_gt f_y/1.10',
        tears(block),
        'force',
      );
    }
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: block && working.step('resistance', 'T_db', 'min(T_1, T_2)', lesser(block), 'force'),
        standard: STANDARD,
        clause: '6.4.1',
        confidence: 'read in a source',
      },
      working,
    );
  },
  threadRupture: ({ section, steel }, end) => {
    const working = new Working();
    const d = working.given('diameter', 'd', rodDiameter(section), 'length');
    const An = working.step('stress area', 'A_n', 'π/4 (d − 0.9382 p)²', stressArea(d), 'area');
    const { fy, fu } = steel;
    const tears = working.step(
      'rupture of the thread',
      'T_1',
      '0.9 f_u A_n/1.25',
      (0.9 * fu * An) / 1.25,
      'force',
    );
    const shank = working.step(
      'yield of the shank',
      'T_2',
      'f_y A_sb/1.10',
      (fy * section.properties.area) / 1.1,
      'force',
    );
    return resistance(
      {
        kind: 'net rupture',
        title: 'Rupture at the thread',
        against: 'tension',
        end: end.end,
        resistance: working.step('resistance', 'T_db', 'min(T_1, T_2)', Math.min(tears, shank), 'force'),
        standard: STANDARD,
        clause: '10.3.5',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
};

function whole(question: TensionQuestion, end: ResistingEnd, working: Working): number | null {
  if (!isWhole(question, end)) {
    refuseShape(question, end, 'a flat, or a single angle', working);
    return null;
  }
  const An =
    end.kind === 'bolted'
      ? netArea(question, end, working)
      : working.step('net area', 'A_n', 'A_g, nothing taken out', question.section.properties.area, 'area');
  return working.step(
    'resistance',
    'T_dn',
    '0.9 A_n f_u/1.25',
    (0.9 * An * question.steel.fu) / GAMMA_M1,
    'force',
  );
}

function oneLeg(question: TensionQuestion, end: ResistingEnd, working: Working): number | null {
  const { section, steel } = question;
  const { fy, fu } = steel;
  const bolted = end.kind === 'bolted';
  const length = bolted ? boltedLength(end, section) : end.weldLength;
  working.requires('two bolts in line at least, or a weld', length > 0, bolted ? 'one bolt' : 'no weld');
  if (working.refused) return null;
  const t = working.given('thickness', 't', section.thickness, 'length');
  const w = working.given('outstanding leg', 'w', section.outstandingLeg, 'length');
  if (bolted) working.given('heel to the first row', 'w_1', end.gauge, 'length');
  const bs = working.step(
    'shear lag width',
    'b_s',
    bolted ? 'w + w_1 − t' : 'w',
    bolted ? w + end.gauge - t : w,
    'length',
  );
  const Lc = working.given('length of the connection', 'L_c', length, 'length');
  const leg = working.step(
    'area of the connected leg',
    'A_c',
    '(b − t/2) t',
    (section.connectedLeg - t / 2) * t,
    'area',
  );
  const Anc = bolted ? netOf(leg, 'A_c', question, end, working) : leg;
  const Ago = working.step(
    'gross area of the outstanding leg',
    'A_go',
    '(w − t/2) t',
    (w - t / 2) * t,
    'area',
  );
  // A weld of less than a millimetre is none, and would divide by nothing.
  const raw = 1.4 - 0.076 * (w / t) * (fy / fu) * (bs / Math.max(Lc, 1));
  working.step('shear lag, before its bounds', 'β_0', '1.4 − 0.076 (w/t)(f_y/f_u)(b_s/L_c)', raw, 'factor');
  const most = working.step(
    'at most',
    'β_max',
    'f_u γ_m0/(f_y γ_m1)',
    (fu * GAMMA_M0) / (fy * GAMMA_M1),
    'factor',
  );
  const beta = working.step(
    'shear lag',
    'β',
    '0.7 ≤ β_0 ≤ β_max',
    Math.min(most, Math.max(0.7, raw)),
    'factor',
  );
  return working.step(
    'resistance',
    'T_dn',
    `0.9 ${bolted ? 'A_n' : 'A_c'} f_u/1.25 + β A_go f_y/1.10`,
    (0.9 * Anc * fu) / GAMMA_M1 + (beta * Ago * fy) / GAMMA_M0,
    'force',
  );
}
