import type { BucklingMode } from '../stability/model.ts';

const COUNT = ['no', 'one', 'two', 'three', 'four', 'five', 'six'];

/** The shape at buckling in words. */
export function modeInWords(mode: BucklingMode): string {
  const waves = `${COUNT[mode.halfWaves] ?? mode.halfWaves} half-wave${mode.halfWaves === 1 ? '' : 's'}`;
  const v = mode.energyAboutV * 100;
  const about =
    v > 99.5
      ? 'about v alone'
      : v < 0.5
        ? 'about u alone'
        : `${v.toFixed(0)} % of the bending about v, the rest about u`;
  return `${waves}, ${about}, ${mode.symmetry === 'unsymmetric' ? 'lopsided' : mode.symmetry} about the middle`;
}
