import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { along, dot } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { Restraint, Station } from '../../../core/restraint/model.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';
import { seenEndOn } from './bowInk.ts';
import { type BowShape, inSpace } from './bowShape.ts';
import { across, arrowHead, from, heading, type Ink, line, plus } from './ink.ts';

/** From the station to the arrow's tip, its tail and its caption, px. The tip stays clear of the join's glyph. */
const TIP = 17;
const TAIL = 50;
const CAPTION = 58;
/** Half the stop bar that an arrow of a hold ends at, px. */
const STOP = 8;

/** Cosine of the 10° within which directions count as one, as in the free-direction rule. */
const ALIKE = Math.cos((10 * Math.PI) / 180);

/** More captions than this at one bar hide the bar; the panel has them all. */
const MOST_HOLDS = 2;

/** What holds the bowed bar between the ends of its bow, and which way it is free: arrows and a few words. */
export function holdInk(
  view: SheetView,
  bar: Bar,
  angle: AngleBar,
  restraint: Restraint,
  bow: BowShape,
): readonly Ink[] {
  const between = restraint.stations.filter((one) => one.at > bow.from + 1 && one.at < bow.to - 1);
  const holding = between.filter((one) => one.held.ways === 1).slice(0, MOST_HOLDS);
  return [
    ...holding.flatMap((station) => heldInk(view, bar, angle, station)),
    ...freeInk(view, bar, angle, bow),
  ];
}

/** A pair of arrows against stop bars: moving this way the bar is stopped. */
function heldInk(view: SheetView, bar: Bar, angle: AngleBar, station: Station): readonly Ink[] {
  if (station.held.ways !== 1) return [];
  const direction = inSpace(angle, station.held.direction);
  const way = upwards(heading(directionOnSheet(view, direction), 0.2 * view.pxPerMm));
  const at = onSheet(view, along(bar.from, bar.direction, station.at));
  const key = `held ${station.at}`;
  const words = [`held ${named(angle, direction)}`, `by ${station.label}`];
  if (way === null) return caption(key, 'scene-words strong', plus(at, [0, -CAPTION]), [0, -1], words);
  const arrow = (out: Vec2): string => line(from(at, out, TAIL), from(at, out, TIP + 6));
  const stop = (out: Vec2): string =>
    line(from(from(at, out, TIP), across(out), STOP), from(from(at, out, TIP), across(out), -STOP));
  const opposite: Vec2 = [-way[0], -way[1]];
  return [
    {
      kind: 'path',
      key: `${key} lines`,
      look: 'scene-hold',
      d: [way, opposite].map((out) => arrow(out) + stop(out)).join(''),
    },
    {
      kind: 'path',
      key: `${key} heads`,
      look: 'scene-solid',
      d: [way, opposite].map((out) => arrowHead(from(at, out, TIP), [-out[0], -out[1]])).join(''),
    },
    ...caption(key, 'scene-words strong', from(at, way, CAPTION), way, words),
  ];
}

/** An arrow out of the middle of the bow; seen end on, a ring with a dot: it comes out of the sheet. */
function freeInk(view: SheetView, bar: Bar, angle: AngleBar, bow: BowShape): readonly Ink[] {
  const at = onSheet(view, along(bar.from, bar.direction, (bow.from + bow.to) / 2));
  if (seenEndOn(view, bow)) {
    const mark = plus(at, [-26, 26]);
    return [
      { kind: 'ring', key: 'free ring', look: 'scene-free-ring', at: mark, radius: 6 },
      { kind: 'ring', key: 'free dot', look: 'scene-free-head', at: mark, radius: 2 },
      ...caption(
        'free',
        'scene-words motion',
        plus(mark, [-12, 0]),
        [-1, 0],
        ['free to bow', 'towards you and away'],
      ),
    ];
  }
  const way = heading(directionOnSheet(view, bow.direction));
  if (way === null) return [];
  return [
    {
      kind: 'path',
      key: 'free line',
      look: 'scene-free',
      d: line(from(at, way, 14), from(at, way, 38)),
    },
    { kind: 'path', key: 'free head', look: 'scene-free-head', d: arrowHead(from(at, way, 46), way) },
    ...caption('free', 'scene-words motion', from(at, way, 54), way, [
      'free to bow',
      named(angle, bow.direction),
    ]),
  ];
}

/** Lines of words that stand clear of a place in the direction `out`. */
function caption(key: string, look: string, at: Vec2, out: Vec2, lines: readonly string[]): readonly Ink[] {
  const anchor = out[0] > 0.5 ? 'start' : out[0] < -0.5 ? 'end' : 'middle';
  const height = 14 * lines.length;
  // Above the place the last line sits on it; below, the first hangs from it; beside, they straddle it.
  const top = out[1] < -0.5 ? at[1] - height + 12 : out[1] > 0.5 ? at[1] + 12 : at[1] - height / 2 + 11;
  return lines.map((text, index) => ({
    kind: 'words',
    key: `${key} words ${index}`,
    look,
    at: [at[0], top + 14 * index],
    anchor,
    text,
  }));
}

/** Of a two-ended direction the end that points up the sheet, where its caption stands. */
function upwards(way: Vec2 | null): Vec2 | null {
  if (way === null) return null;
  return way[1] > 0 ? [-way[0], -way[1]] : way;
}

/** A direction in words: along the plane, out of it, or neither. */
function named(angle: AngleBar, direction: Vec3): string {
  if (Math.abs(dot(direction, angle.placement.inPlane)) > ALIKE) return 'in plane';
  if (Math.abs(dot(direction, angle.placement.outOfPlane)) > ALIKE) return 'out of plane';
  return 'one way';
}
