/** SANS 10162-1 and CSA S16, 13.3. Practice-facts D1. */
import type { CompressionQuestion, Resistance } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { doublePower } from './curves.ts';
import { slenderOneLeg } from './modifiedSlenderness.ts';
import { type CompressionPack, oneLegConditions } from './pack.ts';

const PHI = 0.9;
const N = 1.34;

function strength({ section, steel }: CompressionQuestion, Fe: number, working: Working): number {
  const b = Math.max(section.connectedLeg, section.outstandingLeg);
  if (section.shape === 'angle' || section.shape.includes('angles') || section.shape === 'tee')
    working.requires(
      `legs no more slender than 200/√F_y = ${(200 / Math.sqrt(steel.fy)).toFixed(1)}`,
      b / section.thickness <= 200 / Math.sqrt(steel.fy) + 1e-9,
      `b/t = ${(b / section.thickness).toFixed(1)}`,
    );
  const A = working.given('area', 'A', section.properties.area, 'area');
  const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
  const lambda = working.step('relative slenderness', 'λ', '√(f_y/f_e)', Math.sqrt(fy / Fe), 'ratio');
  return working.step(
    'resistance',
    'C_r',
    '0.90 A f_y (1 + λ^2n)^(−1/n), n = 1.34',
    PHI * A * fy * doublePower(lambda, N),
    'force',
  );
}

function oneLeg(question: CompressionQuestion, standard: string, ownRule: boolean): Resistance {
  const working = new Working();
  oneLegConditions(question, working, 1.7);
  const ratio = slenderOneLeg(question, working);
  working.requires('KL/r not above 200', ratio <= 200 + 1e-9, ratio.toFixed(1));
  const Fe = working.step(
    'elastic stress',
    'f_e',
    'π²E/(KL/r)²',
    (Math.PI ** 2 * question.steel.E) / ratio ** 2,
    'stress',
  );
  return resistance(
    {
      kind: 'compression, one leg',
      title: 'Compression of an angle by one leg',
      against: 'compression',
      resistance: strength(question, Fe, working),
      standard: ownRule ? standard : 'CSA S16',
      clause: question.system === 'planar' ? '13.3.3.2' : '13.3.3.3',
      confidence: 'from memory, verify',
      ownRule,
      note: ownRule
        ? null
        : 'SANS 10162-1 has no rule of its own for an angle by one leg: that of CSA S16 is borrowed as an engineering choice.',
    },
    working,
  );
}

const pack = (standard: string, own: boolean): CompressionPack => ({
  column: {
    standard,
    clause: '13.3.1',
    twistClause: '13.3.2',
    confidence: 'from memory, sure',
    strength,
  },
  oneLeg: (question) => oneLeg(question, standard, own),
});

export const SANS = pack('SANS 10162-1', false);
export const CSA = pack('CSA S16', true);
