import { UNMARKED } from '../../layout/joinWords.ts';
import { JOIN_NAMES } from '../../project/joinNames.ts';
import { type Markup, markup } from '../markup.ts';
import { STATUS_NAMES } from '../words.ts';
import type { Elevation } from './elevation.ts';
import { type JoinShape, joinGlyph } from './joinGlyph.ts';
import { inlineSign, statusSign } from './signs.ts';

/** What is on the drawings, and nothing else. */
export function legend(drawings: readonly Elevation[]): Markup {
  const joins = [...new Set(drawings.flatMap((drawing) => drawing.joins))];
  const sides = new Set(drawings.flatMap((drawing) => drawing.sides));
  return markup`<ul class="legend">${sides.has('near') ? entry(markup`<rect class="dg" x="1" y="4" width="36" height="7"/>`, 'angle on the near side') : null}${
    sides.has('far')
      ? entry(markup`<rect class="dgf" x="1" y="4" width="36" height="7"/>`, 'angle on the far side')
      : null
  }${joins.map((join) => entry(joinGlyph(join, [19, 8], 1), joinWords(join)))}${entry(
    markup`<path class="dim" d="M1 8h36"/><path class="hld" d="M19 1v14"/>`,
    'end of the steel: held both ways',
  )}${entry(markup`<path class="cross" d="M14 8h10M19 3v10"/>`, 'set-out point, where lengths are taken')}${drawings.some(({ heldPoints }) => heldPoints) ? entry(markup`<rect class="heldpoint" x="13" y="2" width="12" height="12"/>`, 'point taken as held') : null}${entry(
    markup`<path class="edh" d="M1 8h36"/>`,
    'edge of a leg that lies behind',
  )}</ul><p class="legend-line">${(['over', 'near', 'within'] as const).map(
    (status) => markup`<span>${inlineSign(statusSign(status))} ${STATUS_NAMES[status]}</span> `,
  )}<span>the figure is L/r</span></p>`;
}

function joinWords(join: JoinShape): string {
  return join === 'unmarked' ? `crossing ${UNMARKED}` : `crossing: ${JOIN_NAMES[join]}`;
}

function entry(sign: Markup, words: string): Markup {
  return markup`<li><svg width="38" height="16" viewBox="0 0 38 16" aria-hidden="true">${sign}</svg><span>${words}</span></li>`;
}
