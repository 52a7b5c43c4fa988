/** AISC 360-16 and -22, chapters D and J. Practice-facts B3, C. */
import type { ResistanceOptions, ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { type Block, blocksOf, weakestBlock } from './blocks.ts';
import { boltedLength, boltsInLine, netArea, pliesOf } from './boltRows.ts';
import { heldBy, refuseShape, ruptureTitle, type TensionPack } from './pack.ts';
import { rodDiameter } from './rods.ts';
import { givenStresses } from './stresses.ts';

const STANDARD = 'AISC 360';

/** Design strength φR_n, or allowable strength R_n/Ω. */
export function strengthOf(
  nominal: number,
  phi: number,
  omega: number,
  { method }: ResistanceOptions,
  working: Working,
  symbol: string,
): number {
  return method === 'ASD'
    ? working.step(
        'allowable strength',
        `${symbol}/Ω`,
        `${symbol}/${omega.toFixed(2)}`,
        nominal / omega,
        'force',
      )
    : working.step('design strength', `φ${symbol}`, `${phi.toFixed(2)} ${symbol}`, phi * nominal, 'force');
}

export const AISC: TensionPack = {
  grossYield: ({ section, steel, options }) => {
    const working = new Working();
    const A = working.given('gross area', 'A_g', section.properties.area, 'area');
    const Fy = working.given('yield stress', 'F_y', steel.fy, 'stress');
    const Pn = working.step('nominal strength', 'P_n', 'F_y A_g', Fy * A, 'force');
    return resistance(
      {
        kind: 'gross yield',
        title: 'Yield of the gross section',
        against: 'tension',
        resistance: strengthOf(Pn, 0.9, 1.67, options, working, 'P_n'),
        standard: STANDARD,
        clause: 'D2(a), (D2-1)',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  netRupture: (question, end) => {
    const working = new Working();
    const area = effectiveArea(question, end, working);
    return resistance(
      {
        kind: 'net rupture',
        title: ruptureTitle(question, end),
        against: 'tension',
        end: end.end,
        resistance: area === null ? null : rupture(area, question, working),
        standard: STANDARD,
        clause: `D2(b), (D2-2), Table D3.1${end.kind === 'welded' ? ' case 4' : ''}`,
        confidence: end.kind === 'bolted' ? 'read in a source' : 'from memory, sure',
        note:
          end.kind === 'bolted' &&
          heldBy(question, end) === 'one leg' &&
          boltsInLine(end, question.section) < 2
            ? 'With one bolt in line no length of connection counts: U rests on the connected leg’s share alone.'
            : null,
      },
      working,
    );
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { fy, fu } = givenStresses(question.steel, 'F', working);
    const tension = ({ netTension }: Block): number => fu * netTension;
    const tears = ({ netShear }: Block): number => 0.6 * fu * netShear;
    const yields = ({ grossShear }: Block): number => 0.6 * fy * grossShear;
    const nominal = (block: Block): number => tension(block) + Math.min(tears(block), yields(block));
    const block = weakestBlock(blocksOf(question, end), nominal, working);
    if (block) {
      working.step('in tension', 'T_n', 'U_bs F_u A_nt, U_bs = 1', tension(block), 'force');
      working.step('rupture in shear', 'V_u', '0.60 F_u A_nv', tears(block), 'force');
      working.step('yield in shear', 'V_y', '0.60 F_y A_gv', yields(block), 'force');
      working.step('nominal strength', 'R_n', 'T_n + min(V_u, V_y)', nominal(block), 'force');
    }
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: block && strengthOf(nominal(block), 0.75, 2, question.options, working, 'R_n'),
        standard: STANDARD,
        clause: 'J4.3, (J4-5), U_bs = 1',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  threadRupture: ({ section, steel, options }, end) => {
    const working = new Working();
    const d = working.given('diameter', 'd', rodDiameter(section), 'length');
    const A = working.step('area of the shank', 'A_b', 'πd²/4', (Math.PI / 4) * d * d, 'area');
    const Fu = working.given('tensile strength', 'F_u', steel.fu, 'stress');
    const Rn = working.step('nominal strength', 'R_n', '0.75 F_u A_b', 0.75 * Fu * A, 'force');
    return resistance(
      {
        kind: 'net rupture',
        title: 'Rupture at the thread',
        against: 'tension',
        end: end.end,
        resistance: strengthOf(Rn, 0.75, 2, options, working, 'R_n'),
        standard: STANDARD,
        clause: 'J3.7 (J3.6 before 2022), Table J3.2, threaded parts',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
};

function rupture(Ae: number, { steel, options }: TensionQuestion, working: Working): number {
  const Fu = working.given('tensile strength', 'F_u', steel.fu, 'stress');
  const Pn = working.step('nominal strength', 'P_n', 'F_u A_e', Fu * Ae, 'force');
  return strengthOf(Pn, 0.75, 2, options, working, 'P_n');
}

function effectiveArea(question: TensionQuestion, end: ResistingEnd, working: Working): number | null {
  const { section } = question;
  const held = heldBy(question, end);
  const open = section.shape === 'tee' || section.shape === 'channel';
  if (held === 'in part' && !(open && end.kind === 'bolted')) {
    refuseShape(question, end, 'a flat, an angle or a pair; a tee or a channel, bolted', working);
    return null;
  }
  const net =
    end.kind === 'bolted'
      ? netArea(question, end, working)
      : working.step('net area', 'A_n', 'A_g, nothing taken out', section.properties.area, 'area');
  const U =
    end.kind === 'welded'
      ? weldedLag(question, end, working)
      : held === 'whole'
        ? working.step('shear lag factor', 'U', '1, all of it connected: case 1', 1, 'factor')
        : boltedLag(question, end, working);
  return working.step('effective net area', 'A_e', 'A_n U', net * U, 'area');
}

/** Table D3.1: the larger of case 2 and, for angles, case 8; of an open section not below the connected share of the gross area. */
function boltedLag(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  const l = working.given('first bolt to last', 'l', boltedLength(end, section), 'length');
  const x = working.given('face to centroid', 'x̄', section.offCentroid, 'length');
  const byLength = l > 0 ? working.step('case 2', 'U_2', '1 − x̄/l', Math.max(0, 1 - x / l), 'factor') : 0;
  if (heldBy(question, end) === 'in part') {
    working.requires('two bolts in line at least', l > 0, 'one bolt');
    return working.step('shear lag factor', 'U', 'U_2', byLength, 'factor');
  }
  const inLine = boltsInLine(end, section);
  const byCount = inLine >= 4 ? 0.8 : inLine === 3 ? 0.6 : 0;
  if (byCount > 0) working.step('case 8', 'U_8', `${inLine} bolts in line`, byCount, 'factor');
  const share = connectedShare(question, working);
  return working.step(
    'shear lag factor',
    'U',
    'the largest',
    Math.min(1, Math.max(byLength, byCount, share)),
    'factor',
  );
}

/** D3: U of an open section need not be below it. */
function connectedShare({ section }: TensionQuestion, working: Working): number {
  const connected = pliesOf(section) * section.connectedLeg * section.thickness;
  return working.step(
    'least',
    'U_min',
    'connected leg over gross area',
    connected / section.properties.area,
    'factor',
  );
}

/** Case 4 (since 360-16 for angles too): two welds along the bar. With both legs welded nothing stands off: x̄ = 0, an engineering reading. */
function weldedLag(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  const whole = heldBy(question, end) === 'whole';
  const l = working.given('length of the welds', 'l', end.weldLength, 'length');
  const wide =
    section.shape === 'flat' || !whole
      ? section.connectedLeg
      : Math.max(section.connectedLeg, section.outstandingLeg);
  const w = working.given('width between the welds', 'w', wide, 'length');
  const x = working.given('face to centroid', 'x̄', whole ? 0 : section.offCentroid, 'length');
  working.requires(
    `each weld at least four times its size, ${(4 * end.weldSize).toFixed(0)} mm`,
    l >= 4 * end.weldSize,
    `${l.toFixed(0)} mm`,
  );
  const spread = (3 * l * l) / (3 * l * l + w * w);
  const lag = l > 0 ? Math.max(0, 1 - x / l) : 0;
  const U = working.step('case 4', 'U_4', '3l²/(3l² + w²) (1 − x̄/l)', spread * lag, 'factor');
  if (section.shape === 'flat' || whole) return U;
  return working.step(
    'shear lag factor',
    'U',
    'the larger',
    Math.max(U, connectedShare(question, working)),
    'factor',
  );
}
