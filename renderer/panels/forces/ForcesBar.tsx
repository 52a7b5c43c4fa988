import type { JSX } from 'react';
import { unitNames } from '../../../core/units/unitSystem.ts';
import { Segmented } from '../../controls/Segmented.tsx';
import { useWindow } from '../../shell/services.tsx';
import { shownProject } from '../../store/shown.ts';

export type ForcesView = 'combinations' | 'loads';

interface ForcesBarProps {
  readonly view: ForcesView;
  onChange(view: ForcesView): void;
}

/** What the Forces tab shows: the combinations with what they come to, or what acts. */
export function ForcesBar({ view, onChange }: ForcesBarProps): JSX.Element {
  const units = useWindow((state) => shownProject(state).settings.units);
  return (
    <>
      <span>{unitNames(units).force}</span>
      <Segmented<ForcesView>
        bare
        label="Shown"
        value={view}
        options={[
          { value: 'combinations', label: 'Combinations' },
          { value: 'loads', label: 'What acts' },
        ]}
        onChange={onChange}
      />
    </>
  );
}
