import type { JSX } from 'react';
import type { DiagonalAssessment } from '../../core/assessment.ts';

export type Status = DiagonalAssessment['status'];

/** Filled diamond: over. Half-filled ring: near. Open ring: within. Dashed ring: not known. */
export function StatusGlyph({ status }: { readonly status: Status }): JSX.Element {
  return (
    <svg className="glyph" width="11" height="11" viewBox="0 0 11 11" aria-hidden="true">
      <StatusShape status={status} />
    </svg>
  );
}

function StatusShape({ status }: { readonly status: Status }): JSX.Element {
  switch (status) {
    case 'over':
      return <path d="M5.5 0 11 5.5 5.5 11 0 5.5Z" fill="var(--over)" />;
    case 'near':
      return (
        <>
          <circle cx="5.5" cy="5.5" r="4.4" fill="none" stroke="var(--ink)" strokeWidth="1.3" />
          <path d="M5.5 1.1a4.4 4.4 0 0 1 0 8.8Z" fill="var(--ink)" />
        </>
      );
    case 'within':
      return <circle cx="5.5" cy="5.5" r="4.4" fill="none" stroke="var(--ink)" strokeWidth="1.3" />;
    case 'unknown':
      return (
        <circle
          cx="5.5"
          cy="5.5"
          r="4.4"
          fill="none"
          stroke="var(--ink2)"
          strokeWidth="1.3"
          strokeDasharray="2 1.6"
        />
      );
    default:
      return status satisfies never;
  }
}

/** One word for a status, as in the schedule. */
export const STATUS_WORDS: Readonly<Record<Status, string>> = {
  over: 'over',
  near: 'near',
  within: 'within',
  unknown: 'not known',
};
