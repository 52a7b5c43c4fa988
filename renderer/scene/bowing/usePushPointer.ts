import { type RefObject, useEffect, useRef } from 'react';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { Bar } from '../../../core/layout/model.ts';
import type { SheetView } from '../view/sheetView.ts';
import { forceOfDrag } from './forceOfDrag.ts';
import { isOnPushedPlace, placeUnder } from './placeUnder.ts';
import type { PushChange, PushShown } from './pushShown.ts';
import { dragOf, NOT_PUSHING, type PushEvent, type PushTool, pushToolAfter } from './pushTool.ts';

export interface PushPointerWishes {
  /** Takes presses before the camera does. */
  readonly surface: RefObject<HTMLElement | null>;
  readonly view: RefObject<SheetView | null>;
  readonly bar: Bar | null;
  readonly push: PushShown | null;
  readonly onPush: (change: PushChange) => void;
}

/** Takes hold of the chosen bar where it is pressed, and pushes it as far as it is dragged. Everywhere else the camera keeps its drags. */
export function usePushPointer(wishes: PushPointerWishes): void {
  const latest = useRef(wishes);
  latest.current = wishes;
  const { surface } = wishes;
  const pushes = wishes.push !== null;
  useEffect(() => {
    const element = surface.current;
    if (element === null || !pushes) return;
    let tool: PushTool = NOT_PUSHING;
    // The click that ends a press on the bar would choose what lies there.
    let swallowsClick = false;

    const after = (event: PushEvent): void => {
      tool = pushToolAfter(tool, event);
    };
    const isHeld = (): boolean => tool.state !== 'idle';
    const down = (event: PointerEvent): void => {
      swallowsClick = false;
      const { view, bar, push, onPush } = latest.current;
      if (event.button !== 0 || event.shiftKey || view.current === null || bar === null || push === null)
        return;
      if (event.target instanceof Element && event.target.closest('.scene-label, .scene-end')) return;
      const at = placeOf(element, event);
      const place = isOnPushedPlace(view.current, bar, push, at)
        ? push.at
        : placeUnder(view.current, bar, at, push.places);
      if (place === null) return;
      event.stopPropagation();
      event.preventDefault();
      element.setPointerCapture(event.pointerId);
      element.querySelector<HTMLElement>('.scene-stage')?.focus();
      swallowsClick = true;
      after({ kind: 'down', at, place });
      onPush({ at: place, force: [0, 0] });
    };
    const move = (event: PointerEvent): void => {
      if (!isHeld()) return;
      event.stopPropagation();
      after({ kind: 'move', at: placeOf(element, event) });
      const { view, bar, push, onPush } = latest.current;
      if (tool.state !== 'dragging' || view.current === null || bar?.angle == null) return;
      if (push?.test == null || Math.abs(push.at - tool.place) > 1) return;
      const { test, way, most, times } = push;
      onPush({
        force: forceOfDrag({ view: view.current, angle: bar.angle, test, way, most, times }, dragOf(tool)),
      });
    };
    const up = (event: PointerEvent): void => {
      if (!isHeld()) return;
      event.stopPropagation();
      after({ kind: 'up' });
    };
    const cancel = (): void => {
      if (!isHeld()) return;
      after({ kind: 'cancel' });
      latest.current.onPush({ force: [0, 0] });
    };
    const onEscape = (event: KeyboardEvent): void => {
      if (event.key !== 'Escape' || !isHeld()) return;
      event.stopPropagation();
      event.preventDefault();
      cancel();
    };
    const click = (event: MouseEvent): void => {
      if (!swallowsClick) return;
      swallowsClick = false;
      event.stopPropagation();
      event.preventDefault();
    };
    const early = { capture: true };
    element.addEventListener('pointerdown', down, early);
    element.addEventListener('pointermove', move, early);
    element.addEventListener('pointerup', up, early);
    element.addEventListener('pointercancel', cancel, early);
    element.addEventListener('click', click, early);
    window.addEventListener('keydown', onEscape, early);
    return () => {
      element.removeEventListener('pointerdown', down, early);
      element.removeEventListener('pointermove', move, early);
      element.removeEventListener('pointerup', up, early);
      element.removeEventListener('pointercancel', cancel, early);
      element.removeEventListener('click', click, early);
      window.removeEventListener('keydown', onEscape, early);
    };
  }, [surface, pushes]);
}

function placeOf(element: HTMLElement, event: PointerEvent): Vec2 {
  const box = element.getBoundingClientRect();
  return [event.clientX - box.left, event.clientY - box.top];
}
