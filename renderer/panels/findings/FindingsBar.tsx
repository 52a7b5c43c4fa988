import type { JSX } from 'react';
import { CheckField } from '../../controls/CheckField.tsx';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { SEVERITIES } from '../../shell/top/FindingCounts.tsx';
import { beforeAssessment, shownAssessment } from '../../store/shown.ts';

interface FindingsBarProps {
  readonly onlyBay: boolean;
  onOnlyBay(only: boolean): void;
}

/** Beside the tabs: how many of each weight, one bay or all, and the list as text. */
export function FindingsBar({ onlyBay, onOnlyBay }: FindingsBarProps): JSX.Element {
  const actions = useActions();
  const assessment = useWindow(shownAssessment);
  const before = useWindow(beforeAssessment);
  const bay = useWindow((state) => state.selection.bay);
  const copy = async (): Promise<void> => {
    const lines = (assessment?.findings ?? []).map(
      (finding) => `${finding.severity}\t${finding.bay}\t${finding.title}\t${finding.detail}`,
    );
    await navigator.clipboard.writeText(lines.join('\n'));
    actions.say('The findings are on the clipboard.');
  };
  return (
    <>
      {SEVERITIES.map((severity) => (
        <span key={severity} className="findings-count">
          <SeverityGlyph severity={severity} />
          {severity}{' '}
          <b>
            {before !== null && before.counts[severity] !== assessment?.counts[severity] && (
              <s className="was">{before.counts[severity]}</s>
            )}{' '}
            {assessment?.counts[severity] ?? 0}
          </b>
        </span>
      ))}
      <CheckField label={`Only ${bay ?? 'this bay'}`} checked={onlyBay} onChange={onOnlyBay} />
      <button type="button" className="link-button" onClick={() => void copy()}>
        Copy list
      </button>
    </>
  );
}
