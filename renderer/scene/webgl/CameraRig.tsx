import { useFrame, useThree } from '@react-three/fiber';
import CameraControls from 'camera-controls';
import { type RefObject, useCallback, useEffect, useImperativeHandle, useRef } from 'react';
import {
  Box3,
  Matrix4,
  OrthographicCamera,
  Quaternion,
  Raycaster,
  Sphere,
  Spherical,
  Vector2,
  Vector3,
  Vector4,
} from 'three';
import type { Vec3 } from '../../../core/geometry/vector.ts';
import { scale } from '../../../core/geometry/vector.ts';
import type { Fit } from '../view/fit.ts';
import { cameraAngles, type ViewDirections } from '../view/namedView.ts';
import type { SheetView } from '../view/sheetView.ts';

CameraControls.install({
  THREE: { Box3, Matrix4, Quaternion, Raycaster, Sphere, Spherical, Vector2, Vector3, Vector4 },
});

/** The world of the scene is in metres; the project is in mm. */
export const M_PER_MM = 0.001;

/** Longest time that one frame may count for, s: after a pause the clock has run on, and the view would jump. */
const LONGEST_FRAME = 1 / 20;

/** A view turned by more than this is no longer the named one, rad. */
const TURNED_AWAY = 0.01;

/** How far out and in the wheel goes, px per mm. */
const FARTHEST = 0.001;
const CLOSEST = 8;

/** What the keys may ask of the camera. */
export interface CameraHandle {
  /** Looks in the given directions at what is to be seen. `smooth`: over a few tenths of a second. */
  look(view: ViewDirections, fit: Fit, smooth: boolean): void;
  /** Turns about the upright and tips, rad. */
  turn(about: number, tip: number, smooth: boolean): void;
  /** Moves the sheet, px. */
  move(right: number, down: number, smooth: boolean): void;
  /** Comes closer by a factor. */
  closer(factor: number, smooth: boolean): void;
}

export interface CameraRigProps {
  /** Takes the drags, wheels and pinches. */
  readonly surface: RefObject<HTMLElement | null>;
  readonly handle: RefObject<CameraHandle | null>;
  /** How far the steel reaches from anything that is looked at, m. The camera stands so far off, and sees as far again. */
  readonly depth: number;
  /** Called in every frame in which the view has moved. */
  readonly onView: (view: SheetView) => void;
  /** The camera is there and can be told where to look. */
  readonly onReady: () => void;
  /** The user has turned the view by hand, away from where it was put. */
  readonly onTurned: () => void;
  /** The user has moved the view by hand in any way. */
  readonly onMoved: () => void;
}

/** A parallel camera that turns about the upright Z, moved by hand, by keys, or to a named view. */
export function CameraRig({
  surface,
  handle,
  depth,
  onView,
  onReady,
  onTurned,
  onMoved,
}: CameraRigProps): null {
  const camera = useThree((state) => state.camera);
  const invalidate = useThree((state) => state.invalidate);
  const size = useThree((state) => state.size);
  const controls = useRef<CameraControls | null>(null);
  const turnedFrom = useRef<{ readonly azimuth: number; readonly polar: number } | null>(null);
  const latest = useRef({ onView, onReady, onTurned, onMoved });
  latest.current = { onView, onReady, onTurned, onMoved };

  useEffect(() => {
    const element = surface.current;
    if (!(camera instanceof OrthographicCamera) || element === null) return;
    camera.up.set(0, 0, 1);
    camera.position.set(0, -1, 0);
    const made = new CameraControls(camera, element);
    made.updateCameraUp();
    made.dollyToCursor = true;
    made.smoothTime = 0.16;
    made.draggingSmoothTime = 0.04;
    made.minZoom = FARTHEST / M_PER_MM;
    made.maxZoom = CLOSEST / M_PER_MM;
    made.mouseButtons.middle = CameraControls.ACTION.TRUCK;
    made.mouseButtons.right = CameraControls.ACTION.TRUCK;
    const wake = (): void => invalidate();
    const moved = (): void => {
      invalidate();
      latest.current.onMoved();
      const from = turnedFrom.current;
      if (from === null) return;
      const away = Math.hypot(made.azimuthAngle - from.azimuth, made.polarAngle - from.polar);
      if (away < TURNED_AWAY) return;
      turnedFrom.current = null;
      latest.current.onTurned();
    };
    // With shift held the left button moves the sheet. Caught before the controls see the press.
    const chooseButton = (event: PointerEvent): void => {
      made.mouseButtons.left = event.shiftKey ? CameraControls.ACTION.TRUCK : CameraControls.ACTION.ROTATE;
    };
    element.addEventListener('pointerdown', chooseButton, { capture: true });
    made.addEventListener('control', moved);
    made.addEventListener('controlstart', wake);
    made.addEventListener('update', wake);
    made.addEventListener('transitionstart', wake);
    controls.current = made;
    latest.current.onReady();
    return () => {
      element.removeEventListener('pointerdown', chooseButton, { capture: true });
      made.dispose();
      controls.current = null;
    };
  }, [camera, surface, invalidate]);

  useEffect(() => {
    if (!(camera instanceof OrthographicCamera)) return;
    camera.near = 0;
    camera.far = 2 * depth;
    camera.updateProjectionMatrix();
    void controls.current?.dollyTo(depth, false);
    invalidate();
  }, [camera, depth, invalidate]);

  const look = useCallback(
    (view: ViewDirections, fit: Fit, smooth: boolean): void => {
      const made = controls.current;
      if (made === null) return;
      const { azimuth, polar } = cameraAngles(view);
      const centre = scale(fit.centre, M_PER_MM);
      made.normalizeRotations();
      // The short way round.
      const turn = azimuth + 2 * Math.PI * Math.round((made.azimuthAngle - azimuth) / (2 * Math.PI));
      turnedFrom.current = { azimuth: turn, polar };
      void made.rotateTo(turn, polar, smooth);
      void made.moveTo(centre[0], centre[1], centre[2], smooth);
      void made.zoomTo(fit.pxPerMm / M_PER_MM, smooth);
      void made.setFocalOffset(0, 0, 0, smooth);
      invalidate();
    },
    [invalidate],
  );

  useImperativeHandle(
    handle,
    () => ({
      look,
      turn(about, tip, smooth) {
        void controls.current?.rotate(about, tip, smooth);
        if (turnedFrom.current !== null) latest.current.onTurned();
        turnedFrom.current = null;
        latest.current.onMoved();
        invalidate();
      },
      move(right, down, smooth) {
        const made = controls.current;
        if (made === null || !(camera instanceof OrthographicCamera)) return;
        void made.truck(-right / camera.zoom, -down / camera.zoom, smooth);
        latest.current.onMoved();
        invalidate();
      },
      closer(factor, smooth) {
        const made = controls.current;
        if (made === null || !(camera instanceof OrthographicCamera)) return;
        void made.zoomTo(camera.zoom * factor, smooth);
        latest.current.onMoved();
        invalidate();
      },
    }),
    [camera, invalidate, look],
  );

  // The size of the sheet is part of the view: a resized one must be drawn and told anew.
  const told = useRef('');
  useFrame((_, delta) => {
    const moving = controls.current?.update(Math.min(delta, LONGEST_FRAME)) ?? false;
    if (moving) invalidate();
    if (!(camera instanceof OrthographicCamera)) return;
    camera.updateMatrixWorld();
    const view = sheetViewOf(camera, size.width, size.height);
    const said = JSON.stringify(view);
    if (said === told.current) return;
    told.current = said;
    latest.current.onView(view);
  });
  return null;
}

/** The camera as a view on a sheet of so many px. */
function sheetViewOf(camera: OrthographicCamera, width: number, height: number): SheetView {
  const e = camera.matrixWorld.elements;
  const column = (at: number): Vec3 => [e[at] ?? 0, e[at + 1] ?? 0, e[at + 2] ?? 0];
  return {
    right: column(0),
    up: column(4),
    towards: column(8),
    centre: scale(column(12), 1 / M_PER_MM),
    pxPerMm: camera.zoom * M_PER_MM,
    width,
    height,
  };
}
