/** SANS 10162-1 and CSA S16: one ancestor, different factors. Practice-facts B1, B2, C. */
import type { Confidence } from '../../practice/model.ts';
import type { Resistance, ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { type Block, blocksOf, weakestBlock } from './blocks.ts';
import { boltLines, netArea, pliesOf, rowsOf } from './boltRows.ts';
import { heldBy, isWhole, refuseShape, ruptureTitle, type TensionPack } from './pack.ts';
import { rodDiameter } from './rods.ts';
import { givenStresses } from './stresses.ts';
import { weldedArea } from './weldedArea.ts';

const PHI = 0.9;
const PHI_U = 0.75;
const PHI_B = 0.8;

/** What the two do not share. */
interface Member {
  readonly standard: string;
  /** What stands before A′_ne f_u: 0.85 φ of the older rule, φ_u of the newer. */
  readonly rupture: { readonly factor: number; readonly says: string };
  readonly clauses: {
    readonly gross: string;
    readonly net: string;
    readonly lag: string;
    readonly thread: string;
  };
  readonly confidence: { readonly gross: Confidence; readonly oneLeg: Confidence; readonly weld: Confidence };
  readonly blockShear: (question: TensionQuestion, end: ResistingEnd) => Resistance;
}

function pack({ standard, rupture, clauses, confidence, blockShear }: Member): TensionPack {
  return {
    grossYield: ({ section, steel }) => {
      const working = new Working();
      const A = working.given('gross area', 'A_g', section.properties.area, 'area');
      const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
      return resistance(
        {
          kind: 'gross yield',
          title: 'Yield of the gross section',
          against: 'tension',
          resistance: working.step('resistance', 'T_r', '0.90 A_g f_y', PHI * A * fy, 'force'),
          standard,
          clause: clauses.gross,
          confidence: confidence.gross,
        },
        working,
      );
    },
    netRupture: (question, end) => {
      const working = new Working();
      const area =
        end.kind === 'bolted' ? boltedArea(question, end, working) : weldedPart(question, end, working);
      return resistance(
        {
          kind: 'net rupture',
          title: ruptureTitle(question, end),
          against: 'tension',
          end: end.end,
          resistance: ruptureOf(area, rupture, question, working),
          standard,
          clause:
            end.kind === 'welded'
              ? `${clauses.lag}, 12.3.3.3`
              : isWhole(question, end)
                ? clauses.net
                : `${clauses.lag}, 12.3.3.2`,
          confidence:
            end.kind === 'welded'
              ? confidence.weld
              : heldBy(question, end) === 'one leg' || isWhole(question, end)
                ? confidence.oneLeg
                : 'from memory, verify',
        },
        working,
      );
    },
    blockShear,
    threadRupture: ({ section, steel }, end) => {
      const working = new Working();
      const d = working.given('diameter', 'd', rodDiameter(section), 'length');
      const A = working.step('area of the shank', 'A_b', 'πd²/4', (Math.PI / 4) * d * d, 'area');
      const fu = working.given('tensile strength', 'f_u', steel.fu, 'stress');
      return resistance(
        {
          kind: 'net rupture',
          title: 'Rupture at the thread',
          against: 'tension',
          end: end.end,
          resistance: working.step(
            'resistance',
            'T_r',
            '0.75 × 0.80 A_b f_u',
            0.75 * PHI_B * A * fu,
            'force',
          ),
          standard,
          clause: clauses.thread,
          confidence: 'from memory, verify',
        },
        working,
      );
    },
  };
}

function ruptureOf(
  area: number | null,
  { factor, says }: Member['rupture'],
  { steel }: TensionQuestion,
  working: Working,
): number | null {
  if (area === null) return null;
  const fu = working.given('tensile strength', 'f_u', steel.fu, 'stress');
  return working.step('resistance', 'T_r', `${says} A′_ne f_u`, factor * area * fu, 'force');
}

/** 0.80 or 0.60 of the net area of an angle by one leg (12.3.3.2(b)); 0.85 or 0.75 of other shapes not wholly connected (c). */
function boltedArea(question: TensionQuestion, end: ResistingEnd, working: Working): number | null {
  const held = heldBy(question, end);
  const { shape } = question.section;
  if (shape !== 'tee' && shape !== 'channel' && held === 'in part') {
    refuseShape(question, end, 'a flat, an angle or a pair, a tee or a channel', working);
    return null;
  }
  const net = netArea(question, end, working);
  if (held === 'whole') return working.step('effective net area', 'A′_ne', 'A_n', net, 'area');
  const lines = working.given(
    'lines of bolts across the force',
    'n',
    boltLines(end, question.section),
    'count',
  );
  if (held === 'in part')
    working.requires('two lines of bolts across the force at least', lines >= 2, 'one line');
  const share = held === 'in part' ? (lines >= 3 ? 0.85 : 0.75) : lines >= 4 ? 0.8 : 0.6;
  const when = held === 'in part' ? (lines >= 3 ? 'n ≥ 3' : 'n < 3') : lines >= 4 ? 'n ≥ 4' : 'n < 4';
  return working.step('effective net area', 'A′_ne', `${share.toFixed(2)} A_n, ${when}`, share * net, 'area');
}

function weldedPart(question: TensionQuestion, end: ResistingEnd, working: Working): number | null {
  if (heldBy(question, end) !== 'in part') return weldedArea(question, end, working);
  refuseShape(question, end, 'a flat, an angle or a pair', working);
  return null;
}

export const SANS: TensionPack = pack({
  standard: 'SANS 10162-1',
  rupture: { factor: 0.85 * PHI, says: '0.85 × 0.90' },
  clauses: {
    gross: '13.2(a)(i)',
    net: '13.2(a)(ii)',
    lag: '13.2(a)(iii)',
    thread: '13.12.1.2',
  },
  confidence: { gross: 'from memory, sure', oneLeg: 'from memory, sure', weld: 'from memory, verify' },
  blockShear: (question, end) => {
    const working = new Working();
    const { fy, fu } = givenStresses(question.steel, 'f', working);
    const yields = ({ netTension, grossShear }: Block): number =>
      PHI * netTension * fu + 0.6 * PHI * grossShear * fy;
    const tears = ({ netTension, netShear }: Block): number =>
      PHI * netTension * fu + 0.6 * PHI * netShear * fu;
    const lesser = (block: Block): number => Math.min(yields(block), tears(block));
    const block = weakestBlock(blocksOf(question, end), lesser, working);
    if (block) {
      working.step(
        'with yield in shear',
        'V_1',
        '0.90 A_nt f_u + 0.60 × 0.90 A_gv f_y',
        yields(block),
        'force',
      );
      working.step(
        'with rupture in shear',
        'V_2',
        '0.90 A_nt f_u + 0.60 × 0.90 A_nv f_u',
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
        resistance: block && working.step('resistance', 'T_r + V_r', 'min(V_1, V_2)', lesser(block), 'force'),
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
  rupture: { factor: PHI_U, says: '0.75' },
  clauses: {
    gross: '13.2(a)(i)',
    net: '13.2(a)(iii)',
    lag: '13.2(a)(iii)',
    thread: '13.12.1.3',
  },
  confidence: { gross: 'read in a source', oneLeg: 'read in a source', weld: 'from memory, sure' },
  blockShear: (question, end) => {
    const working = new Working();
    const { fy, fu } = givenStresses(question.steel, 'F', working);
    const fv = fy > 460 ? fy : (fy + fu) / 2;
    // 0.6 where the block is pulled off its middle, as in an angle by one leg.
    const evenness = ({ even }: Block): number => (even ? 1 : 0.6);
    const strength = (block: Block): number =>
      PHI_U * (evenness(block) * block.netTension * fu + 0.6 * block.grossShear * fv);
    const block = weakestBlock(withTearing(blocksOf(question, end), question, end), strength, working);
    if (block) {
      working.given('factor for uneven tension', 'U_t', evenness(block), 'factor');
      working.step('stress in shear', 'f_v', fy > 460 ? 'F_y, above 460' : '(F_y + F_u)/2', fv, 'stress');
    }
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance:
          block &&
          working.step('resistance', 'T_r', '0.75 (U_t A_nt F_u + 0.60 A_gv f_v)', strength(block), 'force'),
        standard: 'CSA S16',
        clause: '13.11',
        confidence: 'read in a source',
      },
      working,
    );
  },
});

/** 13.11 also lets every row tear out along both of its sides, with nothing in tension. */
function withTearing(
  blocks: readonly Block[] | string,
  { section }: TensionQuestion,
  end: ResistingEnd,
): readonly Block[] | string {
  if (typeof blocks === 'string') return blocks;
  const length = rowsOf(end, section).reduce(
    (sum, { start, bolts }) => sum + start + (bolts - 1) * end.pitch,
    0,
  );
  const shear = 2 * length * section.thickness * pliesOf(section);
  return [
    ...blocks,
    {
      name: 'along both sides of every row',
      netTension: 0,
      grossTension: 0,
      netShear: shear,
      grossShear: shear,
      even: false,
    },
  ];
}
