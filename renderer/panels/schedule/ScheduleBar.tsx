import type { JSX } from 'react';
import { Segmented } from '../../controls/Segmented.tsx';
import { useServices } from '../../shell/services.tsx';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { tableText } from './cellText.ts';
import { COLUMN_SETS } from './scheduleColumns.ts';
import { type ScheduleView, seenRows, sortText, withFilterTurned } from './scheduleView.ts';

interface ScheduleBarProps {
  readonly view: ScheduleView;
  onChange(view: ScheduleView): void;
}

/** Beside the tabs: which columns, whether it is filtered, and the table as text. */
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
  return (
    <>
      {!view.filtering && <span className="schedule-sorted">{sortText(view.sort)}</span>}
      <button
        type="button"
        className="link-button"
        aria-pressed={view.filtering}
        onClick={() => onChange(withFilterTurned(view))}
      >
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
