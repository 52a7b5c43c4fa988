import type { UnitSystem } from '../../project/model.ts';
import type { Restraint } from '../../restraint/model.ts';
import { showLength } from '../../units/quantity.ts';
import type { NumberedClaim } from '../claimNumbers.ts';
import { type Markup, markup } from '../markup.ts';
import { DIRECTION_NAMES, joinKindName, reasonText, trailText } from '../words.ts';

/**
 * Every hold claimed between the ends, counted or not, with why and the trail from it to a support or to what is free. Those that count
 * are what the figures stand on, and have boxes for the checker.
 */
export function holdsTable(
  restraint: Restraint,
  claims: readonly NumberedClaim[],
  units: UnitSystem,
): Markup {
  if (claims.length === 0)
    return markup`<p>Nothing meets the bar between its ends, which hold it every way.</p>`;
  return markup`<table class="t holds"><thead><tr><th class="l">No.</th><th class="l">At</th><th>from i</th><th class="l">By</th><th class="l">Pushed</th><th class="l">Holds</th><th class="l">Because, and the trail to what holds it</th><th class="tick">agreed</th><th class="tick">not</th></tr></thead><tbody>${claims.map(
    ({ number, station, claim }) => {
      const { label, at } = restraint.stations[station] ?? { label: '', at: 0 };
      return markup`<tr class="${claim.counted ? 'counts' : 'countsnot'}"><td class="l"><span class="no">${String(number)}</span></td><td class="l"><b>${label}</b></td><td>${showLength(at, units, 'spoken')}</td><td class="l">${joinKindName(claim.join)}</td><td class="l">${DIRECTION_NAMES[claim.direction]}</td><td class="l">${claim.counted ? markup`<b>yes</b>` : 'no'}</td><td class="l wrap">${reasonText(claim.reason)}${claim.trail.length > 0 ? markup` <i>${trailText(claim.trail)}</i>` : null}</td>${claim.counted ? BOXES : NO_BOXES}</tr>`;
    },
  )}</tbody></table>`;
}

const BOXES: Markup = markup`<td class="tick"><i class="box"></i></td><td class="tick"><i class="box"></i></td>`;
const NO_BOXES: Markup = markup`<td></td><td></td>`;
