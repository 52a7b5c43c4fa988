/**
 * AISC 360-16 and -22, chapter E. Practice-facts D2. (E3-2), (E3-3), (E4-3), (E5-1), (E7-3), (E7-5), their limits and the conditions of E5 were read in a copy of
 * the AISC Design Examples v16, E.5, E.6, E.14A and E.14B; (E5-2) to (E5-4) and the terms of the shorter leg are from memory.
 */
import type { CompressionQuestion } from '../model.ts';
import { strengthOf } from '../tension/aisc.ts';
import { resistance, Working } from '../working.ts';
import { exponential } from './curves.ts';
import { legsOf, slenderest } from './legs.ts';
import { isByShorterLeg, modifiedSlenderness, wholeLengthNote } from './modifiedSlenderness.ts';
import {
  ONE_LEG,
  requireEvenLegs,
  requireFirmEnds,
  requireNothingAcross,
  requireSameLeg,
} from './oneLegTerms.ts';
import type { CompressionPack } from './pack.ts';

/** E1. */
const PHI = 0.9;
const OMEGA = 1.67;

function strength(question: CompressionQuestion, Fe: number, working: Working): number {
  const { steel, options } = question;
  const Fy = working.given('yield stress', 'F_y', steel.fy, 'stress');
  const ratio = working.step('yield over elastic stress', 'F_y/F_e', 'F_y/F_e', Fy / Fe, 'ratio');
  const Fn = working.step(
    'nominal stress',
    'F_n',
    ratio <= 2.25 ? '0.658^(F_y/F_e) F_y' : '0.877 F_e',
    exponential(ratio) * Fy,
    'stress',
  );
  const { area, symbol } = effectiveArea(question, Fn, working);
  const Pn = working.step('nominal strength', 'P_n', `F_n ${symbol}`, Fn * area, 'force');
  return strengthOf(Pn, PHI, OMEGA, options, working, 'P_n');
}

/** E7, 360-16 on: what legs lose that are too slender for the stress, Table E7.1 case (c). */
function effectiveArea(
  { section, steel }: CompressionQuestion,
  Fn: number,
  working: Working,
): { readonly area: number; readonly symbol: string } {
  const gross = section.properties.area;
  const limit = 0.45 * Math.sqrt(steel.E / steel.fy);
  const reached = limit * Math.sqrt(steel.fy / Fn);
  const slender = legsOf(section).filter(({ width, thickness }) => width / thickness > reached);
  if (slender.length === 0) return { area: gross, symbol: 'A' };
  working.given('modulus', 'E', steel.E, 'stress');
  working.step('limit of slenderness', 'λ_r', '0.45 √(E/F_y)', limit, 'slenderness');
  let lost = 0;
  for (const { name, index, width, thickness, count } of slender) {
    working.given(`width of the ${name}`, `b_${index}`, width, 'length');
    const ratio = working.given(`slenderness of the ${name}`, `λ_${index}`, width / thickness, 'slenderness');
    const Fel = working.step(
      `elastic stress of the ${name}`,
      `F_el,${index}`,
      `(1.49 λ_r/λ_${index})² F_y`,
      ((1.49 * limit) / ratio) ** 2 * steel.fy,
      'stress',
    );
    const root = Math.sqrt(Fel / Fn);
    // At its limit the formula gives 1.0016 b.
    const kept = working.step(
      `effective width of the ${name}`,
      `b_e${index}`,
      `b_${index} [1 − 0.22 √(F_el,${index}/F_n)] √(F_el,${index}/F_n)`,
      width * Math.min(1, (1 - 0.22 * root) * root),
      'length',
    );
    lost += count * (width - kept) * thickness;
  }
  working.given('thickness', 't', section.thickness, 'length');
  const area = working.step('effective area', 'A_e', 'A − Σ(b − b_e) t', gross - lost, 'area');
  return { area, symbol: 'A_e' };
}

/** E5: a single angle of stout legs need not be looked at for twist. */
function twistLeftOut({ section, steel }: CompressionQuestion): string | null {
  if (section.shape !== 'angle') return null;
  const limit = 0.71 * Math.sqrt(steel.E / steel.fy);
  return slenderest(section) <= limit ? `twist is not asked for up to b/t = ${limit.toFixed(1)}` : null;
}

export const AISC: CompressionPack = {
  column: {
    standard: 'AISC 360',
    clause: 'E3, E7',
    confidence: 'read in a source',
    twist: { clause: 'E4, E7', confidence: 'read in a source' },
    walls: {
      round: { most: ({ E, fy }) => (0.11 * E) / fy, says: '0.11 E/F_y' },
      square: { most: ({ E, fy }) => 1.4 * Math.sqrt(E / fy), says: '1.40 √(E/F_y)' },
      flange: { most: ({ E, fy }) => 0.56 * Math.sqrt(E / fy), says: '0.56 √(E/F_y)' },
      web: { most: ({ E, fy }) => 1.49 * Math.sqrt(E / fy), says: '1.49 √(E/F_y)' },
      stem: { most: ({ E, fy }) => 0.75 * Math.sqrt(E / fy), says: '0.75 √(E/F_y)' },
    },
    twistLeftOut,
    remark: () => null,
    strength,
  },
  oneLeg: (question) => {
    const working = new Working();
    requireSameLeg(question, working);
    requireFirmEnds(question, working);
    requireNothingAcross(question, working);
    requireEvenLegs(question, working);
    const slender = modifiedSlenderness(question, working);
    working.requires('L_c/r not above 200', slender <= 200 + 1e-9, slender.toFixed(1));
    const { steel, section, system, length } = question;
    working.given('area', 'A', section.properties.area, 'area');
    working.given('modulus', 'E', steel.E, 'stress');
    const Fe = working.step(
      'elastic stress',
      'F_e',
      'π² E/(L_c/r)²',
      (Math.PI ** 2 * steel.E) / slender ** 2,
      'stress',
    );
    const planar = system === 'planar';
    const wasRead = planar && !isByShorterLeg(question) && length <= 80 * section.properties.ry;
    return resistance(
      {
        ...ONE_LEG,
        resistance: strength(question, Fe, working),
        standard: 'AISC 360',
        clause: planar ? 'E5(a), (E5-1), (E5-2), E3, E7' : 'E5(b), (E5-3), (E5-4), E3, E7',
        confidence: wasRead ? 'read in a source' : 'from memory, sure',
        note: wholeLengthNote(question),
      },
      working,
    );
  },
};
