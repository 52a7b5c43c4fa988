import type { JSX } from 'react';

/** Small signs of the window: the mark, arrows, cross, tick. Always beside a word or under an accessible name. */

export function TautlineMark(): JSX.Element {
  return (
    <svg
      className="glyph"
      width="20"
      height="20"
      viewBox="0 0 20 20"
      fill="none"
      stroke="var(--ink)"
      aria-hidden="true"
    >
      <path d="M2 3v14M18 3v14" strokeWidth="2" />
      <path d="M2 15.5 18 4.5" strokeWidth="1.6" />
      <path d="M2 4.5Q8.5 11.5 18 15.5" strokeWidth="1.1" strokeDasharray="2.4 1.6" />
    </svg>
  );
}

export function ArrowSign(): JSX.Element {
  return (
    <svg className="glyph" width="13" height="8" aria-hidden="true">
      <path d="M0 4h11M8 1l3.4 3L8 7" fill="none" stroke="var(--ink2)" strokeWidth="1.2" />
    </svg>
  );
}

export function UndoSign(): JSX.Element {
  return <LineSign path="M5.5 3 2.5 6l3 3M3 6h6.2a3.6 3.6 0 0 1 0 7.2H6" />;
}

export function RedoSign(): JSX.Element {
  return <LineSign path="M10.5 3l3 3-3 3M13 6H6.8a3.6 3.6 0 0 0 0 7.2H10" />;
}

export function FindSign(): JSX.Element {
  return <LineSign path="M11 11l3 3M7 12a5 5 0 1 0 0-10 5 5 0 0 0 0 10Z" />;
}

export function CloseSign(): JSX.Element {
  return <LineSign path="M4 4l8 8M12 4l-8 8" />;
}

export function PlusSign(): JSX.Element {
  return <LineSign path="M8 3v10M3 8h10" />;
}

export function MinusSign(): JSX.Element {
  return <LineSign path="M3 8h10" />;
}

export function MoreSign(): JSX.Element {
  return (
    <svg className="glyph" width="16" height="16" fill="var(--ink2)" aria-hidden="true">
      <circle cx="3.5" cy="8" r="1.3" />
      <circle cx="8" cy="8" r="1.3" />
      <circle cx="12.5" cy="8" r="1.3" />
    </svg>
  );
}

export function TickSign(): JSX.Element {
  return (
    <svg className="glyph" width="12" height="10" aria-hidden="true">
      <path d="M1.5 5 4.5 8.3 10.5 1.3" fill="none" stroke="var(--ink)" strokeWidth="1.8" />
    </svg>
  );
}

export function StepSign({ up }: { readonly up: boolean }): JSX.Element {
  return (
    <svg className="glyph" width="7" height="4" fill="var(--ink2)" aria-hidden="true">
      <path d={up ? 'M0 4 3.5 0 7 4Z' : 'M0 0h7L3.5 4Z'} />
    </svg>
  );
}

/** An open triangle: something claimed that is not so, or worth a look. */
export function LookSign(): JSX.Element {
  return (
    <svg className="glyph" width="11" height="11" viewBox="0 0 11 11" aria-hidden="true">
      <path
        d="M5.5 .9 10.4 9.8H.6Z"
        fill="none"
        stroke="var(--ink)"
        strokeWidth="1.4"
        strokeLinejoin="round"
      />
    </svg>
  );
}

function LineSign({ path }: { readonly path: string }): JSX.Element {
  return (
    <svg
      className="glyph"
      width="16"
      height="16"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      aria-hidden="true"
    >
      <path d={path} />
    </svg>
  );
}
