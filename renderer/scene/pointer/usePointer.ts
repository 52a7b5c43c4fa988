import { type PointerEvent, type RefObject, useCallback, useEffect, useRef } from 'react';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { BarId } from '../../../core/layout/model.ts';
import { pickedBar, type Target } from '../geometry/pick.ts';
import type { SheetView } from '../view/sheetView.ts';
import { IDLE, isClick, type Press, type PressEvent, pressAfter } from './press.ts';
import { pointerReach, sightAt } from './sight.ts';

export interface PointerWishes {
  readonly view: RefObject<SheetView | null>;
  readonly targets: readonly Target[];
  readonly hovered: BarId | null;
  readonly onHoverBar: (bar: BarId | null) => void;
  /** A click on a bar, or on none. */
  readonly onPick: (bar: BarId | null) => void;
}

export interface PointerHandlers {
  readonly onPointerDown: (event: PointerEvent<HTMLElement>) => void;
  readonly onPointerMove: (event: PointerEvent<HTMLElement>) => void;
  readonly onPointerUp: (event: PointerEvent<HTMLElement>) => void;
  readonly onPointerCancel: () => void;
  readonly onPointerLeave: () => void;
}

/** Hovering and clicking on bars, by lines of sight through the sheet. Dragging is left to the camera. */
export function usePointer(wishes: PointerWishes): PointerHandlers {
  const latest = useRef(wishes);
  latest.current = wishes;
  const press = useRef<Press>(IDLE);
  const frame = useRef(0);
  useEffect(() => () => cancelAnimationFrame(frame.current), []);

  const after = (event: PressEvent): void => {
    press.current = pressAfter(press.current, event);
  };
  const picked = useCallback((at: Vec2): BarId | null => {
    const { view, targets } = latest.current;
    if (view.current === null) return null;
    return pickedBar(targets, sightAt(view.current, at), pointerReach(view.current));
  }, []);
  const hover = (bar: BarId | null): void => {
    if (bar !== latest.current.hovered) latest.current.onHoverBar(bar);
  };

  return {
    onPointerDown: (event) =>
      after({ kind: 'down', at: placeOf(event), primary: event.button === 0 && event.isPrimary }),
    onPointerMove: (event) => {
      const at = placeOf(event);
      after({ kind: 'move', at });
      if (press.current.state === 'dragging' || event.pointerType === 'touch') return;
      // Once a frame is as often as anyone can see.
      cancelAnimationFrame(frame.current);
      frame.current = requestAnimationFrame(() => hover(picked(at)));
    },
    onPointerUp: (event) => {
      const clicked = isClick(press.current);
      after({ kind: 'up' });
      if (clicked) latest.current.onPick(picked(placeOf(event)));
    },
    onPointerCancel: () => after({ kind: 'cancel' }),
    onPointerLeave: () => {
      cancelAnimationFrame(frame.current);
      hover(null);
    },
  };
}

function placeOf(event: PointerEvent<HTMLElement>): Vec2 {
  const box = event.currentTarget.getBoundingClientRect();
  return [event.clientX - box.left, event.clientY - box.top];
}
