import { pushTimes } from '../../scene/bowing/pushScale.ts';
import type { PushShown } from '../../scene/bowing/pushShown.ts';
import { shownPush } from '../../store/closer.ts';
import { greatestForce, presentForce, pushedAt, pushPlaces } from '../../store/pushing.ts';
import { shownAssessment } from '../../store/shown.ts';
import type { WindowState } from '../../store/windowState.ts';

/** The push on the chosen bar as it stands; null while nothing is pushed. */
export function pushToShow(state: WindowState): PushShown | null {
  const assessment = shownAssessment(state);
  const { pushing, selection, view } = state;
  const bar = selection.bar === null ? undefined : assessment?.layout.bars.get(selection.bar);
  if (!view.push || assessment === null || bar?.angle == null) return null;
  const at = pushedAt(state, assessment);
  if (at === null) return null;
  const found = shownPush(state);
  // Of another place on the bar while the answer for this one is on its way.
  const test = found !== null && Math.abs(found.at - at) < 1 ? found : null;
  const own = pushing.bar === bar.id;
  const shared = {
    at,
    places: pushPlaces(assessment, bar.id).map((place) => place.at),
    way: own ? pushing.way : 'any way',
    test,
  } as const;
  if (test === null) return { ...shared, most: 1, force: [0, 0], byHand: true, times: 1 };
  const most = greatestForce(pushing, test, bar.length);
  return {
    ...shared,
    most,
    force: presentForce(pushing, test, bar.angle, bar.length),
    byHand: own && pushing.force !== null,
    times: pushTimes(test, most, bar.length),
  };
}
