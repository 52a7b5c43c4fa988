/** IS 800:2007 7.1.2 and 7.5.1. Practice-facts D5. */

import type { CompressionQuestion, ResistingEnd, ResistingSection } from '../model.ts';
import { GAMMA_M0 } from '../tension/is.ts';
import { resistance, Working } from '../working.ts';
import { perry } from './curves.ts';
import { legsOf } from './legs.ts';
import { lengthsByHand } from './lengthsByHand.ts';
import { CROSSED, isFirm, ONE_LEG, requireNothingAcross, requireSameLeg } from './oneLegTerms.ts';
import type { CompressionPack } from './pack.ts';

/** Table 10, class c for all but hollow sections; those as cold formed, class b (verify). Table 7. */
function classOf({ shape, connectedLeg: depth, outstandingLeg: width }: ResistingSection): 'b' | 'c' {
  if (shape === 'round tube' || shape === 'square tube') return 'b';
  // Of a rolled I that of its weaker axis, flanges up to 40 mm.
  return shape === 'I section' && depth > 1.2 * width ? 'b' : 'c';
}
const IMPERFECTION = { b: 0.34, c: 0.49 } as const;

/** Table 2, angles in axial compression: each leg, and both together, over t (from memory, verify). */
const LEG_LIMIT = 15.7;
const LEGS_LIMIT = 25;

/** Width of the legs beyond semi-compact, mm, of one angle. */
function excessWidth({ section, steel }: CompressionQuestion): number {
  const eps = Math.sqrt(250 / steel.fy);
  const legs = legsOf(section);
  const each = legs.reduce(
    (sum, { width, thickness: t }) => sum + Math.max(0, width - LEG_LIMIT * eps * t),
    0,
  );
  const together = legs.reduce((sum, { width }) => sum + width, 0) - LEGS_LIMIT * eps * section.thickness;
  return legs.length === 0 ? 0 : Math.max(each, together, 0);
}

/** 3.7.2(d), 7.3.2: of a slender section the width beyond the semi-compact limit is taken off (from memory, verify). */
function effectiveArea(question: CompressionQuestion, working: Working): number {
  const { section } = question;
  const gross = section.properties.area;
  const excess = excessWidth(question);
  if (excess === 0) return gross;
  const count = legsOf(section)[0]?.count ?? 1;
  working.step(
    'width beyond semi-compact',
    'Δb',
    'b over 15.7 ε t, or b_1 + b_2 over 25 ε t',
    excess,
    'length',
  );
  working.given('thickness', 't', section.thickness, 'length');
  return working.step(
    'effective area, slender legs',
    'A_e',
    `A − ${count === 2 ? '2 ' : ''}Δb t`,
    gross - count * excess * section.thickness,
    'area',
  );
}

function strengthAt(question: CompressionQuestion, lambda: number, symbol: string, working: Working): number {
  const { section, steel } = question;
  const letter = classOf(section);
  const area = effectiveArea(question, working);
  const alpha = working.given(`imperfection, class ${letter}`, 'α', IMPERFECTION[letter], 'factor');
  const { phi, chi } = perry(lambda, alpha);
  working.step('Perry’s term', 'φ', `0.5 [1 + α (${symbol} − 0.2) + ${symbol}²]`, phi, 'factor');
  working.step('reduction', 'χ', `1/(φ + √(φ² − ${symbol}²)), 1 at most`, chi, 'factor');
  return working.step(
    'resistance',
    'P_d',
    `χ ${area < section.properties.area ? 'A_e' : 'A'} f_y/1.10`,
    (chi * area * steel.fy) / GAMMA_M0,
    'force',
  );
}

const slenderRemark = (question: CompressionQuestion): string | null =>
  excessWidth(question) > 0
    ? 'The legs are slender by Table 2: the width beyond semi-compact is taken off, 3.7.2(d), from memory, verify.'
    : null;

/** Table 12 by bolts and what the gusset gives. */
const TABLE_12 = {
  firm: { fixed: { k1: 0.2, k2: 0.35, k3: 20 }, hinged: { k1: 0.7, k2: 0.6, k3: 5 } },
  'one bolt': { fixed: { k1: 0.75, k2: 0.35, k3: 20 }, hinged: { k1: 1.25, k2: 0.5, k3: 60 } },
} as const;

type Row = keyof typeof TABLE_12;
const rowOf = (end: ResistingEnd): Row => (isFirm(end) ? 'firm' : 'one bolt');

/** λ_e by the row of each end; where the ends differ the worse counts. */
function equivalent(question: CompressionQuestion, vv: number, phi: number, working: Working): number {
  const { ends, options } = question;
  const rows = [...new Set(ends.map(rowOf))];
  const found = rows.map((row) => {
    const k = TABLE_12[row][options.gussetFixity];
    return { row, k, value: Math.sqrt(k.k1 + k.k2 * vv * vv + k.k3 * phi * phi) };
  });
  const worst = found.reduce((most, each) => (each.value > most.value ? each : most));
  const which = `Table 12, ${worst.row === 'firm' ? 'two bolts or weld' : 'one bolt'}, ${options.gussetFixity}`;
  working.given(which, 'k_1', worst.k.k1, 'factor');
  working.given(which, 'k_2', worst.k.k2, 'factor');
  working.given(which, 'k_3', worst.k.k3, 'factor');
  const formula = '√(k_1 + k_2 λ_vv² + k_3 λ_φ²)';
  return working.step(
    'equivalent slenderness',
    'λ_e',
    question.joinedBetween ? `${formula}, λ_vv at least` : formula,
    question.joinedBetween ? Math.max(worst.value, vv) : worst.value,
    'ratio',
  );
}

export const IS: CompressionPack = {
  column: {
    standard: 'IS 800',
    clause: '7.1.2',
    confidence: 'from memory, sure',
    twist: { clause: '7.1.2, 7.5.1.1, f_cc with twist', confidence: 'from memory, verify' },
    walls: {
      round: { most: ({ fy }) => (88 * 250) / fy, says: '88 ε²' },
      square: { most: ({ fy }) => 42 * Math.sqrt(250 / fy), says: '42 ε' },
      flange: { most: ({ fy }) => 15.7 * Math.sqrt(250 / fy), says: '15.7 ε' },
      web: { most: ({ fy }) => 42 * Math.sqrt(250 / fy), says: '42 ε' },
      stem: { most: ({ fy }) => 18.9 * Math.sqrt(250 / fy), says: '18.9 ε' },
    },
    twistLeftOut: () => null,
    remark: slenderRemark,
    strength: (question, Fe, working) => {
      const fy = working.given('yield stress', 'f_y', question.steel.fy, 'stress');
      const lambda = working.step('relative slenderness', 'λ', '√(f_y/F_e)', Math.sqrt(fy / Fe), 'ratio');
      return strengthAt(question, lambda, 'λ', working);
    },
  },
  oneLeg: (question) => {
    const working = new Working();
    requireSameLeg(question, working);
    requireNothingAcross(question, working);
    const { section, steel, unbraced } = question;
    working.given('area', 'A', section.properties.area, 'area');
    const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
    const E = working.given('modulus', 'E', steel.E, 'stress');
    const eps = working.step('of the steel', 'ε', '√(250/f_y)', Math.sqrt(250 / fy), 'factor');
    const base = eps * Math.sqrt((Math.PI ** 2 * E) / 250);
    const l = working.given('length between supports', 'l', unbraced.v, 'length');
    const rv = working.given('least radius', 'r_vv', section.properties.rv, 'length');
    const vv = working.step(
      'about the minor axis',
      'λ_vv',
      '(l/r_vv)/(ε √(π² E/250))',
      l / rv / base,
      'ratio',
    );
    const b1 = working.given('connected leg', 'b_1', section.connectedLeg, 'length');
    const b2 = working.given('outstanding leg', 'b_2', section.outstandingLeg, 'length');
    const t = working.given('thickness', 't', section.thickness, 'length');
    const phi = working.step(
      'of the legs',
      'λ_φ',
      '((b_1 + b_2)/(2 t))/(ε √(π² E/250))',
      (b1 + b2) / (2 * t) / base,
      'ratio',
    );
    const lambda = equivalent(question, vv, phi, working);
    const slender = slenderRemark(question);
    const notes = [
      lengthsByHand(question),
      'Between a fixed and a hinged gusset the standard interpolates.',
      question.joinedBetween ? `${CROSSED}; so the length is that between holds, without relief.` : null,
      slender,
    ];
    return resistance(
      {
        ...ONE_LEG,
        resistance: strengthAt(question, lambda, 'λ_e', working),
        standard: 'IS 800',
        clause: '7.5.1.2, Table 12',
        confidence: slender === null ? 'from memory, sure' : 'from memory, verify',
        note: notes.filter((note) => note !== null).join(' '),
      },
      working,
    );
  },
};
