import type { JSX } from 'react';
import type { JoinKind } from '../../core/project/model.ts';

/** What a join looks like, told apart by shape alone. "unmarked" is a dashed ring; "end" a tick across the bar. */
export type JoinShape = JoinKind | 'unmarked' | 'end';

/** A join's glyph centred on (0, 0), 11.2 px across, to be placed in a drawing. */
export function JoinMark({ join }: { readonly join: JoinShape }): JSX.Element {
  switch (join) {
    case 'unmarked':
      return <circle className="glyph-line" r="5.4" strokeDasharray="2.6 2" />;
    case 'none':
      return <circle className="glyph-line" r="5.6" />;
    case 'bolted':
      return (
        <>
          <circle className="glyph-line" r="5.6" />
          <circle className="glyph-solid" r="2.8" />
        </>
      );
    case 'packed':
      return (
        <>
          <circle className="glyph-line" r="5.6" />
          <path className="glyph-bar" d="M-5.6 0h11.2" />
          <circle className="glyph-solid" r="2.4" />
        </>
      );
    case 'cut':
      return (
        <>
          <rect className="glyph-line" x="-5.2" y="-5.2" width="10.4" height="10.4" />
          <path className="glyph-bar" d="M0 -5.2v10.4" />
        </>
      );
    case 'welded':
      return <path className="glyph-line" d="M0 -5.9 6.2 4.8H-6.2Z" strokeLinejoin="round" />;
    case 'purlin':
      return (
        <>
          <path className="glyph-line" d="M-6.4 -5.2h12.8L4 3.4Q0 7.4 -4 3.4Z" strokeLinejoin="round" />
          <circle className="glyph-solid" cy="-0.6" r="2.2" />
        </>
      );
    case 'hung':
      return (
        <>
          <path className="glyph-bar" d="M-6.4 -5.6h12.8M0 -5.6v4" />
          <circle className="glyph-line" cy="2.4" r="3.6" />
        </>
      );
    case 'end':
      return <path className="glyph-bar" d="M-6.4 0h12.8M0 -6v12" />;
    default:
      return join satisfies never;
  }
}

export function JoinGlyph({ join }: { readonly join: JoinShape }): JSX.Element {
  return (
    <svg className="glyph" width="16" height="16" viewBox="-8 -8 16 16" aria-hidden="true">
      <JoinMark join={join} />
    </svg>
  );
}
