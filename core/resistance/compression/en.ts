/** EN 1993-1-1 6.3.1 and BB.1.2, EN 1993-1-5 4.4. Practice-facts D3. */

import type { CompressionQuestion, ResistingSection, SectionShape } from '../model.ts';
import { partialFactors } from '../tension/en.ts';
import { resistance, Working } from '../working.ts';
import { perry } from './curves.ts';
import { legsOf, longAndShort } from './legs.ts';
import { lengthsByHand } from './lengthsByHand.ts';
import { CROSSED, ONE_LEG, requireFirmEnds, requireNothingAcross, requireSameLeg } from './oneLegTerms.ts';
import type { CompressionPack } from './pack.ts';

/**
 * Table 6.2: curve b for angles (2005, up to S460); for the others from memory: c for solid sections, tees and channels. Tubes are taken as cold formed, c
 * (hot finished ones have a); pairs of angles, which the table does not name, as c too.
 */
const CURVES: Readonly<Record<Exclude<SectionShape, 'I section'>, 'b' | 'c'>> = {
  angle: 'b',
  'angles back to back': 'c',
  'starred angles': 'c',
  flat: 'c',
  rod: 'c',
  tee: 'c',
  channel: 'c',
  'round tube': 'c',
  'square tube': 'c',
};
const IMPERFECTION = { b: 0.34, c: 0.49 } as const;

/** Of a rolled I that of its weaker axis, flanges up to 40 mm: b for h/b > 1.2, c below. */
function curveOf({ shape, connectedLeg: depth, outstandingLeg: width }: ResistingSection): 'b' | 'c' {
  if (shape !== 'I section') return CURVES[shape];
  return depth > 1.2 * width ? 'b' : 'c';
}

/** Table 5.2, sheet 3: class 3 needs both. Legs that fail keep what EN 1993-1-5 4.4 leaves of them, often all. */
function effectiveArea({ section, steel }: CompressionQuestion, working: Working): number {
  const gross = section.properties.area;
  const legs = legsOf(section);
  if (legs.length === 0) return gross;
  const eps = Math.sqrt(235 / steel.fy);
  const [h, b] = longAndShort(section);
  const t = section.thickness;
  if (h / t <= 15 * eps && (b + h) / (2 * t) <= 11.5 * eps) return gross;
  working.step('of the steel', 'ε', '√(235/f_y)', eps, 'factor');
  working.given('thickness', 't', t, 'length');
  let lost = 0;
  for (const { name, index, width, thickness, count } of legs) {
    working.given(`width of the ${name}`, `b_${index}`, width, 'length');
    const slender = working.step(
      `relative slenderness of the ${name}, class 4`,
      `λ̄_p${index}`,
      `(b_${index}/t)/(28.4 ε √0.43)`,
      width / thickness / (28.4 * eps * Math.sqrt(0.43)),
      'ratio',
    );
    const rho = working.step(
      `share left of the ${name}`,
      `ρ_${index}`,
      slender <= 0.748 ? '1, up to 0.748' : `(λ̄_p${index} − 0.188)/λ̄_p${index}²`,
      slender <= 0.748 ? 1 : Math.min(1, (slender - 0.188) / slender ** 2),
      'factor',
    );
    lost += count * (1 - rho) * width * thickness;
  }
  return working.step('effective area', 'A_eff', 'A − Σ(1 − ρ) b t', gross - lost, 'area');
}

/** What class 4 takes off is less sure than the rest of 6.3.1. */
function class4Remark(question: CompressionQuestion): string | null {
  return effectiveArea(question, new Working()) < question.section.properties.area
    ? 'The legs are class 4: EN 1993-1-5 4.4 takes width off, with the whole leg as its width, from memory, verify; that the centroid moves by it is left out.'
    : null;
}

function strengthAt(question: CompressionQuestion, lambda: number, area: number, working: Working): number {
  const { section, steel, options } = question;
  const curve = curveOf(section);
  const alpha = working.given(`imperfection, curve ${curve}`, 'α', IMPERFECTION[curve], 'factor');
  const { phi, chi } = perry(lambda, alpha);
  working.step('Perry’s term', 'Φ', '0.5 [1 + α (λ̄ − 0.2) + λ̄²]', phi, 'factor');
  working.step('reduction', 'χ', '1/(Φ + √(Φ² − λ̄²)), 1 at most', chi, 'factor');
  const gamma = working.given('partial factor', 'γ_M1', partialFactors(options).M1, 'factor');
  return working.step(
    'resistance',
    'N_b,Rd',
    `χ ${symbolOf(question, area)} f_y/γ_M1`,
    (chi * area * steel.fy) / gamma,
    'force',
  );
}

const symbolOf = ({ section }: CompressionQuestion, area: number): string =>
  area < section.properties.area ? 'A_eff' : 'A';

const TAKEN_FOR_GRANTED =
  'The rule takes for granted that what the gussets sit on keeps the ends from turning. Eccentricity is then left out.';

const WHOLE_ALONG_LEGS = `${CROSSED}; so the whole length is taken about the axes along the legs, and about the minor axis the length between holds without relief.`;

export const EN: CompressionPack = {
  column: {
    standard: 'EN 1993-1-1',
    clause: '6.3.1, Table 6.2',
    confidence: 'from memory, sure',
    twist: { clause: '6.3.1.4, Table 6.2', confidence: 'from memory, sure' },
    walls: {
      round: { most: ({ fy }) => (90 * 235) / fy, says: '90 ε²' },
      square: { most: ({ fy }) => 42 * Math.sqrt(235 / fy), says: '42 ε' },
      flange: { most: ({ fy }) => 14 * Math.sqrt(235 / fy), says: '14 ε' },
      web: { most: ({ fy }) => 42 * Math.sqrt(235 / fy), says: '42 ε' },
      stem: { most: ({ fy }) => 14 * Math.sqrt(235 / fy), says: '14 ε' },
    },
    twistLeftOut: () => null,
    remark: class4Remark,
    strength: (question, Fe, working) => {
      const { section, steel } = question;
      const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
      const area = effectiveArea(question, working);
      const lambda = working.step(
        'relative slenderness',
        'λ̄',
        `√(${symbolOf(question, area)} f_y/N_cr)`,
        Math.sqrt((area * fy) / (section.properties.area * Fe)),
        'ratio',
      );
      return strengthAt(question, lambda, area, working);
    },
  },
  oneLeg: (question) => {
    const working = new Working();
    requireSameLeg(question, working);
    requireFirmEnds(question, working);
    requireNothingAcross(question, working);
    const { section, steel, unbraced, joinedBetween, length } = question;
    const { area: gross, rx, ry, rv } = section.properties;
    working.given('area', 'A', gross, 'area');
    const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
    const E = working.given('modulus', 'E', steel.E, 'stress');
    const area = effectiveArea(question, working);
    const share =
      area < gross
        ? working.step('root of the share', '√β', '√(A_eff/A)', Math.sqrt(area / gross), 'ratio')
        : 1;
    const one = working.step(
      'slenderness at yield',
      'λ_1',
      'π √(E/f_y)',
      Math.PI * Math.sqrt(E / fy),
      'slenderness',
    );
    const relative = (about: string, axis: 'v' | 'x' | 'y', L: number, r: number): number => {
      working.given(`length ${about}`, `L_${axis}`, L, 'length');
      working.given(`radius ${about}`, `r_${axis}`, r, 'length');
      return working.step(
        `relative slenderness ${about}`,
        `λ̄_${axis}`,
        `(L_${axis}/r_${axis})${share < 1 ? ' √β' : ''}/λ_1`,
        ((L / r) * share) / one,
        'ratio',
      );
    };
    const lv = relative('about the minor axis', 'v', unbraced.v, rv);
    const lx = relative('about the axis along the shorter leg', 'x', joinedBetween ? length : unbraced.x, rx);
    const ly = relative('about the axis along the longer leg', 'y', joinedBetween ? length : unbraced.y, ry);
    const eased = 0.35 + 0.7 * lv;
    const v = working.step(
      'effective, about the minor axis',
      'λ̄_eff,v',
      joinedBetween ? 'max(0.35 + 0.7 λ̄_v, λ̄_v)' : '0.35 + 0.7 λ̄_v',
      joinedBetween ? Math.max(eased, lv) : eased,
      'ratio',
    );
    const x = working.step(
      'effective, along the shorter leg',
      'λ̄_eff,x',
      '0.50 + 0.7 λ̄_x',
      0.5 + 0.7 * lx,
      'ratio',
    );
    const y = working.step(
      'effective, along the longer leg',
      'λ̄_eff,y',
      '0.50 + 0.7 λ̄_y',
      0.5 + 0.7 * ly,
      'ratio',
    );
    const lambda = working.step(
      'the worst',
      'λ̄',
      'max(λ̄_eff,v, λ̄_eff,x, λ̄_eff,y)',
      Math.max(v, x, y),
      'ratio',
    );
    const slender = class4Remark(question);
    const notes = [
      TAKEN_FOR_GRANTED,
      joinedBetween ? WHOLE_ALONG_LEGS : null,
      slender,
      lengthsByHand(question),
    ];
    return resistance(
      {
        ...ONE_LEG,
        resistance: strengthAt(question, lambda, area, working),
        standard: 'EN 1993-1-1',
        clause: 'BB.1.2, (BB.1), 6.3.1',
        confidence: slender === null ? 'from memory, sure' : 'from memory, verify',
        note: notes.filter((note) => note !== null).join(' '),
      },
      working,
    );
  },
};
