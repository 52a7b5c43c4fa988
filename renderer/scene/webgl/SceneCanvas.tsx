import { Canvas, useThree } from '@react-three/fiber';
import { type RefObject, useCallback, useEffect, useState } from 'react';
import { Vector3 } from 'three';
import { sceneColours } from '../colours.ts';
import type { MergedSteel } from '../geometry/mergedSteel.ts';
import type { SteelPart } from '../geometry/steelPart.ts';
import type { SheetView } from '../view/sheetView.ts';
import type { Subject } from '../view/subject.ts';
import { BarOverlay } from './BarOverlay.tsx';
import { type CameraHandle, CameraRig, type CameraRigProps, M_PER_MM } from './CameraRig.tsx';
import {
  colourMaterials,
  disposeMaterials,
  makeMaterials,
  type SceneMaterials,
  setSubject,
  setView,
} from './materials.ts';
import { Steel } from './Steel.tsx';
import { hearThree } from './threeNotices.ts';

hearThree();

export interface SceneCanvasProps {
  readonly merged: MergedSteel;
  readonly bay: string | null;
  readonly subject: Subject | null;
  /** The whole project. */
  readonly whole: Subject | null;
  readonly theme: 'light' | 'dark';
  readonly selected: readonly SteelPart[];
  readonly hovered: readonly SteelPart[];
  readonly surface: RefObject<HTMLElement | null>;
  readonly camera: RefObject<CameraHandle | null>;
  readonly onView: (view: SheetView) => void;
  readonly onReady: () => void;
  readonly onTurned: () => void;
  readonly onMoved: () => void;
  /** The graphics card has dropped the drawing. */
  readonly onLost: () => void;
}

/** From one end of a project to the other is twice its reach; the user may look a little beside it. m. */
const DEPTHS = 2.2;
const BESIDES = 20;

/** Thickness of ordinary angle, mm, and the px it must take up for the inner lines of a profile to be drawn in full. */
const THICKNESS = 9;
const FINE_IN_FULL = 3;
/** What is left of the inner lines when far too small to be told apart. */
const FINE_LEAST = 0.3;

/** The drawing in WebGL. It is drawn when something changes, and not otherwise. */
export function SceneCanvas(props: SceneCanvasProps) {
  const materials = useMaterials();
  return (
    <Canvas
      className="scene-canvas"
      orthographic
      flat
      frameloop="demand"
      dpr={[1, 2]}
      gl={{ antialias: true, alpha: true, stencil: false, powerPreference: 'default' }}
      onCreated={({ gl }) => {
        gl.setClearAlpha(0);
        gl.sortObjects = true;
        gl.domElement.addEventListener('webglcontextlost', (event) => {
          event.preventDefault();
          props.onLost();
        });
      }}
    >
      <Colouring materials={materials} theme={props.theme} subject={props.subject} surface={props.surface} />
      <Rig {...props} materials={materials} />
      <group scale={M_PER_MM}>
        <Steel merged={props.merged} bay={props.bay} materials={materials} />
        {props.hovered.length > 0 && <BarOverlay parts={props.hovered} as="hovered" materials={materials} />}
        {props.selected.length > 0 && (
          <BarOverlay parts={props.selected} as="selected" materials={materials} />
        )}
      </group>
    </Canvas>
  );
}

function useMaterials(): SceneMaterials {
  const [materials] = useState(makeMaterials);
  useEffect(() => () => disposeMaterials(materials), [materials]);
  return materials;
}

/** Keeps the materials in the colours of the theme and the fading round the bay in hand. */
function Colouring({
  materials,
  theme,
  subject,
  surface,
}: Pick<SceneCanvasProps, 'theme' | 'subject' | 'surface'> & { readonly materials: SceneMaterials }): null {
  const invalidate = useThree((state) => state.invalidate);
  useEffect(() => {
    // `theme` says when the variables have changed; their values are read where the drawing is.
    if (surface.current && theme) colourMaterials(materials, sceneColours(surface.current));
    invalidate();
  }, [materials, theme, surface, invalidate]);
  useEffect(() => {
    const middle = subject?.middle ?? [0, 0, 0];
    setSubject(
      materials,
      new Vector3(middle[0], middle[1], middle[2]).multiplyScalar(M_PER_MM),
      (subject?.reach ?? 0) * M_PER_MM,
    );
    invalidate();
  }, [materials, subject, invalidate]);
  return null;
}

function Rig(props: SceneCanvasProps & { readonly materials: SceneMaterials }) {
  const { materials, onView, surface, camera, whole, onReady, onTurned, onMoved } = props;
  const told = useCallback<CameraRigProps['onView']>(
    (view) => {
      const fine = Math.min(1, Math.max(FINE_LEAST, (view.pxPerMm * THICKNESS) / FINE_IN_FULL));
      setView(materials, view.width, view.height, fine);
      onView(view);
    },
    [materials, onView],
  );
  return (
    <CameraRig
      surface={surface}
      handle={camera}
      depth={DEPTHS * (whole?.reach ?? 0) * M_PER_MM + BESIDES}
      onView={told}
      onReady={onReady}
      onTurned={onTurned}
      onMoved={onMoved}
    />
  );
}
