import type { JSX } from 'react';

/** The hatches for "over the limit", drawn once for the whole window: lanes, chips, and the far side of a limit line. */
export function Hatches(): JSX.Element {
  return (
    <svg width="0" height="0" style={{ position: 'absolute' }} aria-hidden="true">
      <defs>
        <pattern id="hatch" width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <rect width="6" height="6" fill="var(--overbg)" />
          <path d="M0 0v6" stroke="var(--over)" strokeWidth="3.2" />
        </pattern>
        <pattern
          id="hatch-fine"
          width="4.4"
          height="4.4"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="4.4" height="4.4" fill="var(--overbg)" />
          <path d="M0 0v4.4" stroke="var(--over)" strokeWidth="2.6" />
        </pattern>
        <pattern
          id="hatch-ground"
          width="9"
          height="9"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0v9" stroke="var(--over)" strokeWidth="1" opacity=".32" />
        </pattern>
      </defs>
    </svg>
  );
}
