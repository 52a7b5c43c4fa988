import { useEffect, useState } from 'react';
import type { BarId } from '../../../core/layout/model.ts';
import type { Shortlist } from '../../../core/shortlist/model.ts';
import { useServices, useWindow } from '../../shell/services.tsx';
import { barsInScope, type ShortlistView } from './shortlistView.ts';

export interface ShortlistAnswer {
  readonly bar: BarId;
  readonly list: Shortlist;
}

/** The shortlist for the chosen bar and those that share its size, of the project as it stands; null until it is there. */
export function useShortlist(wanted: boolean, view: ShortlistView): ShortlistAnswer | null {
  const { assessor } = useServices();
  const base = useWindow((state) => state.assessing.base);
  const bar = useWindow((state) => state.selection.bar);
  const [answer, setAnswer] = useState<ShortlistAnswer | null>(null);
  const { scope, placements } = view;
  useEffect(() => {
    if (!wanted || base === null || bar === null || !base.assessment.diagonals.has(bar)) {
      setAnswer(null);
      return;
    }
    let current = true;
    const bars = barsInScope(scope, bar, base.assessment);
    assessor
      .ask((api, snapshotOf) => api.shortlist(snapshotOf(base.project), [...bars], { placements }))
      .then(
        (list) => {
          if (current) setAnswer({ bar, list });
        },
        () => {
          if (current) setAnswer(null);
        },
      );
    return () => {
      current = false;
    };
  }, [assessor, wanted, base, bar, scope, placements]);
  return answer;
}
