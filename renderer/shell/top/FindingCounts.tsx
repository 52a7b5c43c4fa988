import type { JSX } from 'react';
import type { Severity } from '../../../core/findings/model.ts';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { beforeAssessment, shownAssessment } from '../../store/shown.ts';
import { useActions, useWindow } from '../services.tsx';

export const SEVERITIES: readonly Severity[] = ['must fix', 'look into', 'note'];

/** How many findings there are of each weight; opens their list. */
export function FindingCounts(): JSX.Element | null {
  const actions = useActions();
  const counts = useWindow((state) => shownAssessment(state)?.counts ?? null);
  const before = useWindow((state) => beforeAssessment(state)?.counts ?? null);
  if (counts === null) return null;
  const spoken = SEVERITIES.map((severity) => `${counts[severity]} ${severity}`).join(', ');
  return (
    <button
      type="button"
      className="counts"
      aria-label={`Findings: ${spoken}`}
      onClick={() => actions.showTab('findings')}
    >
      {SEVERITIES.map((severity) => (
        <span key={severity}>
          <SeverityGlyph severity={severity} />
          {before !== null && before[severity] !== counts[severity] && (
            <s className="was">{before[severity]}</s>
          )}
          {counts[severity]}
        </span>
      ))}
      <span className="top-word">findings</span>
    </button>
  );
}
