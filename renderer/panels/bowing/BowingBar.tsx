import type { JSX } from 'react';
import { useWindow } from '../../shell/services.tsx';
import { latestStudy } from '../../store/closer.ts';
import { shownAssessment } from '../../store/shown.ts';

/** Beside the tabs: the computed shape in words. */
export function BowingBar(): JSX.Element | null {
  const study = useWindow(latestStudy);
  const mark = useWindow((state) =>
    state.selection.bar === null
      ? ''
      : (shownAssessment(state)?.layout.bars.get(state.selection.bar)?.mark ?? ''),
  );
  return study === null ? null : (
    <span className="bowing-says" title={study.modeSays}>
      {mark} bows in {study.modeSays}
    </span>
  );
}
