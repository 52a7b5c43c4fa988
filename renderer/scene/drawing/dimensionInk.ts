import { dot, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { BayLayout, DimensionLine } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import type { PointToShow } from '../view/fit.ts';
import type { ViewDirections } from '../view/namedView.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';
import { from, heading, type Ink, line, minus, plus, span, times } from './ink.ts';

/** How far a dimension line stands off the steel, and how far its witness lines begin from the steel and run past it, px. */
const STAND_OFF = 46;
const GAP = 10;
const PAST = 6;
/** Half a tick, px. */
const TICK = 4;
/** From the dimension line to the middle of its figure, px. */
const FIGURE_OFF = 11;

/** Set-out dimensions beside the bay. A dimension seen nearly end on, or whose stand-off is, is left out. */
export function dimensionInk(view: SheetView, bay: BayLayout, units: UnitSystem): readonly Ink[] {
  return bay.dimensions.flatMap((dimension, index): readonly Ink[] => {
    const placed = dimensionLine(view, dimension);
    const text = showLength(dimension.value, units, 'bare');
    if (placed === null || span(minus(placed[1], placed[0])) < 6 * text.length + 8) return [];
    const [p, q] = placed;
    const out = outwards(view, dimension) ?? [0, 0];
    const a = onSheet(view, dimension.from);
    const b = onSheet(view, dimension.to);
    const key = `dimension ${index}`;
    const witness = (end: Vec2): string => line(from(end, out, GAP), from(end, out, STAND_OFF + PAST));
    const middle = times(plus(p, q), 0.5);
    const anchor = out[0] < -0.5 ? 'end' : out[0] > 0.5 ? 'start' : 'middle';
    // Words hang from their base line: four px put their middle where it is wanted.
    const at = plus(from(middle, out, anchor === 'middle' ? FIGURE_OFF + 4 : FIGURE_OFF - 2), [0, 4]);
    return [
      { kind: 'path', key: `${key} witness`, look: 'scene-witness', d: witness(a) + witness(b) },
      { kind: 'path', key: `${key} line`, look: 'scene-dimension', d: line(p, q) },
      { kind: 'path', key: `${key} ticks`, look: 'scene-tick-mark', d: tick(p) + tick(q) },
      { kind: 'words', key: `${key} figure`, look: 'scene-words quiet', at, anchor, text },
    ];
  });
}

/** Where a dimension line runs on the sheet; null when its stand-off is seen end on. */
export function dimensionLine(view: SheetView, dimension: DimensionLine): readonly [Vec2, Vec2] | null {
  const out = outwards(view, dimension);
  if (out === null) return null;
  return [
    from(onSheet(view, dimension.from), out, STAND_OFF),
    from(onSheet(view, dimension.to), out, STAND_OFF),
  ];
}

function outwards(view: SheetView, dimension: DimensionLine): Vec2 | null {
  return heading(directionOnSheet(view, dimension.away), 0.25 * view.pxPerMm);
}

/** Room that a figure takes beside its dimension line, px. */
const FIGURE_WIDTH = 44;
const FIGURE_HEIGHT = 18;

/** The room that a bay's dimensions take beside it, for fitting a view: at their ends for the lines, at their middles for the figures. */
export function dimensionRoom(bay: BayLayout, view: ViewDirections): readonly PointToShow[] {
  return bay.dimensions.flatMap(({ from: a, to: b, away }): readonly PointToShow[] => {
    const out = heading([dot(away, view.right), -dot(away, view.up)], 0.25);
    if (out === null) return [];
    const line = times(out, STAND_OFF + PAST);
    const figure: Vec2 = [
      out[0] * (STAND_OFF + FIGURE_OFF + Math.abs(out[0]) * FIGURE_WIDTH),
      out[1] * (STAND_OFF + FIGURE_OFF + Math.abs(out[1]) * FIGURE_HEIGHT),
    ];
    const middle: Vec3 = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2, (a[2] + b[2]) / 2];
    return [
      { at: a, beside: line },
      { at: b, beside: line },
      { at: middle, beside: figure },
    ];
  });
}

function tick([x, y]: Vec2): string {
  return line([x - TICK, y + TICK], [x + TICK, y - TICK]);
}
