/** AS 4100 6.2 and 6.3. Practice-facts D4. */
import type { CompressionQuestion, SectionShape } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { memberReduction } from './curves.ts';
import { legsOf } from './legs.ts';
import { ONE_LEG } from './oneLegTerms.ts';
import type { CompressionPack } from './pack.ts';
import { plateRemark } from './walls.ts';

const PHI = 0.9;
/** Table 6.2.4: plate elements of hot-rolled sections held along one edge. */
const YIELD_LIMIT = 16;
/** k_f from which on nothing is lost, rounding apart. */
const FULL = 1 - 1e-9;

/** Any k_f of a section with a plate beyond the yield limit: which one matters to the column constant no further. */
const BELOW = 0.99;

/** 6.2.2: what slender legs leave of the section. */
function formFactor({ section, steel }: CompressionQuestion, working: Working): number {
  let lost = 0;
  for (const { name, index, width, thickness, count } of legsOf(section)) {
    const clear = working.step(
      `clear width of the ${name}`,
      `b_${index}`,
      'leg − t',
      width - thickness,
      'length',
    );
    const slender = working.step(
      `slenderness of the ${name}`,
      `λ_e${index}`,
      `(b_${index}/t) √(f_y/250)`,
      (clear / thickness) * Math.sqrt(steel.fy / 250),
      'slenderness',
    );
    lost += count * clear * (1 - Math.min(1, YIELD_LIMIT / slender)) * thickness;
  }
  return working.step(
    'form factor',
    'k_f',
    lost > 0 ? '1 − Σ b (1 − 16/λ_e) t/A' : '1: no leg is beyond λ_ey = 16',
    1 - lost / section.properties.area,
    'factor',
  );
}

/** α_b 1 below k_f = 1 is less sure than the rest. */
const slenderRemark = (question: CompressionQuestion): string | null =>
  formFactor(question, new Working()) < FULL || plateRemark(question, AS.column.walls) !== null
    ? 'A plate is beyond the yield limit, so k_f is below 1: α_b is then 1.0, from memory, verify.'
    : null;

/** Table 6.3.3: 0 for a rolled I with flanges up to 40 mm, 0.5 for angles, tees, channels and what is not named, with k_f = 1; 1.0 below (verify). Tubes as cold formed, −0.5. */
function constantOf(shape: SectionShape, kf: number): number {
  if (shape === 'round tube' || shape === 'square tube') return -0.5;
  if (shape === 'I section' && kf >= FULL) return 0;
  return kf < FULL ? 1 : 0.5;
}

export const AS: CompressionPack = {
  column: {
    standard: 'AS 4100',
    clause: '6.2.1, 6.3.3',
    confidence: 'from memory, sure',
    twist: { clause: '6.3.3, F_e with twist', confidence: 'from memory, verify' },
    walls: {
      round: { most: ({ fy }) => (82 * 250) / fy, says: '82 × 250/f_y' },
      square: { most: ({ fy }) => 40 * Math.sqrt(250 / fy), says: '40 √(250/f_y)' },
      flange: { most: ({ fy }) => 16 * Math.sqrt(250 / fy), says: '16 √(250/f_y)' },
      web: { most: ({ fy }) => 45 * Math.sqrt(250 / fy), says: '45 √(250/f_y)' },
      stem: { most: ({ fy }) => 16 * Math.sqrt(250 / fy), says: '16 √(250/f_y)' },
    },
    twistLeftOut: () => null,
    remark: slenderRemark,
    strength: (question, Fe, working) => {
      const { section, steel } = question;
      const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
      working.given('thickness', 't', section.thickness, 'length');
      const kf = formFactor(question, working);
      const E = working.given('modulus', 'E', steel.E, 'stress');
      const slender = working.step(
        'slenderness of that stress',
        'l_e/r',
        'π √(E/F_e)',
        Math.PI * Math.sqrt(E / Fe),
        'slenderness',
      );
      const lambdaN = working.step(
        'modified slenderness',
        'λ_n',
        '(l_e/r) √k_f √(f_y/250)',
        slender * Math.sqrt(kf) * Math.sqrt(fy / 250),
        'slenderness',
      );
      const alphaB = working.given(
        'section constant',
        'α_b',
        constantOf(section.shape, question.slenderPlate ? Math.min(kf, BELOW) : kf),
        'factor',
      );
      const { alphaA, lambda, eta, xi, alphaC } = memberReduction(lambdaN, alphaB);
      working.step(
        'slenderness added, α_b 1',
        'α_a',
        '2100 (λ_n − 13.5)/(λ_n² − 15.3 λ_n + 2050)',
        alphaA,
        'factor',
      );
      working.step('slenderness with its imperfection', 'λ', 'λ_n + α_a α_b', lambda, 'slenderness');
      working.step('imperfection', 'η', '0.00326 (λ − 13.5), 0 at least', eta, 'factor');
      working.step('term of the curve', 'ξ', '[(λ/90)² + 1 + η]/[2 (λ/90)²]', xi, 'factor');
      working.step('slenderness reduction', 'α_c', 'ξ {1 − √[1 − (90/(ξ λ))²]}, 1 at most', alphaC, 'factor');
      const Ns = working.step(
        'section capacity',
        'N_s',
        'k_f A f_y',
        kf * section.properties.area * fy,
        'force',
      );
      return working.step('capacity', 'φN_c', '0.90 α_c N_s', PHI * alphaC * Ns, 'force');
    },
  },
  oneLeg: () => {
    const working = new Working();
    working.requires(
      'the interaction of 8.4.6 for web angles of trusses is worked out here',
      false,
      'it is not reproduced: read the standard',
    );
    return resistance(
      {
        ...ONE_LEG,
        resistance: null,
        standard: 'AS 4100',
        clause: '8.4.6',
        confidence: 'from memory, verify',
      },
      working,
    );
  },
};
