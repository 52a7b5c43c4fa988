import { useEffect, useState } from 'react';
import type { CrossingId } from '../../../core/layout/model.ts';
import type { JoinReading } from '../../assessing/assessApi.ts';
import { useServices, useWindow } from '../../shell/services.tsx';
import { shownAssessed } from '../../store/shown.ts';

/** What each join would do at the crossing; null until it is worked out. The last answer stays while the next is on its way. */
export function useReadings(crossing: CrossingId): readonly JoinReading[] | null {
  const { assessor } = useServices();
  const project = useWindow((state) => shownAssessed(state)?.project ?? null);
  const [answer, setAnswer] = useState<{ crossing: CrossingId; readings: readonly JoinReading[] } | null>(
    null,
  );
  useEffect(() => {
    if (project === null) return;
    let wanted = true;
    assessor
      .ask((api, snapshotOf) => api.readings(snapshotOf(project), crossing))
      .then(
        (readings) => {
          if (wanted) setAnswer({ crossing, readings });
        },
        () => {
          if (wanted) setAnswer(null);
        },
      );
    return () => {
      wanted = false;
    };
  }, [assessor, project, crossing]);
  return answer?.crossing === crossing ? answer.readings : null;
}
