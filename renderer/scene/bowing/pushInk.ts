import { add, along, scale, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { Bar } from '../../../core/layout/model.ts';
import { arrowHead, from, heading, type Ink, line } from '../drawing/ink.ts';
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
  const long = SHORTEST + (LONGEST - SHORTEST) * Math.min(1, size / push.most);
  const tip = from(to, way, long + 9);
  return [
    {
      kind: 'path',
      key: 'push shaft',
      look: 'scene-push-shaft',
      d: line(from(to, way, 8), from(tip, way, -9)),
    },
    { kind: 'path', key: 'push head', look: 'scene-solid', d: arrowHead(tip, way) },
    {
      kind: 'words',
      key: 'push force',
      look: 'scene-words strong',
      at: [
        tip[0] + (way[0] < -0.3 ? -6 : way[0] > 0.3 ? 6 : 0),
        tip[1] + (way[1] > 0.5 ? 16 : way[1] < -0.5 ? -8 : 4),
      ],
      anchor: way[0] < -0.3 ? 'end' : way[0] > 0.3 ? 'start' : 'middle',
      text: says,
    },
  ];
}
