import type { BucklingMode } from '../stability/model.ts';
import type { SolvedMode } from './model.ts';

const percent = (share: number): string => `${(100 * share).toFixed(1)} %`;

/** The shape of one bar at buckling, in a line. */
export function barInWords(mode: BucklingMode | null, solved: SolvedMode | null): string {
  if (!mode || !solved) return 'nothing presses it, so it does not buckle';
  const waves = `${mode.halfWaves} half-wave${mode.halfWaves === 1 ? '' : 's'}`;
  const symmetry =
    mode.symmetry === 'unsymmetric' ? 'lopsided about mid-length' : `${mode.symmetry} about mid-length`;
  const where = `moves most at ${solved.largestAt.toFixed(3)} L, ${solved.largestDirection.toFixed(1)}° from x`;
  return [waves, bendingInWords(mode), symmetry, where, ...twistInWords(mode)].join('; ');
}

function bendingInWords({ energyAboutV, energyAboutU }: BucklingMode): string {
  if (energyAboutV > 0.9995) return 'bends about v alone (the weak axis)';
  if (energyAboutU > 0.9995) return 'bends about u alone (the strong axis)';
  return `bends about both axes together, ${percent(energyAboutV)} of the bending energy about v and ${percent(energyAboutU)} about u`;
}

/** Turning of the section for a largest displacement of 1 mm, where there is any. */
function twistInWords({ shape }: BucklingMode): readonly string[] {
  const most = shape.reduce((largest, { twist }) => Math.max(largest, Math.abs(twist)), 0);
  const degrees = (most * 180) / Math.PI;
  return degrees < 1e-3 ? [] : [`twists by up to ${degrees.toFixed(2)}° for each mm of that`];
}

/** What a crossed pair does at buckling. */
export function pairInWords(what: 'no load' | 'crossing moves' | 'bar alone' | 'partner alone'): string {
  switch (what) {
    case 'no load':
      return 'moves without resistance: hinges at the crossing, and too little pull to keep it in place';
    case 'crossing moves':
      return 'crossing moves: both bars bow together';
    case 'bar alone':
      return 'crossing stays: the bar bows between its ends and the crossing';
    case 'partner alone':
      return 'crossing stays: the partner bows by itself, the bar stays straight';
    default:
      return what satisfies never;
  }
}
