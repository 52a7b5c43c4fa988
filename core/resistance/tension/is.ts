/** IS 800:2007 clause 6. Practice-facts B6, C. */
import { deductedWidth } from '../holes.ts';
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { blockOf, boltedLength, netArea } from './boltRows.ts';
import { isOneLeg, isWhole, type TensionPack } from './pack.ts';

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
    const N = isOneLeg(question, end) ? oneLeg(question, end, working) : whole(question, end, working);
    return resistance(
      {
        kind: 'net rupture',
        title: isOneLeg(question, end) ? 'Rupture with shear lag' : 'Rupture of the net section',
        against: 'tension',
        end: end.end,
        resistance: N,
        standard: STANDARD,
        clause: isOneLeg(question, end) ? '6.3.3' : '6.3.1',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { netTension, grossTension, netShear, grossShear } = blockOf(question, end, working);
    const { fy, fu } = question.steel;
    const root = Math.sqrt(3);
    const a = working.step(
      'yield in shear, rupture in tension',
      'T_1',
      'A_gv f_y/(√3 × 1.10) + 0.9 A_nt f_u/1.25',
      (grossShear * fy) / (root * GAMMA_M0) + (0.9 * netTension * fu) / GAMMA_M1,
      'force',
    );
    const b = working.step(
      'rupture in shear, yield in tension',
      'T_2',
      '0.9 A_nv f_u/(√3 × 1.25) + A_gt f_y/1.10',
      (0.9 * netShear * fu) / (root * GAMMA_M1) + (grossTension * fy) / GAMMA_M0,
      'force',
    );
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: working.step('resistance', 'T_db', 'the lesser', Math.min(a, b), 'force'),
        standard: STANDARD,
        clause: '6.4.1',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
};

function whole(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const An =
    end.kind === 'bolted'
      ? netArea(question, end, working)
      : working.given('net area', 'A_n', question.section.properties.area, 'area');
  working.requires('every part of the section is connected', isWhole(question, end), 'part of it is not');
  return working.step(
    'resistance',
    'T_dn',
    '0.9 A_n f_u/1.25',
    (0.9 * An * question.steel.fu) / GAMMA_M1,
    'force',
  );
}

function oneLeg(
  { section, steel, practice, options }: TensionQuestion,
  end: ResistingEnd,
  working: Working,
): number {
  const { fy, fu } = steel;
  const t = working.given('thickness', 't', section.thickness, 'length');
  const w = working.given('outstanding leg', 'w', section.outstandingLeg, 'length');
  const bolted = end.kind === 'bolted';
  const bs = working.step(
    'shear lag width',
    'b_s',
    bolted ? 'w + w_1 − t' : 'w',
    bolted ? w + end.gauge - t : w,
    'length',
  );
  const Lc = working.given(
    'length of the connection',
    'L_c',
    bolted ? boltedLength(end) : end.weldLength,
    'length',
  );
  working.requires('more than one bolt in line', Lc > 0, 'one bolt');
  const holes = bolted ? end.rows * deductedWidth(practice, end.hole, options.punchedHoles) * t : 0;
  const Anc = working.step(
    'net area of the connected leg',
    'A_nc',
    '(b − t/2) t − d_h t',
    (section.connectedLeg - t / 2) * t - holes,
    'area',
  );
  const Ago = working.step(
    'gross area of the outstanding leg',
    'A_go',
    '(w − t/2) t',
    (w - t / 2) * t,
    'area',
  );
  const most = (fu * GAMMA_M0) / (fy * GAMMA_M1);
  const raw = Lc > 0 ? 1.4 - 0.076 * (w / t) * (fy / fu) * (bs / Lc) : 0.7;
  working.step('shear lag, before its bounds', 'β_0', '1.4 − 0.076 (w/t)(f_y/f_u)(b_s/L_c)', raw, 'factor');
  const beta = working.step(
    'shear lag',
    'β',
    '0.7 ≤ β_0 ≤ f_u γ_m0/(f_y γ_m1)',
    Math.min(most, Math.max(0.7, raw)),
    'factor',
  );
  return working.step(
    'resistance',
    'T_dn',
    '0.9 A_nc f_u/1.25 + β A_go f_y/1.10',
    (0.9 * Anc * fu) / GAMMA_M1 + (beta * Ago * fy) / GAMMA_M0,
    'force',
  );
}
