import type { DimensionLine } from '../../layout/model.ts';
import type { UnitSystem } from '../../project/model.ts';
import { grouped } from '../../units/figures.ts';
import { showLength } from '../../units/quantity.ts';
import { type Markup, markup } from '../markup.ts';
import { type ElevationView, type Extent, toSheet } from './view.ts';

/** Between the steel and the right end of a level's figure, px: left of the first dimension line. */
const AWAY = 56;

/** Levels at the ends of the upright dimensions of an upright plane: "+4.20" in metres above the zero of the project. */
export function levelMarks(
  lines: readonly DimensionLine[],
  view: ElevationView,
  extent: Extent,
  units: UnitSystem,
): Markup | null {
  if (view.plane.up[2] < 0.99) return null;
  const upright = lines.filter(
    ({ from, to }) =>
      Math.abs(to[2] - from[2]) > 0.99 * Math.hypot(to[0] - from[0], to[1] - from[1], to[2] - from[2]),
  );
  const byLevel = new Map(upright.flatMap(({ from, to }) => [from, to]).map((at) => [Math.round(at[2]), at]));
  const x = view.origin[0] + extent.left * view.scale - AWAY;
  return markup`${[...byLevel].map(
    ([level, at]) =>
      markup`<text x="${x}" y="${toSheet(view, at)[1] + 4}" text-anchor="end">${levelText(level, units)}</text>`,
  )}`;
}

function levelText(mm: number, units: UnitSystem): string {
  const sign = mm === 0 ? '±' : mm > 0 ? '+' : '−';
  const size = Math.abs(mm);
  return sign + (units === 'us' ? showLength(size, units) : grouped(size / 1000, 2));
}
