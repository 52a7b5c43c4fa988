import type { Vec2 } from '../../../core/geometry/vector.ts';

/** What the pointer is doing over the drawing. A press that travels is a drag, of the camera, and no click. */
export type Press =
  | { readonly state: 'idle' }
  | { readonly state: 'pressing'; readonly at: Vec2 }
  | { readonly state: 'dragging' };

export type PressEvent =
  | { readonly kind: 'down'; readonly at: Vec2; readonly primary: boolean }
  | { readonly kind: 'move'; readonly at: Vec2 }
  | { readonly kind: 'up' }
  | { readonly kind: 'cancel' };

export const IDLE: Press = { state: 'idle' };

/** A hand that clicks moves a little; farther than this it drags, px. */
const STILL = 4;

export function pressAfter(press: Press, event: PressEvent): Press {
  switch (event.kind) {
    case 'down':
      // A second finger or another button makes the press a gesture.
      return event.primary && press.state === 'idle'
        ? { state: 'pressing', at: event.at }
        : { state: 'dragging' };
    case 'move': {
      if (press.state !== 'pressing') return press;
      const travelled = Math.hypot(event.at[0] - press.at[0], event.at[1] - press.at[1]);
      return travelled > STILL ? { state: 'dragging' } : press;
    }
    case 'up':
    case 'cancel':
      return IDLE;
    default:
      return event satisfies never;
  }
}

/** Whether letting go now is a click. */
export function isClick(press: Press): boolean {
  return press.state === 'pressing';
}
