import type { JSX } from 'react';
import { Segmented } from '../../controls/Segmented.tsx';
import type { ShortlistView } from './shortlistView.ts';
import type { ShortlistAnswer } from './useShortlist.ts';

interface ShortlistBarProps {
  readonly view: ShortlistView;
  readonly answer: ShortlistAnswer | null;
  onChange(view: ShortlistView): void;
}

/** Beside the tabs: how many were tried, how many pass, and the picture or a table. */
export function ShortlistBar({ view, answer, onChange }: ShortlistBarProps): JSX.Element {
  const tried = answer?.list.candidates.length ?? 0;
  return (
    <>
      {answer !== null && (
        <span>
          {tried} tried, {answer.list.passing} pass
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
