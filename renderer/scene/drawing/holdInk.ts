import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { along, dot } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { Restraint, Station } from '../../../core/restraint/model.ts';
import { type Box, boxAbout, overlap } from '../view/box.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';
import { seenEndOn } from './bowInk.ts';
import { type BowShape, inSpace } from './bowShape.ts';
import { across, arrowHead, from, heading, type Ink, line, plus, wordsBox } from './ink.ts';

/** From the station to the arrow's tip, its tail and its caption, px. The tip stays clear of the join's glyph. */
const TIP = 17;
const TAIL = 50;
const CAPTION = 56;
/** Half the stop bar that an arrow of a hold ends at, px. */
const STOP = 8;

/** Cosine of the 10° within which directions count as one, as in the free-direction rule. */
const ALIKE = Math.cos((10 * Math.PI) / 180);

/** More captions than this at one bar hide the bar; the panel has them all. */
const MOST_HOLDS = 2;

/** Parts of the bow at which the arrow of the free way is tried, in order of preference. */
const FREE_AT = [0.5, 0.36, 0.64, 0.25, 0.75] as const;

/** One way of drawing a note, and the room that its words and arrows take. */
interface Note {
  readonly ink: readonly Ink[];
  readonly boxes: readonly Box[];
}

export interface HoldNotes {
  /** What the words should not cover. */
  readonly inTheWay: readonly Box[];
  /** Whether the way that is free is noted too. */
  readonly free: boolean;
}

/**
 * What holds the bowed bar between the ends of its bow, and which way it is free: arrows and a few words. Of a bound for mixed holds, the
 * holds that it leaves out are not drawn.
 */
export function holdInk(
  view: SheetView,
  bar: Bar,
  angle: AngleBar,
  restraint: Restraint,
  bow: BowShape,
  { inTheWay, free }: HoldNotes,
): readonly Ink[] {
  const stopping = restraint.stations.filter((station) => {
    if (station.held.ways !== 1 || station.at <= bow.from + 1 || station.at >= bow.to - 1) return false;
    return Math.abs(dot(inSpace(angle, station.held.direction), bow.direction)) < ALIKE;
  });
  const taken: Box[] = [...inTheWay];
  const ink: Ink[] = [];
  const put = (notes: readonly Note[]): void => {
    const best = clearest(notes, taken);
    if (!best) return;
    taken.push(...best.boxes);
    ink.push(...best.ink);
  };
  for (const station of stopping.slice(0, MOST_HOLDS)) put(heldNotes(view, bar, angle, station));
  if (free) put(freeNotes(view, bar, angle, restraint, bow));
  return ink;
}

/** The note that covers least of what is there; the first of equals. */
function clearest(notes: readonly Note[], taken: readonly Box[]): Note | undefined {
  const covers = (note: Note): number =>
    taken.reduce((sum, box) => sum + note.boxes.reduce((of, own) => of + overlap(own, box), 0), 0);
  return notes.map((note) => ({ note, cost: covers(note) })).toSorted((a, b) => a.cost - b.cost)[0]?.note;
}

/** What holds there, by name; other bars that meet at the place and hold nothing are not named. */
function holderNames({ claims, label }: Station): string {
  const names = claims.flatMap(({ counted, direction, reason }) => {
    if (!counted || direction === 'twist') return [];
    if ('partner' in reason) return [reason.partner];
    if ('line' in reason) return [reason.line];
    return 'bar' in reason ? [reason.bar] : [];
  });
  return [...new Set(names)].join(' and ') || label;
}

/** A pair of arrows against stop bars: moving this way the bar is stopped. The words stand at either arrow. */
function heldNotes(view: SheetView, bar: Bar, angle: AngleBar, station: Station): readonly Note[] {
  if (station.held.ways !== 1) return [];
  const direction = inSpace(angle, station.held.direction);
  const way = heading(directionOnSheet(view, direction), 0.2 * view.pxPerMm);
  const at = onSheet(view, along(bar.from, bar.direction, station.at));
  const key = `held ${station.at}`;
  const words = [`held ${named(angle, direction)}`, `by ${holderNames(station)}`];
  if (way === null) return [caption(key, 'scene-words strong', plus(at, [0, -22]), [0, -1], words)];
  const ways = upFirst(way);
  const arrow = (out: Vec2): string => line(from(at, out, TAIL), from(at, out, TIP + 6));
  const stop = (out: Vec2): string =>
    line(from(from(at, out, TIP), across(out), STOP), from(from(at, out, TIP), across(out), -STOP));
  const arrows: readonly Ink[] = [
    {
      kind: 'path',
      key: `${key} lines`,
      look: 'scene-hold',
      d: ways.map((out) => arrow(out) + stop(out)).join(''),
    },
    {
      kind: 'path',
      key: `${key} heads`,
      look: 'scene-solid',
      d: ways.map((out) => arrowHead(from(at, out, TIP), [-out[0], -out[1]])).join(''),
    },
  ];
  return ways.map((out) => {
    const note = caption(key, 'scene-words strong', from(at, out, CAPTION), out, words);
    const shafts = ways.flatMap((end) => shaft(from(at, end, TIP), from(at, end, TAIL)));
    return { ink: [...arrows, ...note.ink], boxes: [...note.boxes, ...shafts] };
  });
}

/** An arrow out of the bow; seen end on, a ring with a dot: it comes out of the sheet. */
function freeNotes(
  view: SheetView,
  bar: Bar,
  angle: AngleBar,
  restraint: Restraint,
  bow: BowShape,
): readonly Note[] {
  const words = freeWords(view, angle, restraint, bow);
  return FREE_AT.flatMap((part): readonly Note[] => {
    const at = onSheet(view, along(bar.from, bar.direction, bow.from + part * (bow.to - bow.from)));
    if (seenEndOn(view, bow)) return [[-1, 0] as const, [1, 0] as const].map((out) => endOn(at, out, words));
    const way = heading(directionOnSheet(view, bow.direction));
    if (way === null) return [];
    const note = caption('free', 'scene-words motion', from(at, way, 56), way, words);
    return [
      {
        ink: [
          {
            kind: 'path',
            key: 'free line',
            look: 'scene-free',
            d: line(from(at, way, 18), from(at, way, 40)),
          },
          { kind: 'path', key: 'free head', look: 'scene-free-head', d: arrowHead(from(at, way, 48), way) },
          ...note.ink,
        ],
        boxes: [...note.boxes, ...shaft(from(at, way, 28), from(at, way, 48))],
      },
    ];
  });
}

function freeWords(
  view: SheetView,
  angle: AngleBar,
  { governing }: Restraint,
  bow: BowShape,
): readonly string[] {
  // Nothing holds it on the way: it goes over its least radius, but could go any way.
  if (governing.freeDirection === null && governing.basis === 'span')
    return ['free every way', 'weakest shown'];
  const way = seenEndOn(view, bow) ? 'towards you and away' : named(angle, bow.direction);
  return ['free to bow', way, ...(governing.basis === 'mixed bound' ? ['(a safe bound)'] : [])];
}

function endOn(at: Vec2, out: Vec2, words: readonly string[]): Note {
  const mark = from(at, out, 34);
  const note = caption('free', 'scene-words motion', from(mark, out, 13), out, words);
  return {
    ink: [
      { kind: 'ring', key: 'free ring', look: 'scene-free-ring', at: mark, radius: 6 },
      { kind: 'ring', key: 'free dot', look: 'scene-free-head', at: mark, radius: 2 },
      ...note.ink,
    ],
    boxes: [...note.boxes, boxAbout(mark, 8)],
  };
}

/** The room that an arrow takes, as a row of small boxes along it. */
function shaft(a: Vec2, b: Vec2): readonly Box[] {
  return [0, 0.33, 0.67, 1].map((part) =>
    boxAbout([a[0] + (b[0] - a[0]) * part, a[1] + (b[1] - a[1]) * part], 7),
  );
}

/** Lines of words that stand clear of a place in the direction `out`. */
function caption(key: string, look: string, at: Vec2, out: Vec2, lines: readonly string[]): Note {
  const anchor = out[0] > 0.5 ? 'start' : out[0] < -0.5 ? 'end' : 'middle';
  const height = 14 * lines.length;
  // Above the place the last line sits on it; below, the first hangs from it; beside, they straddle it.
  const top = out[1] < -0.5 ? at[1] - height + 12 : out[1] > 0.5 ? at[1] + 12 : at[1] - height / 2 + 11;
  const ink = lines.map(
    (text, index): Extract<Ink, { kind: 'words' }> => ({
      kind: 'words',
      key: `${key} words ${index}`,
      look,
      at: [at[0], top + 14 * index],
      anchor,
      text,
    }),
  );
  const boxes = ink.map(wordsBox);
  const left = Math.min(...boxes.map((box) => box.left));
  const right = Math.max(...boxes.map((box) => box.left + box.width));
  return { ink, boxes: [{ left, top: top - 11, width: right - left, height }] };
}

/** The two ends of a direction, the one that points up the sheet first. */
function upFirst(way: Vec2): readonly [Vec2, Vec2] {
  const back: Vec2 = [-way[0], -way[1]];
  return way[1] > 0 ? [back, way] : [way, back];
}

/** A direction in words: along the plane, out of it, or neither. */
function named(angle: AngleBar, direction: Vec3): string {
  if (Math.abs(dot(direction, angle.placement.inPlane)) > ALIKE) return 'in plane';
  if (Math.abs(dot(direction, angle.placement.outOfPlane)) > ALIKE) return 'out of plane';
  return 'askew to the plane';
}
