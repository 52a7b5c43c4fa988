import type { Layout, NodeSupport, Plane } from '../../layout/model.ts';
import { type Markup, markup } from '../markup.ts';
import { type ElevationView, toSheet } from './view.ts';

/** Set-out points as small crosses; earth under foundations, a square around other points taken as held. */
export function nodeMarks(
  nodes: readonly string[],
  bay: string,
  layout: Layout,
  view: ElevationView,
): Markup {
  return markup`${nodes.map((id) => {
    const node = layout.nodes.get(id);
    if (!node) return null;
    const [x, y] = toSheet(view, node.at);
    const support = node.supports[bay];
    return markup`${support ? supportMark(support.kind, x, y, view.plane) : null}<path class="cross" d="M${x - 5} ${y}h10M${x} ${y - 5}v10"/>`;
  })}`;
}

/** Whether a point is held by something else than a foundation, which has a sign of its own. */
export function isHeldPoint(kind: NodeSupport['kind'] | undefined): boolean {
  return kind === 'standing' || kind === 'eaves' || kind === 'vouched';
}

function supportMark(kind: NodeSupport['kind'], x: number, y: number, plane: Plane): Markup {
  const isUpright = plane.up[2] > Math.SQRT1_2;
  if (isHeldPoint(kind) || !isUpright)
    return markup`<rect class="heldpoint" x="${x - 7}" y="${y - 7}" width="14" height="14"/>`;
  const strokes = Array.from({ length: 9 }, (_, index) => markup`M${x - 22 + index * 5.5} ${y}l-5 7`);
  return markup`<path class="earth" d="M${x - 26} ${y}h52${strokes}"/>`;
}
