import type { JSX } from 'react';
import type { ReadingState } from '../../../core/documents/bowingWords.ts';
import { StatusGlyph } from '../../glyphs/StatusGlyph.tsx';
import { LookSign, TickSign } from '../../glyphs/signs.tsx';

/** The window's own signs: diamond, rings, the open triangle for what is claimed or too soft, a tick for what is firm. */
export function ReadingGlyph({ state }: { readonly state: ReadingState }): JSX.Element | null {
  switch (state) {
    case 'over':
    case 'near':
    case 'within':
      return <StatusGlyph status={state} />;
    case 'weak':
      return <StatusGlyph status="over" />;
    case 'soft':
      return <LookSign />;
    case 'firm':
      return <TickSign />;
    case 'nothing':
      return null;
    default:
      return state satisfies never;
  }
}
