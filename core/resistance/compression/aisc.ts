/** AISC 360-16 and -22, chapter E. Practice-facts D2. */
import type { CompressionQuestion } from '../model.ts';
import { strengthOf } from '../tension/aisc.ts';
import { resistance, Working } from '../working.ts';
import { exponential } from './curves.ts';
import { slenderOneLeg } from './modifiedSlenderness.ts';
import { type CompressionPack, oneLegConditions } from './pack.ts';

function strength(question: CompressionQuestion, Fe: number, working: Working): number {
  const { steel, options } = question;
  const Fy = working.given('yield stress', 'F_y', steel.fy, 'stress');
  const ratio = Fy / Fe;
  const Fcr = working.step(
    'critical stress',
    'F_cr',
    ratio <= 2.25 ? '0.658^(F_y/F_e) F_y' : '0.877 F_e',
    exponential(ratio) * Fy,
    'stress',
  );
  const A = effectiveArea(question, Fcr, working);
  const Pn = working.step('nominal strength', 'P_n', 'F_cr A_e', Fcr * A, 'force');
  return strengthOf(Pn, 0.9, 1.67, options, working, 'P_n');
}

/** E7, 360-16 on: legs too slender for the stress lose width. */
function effectiveArea({ section, steel }: CompressionQuestion, Fcr: number, working: Working): number {
  const A = working.given('area', 'A_g', section.properties.area, 'area');
  const hasLegs = section.shape === 'angle' || section.shape.includes('angles');
  if (!hasLegs) return A;
  const limit = 0.45 * Math.sqrt(steel.E / steel.fy);
  const lost = [section.connectedLeg, section.outstandingLeg].reduce((sum, b) => {
    const slender = b / section.thickness;
    if (slender <= limit * Math.sqrt(steel.fy / Fcr)) return sum;
    const Fel = ((1.49 * limit) / slender) ** 2 * steel.fy;
    const root = Math.sqrt(Fel / Fcr);
    return sum + b * (1 - Math.min(1, (1 - 0.22 * root) * root)) * section.thickness;
  }, 0);
  return lost === 0 ? A : working.step('effective area', 'A_e', 'A_g − Σ(b − b_e) t, E7', A - lost, 'area');
}

export const AISC: CompressionPack = {
  column: {
    standard: 'AISC 360',
    clause: 'E3, E7',
    twistClause: 'E4, E7',
    confidence: 'from memory, sure',
    strength,
  },
  oneLeg: (question) => {
    const working = new Working();
    oneLegConditions(question, working, 1.7);
    const ratio = slenderOneLeg(question, working);
    working.requires('L_c/r not above 200', ratio <= 200 + 1e-9, ratio.toFixed(1));
    const Fe = working.step(
      'elastic stress',
      'F_e',
      'π²E/(L_c/r)²',
      (Math.PI ** 2 * question.steel.E) / ratio ** 2,
      'stress',
    );
    return resistance(
      {
        kind: 'compression, one leg',
        title: 'Compression of an angle by one leg',
        against: 'compression',
        resistance: strength(question, Fe, working),
        standard: 'AISC 360',
        clause: question.system === 'planar' ? 'E5(a), (E5-1), (E5-2)' : 'E5(b), (E5-3), (E5-4)',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
};
