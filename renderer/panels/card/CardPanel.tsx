import { type JSX, useEffect, useRef } from 'react';
import { useWindow } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { DiagonalCard } from './DiagonalCard.tsx';
import { MemberCard } from './MemberCard.tsx';
import './card.css';

/** The card of the chosen bar, at full height: section, lanes, verdicts, reason, remedies. */
export function CardPanel(): JSX.Element {
  const assessment = useWindow(shownAssessment);
  const bar = useWindow((state) => state.selection.bar);
  const found = bar === null ? undefined : assessment?.layout.bars.get(bar);
  const card = useRef<HTMLElement>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: another bar is read from the top.
  useEffect(() => {
    card.current?.scrollTo({ top: 0 });
  }, [bar]);
  return (
    <aside ref={card} className="card" data-region tabIndex={-1} aria-label="Card of the chosen bar">
      {assessment === null || found === undefined ? (
        <NothingChosen />
      ) : found.angle === null ? (
        <MemberCard bar={found} assessment={assessment} />
      ) : (
        <DiagonalCard bar={found} angle={found.angle} assessment={assessment} />
      )}
    </aside>
  );
}

function NothingChosen(): JSX.Element {
  const empty = useWindow((state) => shownProject(state).bays.length === 0);
  return (
    <p className="card-nothing">
      {empty
        ? 'The card of a diagonal stands here: its section, its four lanes, the verdicts and the reason.'
        : 'Choose a diagonal in the view or in the schedule.'}
    </p>
  );
}
