import type { Vec2 } from '../../../core/geometry/vector.ts';
import { type Box, crosses, overlap } from '../view/box.ts';

/** Radius of a detail and height of its lines of caption, px. */
export const DETAIL_RADIUS = 74;
export const DETAIL_CAPTION = 38;
export const FIGURE_CAPTION = 54;

/** From the edges of the sheet, px. */
const EDGE = 16;

/** A leader that runs across a label or words is as bad as one longer by this, px. */
const CROSSED = 240;

/** The places tried, by part of the free width and height. */
const PLACES: readonly Vec2[] = [
  [1, 0.72],
  [1, 0.48],
  [1, 0.24],
  [1, 0],
  [0, 0],
  [0, 0.3],
  [0, 0.6],
];

export interface DetailPlace {
  /** Middle of the circle, px. */
  readonly at: Vec2;
  readonly place: number;
}

/**
 * Where on the sheet there is room for a detail with its caption: clear of all bars, words and marks, as near to the glyph of its crossing
 * as may be. The place that it had is kept while it lasts. Null: there is no room.
 */
export function detailPlace(
  sheet: { readonly width: number; readonly height: number },
  glyph: Vec2,
  bars: readonly (readonly [Vec2, Vec2])[],
  taken: readonly Box[],
  previous: number | null,
  caption = DETAIL_CAPTION,
): DetailPlace | null {
  const height = 2 * DETAIL_RADIUS + caption;
  const free = PLACES.flatMap(([right, down], place) => {
    const box: Box = {
      left: EDGE + right * (sheet.width - 2 * EDGE - 2 * DETAIL_RADIUS),
      top: EDGE + down * (sheet.height - 2 * EDGE - height),
      width: 2 * DETAIL_RADIUS,
      height,
    };
    if (bars.some((bar) => crosses(bar, box)) || taken.some((one) => overlap(one, box) > 0)) return [];
    const at: Vec2 = [box.left + DETAIL_RADIUS, box.top + DETAIL_RADIUS];
    const away = Math.hypot(at[0] - glyph[0], at[1] - glyph[1]);
    const crossed = taken.filter((one) => crosses([glyph, at], one)).length;
    return [{ at, place, cost: away + CROSSED * crossed }];
  });
  const kept = free.find(({ place }) => place === previous);
  return kept ?? free.toSorted((a, b) => a.cost - b.cost)[0] ?? null;
}
