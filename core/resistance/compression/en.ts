/** EN 1993-1-1 6.3.1 and BB.1.2. Practice-facts D3. */
import type { CompressionQuestion, SectionShape } from '../model.ts';
import { partialFactors } from '../tension/en.ts';
import { resistance, Working } from '../working.ts';
import { perry } from './curves.ts';
import { type CompressionPack, oneLegConditions } from './pack.ts';

/** Table 6.2: curve b for angles; from memory for the others: hot-finished tubes a, flats and rods c, tees and channels c, double angles c. */
const IMPERFECTION: Readonly<Record<SectionShape, number>> = {
  angle: 0.34,
  'angles back to back': 0.34,
  'starred angles': 0.34,
  flat: 0.49,
  rod: 0.49,
  tee: 0.49,
  channel: 0.49,
  'round tube': 0.49,
  'square tube': 0.49,
};

/** Legs that are class 4 by Table 5.2 keep what EN 1993-1-5 4.4 leaves of them. */
function effectiveShare({ section, steel }: CompressionQuestion, working: Working): number {
  if (section.shape !== 'angle' && !section.shape.includes('angles')) return 1;
  const eps = Math.sqrt(235 / steel.fy);
  const legs = [section.connectedLeg, section.outstandingLeg];
  const [h, b] = [Math.max(...legs), Math.min(...legs)];
  const t = section.thickness;
  if (h / t <= 15 * eps && (b + h) / (2 * t) <= 11.5 * eps) return 1;
  const lost = legs.reduce((sum, leg) => {
    const slender = leg / t / (28.4 * eps * Math.sqrt(0.43));
    const rho = slender <= 0.748 ? 1 : (slender - 0.188) / slender ** 2;
    return sum + (1 - rho) * leg * t;
  }, 0);
  return working.step(
    'effective area over area',
    'A_eff/A',
    'class 4 by Table 5.2; ρ of EN 1993-1-5 4.4 for each leg',
    Math.max(0, 1 - lost / section.properties.area),
    'ratio',
  );
}

function strengthAt(question: CompressionQuestion, lambda: number, share: number, working: Working): number {
  const { section, steel, options } = question;
  const alpha = working.given('imperfection', 'α', IMPERFECTION[section.shape], 'factor');
  const chi = working.step('reduction', 'χ', '1/(Φ + √(Φ² − λ̄²))', perry(lambda, alpha), 'factor');
  const gamma = working.given('partial factor', 'γ_M1', partialFactors(options).M1, 'factor');
  return working.step(
    'resistance',
    'N_b,Rd',
    share < 1 ? 'χ A_eff f_y/γ_M1' : 'χ A f_y/γ_M1',
    (chi * share * section.properties.area * steel.fy) / gamma,
    'force',
  );
}

export const EN: CompressionPack = {
  column: {
    standard: 'EN 1993-1-1',
    clause: '6.3.1, Table 6.2',
    twistClause: '6.3.1, 6.3.1.4',
    confidence: 'from memory, sure',
    strength: (question, Fe, working) => {
      const share = effectiveShare(question, working);
      const lambda = working.step(
        'relative slenderness',
        'λ̄',
        '√(A f_y/N_cr)',
        Math.sqrt((share * question.steel.fy) / Fe),
        'ratio',
      );
      return strengthAt(question, lambda, share, working);
    },
  },
  oneLeg: (question) => {
    const working = new Working();
    oneLegConditions(question, working, null);
    const { section, steel, unbraced } = question;
    const { rx, ry, rv } = section.properties;
    const share = effectiveShare(question, working);
    const one = Math.PI * Math.sqrt(steel.E / steel.fy);
    const relative = (L: number, r: number): number => ((L / r) * Math.sqrt(share)) / one;
    const v = working.step(
      'about v',
      'λ̄_eff,v',
      '0.35 + 0.7 λ̄_v',
      0.35 + 0.7 * relative(unbraced.v, rv),
      'ratio',
    );
    const x = working.step(
      'about the axis along the shorter leg',
      'λ̄_eff,y',
      '0.50 + 0.7 λ̄_y',
      0.5 + 0.7 * relative(unbraced.x, rx),
      'ratio',
    );
    const y = working.step(
      'about the axis along the longer leg',
      'λ̄_eff,z',
      '0.50 + 0.7 λ̄_z',
      0.5 + 0.7 * relative(unbraced.y, ry),
      'ratio',
    );
    const lambda = working.step('the worst', 'λ̄_eff', 'max', Math.max(v, x, y), 'ratio');
    return resistance(
      {
        kind: 'compression, one leg',
        title: 'Compression of an angle by one leg',
        against: 'compression',
        resistance: strengthAt(question, lambda, share, working),
        standard: 'EN 1993-1-1',
        clause: 'BB.1.2, (BB.1)',
        confidence: 'from memory, sure',
        note: question.joinedBetween
          ? 'Lengths between holds by the marks; the crossing’s one bolt fixes the end of a half less than the rule takes for granted.'
          : null,
      },
      working,
    );
  },
};
