import type { JSX } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { Finding } from '../../../core/findings/model.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { Remedy } from '../../../core/remedies/model.ts';
import { useRemedies } from '../../assessing/useRemedies.ts';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { useServices, useWindow } from '../../shell/services.tsx';
import { EffectFigures } from '../findings/EffectFigures.tsx';
import { remedyTrial } from '../findings/remedyTrial.ts';
import { TryButton } from '../findings/TryButton.tsx';

interface RemedyListProps {
  readonly bar: Bar;
  readonly assessment: Assessment;
}

/** What would answer this bar's findings, each with what it would do, to be tried with one click. */
export function RemedyList({ bar, assessment }: RemedyListProps): JSX.Element {
  const { actions } = useServices();
  const base = useWindow((state) => state.assessing.base?.assessment ?? assessment);
  const findings = base.findings.filter((finding) => finding.bars.includes(bar.id));
  const answers = useRemedies(findings.map(({ id }) => id));
  const rows = distinct(
    answers.flatMap(({ finding, remedies }) => {
      const found = findings.find(({ id }) => id === finding);
      return found === undefined ? [] : (remedies ?? []).map((remedy) => ({ finding: found, remedy }));
    }),
  );
  const waiting = answers.some(({ remedies }) => remedies === null);
  return (
    <section className="remedies" aria-label={`Remedies for ${bar.mark}`}>
      <div className="remedies-head">
        <h3>Remedies</h3>
        {findings.length > 0 && (
          <button type="button" className="link-button" onClick={() => actions.showTab('findings')}>
            {findings.length} {findings.length === 1 ? 'finding' : 'findings'}
          </button>
        )}
      </div>
      {findings.length === 0 && <p className="remedies-none">Nothing found that wants one.</p>}
      {waiting && rows.length === 0 && <p className="remedies-none">Working out what would help…</p>}
      <ul>
        {rows.map(({ finding, remedy }) => (
          <li key={remedy.id} className="remedy">
            <SeverityGlyph severity={finding.severity} />
            <span className="remedy-words" title={finding.title}>
              {remedy.label}
              <em>{remedy.detail}</em>
            </span>
            <EffectFigures effect={remedy.effect} finding={finding} />
            <TryButton
              name={remedy.label}
              id={remedy.id}
              trial={() => remedyTrial(remedy, finding, base, bar.id)}
            />
          </li>
        ))}
      </ul>
    </section>
  );
}

interface RemedyRow {
  readonly finding: Finding;
  readonly remedy: Remedy;
}

/** One change may answer several findings: it is listed once, for the weightiest. */
function distinct(rows: readonly RemedyRow[]): readonly RemedyRow[] {
  const seen = new Set<string>();
  return rows.filter(({ remedy }) => {
    const same = JSON.stringify(remedy.edits);
    if (seen.has(same)) return false;
    seen.add(same);
    return true;
  });
}
