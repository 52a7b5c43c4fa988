import type { JSX } from 'react';
import { Segmented } from '../../controls/Segmented.tsx';
import { type ShortlistView, seenCandidates } from './shortlistView.ts';
import type { ShortlistAnswer } from './useShortlist.ts';

interface ShortlistBarProps {
  readonly view: ShortlistView;
  readonly answer: ShortlistAnswer | null;
  onChange(view: ShortlistView): void;
}

/** Beside the tabs: how many were tried, how many pass, and the picture or a table. */
export function ShortlistBar({ view, answer, onChange }: ShortlistBarProps): JSX.Element {
  const tried = answer === null ? [] : seenCandidates(answer.list, view);
  const passing = tried.filter(({ passes }) => passes).length;
  return (
    <>
      {answer !== null && (
        <span>
          {tried.length} tried, {passing} pass
        </span>
      )}
      <Segmented
        bare
        label="Read as"
        value={view.asTable ? 'table' : 'picture'}
        options={[
          { value: 'picture', label: 'Picture' },
          { value: 'table', label: 'Table' },
        ]}
        onChange={(as) => onChange({ ...view, asTable: as === 'table' })}
      />
    </>
  );
}
