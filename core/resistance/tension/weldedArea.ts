import type { ResistingEnd, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { pliesOf } from './boltRows.ts';
import { heldBy } from './pack.ts';

/** An element between two welds along it: all of it from L = 2w on, continuous at L = w and L = 2w. mm². */
export const betweenWelds = (w: number, L: number, t: number): number =>
  L >= 2 * w ? w * t : L >= w ? 0.5 * w * t + 0.25 * L * t : 0.75 * L * t;

/** An element along one weld at its edge, whose middle stands w/2 off: continuous at L = w. mm². */
export const besideWeld = (w: number, L: number, t: number): number =>
  L >= w ? (1 - w / 2 / L) * w * t : 0.5 * L * t;

/** CSA S16 12.3.3.3 (SANS 10162-1 alike, from memory, verify): area that two welds along the bar bring into play, mm². */
export function weldedArea(question: TensionQuestion, end: ResistingEnd, working: Working): number {
  const { section } = question;
  const t = working.given('thickness', 't', section.thickness, 'length');
  const L = working.given('length of the welds', 'L', end.weldLength, 'length');
  const plies = pliesOf(section);
  const times = plies === 2 ? '2 × ' : '';
  const between = (name: string, symbol: string, w: number): number => {
    working.given(`width of ${name}`, `w_${symbol}`, w, 'length');
    return working.step(
      `area through ${name}`,
      `A_n2,${symbol}`,
      times + (L >= 2 * w ? 'w t' : L >= w ? '0.50 w t + 0.25 L t' : '0.75 L t'),
      plies * betweenWelds(w, L, t),
      'area',
    );
  };
  const parts = [
    between(section.shape === 'flat' ? 'the flat' : 'the connected leg', '1', section.connectedLeg),
  ];
  if (section.shape !== 'flat') {
    // The legs meet in the heel: what stands out is counted beyond the connected leg.
    const out = section.outstandingLeg - t;
    if (heldBy(question, end) === 'whole') parts.push(between('the other leg', '2', out));
    else {
      working.given('width of the outstanding leg', 'w_2', out, 'length');
      parts.push(
        working.step(
          'area through the outstanding leg',
          'A_n3',
          times + (L >= out ? '(1 − x̄_w/L) w_2 t, x̄_w = w_2/2' : '0.50 L t'),
          plies * besideWeld(out, L, t),
          'area',
        ),
      );
    }
  }
  return working.step(
    'effective area',
    'A′_ne',
    'their sum, not above A_g',
    Math.min(
      parts.reduce((sum, part) => sum + part, 0),
      section.properties.area,
    ),
    'area',
  );
}
