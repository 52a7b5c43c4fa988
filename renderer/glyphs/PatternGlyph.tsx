import type { JSX } from 'react';
import type { Pattern } from '../../core/project/model.ts';

const PATHS: Readonly<Record<Pattern, string>> = {
  crossed: 'M1 11 13 1M1 1l12 10',
  rising: 'M1 11 13 1',
  falling: 'M1 1l12 10',
  peaked: 'M1 11 7 1l6 10',
  vee: 'M1 1l6 10 6-10',
  open: '',
};

/** What each pattern of a tier or panel is called. */
export const PATTERN_WORDS: Readonly<Record<Pattern, string>> = {
  crossed: 'Crossed',
  rising: 'Rising',
  falling: 'Falling',
  peaked: 'Peaked',
  vee: 'Vee',
  open: 'Open',
};

export function PatternGlyph({ pattern }: { readonly pattern: Pattern }): JSX.Element {
  return (
    <svg className="glyph glyph-pattern" width="14" height="12" aria-hidden="true">
      {pattern === 'open' ? (
        <rect x="1" y="1" width="12" height="10" strokeDasharray="2 1.6" />
      ) : (
        <path d={PATHS[pattern]} />
      )}
    </svg>
  );
}
