/** The pointer that pushes: it takes hold of a place on the bar, and drags it. */
import type { Vec2 } from '../../../core/geometry/vector.ts';

export type PushTool =
  | { readonly state: 'idle' }
  /** Taken hold of, not dragged so far. `place` is mm from end i, `from` px on the sheet. */
  | { readonly state: 'pressing'; readonly place: number; readonly from: Vec2 }
  | { readonly state: 'dragging'; readonly place: number; readonly from: Vec2; readonly to: Vec2 };

export type PushEvent =
  | { readonly kind: 'down'; readonly at: Vec2; readonly place: number }
  | { readonly kind: 'move'; readonly at: Vec2 }
  | { readonly kind: 'up' }
  /** Escape, or the pointer is lost. */
  | { readonly kind: 'cancel' };

export const NOT_PUSHING: PushTool = { state: 'idle' };

/** A hand that only takes hold moves a little, px. */
const STILL = 3;

export function pushToolAfter(tool: PushTool, event: PushEvent): PushTool {
  switch (event.kind) {
    case 'down':
      return tool.state === 'idle' ? { state: 'pressing', place: event.place, from: event.at } : tool;
    case 'move': {
      if (tool.state === 'idle') return tool;
      const { place, from } = tool;
      if (tool.state === 'pressing' && Math.hypot(event.at[0] - from[0], event.at[1] - from[1]) <= STILL)
        return tool;
      return { state: 'dragging', place, from, to: event.at };
    }
    case 'up':
    case 'cancel':
      return NOT_PUSHING;
    default:
      return event satisfies never;
  }
}

/** How far the place has been dragged, px on the sheet. */
export function dragOf(tool: PushTool): Vec2 {
  return tool.state === 'dragging' ? [tool.to[0] - tool.from[0], tool.to[1] - tool.from[1]] : [0, 0];
}
