/** The small signs of findings and verdicts, 11 px across, told apart by shape: filled diamond, open triangle, ring. */
import type { Severity } from '../../findings/model.ts';
import { type Markup, markup } from '../markup.ts';
import type { Status } from '../words.ts';

const DIAMOND = markup`<path d="M5.5 0 11 5.5 5.5 11 0 5.5Z"/>`;
const TRIANGLE = markup`<path d="M5.5 .9 10.4 9.8H.6Z" fill="none" stroke="#000" stroke-width="1.3" stroke-linejoin="round"/>`;
const RING = markup`<circle cx="5.5" cy="5.5" r="4.4" fill="none" stroke="#000" stroke-width="1.3"/>`;
const HALF_RING = markup`${RING}<path d="M5.5 1.1a4.4 4.4 0 0 1 0 8.8Z"/>`;
const QUERY = markup`<text x="5.5" y="10" text-anchor="middle" style="font-weight:600">?</text>`;

export function severitySign(severity: Severity): Markup {
  switch (severity) {
    case 'must fix':
      return DIAMOND;
    case 'look into':
      return TRIANGLE;
    case 'note':
      return RING;
    default:
      return severity satisfies never;
  }
}

export function statusSign(status: Status): Markup {
  switch (status) {
    case 'over':
      return DIAMOND;
    case 'near':
      return HALF_RING;
    case 'within':
      return RING;
    case 'unknown':
      return QUERY;
    default:
      return status satisfies never;
  }
}

/** A sign in a line of text. */
export function inlineSign(sign: Markup): Markup {
  return markup`<svg class="sign" width="11" height="11" viewBox="0 0 11 11" aria-hidden="true">${sign}</svg>`;
}
