/** AISC 360-16 and -22, chapters D and J. Practice-facts B3, C. */
import type { ResistanceOptions, ResistingEnd, TensionQuestion } from '../model.ts';
import { resistance, Working } from '../working.ts';
import { blockOf, boltedLength, netArea } from './boltRows.ts';
import { isWhole, type TensionPack } from './pack.ts';

const STANDARD = 'AISC 360';

/** Design strength φR_n, or allowable strength R_n/Ω. */
export function strengthOf(
  nominal: number,
  phi: number,
  omega: number,
  { method }: ResistanceOptions,
  working: Working,
  symbol: string,
): number {
  return method === 'ASD'
    ? working.step(
        'allowable strength',
        `${symbol}/Ω`,
        `${symbol}/${omega.toFixed(2)}`,
        nominal / omega,
        'force',
      )
    : working.step('design strength', `φ${symbol}`, `${phi.toFixed(2)} ${symbol}`, phi * nominal, 'force');
}

export const AISC: TensionPack = {
  grossYield: ({ section, steel, options }) => {
    const working = new Working();
    const A = working.given('gross area', 'A_g', section.properties.area, 'area');
    const Fy = working.given('yield stress', 'F_y', steel.fy, 'stress');
    const Pn = working.step('nominal strength', 'P_n', 'F_y A_g', Fy * A, 'force');
    return resistance(
      {
        kind: 'gross yield',
        title: 'Yield of the gross section',
        against: 'tension',
        resistance: strengthOf(Pn, 0.9, 1.67, options, working, 'P_n'),
        standard: STANDARD,
        clause: 'D2(a), (D2-1)',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
  netRupture: (question, end) => {
    const working = new Working();
    const net =
      end.kind === 'bolted'
        ? netArea(question, end, working)
        : working.step('net area', 'A_n', 'A_g, nothing taken out', question.section.properties.area, 'area');
    const U = isWhole(question, end)
      ? working.step('shear lag factor', 'U', '1, all of it connected: Table D3.1 case 1', 1, 'factor')
      : end.kind === 'bolted'
        ? boltedLag(question, end, working)
        : weldedLag(question, end, working);
    const Ae = working.step('effective net area', 'A_e', 'A_n U', net * U, 'area');
    const Fu = working.given('tensile strength', 'F_u', question.steel.fu, 'stress');
    const Pn = working.step('nominal strength', 'P_n', 'F_u A_e', Fu * Ae, 'force');
    return resistance(
      {
        kind: 'net rupture',
        title: isWhole(question, end) ? 'Rupture of the net section' : 'Rupture with shear lag',
        against: 'tension',
        end: end.end,
        resistance: strengthOf(Pn, 0.75, 2, question.options, working, 'P_n'),
        standard: STANDARD,
        clause: 'D2(b), (D2-2), Table D3.1',
        confidence: end.kind === 'bolted' ? 'read in a source' : 'from memory, sure',
      },
      working,
    );
  },
  blockShear: (question, end) => {
    const working = new Working();
    const { netTension, netShear, grossShear } = blockOf(question, end, working);
    const { fy, fu } = question.steel;
    const tension = working.step('in tension', 'T_n', '1.0 F_u A_nt', fu * netTension, 'force');
    const rupture = working.step('rupture in shear', 'V_u', '0.60 F_u A_nv', 0.6 * fu * netShear, 'force');
    const yields = working.step('yield in shear', 'V_y', '0.60 F_y A_gv', 0.6 * fy * grossShear, 'force');
    const Rn = working.step(
      'nominal strength',
      'R_n',
      'T_n + min(V_u, V_y)',
      tension + Math.min(rupture, yields),
      'force',
    );
    return resistance(
      {
        kind: 'block shear',
        title: 'Block shear',
        against: 'tension',
        end: end.end,
        resistance: strengthOf(Rn, 0.75, 2, question.options, working, 'R_n'),
        standard: STANDARD,
        clause: 'J4.3, (J4-5), U_bs = 1',
        confidence: 'from memory, sure',
      },
      working,
    );
  },
};

/** Table D3.1, the larger of cases 2 and 8, and not below the share of the gross area that is connected. */
function boltedLag(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  const inLine = Math.ceil(end.bolts / end.rows);
  const l = working.given('first bolt to last', 'l', boltedLength(end), 'length');
  const x = working.given('face to centroid', 'x̄', section.offCentroid, 'length');
  const byLength = l > 0 ? working.step('case 2', 'U_2', '1 − x̄/l', Math.max(0, 1 - x / l), 'factor') : 0;
  const isAngle = section.shape === 'angle' || section.shape === 'angles back to back';
  const byCount = isAngle && inLine >= 3 ? (inLine >= 4 ? 0.8 : 0.6) : 0;
  if (byCount > 0) working.step('case 8', 'U_8', `${inLine} bolts in line`, byCount, 'factor');
  const connected = section.shape.includes('tube')
    ? 0
    : working.step(
        'least',
        'U_min',
        'connected leg over gross area',
        (section.connectedLeg * section.thickness) / section.properties.area,
        'factor',
      );
  const U = Math.min(1, Math.max(byLength, byCount, connected));
  return working.step('shear lag factor', 'U', 'the largest', U, 'factor');
}

/** Case 4: two welds along the leg. */
function weldedLag({ section }: TensionQuestion, end: ResistingEnd, working: Working): number {
  const l = working.given('length of the welds', 'l', end.weldLength, 'length');
  const w = working.given('width between the welds', 'w', section.connectedLeg, 'length');
  const x = working.given('face to centroid', 'x̄', section.offCentroid, 'length');
  working.requires('each weld at least four times its size', l >= 4 * end.weldSize, `${l} mm`);
  const U = ((3 * l * l) / (3 * l * l + w * w)) * Math.max(0, 1 - x / Math.max(l, 1e-9));
  return working.step('shear lag factor, case 4', 'U', '3l²/(3l² + w²) (1 − x̄/l)', U, 'factor');
}
