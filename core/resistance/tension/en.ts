/** EN 1993-1-1 6.2.3, EN 1993-1-8 3.10 and 4.13. Practice-facts B4, C. */
import type { ResistanceOptions, ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { blockOf, netArea } from './boltRows.ts';
import { isOneLeg, isWhole, type TensionPack } from './pack.ts';

/** Recommended values; a national annex may have others. */
export function partialFactors({ partialFactors: chosen }: ResistanceOptions): {
  readonly M0: number;
  readonly M1: number;
  readonly M2: number;
} {
  return { M0: chosen.gammaM0 ?? 1, M1: chosen.gammaM1 ?? 1, M2: chosen.gammaM2 ?? 1.25 };
}

export const EN: TensionPack = {
  grossYield: ({ section, steel, options }) => {
    const working = new Working();
    const A = working.given('gross area', 'A', section.properties.area, 'area');
    const fy = working.given('yield stress', 'f_y', steel.fy, 'stress');
    const gamma = working.given('partial factor', 'γ_M0', partialFactors(options).M0, 'factor');
    return resistance(
      {
        kind: 'gross yield',
        title: 'Yield of the gross section',
        against: 'tension',
        resistance: working.step('resistance', 'N_pl,Rd', 'A f_y/γ_M0', (A * fy) / gamma, 'force'),
        standard: 'EN 1993-1-1',
        clause: '6.2.3(2)a, (6.6)',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  netRupture: (question, end) => (end.kind === 'bolted' ? bolted(question, end) : welded(question, end)),
  blockShear: (question, end) => {
    const working = new Working();
    const { netTension, netShear } = blockOf(question, end, working);
    const { fy, fu } = question.steel;
    const { M0, M2 } = partialFactors(question.options);
    const off = question.options.blockTearing === 'off the middle';
    const N = (off ? 0.5 : 1) * ((fu * netTension) / M2) + (fy * netShear) / (Math.sqrt(3) * M0);
    return resistance(
      {
        kind: 'block shear',
        title: 'Block tearing',
        against: 'tension',
        end: end.end,
        resistance: working.step(
          'resistance',
          off ? 'V_eff,2,Rd' : 'V_eff,1,Rd',
          `${off ? '0.5 ' : ''}f_u A_nt/γ_M2 + f_y A_nv/(√3 γ_M0)`,
          N,
          'force',
        ),
        standard: 'EN 1993-1-8',
        clause: off ? '3.10.2(3), (3.10)' : '3.10.2(2), (3.9)',
        confidence: 'from memory, sure',
        note: 'Practice differs on (3.9) or (3.10) for an angle by one leg; the settings choose.',
      },
      working,
    );
  },
};

function bolted(question: TensionQuestion, end: ResistingEnd) {
  const working = new Working();
  const { section, steel, options } = question;
  const gamma = partialFactors(options).M2;
  const fu = steel.fu;
  const common = {
    kind: 'net rupture',
    against: 'tension',
    end: end.end,
    confidence: 'from memory, sure',
  } as const;
  if (!isOneLeg(question, end) || !isSingleAngle(question)) {
    const An = netArea(question, end, working);
    working.given('partial factor', 'γ_M2', gamma, 'factor');
    working.requires(
      'the force goes through the centroid, or the outstanding part is small',
      isWhole(question, end),
      'part of the section is not connected',
    );
    return resistance(
      {
        ...common,
        title: 'Rupture of the net section',
        resistance: working.step(
          'resistance',
          'N_u,Rd',
          '0.9 A_net f_u/γ_M2',
          (0.9 * An * fu) / gamma,
          'force',
        ),
        standard: 'EN 1993-1-1',
        clause: '6.2.3(2)b, (6.7)',
      },
      working,
    );
  }
  working.requires('one row of bolts', end.rows === 1, 'two rows');
  const d0 = working.given('hole', 'd_0', end.hole, 'length');
  const t = working.given('thickness', 't', section.thickness, 'length');
  working.given('partial factor', 'γ_M2', gamma, 'factor');
  if (end.bolts === 1) {
    const e2 = working.given('edge distance', 'e_2', end.edgeDistance, 'length');
    const N = (2 * (e2 - 0.5 * d0) * t * fu) / gamma;
    return resistance(
      {
        ...common,
        title: 'Rupture with shear lag, one bolt',
        resistance: working.step('resistance', 'N_u,Rd', '2.0 (e_2 − 0.5 d_0) t f_u/γ_M2', N, 'force'),
        standard: 'EN 1993-1-8',
        clause: '3.10.3, (3.11)',
      },
      working,
    );
  }
  const An = smallerLegNet(question, end, working);
  const p = working.given('pitch', 'p_1', end.pitch, 'length');
  const two = end.bolts === 2;
  const low = two ? 0.4 : 0.5;
  const beta = low + (0.7 - low) * Math.min(1, Math.max(0, (p / d0 - 2.5) / 2.5));
  const symbol = two ? 'β_2' : 'β_3';
  working.step('reduction', symbol, 'Table 3.8 by p_1/d_0', beta, 'factor');
  return resistance(
    {
      ...common,
      title: 'Rupture with shear lag',
      resistance: working.step(
        'resistance',
        'N_u,Rd',
        `${symbol} A_net f_u/γ_M2`,
        (beta * An * fu) / gamma,
        'force',
      ),
      standard: 'EN 1993-1-8',
      clause: two ? '3.10.3, (3.12)' : '3.10.3, (3.13)',
    },
    working,
  );
}

const isSingleAngle = ({ section }: TensionQuestion): boolean => section.shape === 'angle';

/** An unequal angle by its smaller leg counts as an equal one of that leg. */
function smallerLegNet(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  if (section.connectedLeg >= section.outstandingLeg) return netArea(question, end, working);
  const A = smallerLegArea(question, working);
  return working.step('net area', 'A_net', 'A_eq − d_0 t', A - end.hole * section.thickness, 'area');
}

function smallerLegArea({ section }: TensionQuestion, working: Working): number {
  const lost = (section.outstandingLeg - section.connectedLeg) * section.thickness;
  return working.step(
    'area of an equal angle of the smaller leg',
    'A_eq',
    'A − (h − b) t',
    section.properties.area - lost,
    'area',
  );
}

function welded(question: TensionQuestion, end: ResistingEnd) {
  const working = new Working();
  const { section, steel, options } = question;
  const gamma = partialFactors(options).M0;
  const oneLeg = isSingleAngle(question) && section.connectedLeg < section.outstandingLeg;
  const A = oneLeg
    ? smallerLegArea(question, working)
    : working.given('effective area', 'A', section.properties.area, 'area');
  working.given('partial factor', 'γ_M0', gamma, 'factor');
  return resistance(
    {
      kind: 'net rupture',
      title: 'Effective section at the weld',
      against: 'tension',
      end: end.end,
      resistance: working.step('resistance', 'N_Rd', 'A_eff f_y/γ_M0', (A * steel.fy) / gamma, 'force'),
      standard: 'EN 1993-1-8',
      clause: '4.13',
      confidence: 'from memory, sure',
    },
    working,
  );
}
