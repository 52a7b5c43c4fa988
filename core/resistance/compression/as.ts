/** AS 4100 6.2 and 6.3. Practice-facts D4. */
import type { CompressionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { member } from './curves.ts';
import type { CompressionPack } from './pack.ts';

const PHI = 0.9;

function formFactor({ section, steel }: CompressionQuestion, working: Working): number {
  const hasLegs = section.shape === 'angle' || section.shape.includes('angles') || section.shape === 'tee';
  if (!hasLegs) return 1;
  const lost = [section.connectedLeg, section.outstandingLeg].reduce((sum, leg) => {
    const b = leg - section.thickness;
    const slender = (b / section.thickness) * Math.sqrt(steel.fy / 250);
    return sum + b * (1 - Math.min(1, 16 / slender)) * section.thickness;
  }, 0);
  return working.step(
    'form factor',
    'k_f',
    'Σ b_e t/A_g, λ_ey = 16',
    1 - lost / section.properties.area,
    'factor',
  );
}

export const AS: CompressionPack = {
  column: {
    standard: 'AS 4100',
    clause: '6.2, 6.3.3',
    twistClause: '6.2, 6.3.3',
    confidence: 'from memory, sure',
    strength: (question, Fe, working) => {
      const { section, steel } = question;
      const kf = formFactor(question, working);
      const slender = Math.PI * Math.sqrt(steel.E / Fe);
      const lambda = working.step(
        'modified slenderness',
        'λ_n',
        '(l_e/r) √k_f √(f_y/250)',
        slender * Math.sqrt(kf) * Math.sqrt(steel.fy / 250),
        'slenderness',
      );
      const alphaB = working.given('section constant', 'α_b', alphaOf(section.shape, kf), 'factor');
      const alphaC = working.step('slenderness reduction', 'α_c', '6.3.3', member(lambda, alphaB), 'factor');
      const Ns = working.step(
        'section capacity',
        'N_s',
        'k_f A_n f_y',
        kf * section.properties.area * steel.fy,
        'force',
      );
      return working.step('capacity', 'φN_c', '0.90 α_c N_s', PHI * alphaC * Ns, 'force');
    },
  },
  oneLeg: () => {
    const working = new Working();
    working.requires(
      'the interaction of 8.4.6 for web angles of trusses is worked out',
      false,
      'it is not reproduced here: read the standard',
    );
    return resistance(
      {
        kind: 'compression, one leg',
        title: 'Compression of an angle by one leg',
        against: 'compression',
        resistance: null,
        standard: 'AS 4100',
        clause: '8.4.6',
        confidence: 'from memory, verify',
      },
      working,
    );
  },
};

/** Table 6.3.3: 0.5 for hot-rolled angles, tees and channels with k_f = 1, 1.0 below; −0.5 for tubes, 0.5 for flats and rods (verify). */
function alphaOf(shape: string, kf: number): number {
  if (shape.includes('tube')) return -0.5;
  return kf < 1 ? 1 : 0.5;
}
