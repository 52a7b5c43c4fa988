import { type JSX, useState } from 'react';
import type { Candidate } from '../../../core/shortlist/model.ts';
import { useWindow } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { CandidateCard } from './CandidateCard.tsx';
import { candidateKey } from './candidateKey.ts';
import { ShortlistPicture } from './ShortlistPicture.tsx';
import { ShortlistSide } from './ShortlistSide.tsx';
import { ShortlistTable } from './ShortlistTable.tsx';
import { type ShortlistView, seenCandidates } from './shortlistView.ts';
import type { ShortlistAnswer } from './useShortlist.ts';
import './shortlist.css';

interface ShortlistPanelProps {
  readonly view: ShortlistView;
  readonly answer: ShortlistAnswer | null;
  onChange(view: ShortlistView): void;
}

/** Choosing an angle as a picture: mass against governing slenderness, the limit as a line; or the same as a table. */
export function ShortlistPanel({ view, answer, onChange }: ShortlistPanelProps): JSX.Element {
  const units = useWindow((state) => shownProject(state).settings.units);
  const [chosen, setChosen] = useState<string | null>(null);
  const bar = useWindow((state) => {
    const { bar: id } = state.selection;
    return id !== null && shownAssessment(state)?.diagonals.has(id) ? id : null;
  });
  if (answer === null)
    return (
      <p className="shortlist-none" role="status">
        {bar === null
          ? 'Choose a diagonal to see which stock angles would do for it.'
          : 'Trying every stock angle in place…'}
      </p>
    );
  const list = { ...answer.list, candidates: seenCandidates(answer.list, view) };
  const candidate = chosenOf(list.candidates, chosen) ?? list.first ?? list.candidates[0] ?? null;
  const pick = (each: Candidate): void => setChosen(candidateKey(each));
  return (
    <div className="shortlist">
      {view.asTable ? (
        <ShortlistTable list={list} chosen={candidate} units={units} onChoose={pick} />
      ) : (
        <ShortlistPicture list={list} chosen={candidate} units={units} onChoose={pick} />
      )}
      <div className="shortlist-side">
        {candidate !== null && (
          <CandidateCard candidate={candidate} answer={answer} scope={view.scope} units={units} />
        )}
        <ShortlistSide
          view={view}
          answer={answer}
          chosen={candidate}
          units={units}
          onChange={onChange}
          onChoose={pick}
        />
      </div>
    </div>
  );
}

function chosenOf(candidates: readonly Candidate[], key: string | null): Candidate | undefined {
  return candidates.find((candidate) => candidateKey(candidate) === key);
}
