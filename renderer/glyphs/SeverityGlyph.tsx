import type { JSX } from 'react';
import type { Severity } from '../../core/findings/model.ts';

/** Filled diamond: must fix. Open triangle: look into. Open ring: note. */
export function SeverityGlyph({ severity, closing = false }: SeverityGlyphProps): JSX.Element {
  return (
    <svg className="glyph" width="11" height="11" viewBox="0 0 11 11" aria-hidden="true">
      <SeverityShape severity={severity} closing={closing} />
    </svg>
  );
}

interface SeverityGlyphProps {
  readonly severity: Severity;
  /** Drawn dashed and hollow: the change on trial closes it. */
  readonly closing?: boolean;
}

function SeverityShape({ severity, closing }: Required<SeverityGlyphProps>): JSX.Element {
  const dashed = closing ? { strokeDasharray: '2 1.4' } : {};
  switch (severity) {
    case 'must fix':
      return closing ? (
        <path
          d="M5.5 .7 10.3 5.5 5.5 10.3 .7 5.5Z"
          fill="none"
          stroke="var(--over)"
          strokeWidth="1.2"
          {...dashed}
        />
      ) : (
        <path d="M5.5 0 11 5.5 5.5 11 0 5.5Z" fill="var(--over)" />
      );
    case 'look into':
      return (
        <path
          d="M5.5 .9 10.4 9.8H.6Z"
          fill="none"
          stroke="var(--ink)"
          strokeWidth="1.4"
          strokeLinejoin="round"
          {...dashed}
        />
      );
    case 'note':
      return (
        <circle cx="5.5" cy="5.5" r="4.2" fill="none" stroke="var(--ink2)" strokeWidth="1.3" {...dashed} />
      );
    default:
      return severity satisfies never;
  }
}
