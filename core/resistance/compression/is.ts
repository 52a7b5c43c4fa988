/** IS 800:2007 7.1.2 and 7.5.1.2. Practice-facts D5. */
import type { CompressionQuestion } from '../model.ts';
import { GAMMA_M0 } from '../tension/is.ts';
import { resistance, Working } from '../working.ts';
import { perry } from './curves.ts';
import type { CompressionPack } from './pack.ts';

/** Class c. */
const ALPHA = 0.49;

function strengthAt({ section, steel }: CompressionQuestion, lambda: number, working: Working): number {
  const chi = working.step('reduction', 'χ', 'class c, α = 0.49', perry(lambda, ALPHA), 'factor');
  return working.step(
    'resistance',
    'P_d',
    'χ A_g f_y/1.10',
    (chi * section.properties.area * steel.fy) / GAMMA_M0,
    'force',
  );
}

/** Table 12 by bolts and gusset. */
const TABLE_12 = {
  'two fixed': [0.2, 0.35, 20],
  'two hinged': [0.7, 0.6, 5],
  'one fixed': [0.75, 0.35, 20],
  'one hinged': [1.25, 0.5, 60],
} as const;

export const IS: CompressionPack = {
  column: {
    standard: 'IS 800',
    clause: '7.1.2',
    twistClause: '7.1.2, 7.5.1',
    confidence: 'from memory, sure',
    strength: (question, Fe, working) =>
      strengthAt(
        question,
        working.step('relative slenderness', 'λ', '√(f_y/f_cc)', Math.sqrt(question.steel.fy / Fe), 'ratio'),
        working,
      ),
  },
  oneLeg: (question) => {
    const working = new Working();
    const { section, steel, ends, options, unbraced } = question;
    working.requires('a single angle', section.shape === 'angle', section.shape);
    working.requires(
      'held through one leg',
      ends.every(({ legs }) => legs === 'one'),
      'both legs are connected',
    );
    const count = ends.every(({ kind, bolts }) => kind === 'welded' || bolts >= 2) ? 'two' : 'one';
    const [k1, k2, k3] = TABLE_12[`${count} ${options.gussetFixity}`];
    working.given('Table 12', 'k_1', k1, 'factor');
    working.given('Table 12', 'k_2', k2, 'factor');
    working.given('Table 12', 'k_3', k3, 'factor');
    const base = Math.sqrt(250 / steel.fy) * Math.sqrt((Math.PI ** 2 * steel.E) / 250);
    const lv = working.step(
      'about v',
      'λ_vv',
      '(l/r_vv)/(ε√(π²E/250))',
      unbraced.v / section.properties.rv / base,
      'ratio',
    );
    const lp = working.step(
      'of the legs',
      'λ_φ',
      '(b_1 + b_2)/(2t)/(ε√(π²E/250))',
      (section.connectedLeg + section.outstandingLeg) / (2 * section.thickness) / base,
      'ratio',
    );
    const lambda = working.step(
      'equivalent slenderness',
      'λ_e',
      '√(k_1 + k_2 λ_vv² + k_3 λ_φ²)',
      Math.sqrt(k1 + k2 * lv * lv + k3 * lp * lp),
      'ratio',
    );
    return resistance(
      {
        kind: 'compression, one leg',
        title: 'Compression of an angle by one leg',
        against: 'compression',
        resistance: strengthAt(question, lambda, working),
        standard: 'IS 800',
        clause: '7.5.1.2, Table 12',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
};
