import { type JSX, type KeyboardEvent, useCallback, useMemo, useRef, useState } from 'react';
import type { Bar, BayLayout, Layout } from '../../core/layout/model.ts';
import type { BayViewProps } from './bayViewProps.ts';
import { overlayMotion } from './bowing/overlayMotion.ts';
import { forceAfterKey, placeAfterKey, pushKey } from './bowing/pushKeys.ts';
import { usePushPointer } from './bowing/usePushPointer.ts';
import { FlatScene } from './flat/FlatScene.tsx';
import { mergedSteel } from './geometry/mergedSteel.ts';
import { targetsOf } from './geometry/pick.ts';
import { bayParts, steelwork } from './geometry/steelwork.ts';
import { NoWebgl } from './NoWebgl.tsx';
import { Legend } from './overlay/Legend.tsx';
import { Overlay, type OverlayHandle } from './overlay/Overlay.tsx';
import { overlayContent } from './overlay/overlayContent.ts';
import { reducedMotion } from './overlay/reducedMotion.ts';
import { viewKey } from './pointer/keys.ts';
import { usePointer } from './pointer/usePointer.ts';
import './scene.css';
import './bowing/motion.css';
import './forces/forcesScene.css';
import { useSize } from './useSize.ts';
import type { SheetView } from './view/sheetView.ts';
import { subjectOf } from './view/subject.ts';
import { useNamedView } from './view/useNamedView.ts';
import type { CameraHandle } from './webgl/CameraRig.tsx';
import { webglThere } from './webgl/contextThere.ts';
import { SceneCanvas } from './webgl/SceneCanvas.tsx';

export type { BayViewProps } from './bayViewProps.ts';

/**
 * A bay in 3D as it will be built, with what can be marked on it. Shows an assessment and tells what the user points at; computes no
 * engineering. Without WebGL the same bay is drawn flat, with the same buttons.
 */
export function BayView(props: BayViewProps): JSX.Element {
  const {
    assessment,
    bay: bayId,
    scale,
    selectedBar,
    hoveredBar,
    onSelectBar,
    onHoverBar,
    onViewChange,
  } = props;
  const { selectedCrossing, units, shape, push, onPush, forces } = props;
  // Forces take the place of what bows.
  const bow = props.bow && forces === null;
  const { layout } = assessment;
  const bay = useMemo(() => bayOf(layout, bayId), [layout, bayId]);
  const [drawnBy, setDrawnBy] = useState<'webgl' | 'flat, none' | 'flat, lost'>(() =>
    webglThere() ? 'webgl' : 'flat, none',
  );

  const surface = useRef<HTMLDivElement>(null);
  const camera = useRef<CameraHandle | null>(null);
  const overlay = useRef<OverlayHandle | null>(null);
  const view = useRef<SheetView | null>(null);
  const size = useSize(surface);
  const legendElement = useRef<HTMLDivElement>(null);
  const legend = useSize(legendElement);

  const parts = useMemo(() => steelwork(layout, scale), [layout, scale]);
  const merged = useMemo(() => mergedSteel(parts), [parts]);
  const inHand = useMemo(
    () => (bay === null ? parts : bayParts(layout, bay, scale)),
    [layout, bay, scale, parts],
  );
  const partsOf = useCallback(
    (bar: string | null) => (bar === null ? [] : parts.filter((part) => part.bar === bar)),
    [parts],
  );
  const selected = useMemo(() => partsOf(selectedBar), [partsOf, selectedBar]);
  const hovered = useMemo(
    () => partsOf(hoveredBar === selectedBar ? null : hoveredBar),
    [partsOf, hoveredBar, selectedBar],
  );
  const targets = useMemo(() => targetsOf(inHand, (id) => isChosen(layout.bars.get(id))), [inHand, layout]);
  const whole = useMemo(() => subjectOf(layout, null), [layout]);
  const subject = useMemo(() => (bay === null ? null : subjectOf(layout, bay)), [layout, bay]);
  const content = useMemo(
    () => overlayContent({ assessment, bay: bayId, selectedBar, selectedCrossing, units, bow, forces }),
    [assessment, bayId, selectedBar, selectedCrossing, units, bow, forces],
  );

  const chosen = content.selected;
  const moves = useMemo(
    () => overlayMotion(layout, chosen, { shape, push, units, bow }),
    [layout, chosen, shape, push, units, bow],
  );

  const named = useNamedView({ ...props, layout, bay, camera, size, legend, drawnBy });
  const shown = useCallback((moved: SheetView) => {
    view.current = moved;
    overlay.current?.show(moved);
  }, []);
  const turned = useCallback(() => onViewChange?.('free'), [onViewChange]);
  const pointer = usePointer({ view, targets, hovered: hoveredBar, onHoverBar, onPick: onSelectBar });

  usePushPointer({ surface, view, bar: chosen, push, onPush });
  const pushByKey = (event: KeyboardEvent): boolean => {
    const wish = push === null ? null : pushKey(event.key, event.shiftKey);
    if (wish === null || push === null || chosen?.angle == null) return false;
    if (wish.kind === 'place') onPush({ at: placeAfterKey(push.places, push.at, wish.step), force: [0, 0] });
    else onPush({ force: forceAfterKey(push.byHand ? push.force : [0, 0], wish, push.most, chosen.angle) });
    event.preventDefault();
    return true;
  };

  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (pushByKey(event)) return;
    const wish = viewKey(event.key, event.shiftKey);
    if (wish === null) return;
    event.preventDefault();
    const smooth = !reducedMotion();
    switch (wish.kind) {
      case 'turn':
        camera.current?.turn(wish.about, wish.tip, smooth);
        return;
      case 'move':
        camera.current?.move(wish.right, wish.down, smooth);
        return;
      case 'closer':
        camera.current?.closer(wish.factor, smooth);
        return;
      case 'fit':
        named.fitAgain(view.current);
        return;
      default:
        wish satisfies never;
    }
  };

  return (
    <div className="scene" data-drawn-by={drawnBy}>
      <div ref={surface} className="scene-sheet">
        <div
          className="scene-stage"
          role="application"
          // biome-ignore lint/a11y/noNoninteractiveTabindex: the stage takes the keys that turn the view
          tabIndex={0}
          data-pushes={push === null ? undefined : ''}
          data-over-bar={hoveredBar === null ? undefined : ''}
          aria-label={stageName(bay, drawnBy === 'webgl', push === null ? null : (chosen?.mark ?? null))}
          onKeyDown={onKeyDown}
          {...pointer}
        >
          {drawnBy === 'webgl' ? (
            <SceneCanvas
              merged={merged}
              bay={bay?.id ?? null}
              subject={subject}
              whole={whole}
              theme={props.theme}
              selected={selected}
              hovered={hovered}
              surface={surface}
              camera={camera}
              onView={shown}
              onReady={named.begin}
              onTurned={turned}
              onMoved={named.leave}
              onLost={() => setDrawnBy('flat, lost')}
            />
          ) : (
            <FlatScene
              parts={inHand}
              bay={bay}
              selectedBar={selectedBar}
              hoveredBar={hoveredBar}
              surface={surface}
              camera={camera}
              size={size}
              onView={shown}
              onMoved={named.leave}
            />
          )}
        </div>
        <Overlay {...props} content={content} moves={moves} handle={overlay} legend={legend} />
        <Legend
          element={legendElement}
          crossings={content.crossings}
          scale={scale}
          forces={forces !== null && forces.states.length > 0}
          motion={moves.motion === null ? null : { kind: moves.motion.kind, times: push?.times ?? 1 }}
        />
      </div>
      {drawnBy !== 'webgl' && (
        <NoWebgl
          lost={drawnBy === 'flat, lost'}
          onAgain={() => setDrawnBy(webglThere() ? 'webgl' : 'flat, none')}
        />
      )}
    </div>
  );
}

function bayOf(layout: Layout, id: string | null): BayLayout | null {
  return layout.bays.find((one) => one.id === id) ?? null;
}

function stageName(bay: BayLayout | null, turns: boolean, pushed: string | null): string {
  const of = bay === null ? 'the project' : `bay ${bay.id}`;
  if (pushed !== null)
    return `Drawing of ${of}, pushing ${pushed}. Left and right go along it; with shift, up and down push it out of the plane, left and right in it.`;
  const keys = turns ? 'Arrows turn it, shift and arrows move it' : 'Shift and arrows move it';
  return `Drawing of ${of}. ${keys}, plus and minus zoom, Home fits it.`;
}

/** What a click chooses: bars of angle, and the members that are checked beside them. */
const isChosen = (bar: Bar | undefined): boolean =>
  bar !== undefined && (bar.angle !== null || bar.role === 'strut' || bar.role === 'beam');
