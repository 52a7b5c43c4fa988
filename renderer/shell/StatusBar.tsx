import { type JSX, useEffect } from 'react';
import { useStockChoices } from '../assessing/useStockChoices.ts';
import { shownAssessment } from '../store/shown.ts';
import { AssessingStatus } from './AssessingStatus.tsx';
import { useActions, useWindow } from './services.tsx';

/** What is chosen, how long the figures took, which stock list, what has just happened. */
export function StatusBar(): JSX.Element {
  const stock = useStockChoices();
  return (
    <footer className="status" data-region tabIndex={-1}>
      <ChosenText />
      <TrialText />
      <AssessingStatus />
      {stock !== null && <span>Stock list: {stock.name}</span>}
      <NoticeText />
      <span className="status-caution">An aid for competent people: check figures before use.</span>
    </footer>
  );
}

function ChosenText(): JSX.Element | null {
  const text = useWindow((state) => {
    const assessment = shownAssessment(state);
    if (assessment === null) return null;
    const count = assessment.schedule.length;
    const diagonals = `${count} ${count === 1 ? 'diagonal' : 'diagonals'}`;
    const bar = state.selection.bar === null ? null : assessment.layout.bars.get(state.selection.bar);
    if (!bar) return diagonals;
    return bar.angle ? `${bar.mark} selected, 1 of ${diagonals}` : `${bar.bay} ${bar.mark} selected`;
  });
  return text === null ? null : <span>{text}</span>;
}

function TrialText(): JSX.Element | null {
  const trying = useWindow((state) => state.trying !== null);
  return trying ? <span className="status-trial">On trial: nothing is changed until you keep it</span> : null;
}

/** ms that a notice stays. */
const STAYS = 6000;

function NoticeText(): JSX.Element {
  const actions = useActions();
  const notice = useWindow((state) => state.notice);
  useEffect(() => {
    if (notice === null) return;
    const timer = setTimeout(() => actions.say(null), STAYS);
    return () => clearTimeout(timer);
  }, [notice, actions]);
  return (
    <span className="status-notice" role="status" aria-label="What has just happened">
      {notice}
    </span>
  );
}
