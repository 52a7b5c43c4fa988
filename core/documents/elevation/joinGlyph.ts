import type { JoinKind } from '../../project/model.ts';
import { type Markup, markup } from '../markup.ts';
import type { Point } from './view.ts';

export type JoinShape = JoinKind | 'unmarked';

/** A join's sign on the drawing, told apart by shape alone, some 11 px across. */
export function joinGlyph(join: JoinShape, [x, y]: Point, size = 1.2): Markup {
  return markup`<g transform="translate(${x} ${y}) scale(${size})">${shapeOf(join)}</g>`;
}

function shapeOf(join: JoinShape): Markup {
  switch (join) {
    case 'unmarked':
      return markup`<circle class="gl" r="5.4" stroke-dasharray="2.6 2"/>`;
    case 'none':
      return markup`<circle class="gl" r="5.6"/>`;
    case 'bolted':
      return markup`<circle class="gl" r="5.6"/><circle r="2.8"/>`;
    case 'packed':
      return markup`<circle class="gl" r="5.6"/><path class="gb" d="M-5.6 0h11.2"/><circle r="2.4"/>`;
    case 'cut':
      return markup`<rect class="gl" x="-5.2" y="-5.2" width="10.4" height="10.4"/><path class="gb" d="M0 -5.2v10.4"/>`;
    case 'welded':
      return markup`<path class="gl" d="M0 -5.9 6.2 4.8H-6.2Z" stroke-linejoin="round"/>`;
    case 'purlin':
      return markup`<path class="gl" d="M-6.4 -5.2h12.8L4 3.4Q0 7.4 -4 3.4Z" stroke-linejoin="round"/><circle cy="-.6" r="2.2"/>`;
    case 'hung':
      return markup`<path class="gb" d="M-6.4 -5.6h12.8M0 -5.6v4"/><circle class="gl" cy="2.4" r="3.6"/>`;
    default:
      return join satisfies never;
  }
}
