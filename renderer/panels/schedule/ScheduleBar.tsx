import type { JSX } from 'react';
import { Segmented } from '../../controls/Segmented.tsx';
import { useServices } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { tableText } from './cellText.ts';
import { COLUMN_SETS } from './scheduleColumns.ts';
import { type ScheduleView, seenRows, sortText } from './scheduleView.ts';

interface ScheduleBarProps {
  readonly view: ScheduleView;
  onChange(view: ScheduleView): void;
}

const ONLY: readonly { readonly value: ScheduleView['only']; readonly label: string }[] = [
  { value: 'all', label: 'All' },
  { value: 'over', label: 'Over' },
  { value: 'near', label: 'Near' },
  { value: 'findings', label: 'With findings' },
];

/** Beside the tabs: which columns, the filter, and the table as text. */
export function ScheduleBar({ view, onChange }: ScheduleBarProps): JSX.Element {
  const { documents, store, actions } = useServices();
  const copy = async (): Promise<void> => {
    const state = store.getState();
    const assessment = shownAssessment(state);
    if (assessment === null) return;
    const columns = COLUMN_SETS[view.columns];
    await navigator.clipboard.writeText(
      tableText(seenRows(assessment, view), columns, shownProject(state).settings.units),
    );
    actions.say('The table is on the clipboard.');
  };
  const toggleFilter = (): void =>
    onChange(
      view.filtering ? { ...view, filtering: false, text: '', only: 'all' } : { ...view, filtering: true },
    );
  return (
    <>
      {view.filtering ? (
        <>
          <span className="field schedule-filter">
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
                toggleFilter();
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
        </>
      ) : (
        <span className="schedule-sorted">{sortText(view.sort)}</span>
      )}
      <button type="button" className="link-button" aria-pressed={view.filtering} onClick={toggleFilter}>
        {view.filtering ? 'Show all' : 'Filter'}
      </button>
      <Segmented
        bare
        label="Columns"
        value={view.columns}
        options={[
          { value: 'bracing', label: 'Bracing' },
          { value: 'making', label: 'Making' },
          { value: 'bowing', label: 'Bowing' },
        ]}
        onChange={(columns) => onChange({ ...view, columns })}
      />
      <button type="button" className="link-button" onClick={() => void copy()}>
        Copy table
      </button>
      <button type="button" className="link-button" onClick={() => void documents.exportSchedule('csv')}>
        Export
      </button>
    </>
  );
}

/** The field appears because it was asked for, so it takes the keys. */
function focusOnce(field: HTMLInputElement | null): void {
  field?.focus();
}
