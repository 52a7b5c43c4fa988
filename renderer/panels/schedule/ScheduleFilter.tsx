import type { JSX } from 'react';
import { Segmented } from '../../controls/Segmented.tsx';
import { type ScheduleView, withFilterTurned } from './scheduleView.ts';

interface ScheduleFilterProps {
  readonly view: ScheduleView;
  /** Rows that fit the filter, and all there are. */
  readonly shown: number;
  readonly all: number;
  onChange(view: ScheduleView): void;
  /** Escape has put the filter away. */
  onClosed(): void;
}

const ONLY: readonly { readonly value: ScheduleView['only']; readonly label: string }[] = [
  { value: 'all', label: 'All' },
  { value: 'over', label: 'Over' },
  { value: 'near', label: 'Near' },
  { value: 'findings', label: 'With findings' },
];

/** A strip above the schedule: which of its rows are shown. */
export function ScheduleFilter({ view, shown, all, onChange, onClosed }: ScheduleFilterProps): JSX.Element {
  return (
    <div className="schedule-filter">
      <span className="field">
        <input
          ref={focusOnce}
          className="field-text"
          aria-label="Filter by mark, bay or section"
          placeholder="mark, bay or section"
          autoComplete="off"
          spellCheck={false}
          value={view.text}
          onChange={(event) => onChange({ ...view, text: event.target.value })}
          onKeyDown={(event) => {
            if (event.key !== 'Escape') return;
            event.stopPropagation();
            onChange(withFilterTurned(view));
            onClosed();
          }}
        />
      </span>
      <Segmented
        bare
        label="Rows"
        value={view.only}
        options={ONLY}
        onChange={(only) => onChange({ ...view, only })}
      />
      <span className="second">
        {shown} of {all}
      </span>
    </div>
  );
}

/** The field appears because it was asked for, so it takes the keys. */
function focusOnce(field: HTMLInputElement | null): void {
  field?.focus();
}
