import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, along, dot, scale } from '../../../core/geometry/vector.ts';
import type { BayLayout, Layout } from '../../../core/layout/model.ts';
import { type Box, boxAbout, overlap } from './box.ts';
import type { ViewDirections } from './namedView.ts';
import { onSheet, type SheetView } from './sheetView.ts';

/** Room kept free at the edges of the sheet, px. */
export interface Margins {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** The middle of the sheet and the scale at which a set of points fills it. */
export interface Fit {
  readonly centre: Vec3;
  readonly pxPerMm: number;
}

/** A point to be seen, with what is drawn beside it at any scale: so many px right and down from it. */
export interface PointToShow {
  readonly at: Vec3;
  readonly beside: Vec2;
}

/** A view is not brought closer than this, so that a single short bar does not fill the sheet, px per mm. */
const CLOSEST = 0.6;

const BARE: Vec2 = [0, 0];

/** Shares of a bar's length at which it is looked for under what is taken. */
const ALONG = [0, 0.125, 0.25, 0.375, 0.5, 0.625, 0.75, 0.875, 1];

/** The points that a view of a bay must show: all bars with their offsets, members with their depth; of every bay where there is none. */
export function pointsToShow(layout: Layout, bay: BayLayout | null): readonly Vec3[] {
  const bays = bay === null ? layout.bays : [bay];
  return bays.flatMap((one) =>
    one.bars.flatMap((id) => {
      const bar = layout.bars.get(id);
      if (!bar) return [];
      const middle = ALONG.map((share) =>
        add(along(bar.from, bar.direction, share * bar.length), bar.offset),
      );
      const half = (bar.member?.depth ?? 0) / 2;
      // Depths stand upright on what runs level; of a column they are a hair beside it.
      const isLevel = Math.abs(bar.direction[2]) < 0.7;
      return half > 0 && isLevel
        ? middle.flatMap((at) => [add(at, [0, 0, half]), add(at, [0, 0, -half])])
        : middle;
    }),
  );
}

/** Points with nothing beside them. */
export function bare(points: readonly Vec3[]): readonly PointToShow[] {
  return points.map((at) => ({ at, beside: BARE }));
}

/**
 * The largest view of the points, in the given directions, on a sheet within the margins; null without points. Where it would put a point
 * into one of the corners that are taken, the view is raised out of them, at most by all of their height.
 *
 * @param taken boxes at the foot of the sheet
 */
export function fitOf(
  points: readonly PointToShow[],
  view: ViewDirections,
  sheet: { readonly width: number; readonly height: number },
  margins: Margins,
  taken: readonly Box[],
): Fit | null {
  const foot = Math.max(0, ...taken.map((box) => sheet.height - box.top));
  for (let raised = 0; raised < foot; raised += RAISED) {
    const found = fitWithin(points, view, sheet, { ...margins, bottom: margins.bottom + raised });
    if (found === null || isClear(points, { ...view, ...found, ...sheet }, taken)) return found;
  }
  return fitWithin(points, view, sheet, { ...margins, bottom: margins.bottom + foot });
}

/** Steps in which the foot of the view is raised out of the corners, px. */
const RAISED = 8;

function isClear(points: readonly PointToShow[], placed: SheetView, taken: readonly Box[]): boolean {
  return points.every(({ at, beside }) => {
    const [x, y] = onSheet(placed, at);
    const mark = boxAbout([x + beside[0], y + beside[1]], CLEAR);
    return taken.every((box) => overlap(box, mark) === 0);
  });
}

/** Points keep this clear of the corners that are taken, px. */
const CLEAR = 8;

function fitWithin(
  points: readonly PointToShow[],
  view: ViewDirections,
  { width, height }: { readonly width: number; readonly height: number },
  margins: Margins,
): Fit | null {
  if (points.length === 0) return null;
  const onRight = points.map(({ at, beside }) => ({ mm: dot(at, view.right), px: beside[0] }));
  const onUp = points.map(({ at, beside }) => ({ mm: dot(at, view.up), px: -beside[1] }));
  const onDepth = points.map(({ at }) => ({ mm: dot(at, view.towards), px: 0 }));
  const roomX = Math.max(80, width - margins.left - margins.right);
  const roomY = Math.max(80, height - margins.top - margins.bottom);
  const pxPerMm = largestScale(
    (one) => reach(onRight, one).size <= roomX && reach(onUp, one).size <= roomY,
    CLOSEST,
  );
  // The middle of the free room is not the middle of the sheet: shift by half the difference of the margins.
  const x = reach(onRight, pxPerMm).middle + (margins.right - margins.left) / 2;
  const y = reach(onUp, pxPerMm).middle + (margins.top - margins.bottom) / 2;
  const z = reach(onDepth, 1).middle;
  return {
    centre: add(add(scale(view.right, x / pxPerMm), scale(view.up, y / pxPerMm)), scale(view.towards, z)),
    pxPerMm,
  };
}

interface OnAxis {
  readonly mm: number;
  readonly px: number;
}

/** How far points reach along an axis of the sheet at a scale, px. */
function reach(
  points: readonly OnAxis[],
  pxPerMm: number,
): { readonly size: number; readonly middle: number } {
  let min = Number.POSITIVE_INFINITY;
  let max = Number.NEGATIVE_INFINITY;
  for (const { mm, px } of points) {
    const at = mm * pxPerMm + px;
    if (at < min) min = at;
    if (at > max) max = at;
  }
  return { size: max - min, middle: (min + max) / 2 };
}

/** The largest scale that still fits, by halving: what fits at one scale fits at all smaller ones, near enough. */
function largestScale(fits: (pxPerMm: number) => boolean, closest: number): number {
  if (fits(closest)) return closest;
  let low = closest / 2 ** 20;
  let high = closest;
  // Each halving gains a bit; forty are finer than any screen.
  for (let step = 0; step < 40; step++) {
    const middle = Math.sqrt(low * high);
    if (fits(middle)) low = middle;
    else high = middle;
  }
  return low;
}
