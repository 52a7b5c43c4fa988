import {
  type RefObject,
  useEffect,
  useImperativeHandle,
  useLayoutEffect,
  useMemo,
  useRef,
  useState,
} from 'react';
import { along, type Vec3 } from '../../../core/geometry/vector.ts';
import type { BarId, BayLayout } from '../../../core/layout/model.ts';
import type { SteelPart } from '../geometry/steelPart.ts';
import type { Fit } from '../view/fit.ts';
import type { ViewDirections } from '../view/namedView.ts';
import type { SheetView } from '../view/sheetView.ts';
import type { CameraHandle } from '../webgl/CameraRig.tsx';
import { FlatBay } from './FlatBay.tsx';

export interface FlatSceneProps {
  readonly parts: readonly SteelPart[];
  readonly bay: BayLayout | null;
  readonly selectedBar: BarId | null;
  readonly hoveredBar: BarId | null;
  readonly surface: RefObject<HTMLElement | null>;
  readonly camera: RefObject<CameraHandle | null>;
  readonly size: { readonly width: number; readonly height: number };
  readonly onView: (view: SheetView) => void;
  readonly onMoved: () => void;
}

interface Looking extends ViewDirections {
  readonly centre: Vec3;
  readonly pxPerMm: number;
}

/** One notch of the wheel, as a factor of the scale. */
const WHEEL = 1.15;

/** The drawing without WebGL: the named views as flat polygons, to be moved and brought closer, not turned. */
export function FlatScene(props: FlatSceneProps) {
  const { surface, camera, size, onView, onMoved } = props;
  const [looking, setLooking] = useState<Looking | null>(null);
  const view = useMemo<SheetView | null>(
    () =>
      looking === null || size.width === 0 ? null : { ...looking, width: size.width, height: size.height },
    [looking, size],
  );

  useImperativeHandle(
    camera,
    (): CameraHandle => ({
      look: (directions, fit) => setLooking({ ...directions, ...fit } satisfies ViewDirections & Fit),
      // Turning would redraw every polygon at every step, at a pace that no one could follow: the named views do.
      turn: () => undefined,
      move: (right, down) => setLooking((from) => from && moved(from, right, down)),
      closer: (factor) => setLooking((from) => from && { ...from, pxPerMm: from.pxPerMm * factor }),
    }),
    [],
  );

  useLayoutEffect(() => {
    if (view !== null) onView(view);
  }, [view, onView]);

  const told = useRef(onMoved);
  told.current = onMoved;
  useEffect(() => {
    const element = surface.current;
    if (element === null) return;
    const wheel = (event: WheelEvent): void => {
      event.preventDefault();
      const box = element.getBoundingClientRect();
      const factor = event.deltaY < 0 ? WHEEL : 1 / WHEEL;
      setLooking(
        (from) =>
          from &&
          closerTo(
            from,
            factor,
            event.clientX - box.left - box.width / 2,
            event.clientY - box.top - box.height / 2,
          ),
      );
      told.current();
    };
    const drag = (event: PointerEvent): void => {
      if (event.buttons === 0) return;
      setLooking((from) => from && moved(from, event.movementX, event.movementY));
      if (event.movementX !== 0 || event.movementY !== 0) told.current();
    };
    element.addEventListener('wheel', wheel, { passive: false });
    element.addEventListener('pointermove', drag);
    return () => {
      element.removeEventListener('wheel', wheel);
      element.removeEventListener('pointermove', drag);
    };
  }, [surface]);

  if (view === null) return null;
  return <FlatBay {...props} view={view} />;
}

/** The sheet moved by so many px. */
function moved(from: Looking, right: number, down: number): Looking {
  const centre = along(along(from.centre, from.right, -right / from.pxPerMm), from.up, down / from.pxPerMm);
  return { ...from, centre };
}

/** Closer by a factor, with the point at (x, y) px from the middle of the sheet kept in its place. */
function closerTo(from: Looking, factor: number, x: number, y: number): Looking {
  const shift = 1 - factor;
  const grown = { ...from, pxPerMm: from.pxPerMm * factor };
  return moved(grown, x * shift, y * shift);
}
