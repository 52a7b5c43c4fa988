import { type JSX, useEffect, useRef } from 'react';
import type { Assessment, DiagonalAssessment } from '../../../core/assessment.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { Key } from '../../controls/Key.tsx';
import { STATUS_WORDS, StatusGlyph } from '../../glyphs/StatusGlyph.tsx';
import { ArrowSign } from '../../glyphs/signs.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { beforeAssessment, shownAssessment } from '../../store/shown.ts';
import { findingsChange, type Trying } from '../../store/trying.ts';
import './findings.css';

/** While a change is on trial: what it is, what it does, and keeping it or putting it back. */
export function TryBanner(): JSX.Element | null {
  const trying = useWindow((state) => state.trying);
  return trying === null ? null : <Banner key={trying.id} trying={trying} />;
}

function Banner({ trying }: { readonly trying: Trying }): JSX.Element {
  const actions = useActions();
  const before = useWindow(beforeAssessment);
  const after = useWindow((state) => (state.assessing.tried === null ? null : shownAssessment(state)));
  const keep = useRef<HTMLButtonElement>(null);
  // Enter keeps and Escape puts back from the moment the trial begins; afterwards the focus goes back to where it was.
  useEffect(() => {
    const from = document.activeElement;
    keep.current?.focus();
    return () => {
      // What the trial was begun from may be gone with the finding that it answered.
      if (from instanceof HTMLElement && from.isConnected) from.focus();
      else document.querySelector<HTMLElement>('aside.card')?.focus();
    };
  }, []);
  return (
    <section className="try-banner" aria-label="Change on trial">
      <span className="trying">
        <span className="try-dot" aria-hidden="true" />
        Trying
      </span>
      <b className="try-label" title={trying.label}>
        {trying.label}
      </b>
      {trying.where !== '' && <span className="second">{trying.where}</span>}
      <span className="try-figures" role="status">
        {before !== null && after !== null && <Figures trying={trying} before={before} after={after} />}
      </span>
      <span className="try-buttons">
        <button ref={keep} type="button" className="button main" onClick={actions.keepTrial}>
          Keep <Key>Enter</Key>
        </button>
        <button type="button" className="button" onClick={actions.putBackTrial}>
          Put back <Key>Esc</Key>
        </button>
      </span>
    </section>
  );
}

interface FiguresProps {
  readonly trying: Trying;
  readonly before: Assessment;
  readonly after: Assessment;
}

function Figures({ trying, before, after }: FiguresProps): JSX.Element {
  const { closes, opens } = findingsChange(before, after);
  const bar = trying.bar;
  const was = bar === null ? undefined : before.diagonals.get(bar);
  const now = bar === null ? undefined : after.diagonals.get(bar);
  return (
    <>
      {now !== undefined && (
        <span className="try-bar">
          {after.layout.bars.get(bar ?? '')?.mark}{' '}
          {was !== undefined && <s className="was">{figureOf(was)}</s>}
          <ArrowSign />
          <b>{figureOf(now)}</b>
          <StatusGlyph status={now.status} />
          <span className="try-status">{STATUS_WORDS[now.status]}</span>
        </span>
      )}
      <span>
        closes {closes.length}, opens {opens.length}
      </span>
    </>
  );
}

function figureOf({ inService }: DiagonalAssessment): string {
  return inService === null ? '–' : showSlenderness(inService.slenderness, inService.limit);
}
