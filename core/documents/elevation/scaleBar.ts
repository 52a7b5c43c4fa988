import type { UnitSystem } from '../../project/model.ts';
import { type Markup, markup } from '../markup.ts';
import type { Elevation } from './elevation.ts';

const METRES_PER_FOOT = 0.3048;
/** Steps of the bar in its unit, and the least length of one on the sheet, px. */
const STEPS = [0.5, 1, 2, 5, 10];
const SHORTEST = 22;

/** Two steps of whole metres or feet to scale, so that a reduced print can still be measured, with what is not to scale. */
export function scaleBar({ pxPerMetre, ratio, widened }: Elevation, units: UnitSystem): Markup {
  const pxPerUnit = units === 'us' ? pxPerMetre * METRES_PER_FOOT : pxPerMetre;
  const unit = STEPS.find((candidate) => candidate * pxPerUnit > SHORTEST) ?? 20;
  const step = unit * pxPerUnit;
  const exact = Number.isInteger(ratio) ? `1:${ratio} on A4` : 'not to a usual scale';
  const note = widened === 1 ? exact : `${exact}, angle widths drawn twice their size`;
  return markup`<p class="scale-line"><svg width="${2 * step + 34}" height="22" viewBox="-4 0 ${2 * step + 34} 22" role="img" aria-label="Scale bar"><rect y="2" width="${step}" height="4"/><rect class="bar" x="${step}" y="2" width="${step}" height="4"/><text y="19" text-anchor="middle">0</text><text x="${step}" y="19" text-anchor="middle">${String(unit)}</text><text x="${2 * step}" y="19" text-anchor="middle">${String(2 * unit)} ${units === 'us' ? 'ft' : 'm'}</text></svg><span>${note}</span></p>`;
}
