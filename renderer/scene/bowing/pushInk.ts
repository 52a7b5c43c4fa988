import { add, along, scale, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { Bar } from '../../../core/layout/model.ts';
import { arrowHead, from, heading, type Ink, line, wordsBox } from '../drawing/ink.ts';
import { type Box, clipped, inside } from '../view/box.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';

export interface ShownPush {
  readonly bar: Bar;
  /** mm from end i. */
  readonly at: number;
  /** In space, N; its size against the greatest is the length of the arrow. */
  readonly force: Vec3;
  readonly most: number;
  /** Of the pushed place, as drawn, mm. */
  readonly by: Vec3;
  readonly forceSays: string;
  readonly movementSays: string;
}

/** The arrow at its longest and its shortest, px. */
const LONGEST = 58;
const SHORTEST = 16;
/** A force foreshortened to less than this is seen end on. */
const END_ON = 0.2;
/** Kept free along the edges of the sheet, px. */
const EDGE = 6;

/** The pushed place, where it has gone to, and the force as an arrow with its size. */
export function pushInk(view: SheetView, push: ShownPush): readonly Ink[] {
  const place = along(push.bar.from, push.bar.direction, push.at);
  const on = onSheet(view, place);
  const to = onSheet(view, add(place, push.by));
  const gone = Math.hypot(to[0] - on[0], to[1] - on[1]);
  return [
    ...(gone > 12
      ? [
          { kind: 'path', key: 'push way', look: 'scene-push-way', d: line(on, to) } satisfies Ink,
          {
            kind: 'words',
            key: 'push movement',
            look: 'scene-words motion',
            at: [to[0] + (to[0] < on[0] ? 4 : -4), to[1] - 11],
            anchor: to[0] < on[0] ? 'end' : 'start',
            text: push.movementSays,
          } satisfies Ink,
        ]
      : []),
    { kind: 'ring', key: 'push place', look: 'scene-push-place', at: to, radius: 5.5 },
    { kind: 'ring', key: 'push pip', look: 'scene-free-head', at: to, radius: 2 },
    ...arrow(view, push, to, gone),
  ];
}

function arrow(view: SheetView, push: ShownPush, to: Vec2, gone: number): readonly Ink[] {
  const size = Math.hypot(...push.force);
  if (size === 0) return [];
  const run = directionOnSheet(view, scale(push.force, 1 / size));
  const way = heading(run, END_ON * view.pxPerMm);
  const says = gone > 12 ? push.forceSays : `${push.forceSays}, ${push.movementSays}`;
  if (way === null)
    return [
      { kind: 'ring', key: 'push end on', look: 'scene-push-end-on', at: to, radius: 9 },
      {
        kind: 'words',
        key: 'push force',
        look: 'scene-words strong',
        at: [to[0], to[1] - 15],
        anchor: 'middle',
        text: says,
      },
    ];
  const sheet: Box = { left: EDGE, top: EDGE, width: view.width - 2 * EDGE, height: view.height - 2 * EDGE };
  const wished = SHORTEST + (LONGEST - SHORTEST) * Math.min(1, size / push.most) + 9;
  const long = Math.max(SHORTEST + 9, Math.min(wished, roomAlong(to, way, wished, sheet)));
  const tip = from(to, way, long);
  return [
    {
      kind: 'path',
      key: 'push shaft',
      look: 'scene-push-shaft',
      d: line(from(to, way, 8), from(tip, way, -9)),
    },
    { kind: 'path', key: 'push head', look: 'scene-solid', d: arrowHead(tip, way) },
    forceWords(tip, way, says, sheet),
  ];
}

/** How far an arrow can go before it leaves the sheet, px. */
function roomAlong(to: Vec2, way: Vec2, most: number, sheet: Box): number {
  const seen = clipped([to, from(to, way, most)], sheet);
  return seen === null ? most : Math.hypot(seen[1][0] - to[0], seen[1][1] - to[1]);
}

/** Beyond the arrow's head, or beside its shaft where that would be off the sheet. */
function forceWords(
  tip: Vec2,
  way: Vec2,
  text: string,
  sheet: Box,
): Extract<Ink, { readonly kind: 'words' }> {
  const words = { kind: 'words', key: 'push force', look: 'scene-words strong', text } as const;
  const beyond = {
    ...words,
    at: [
      tip[0] + (way[0] < -0.3 ? -6 : way[0] > 0.3 ? 6 : 0),
      tip[1] + (way[1] > 0.5 ? 16 : way[1] < -0.5 ? -8 : 4),
    ],
    anchor: way[0] < -0.3 ? 'end' : way[0] > 0.3 ? 'start' : 'middle',
  } as const;
  if (inside(wordsBox(beyond), sheet)) return beyond;
  const beside = from(tip, way, -12);
  const right = { ...words, at: [beside[0] + 9, beside[1] + 4], anchor: 'start' } as const;
  return inside(wordsBox(right), sheet)
    ? right
    : { ...right, at: [beside[0] - 9, beside[1] + 4], anchor: 'end' };
}
