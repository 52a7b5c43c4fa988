import { type RefObject, useCallback, useEffect, useMemo, useRef } from 'react';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import type { BayViewProps } from '../bayViewProps.ts';
import { dimensionRoom } from '../drawing/dimensionInk.ts';
import { reducedMotion } from '../overlay/reducedMotion.ts';
import type { Size } from '../useSize.ts';
import type { CameraHandle } from '../webgl/CameraRig.tsx';
import { closeUpPoints, isCrowded, NARROW } from './closeUp.ts';
import { bare, type Fit, fitOf, type Margins, pointsToShow } from './fit.ts';
import { namedView, quarterTurned, type ViewDirections } from './namedView.ts';
import type { SheetView } from './sheetView.ts';

/** Room round the bay and its dimensions, px. */
const MARGINS: Margins = { left: 30, right: 30, top: 28, bottom: 18 };
/** Round a bar or two that are seen alone, with room for their labels, px. */
const CLOSE_MARGINS: Margins = { left: 44, right: 44, top: 44, bottom: 44 };
/** A plan is turned on the sheet where that makes it larger by this much. */
const WORTH_TURNING = 1.15;
/** The lower left corner, where the triad and the scale stand, px. */
const CORNER: Size = { width: 210, height: 70 };
/** The legend's distance from the edges, px. */
const LEGEND_EDGE = 14;

export interface NamedViewWishes
  extends Pick<BayViewProps, 'view' | 'viewNonce' | 'selectedBar' | 'selectedCrossing'> {
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
  selectedBar,
  selectedCrossing,
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

  const fitted = useCallback(
    (directions: ViewDirections): Fit | null => {
      const taken = [
        { left: 0, top: size.height - CORNER.height, ...CORNER },
        {
          left: size.width - legend.width - LEGEND_EDGE,
          top: size.height - legend.height - LEGEND_EDGE,
          width: legend.width + LEGEND_EDGE,
          height: legend.height + LEGEND_EDGE,
        },
      ];
      const points = [
        ...bare(pointsToShow(layout, bay)),
        ...(bay === null ? [] : dimensionRoom(bay, directions)),
      ];
      const whole = fitOf(points, directions, size, MARGINS, taken);
      if (whole === null || size.width >= NARROW) return whole;
      if (!isCrowded(layout, bay, { ...directions, ...whole, ...size })) return whole;
      const close = bare(closeUpPoints(layout, selectedCrossing, selectedBar));
      return fitOf(close, directions, size, CLOSE_MARGINS, taken) ?? whole;
    },
    [layout, bay, size, legend, selectedCrossing, selectedBar],
  );
  const named = useCallback((): ViewDirections => {
    const straight = namedView(view, bay);
    if (view !== 'plan') return straight;
    const turned = quarterTurned(straight);
    const gain = (fitted(turned)?.pxPerMm ?? 0) / (fitted(straight)?.pxPerMm ?? 1);
    return gain > WORTH_TURNING ? turned : straight;
  }, [view, bay, fitted]);
  const look = useCallback(
    (directions: ViewDirections | null, smooth: boolean): void => {
      const towards = directions ?? named();
      const found = fitted(towards);
      if (found !== null) camera.current?.look(towards, found, smooth && !reducedMotion());
    },
    [camera, fitted, named],
  );
  const latest = useRef(look);
  latest.current = look;

  /** What is seen close up where the sheet is narrow; the whole bay elsewhere. */
  const closeUp = size.width < NARROW ? `${selectedCrossing} ${selectedBar}` : '';
  const closeUpSeen = useRef(closeUp);
  // biome-ignore lint/correctness/useExhaustiveDependencies: `extent` and `drawnBy` say when to look again
  useEffect(() => {
    if (size.width === 0 || size.height === 0) return;
    const asked = `${view} ${viewNonce} ${bayId} ${drawnBy}`;
    const first = seen.current === '';
    const anew = seen.current !== asked;
    if (anew) left.current = false;
    seen.current = asked;
    const goesElsewhere = anew || closeUpSeen.current !== closeUp;
    closeUpSeen.current = closeUp;
    if (left.current) return;
    // The first view is simply there, and a resized sheet keeps up with its edge; only a change of what is looked at is shown as a movement.
    latest.current(null, goesElsewhere && !first);
  }, [view, viewNonce, bayId, drawnBy, extent, size, legend, closeUp]);

  const first = useRef<() => void>(() => {});
  first.current = () => latest.current(null, false);
  const begin = useCallback(() => first.current(), []);
  const leave = useCallback(() => {
    left.current = true;
  }, []);
  const fitAgain = useCallback(
    (now: SheetView | null) => {
      look(now, true);
    },
    [look],
  );
  return { begin, leave, fitAgain };
}
