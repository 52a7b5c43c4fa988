/** EN 1993-1-1 6.2.3, EN 1993-1-8 3.10 and 4.13. Practice-facts B4, C. */

import { stressArea } from '../connection/fasteners.ts';
import type { Resistance, ResistanceOptions, ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { type Block, blocksOf, weakestBlock } from './blocks.ts';
import { holesLieInside, netArea, netOf, pliesOf } from './boltRows.ts';
import { heldBy, isOneLeg, isWhole, refuseShape, type TensionPack } from './pack.ts';
import { rodDiameter } from './rods.ts';
import { givenStresses } from './stresses.ts';

/** Recommended values; a national annex may have others. */
export function partialFactors({ partialFactors: chosen }: ResistanceOptions): {
  readonly M0: number;
  readonly M1: number;
  readonly M2: number;
} {
  return { M0: chosen.gammaM0 ?? 1, M1: chosen.gammaM1 ?? 1, M2: chosen.gammaM2 ?? 1.25 };
}

export const EN: TensionPack = {
  grossYield: ({ section, steel, options }) => {
    const working = new Working();
    const A = working.given('gross area', 'A', section.properties.area, 'area');
    const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
    const gamma = working.given('partial factor', 'γ_M0', partialFactors(options).M0, 'factor');
    return resistance(
      {
        kind: 'gross yield',
        title: 'Yield of the gross section',
        against: 'tension',
        resistance: working.step('resistance', 'N_pl,Rd', 'A f_y/γ_M0', (A * fy) / gamma, 'force'),
        standard: 'EN 1993-1-1',
        clause: '6.2.3(2)a, (6.6)',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  netRupture: (question, end) => {
    if (end.kind === 'welded') return welded(question, end);
    return isOneLeg(question, end) ? oneLeg(question, end) : concentric(question, end);
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { fy, fu } = givenStresses(question.steel, 'f', working);
    const { M0, M2 } = partialFactors(question.options);
    // A block of an angle by one leg is off the force's line: (3.10), unless the user holds with (3.9).
    const share = ({ even }: Block): number =>
      even || question.options.blockTearing === 'through the middle' ? 1 : 0.5;
    const strength = (block: Block): number =>
      (share(block) * fu * block.netTension) / M2 + (fy * block.netShear) / (Math.sqrt(3) * M0);
    const block = weakestBlock(blocksOf(question, end), strength, working);
    const off = block !== null && share(block) < 1;
    if (block) {
      working.given('partial factor', 'γ_M0', M0, 'factor');
      working.given('partial factor', 'γ_M2', M2, 'factor');
    }
    return resistance(
      {
        kind: 'block shear',
        title: 'Block tearing',
        against: 'tension',
        end: end.end,
        resistance:
          block &&
          working.step(
            'resistance',
            off ? 'V_eff,2,Rd' : 'V_eff,1,Rd',
            `${off ? '0.5 ' : ''}f_u A_nt/γ_M2 + f_y A_nv/(√3 γ_M0)`,
            strength(block),
            'force',
          ),
        standard: 'EN 1993-1-8',
        clause: off ? '3.10.2(3), (3.10)' : '3.10.2(2), (3.9)',
        confidence: 'from memory, sure',
        note: isOneLeg(question, end)
          ? 'Practice differs on (3.9) or (3.10) for an angle by one leg; the settings choose.'
          : null,
      },
      working,
    );
  },
  threadRupture: ({ section, steel, options }, end) => {
    const working = new Working();
    const d = working.given('diameter', 'd', rodDiameter(section), 'length');
    const A = working.step('stress area', 'A_s', 'π/4 (d − 0.9382 p)²', stressArea(d), 'area');
    const fu = working.given('tensile strength', 'f_u', steel.fu, 'stress');
    const gamma = working.given('partial factor', 'γ_M2', partialFactors(options).M2, 'factor');
    return resistance(
      {
        kind: 'net rupture',
        title: 'Rupture at the thread',
        against: 'tension',
        end: end.end,
        resistance: working.step('resistance', 'F_t,Rd', '0.9 f_u A_s/γ_M2', (0.9 * fu * A) / gamma, 'force'),
        standard: 'EN 1993-1-8',
        clause: 'Table 3.4',
        confidence: 'from memory, sure',
        note: '3.6.1(3) takes 0.85 of this where threads are cut by others than makers of bolts.',
      },
      working,
    );
  },
};

const RUPTURE = { kind: 'net rupture', against: 'tension', confidence: 'from memory, sure' } as const;

/** (6.7): what is wholly connected. */
function concentric(question: TensionQuestion, end: ResistingEnd): Resistance {
  const working = new Working();
  const { steel, options } = question;
  const gamma = partialFactors(options).M2;
  const holds = isWhole(question, end);
  if (!holds) refuseShape(question, end, 'a flat, or a single angle', working);
  const An = holds ? netArea(question, end, working) : null;
  if (An !== null) working.given('partial factor', 'γ_M2', gamma, 'factor');
  return resistance(
    {
      ...RUPTURE,
      end: end.end,
      title: 'Rupture of the net section',
      resistance:
        An === null
          ? null
          : working.step(
              'resistance',
              'N_u,Rd',
              '0.9 A_net f_u/γ_M2',
              (0.9 * An * steel.fu) / gamma,
              'force',
            ),
      standard: 'EN 1993-1-1',
      clause: '6.2.3(2)b, (6.7)',
    },
    working,
  );
}

/** 3.10.3: one row of bolts in one leg. */
function oneLeg(question: TensionQuestion, end: ResistingEnd): Resistance {
  const working = new Working();
  const { section, steel, options } = question;
  const gamma = partialFactors(options).M2;
  const { fu } = steel;
  const common = { ...RUPTURE, end: end.end, standard: 'EN 1993-1-8' } as const;
  working.requires('one row of bolts: 3.10.3 speaks of no more', end.rows === 1, 'two rows');
  if (working.refused)
    return resistance(
      { ...common, title: 'Rupture of the net section, shear lag', resistance: null, clause: '3.10.3' },
      working,
    );
  const d0 = working.given('hole', 'd_0', end.hole, 'length');
  if (end.bolts === 1) {
    holesLieInside(section, end, working);
    const t = working.given('thickness', 't', section.thickness, 'length');
    const e2 = working.given('edge distance', 'e_2', end.edgeDistance, 'length');
    working.given('partial factor', 'γ_M2', gamma, 'factor');
    const N = (2 * Math.max(0, e2 - 0.5 * d0) * t * fu) / gamma;
    return resistance(
      {
        ...common,
        title: 'Rupture of the net section, one bolt',
        resistance: working.step('resistance', 'N_u,Rd', '2.0 (e_2 − 0.5 d_0) t f_u/γ_M2', N, 'force'),
        clause: '3.10.3, (3.11)',
      },
      working,
    );
  }
  const An = oneLegNet(question, end, working);
  const p = working.given('pitch', 'p_1', end.pitch, 'length');
  const two = end.bolts === 2;
  const symbol = two ? 'β_2' : 'β_3';
  const beta = working.step(
    'reduction',
    symbol,
    `Table 3.8: ${two ? '0.4' : '0.5'} up to p_1 = 2.5 d_0, 0.7 from 5 d_0`,
    betaOf(end.bolts, p / d0),
    'factor',
  );
  working.given('partial factor', 'γ_M2', gamma, 'factor');
  return resistance(
    {
      ...common,
      title: 'Rupture of the net section, shear lag',
      resistance: working.step(
        'resistance',
        'N_u,Rd',
        `${symbol} A_net f_u/γ_M2`,
        (beta * An * fu) / gamma,
        'force',
      ),
      clause: two ? '3.10.3, (3.12)' : '3.10.3, (3.13)',
    },
    working,
  );
}

/** Table 3.8, linear between p_1 = 2.5 d_0 and 5 d_0. */
export function betaOf(bolts: number, pitchOverHole: number): number {
  const low = bolts === 2 ? 0.4 : 0.5;
  return low + (0.7 - low) * Math.min(1, Math.max(0, (pitchOverHole - 2.5) / 2.5));
}

/** An unequal angle by its smaller leg counts as an equal one of that leg. */
function oneLegNet(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  if (section.connectedLeg >= section.outstandingLeg) return netArea(question, end, working);
  return netOf(smallerLegArea(question, working), 'A_eq', question, end, working);
}

/** Area of the equal angle, both of a pair. */
function smallerLegArea({ section }: TensionQuestion, working: Working): number {
  const lost = pliesOf(section) * (section.outstandingLeg - section.connectedLeg) * section.thickness;
  const pair = pliesOf(section) === 2 ? '2 ' : '';
  return working.step(
    'area of an equal angle of the smaller leg',
    'A_eq',
    `A − ${pair}(h − b) t`,
    section.properties.area - lost,
    'area',
  );
}

/** 4.13: the area that counts beside the weld. */
function welded(question: TensionQuestion, end: ResistingEnd): Resistance {
  const working = new Working();
  const { section, steel, options } = question;
  const gamma = partialFactors(options).M0;
  const held = heldBy(question, end);
  if (held === 'in part') refuseShape(question, end, 'a flat, an angle or a pair', working);
  const smaller = held !== 'whole' && section.connectedLeg < section.outstandingLeg;
  const A = working.refused
    ? null
    : smaller
      ? smallerLegArea(question, working)
      : working.given('effective area', 'A', section.properties.area, 'area');
  if (A !== null) working.given('partial factor', 'γ_M0', gamma, 'factor');
  return resistance(
    {
      ...RUPTURE,
      end: end.end,
      title: 'Effective section at the weld',
      resistance:
        A === null
          ? null
          : working.step('resistance', 'N_Rd', 'A_eff f_y/γ_M0', (A * steel.fy) / gamma, 'force'),
      standard: 'EN 1993-1-8',
      clause: '4.13',
    },
    working,
  );
}
