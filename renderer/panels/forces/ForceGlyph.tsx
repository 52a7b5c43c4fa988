import type { JSX } from 'react';

/** Chevrons apart: pulled. Chevrons together: squeezed. A drooping dashed line: slack. */
export function ForceGlyph({ kind }: { readonly kind: 'pulled' | 'squeezed' | 'slack' }): JSX.Element {
  return (
    <svg className="glyph" width="16" height="10" viewBox="0 0 16 10" aria-hidden="true">
      {kind === 'slack' ? (
        <path
          d="M1 2Q8 11 15 2"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.2"
          strokeDasharray="2.4 2"
        />
      ) : (
        <path
          d={kind === 'pulled' ? 'M5 1 1 5 5 9M11 1 15 5 11 9' : 'M1 1 5 5 1 9M15 1 11 5 15 9'}
          fill="none"
          stroke="currentColor"
          strokeWidth="1.4"
        />
      )}
    </svg>
  );
}
