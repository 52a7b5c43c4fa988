import type { ComputedShape } from '../../scene/bayViewProps.ts';
import { latestStudy } from '../../store/closer.ts';
import type { WindowState } from '../../store/windowState.ts';

/** The computed shape that is wanted and known; null: the marks' picture. */
export function shapeToShow(state: WindowState): ComputedShape | null {
  const study = latestStudy(state);
  if (study === null) return null;
  switch (state.view.shape) {
    case 'marks':
      return null;
    case 'bar':
      return { kind: 'bar', mode: study.mode };
    case 'bay':
      return study.bay.movement.length === 0
        ? { kind: 'bar', mode: study.mode }
        : { kind: 'bay', movement: study.bay.movement };
    default:
      return state.view.shape satisfies never;
  }
}
