import type { JSX } from 'react';
import { shownProject } from '../../store/shown.ts';
import { useActions, useWindow } from '../services.tsx';

/** Metric or US units, for everything that is shown and typed. */
export function UnitsSwitch(): JSX.Element {
  const actions = useActions();
  const units = useWindow((state) => shownProject(state).settings.units);
  const other = units === 'metric' ? 'us' : 'metric';
  return (
    <button
      type="button"
      className="top-button"
      aria-label={`Units: ${units === 'metric' ? 'metric' : 'US'}. Change to ${other === 'metric' ? 'metric' : 'US'}`}
      title={`Change to ${other === 'metric' ? 'metric' : 'US'} units`}
      onClick={() => actions.edit({ kind: 'settings', change: { units: other } }, 'Change the units')}
    >
      <b>{units === 'metric' ? 'mm · kg' : 'ft-in · lb'}</b>
    </button>
  );
}
