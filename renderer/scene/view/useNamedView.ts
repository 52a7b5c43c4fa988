import { type RefObject, useCallback, useEffect, useMemo, useRef } from 'react';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import type { BayViewProps } from '../bayViewProps.ts';
import { dimensionRoom } from '../drawing/dimensionInk.ts';
import { reducedMotion } from '../overlay/reducedMotion.ts';
import type { Size } from '../useSize.ts';
import type { CameraHandle } from '../webgl/CameraRig.tsx';
import { bare, fitOf, type Margins, pointsToShow } from './fit.ts';
import { namedView, type ViewDirections } from './namedView.ts';
import type { SheetView } from './sheetView.ts';

/** Room round the bay and its dimensions, px. */
const MARGINS: Margins = { left: 30, right: 30, top: 28, bottom: 18 };
/** The lower left corner, where the triad and the scale stand, px. */
const CORNER: Size = { width: 210, height: 70 };
/** The legend's distance from the edges, px. */
const LEGEND_EDGE = 14;

export interface NamedViewWishes extends Pick<BayViewProps, 'view' | 'viewNonce'> {
  readonly layout: Layout;
  readonly bay: BayLayout | null;
  readonly camera: RefObject<CameraHandle | null>;
  readonly size: Size;
  readonly legend: Size;
  /** Changed when another kind of drawing takes over, which begins with no view of its own. */
  readonly drawnBy: string;
}

export interface NamedView {
  /** The camera is there, and takes its first look. */
  readonly begin: () => void;
  /** The user has moved the sheet: from now on it is left where it is, until a view is asked for. */
  readonly leave: () => void;
  /** Fits the bay again; once the view has been turned, from where it is seen now. */
  readonly fitAgain: (now: SheetView | null) => void;
}

/** Takes the camera to the named view when one is asked for, when the bay changes, and, until the user moves it, when the sheet or the bay changes size. */
export function useNamedView({
  view,
  viewNonce,
  layout,
  bay,
  camera,
  size,
  legend,
  drawnBy,
}: NamedViewWishes): NamedView {
  const left = useRef(false);
  const seen = useRef('');
  const bayId = bay?.id ?? null;
  /** What the bay's extent depends on, so that a mark that changes none of it leaves the view alone. */
  const extent = useMemo(() => JSON.stringify(pointsToShow(layout, bay)), [layout, bay]);

  const look = useCallback(
    (directions: ViewDirections, smooth: boolean): void => {
      const points = [
        ...bare(pointsToShow(layout, bay)),
        ...(bay === null ? [] : dimensionRoom(bay, directions)),
      ];
      const found = fitOf(points, directions, size, MARGINS, [
        { left: 0, top: size.height - CORNER.height, ...CORNER },
        {
          left: size.width - legend.width - LEGEND_EDGE,
          top: size.height - legend.height - LEGEND_EDGE,
          width: legend.width + LEGEND_EDGE,
          height: legend.height + LEGEND_EDGE,
        },
      ]);
      if (found !== null) camera.current?.look(directions, found, smooth && !reducedMotion());
    },
    [layout, bay, camera, size, legend],
  );
  const latest = useRef(look);
  latest.current = look;

  // biome-ignore lint/correctness/useExhaustiveDependencies: `extent` and `drawnBy` say when to look again
  useEffect(() => {
    if (size.width === 0 || size.height === 0) return;
    const asked = `${view} ${viewNonce} ${bayId} ${drawnBy}`;
    const first = seen.current === '';
    const anew = seen.current !== asked;
    if (anew) left.current = false;
    seen.current = asked;
    if (left.current) return;
    // The first view is simply there, and a resized sheet keeps up with its edge; only a change of view is shown as a movement.
    latest.current(namedView(view, bay), anew && !first);
  }, [view, viewNonce, bayId, drawnBy, extent, size, legend]);

  const first = useRef<() => void>(() => {});
  first.current = () => latest.current(namedView(view, bay), false);
  const begin = useCallback(() => first.current(), []);
  const leave = useCallback(() => {
    left.current = true;
  }, []);
  const fitAgain = useCallback(
    (now: SheetView | null) => {
      look(now ?? namedView(view, bay), true);
    },
    [look, view, bay],
  );
  return { begin, leave, fitAgain };
}
