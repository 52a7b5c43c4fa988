/** Fills for print in black and white: dots, lines, close lines, heavy diagonals for nearness to the limit; fine diagonals for the far side. */
import { type Markup, markup } from './markup.ts';

export type NearnessFill = 'near-1' | 'near-2' | 'near-3' | 'near-over';

export const NEARNESS_FILLS: readonly { readonly fill: NearnessFill; readonly words: string }[] = [
  { fill: 'near-1', words: 'under half the limit' },
  { fill: 'near-2', words: 'half to 0.85' },
  { fill: 'near-3', words: '0.85 to the limit' },
  { fill: 'near-over', words: 'over' },
];

/** @param nearness slenderness over its limit */
export function nearnessFill(nearness: number): NearnessFill {
  if (nearness > 1) return 'near-over';
  if (nearness >= 0.85) return 'near-3';
  return nearness >= 0.5 ? 'near-2' : 'near-1';
}

/** The patterns, once a document. */
export const HATCHES: Markup = markup`<svg class="hatches" width="0" height="0" aria-hidden="true"><defs>
<pattern id="far" width="4" height="4" patternUnits="userSpaceOnUse" patternTransform="rotate(-35)"><rect width="4" height="4" fill="#fff"/><path d="M0 0v4" stroke="#000" stroke-width=".7"/></pattern>
<pattern id="near-1" width="6" height="6" patternUnits="userSpaceOnUse"><rect width="6" height="6" fill="#fff"/><circle cx="1.5" cy="1.5" r=".7"/><circle cx="4.5" cy="4.5" r=".7"/></pattern>
<pattern id="near-2" width="8" height="5" patternUnits="userSpaceOnUse"><rect width="8" height="5" fill="#fff"/><path d="M0 2.5h8" stroke="#000" stroke-width=".7"/></pattern>
<pattern id="near-3" width="8" height="2.5" patternUnits="userSpaceOnUse"><rect width="8" height="2.5" fill="#fff"/><path d="M0 1.25h8" stroke="#000"/></pattern>
<pattern id="near-over" width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><rect width="7" height="7" fill="#fff"/><path d="M0 0v7" stroke="#000" stroke-width="4.4"/></pattern>
</defs></svg>`;
