import { type JSX, useState } from 'react';
import type { Assessment } from '../../../core/assessment.ts';
import type { Finding } from '../../../core/findings/model.ts';
import { useRemedies } from '../../assessing/useRemedies.ts';
import { JoinGlyph } from '../../glyphs/JoinGlyph.tsx';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownProject } from '../../store/shown.ts';
import { EffectFigures } from './EffectFigures.tsx';
import type { FindingState } from './findingGroups.ts';
import { findingFigure, findingPlace, tellsLimit } from './findingWords.ts';
import { remedyTrial } from './remedyTrial.ts';
import { TryButton } from './TryButton.tsx';

interface FindingRowProps {
  readonly finding: Finding;
  readonly state: FindingState;
  readonly assessment: Assessment;
  readonly before: Assessment | null;
}

export function FindingRow({ finding, state, assessment, before }: FindingRowProps): JSX.Element {
  const actions = useActions();
  const units = useWindow((window) => shownProject(window).settings.units);
  const chosen = useWindow(({ selection }) =>
    finding.crossing === null
      ? selection.bar !== null && finding.bars.includes(selection.bar)
      : selection.crossing === finding.crossing,
  );
  const source = state === 'closes' && before !== null ? before : assessment;
  const crossing = finding.crossing === null ? undefined : source.layout.crossings.get(finding.crossing);
  const choose = (): void => {
    const [bar] = finding.bars;
    if (crossing !== undefined) actions.selectCrossing(crossing.id);
    else if (bar !== undefined) actions.selectBar(bar);
    else actions.selectBay(finding.bay);
  };
  const value = findingFigure(finding.value, finding, units);
  const limit = findingFigure(finding.limit, finding, units);
  return (
    <article className="finding" data-chosen={chosen || undefined} aria-label={finding.title}>
      <SeverityGlyph severity={finding.severity} closing={state === 'closes'} />
      <button type="button" className="finding-words" onClick={choose}>
        <b>
          <span className="unseen">{finding.severity}: </span>
          {finding.title}
        </b>
        <span>
          {state !== 'stands' && <i>{state === 'closes' ? 'Closes. ' : 'Opens. '}</i>}
          {finding.detail}
        </span>
      </button>
      <span className="finding-where">
        {crossing === undefined ? (
          <JoinGlyph join="end" />
        ) : (
          <JoinGlyph join={crossing.join?.kind ?? 'unmarked'} />
        )}
        <span>
          {findingPlace(finding, source)}
          <em>{finding.bay}</em>
        </span>
      </span>
      <span className="finding-value">
        {state === 'closes' ? <s className="was">{value}</s> : <b>{value}</b>}
        {limit !== '' && tellsLimit(finding) && <em>limit {limit}</em>}
      </span>
      {state === 'opens' ? <span /> : <Remedies finding={finding} />}
    </article>
  );
}

/** Remedies shown before the rest is asked for. */
const FIRST = 3;

function Remedies({ finding }: { readonly finding: Finding }): JSX.Element {
  const base = useWindow((state) => state.assessing.base?.assessment ?? null);
  const chosen = useWindow((state) => state.selection.bar);
  const [all, setAll] = useState(false);
  const remedies = useRemedies([finding.id])[0]?.remedies ?? null;
  if (base === null || remedies === null) return <span className="second">Working out what would help…</span>;
  if (remedies.length === 0) return <span className="second">No remedy to offer: judge it by hand.</span>;
  const shown = all ? remedies : remedies.slice(0, FIRST);
  return (
    <div>
      {shown.map((remedy) => (
        <div key={remedy.id} className="finding-remedy">
          <span title={`${remedy.label}: ${remedy.detail}`}>{remedy.label}</span>
          <EffectFigures effect={remedy.effect} finding={finding} />
          <TryButton
            name={remedy.label}
            id={remedy.id}
            trial={() => remedyTrial(remedy, finding, base, chosen)}
          />
        </div>
      ))}
      {remedies.length > shown.length && (
        <button type="button" className="link-button finding-more" onClick={() => setAll(true)}>
          {remedies.length - shown.length} more
        </button>
      )}
    </div>
  );
}
