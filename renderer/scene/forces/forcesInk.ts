import { scale, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { Bar, BayLayout, Layout } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce } from '../../../core/units/loads.ts';
import { across, arrowHead, from, heading, type Ink, line, minus, polyline, span } from '../drawing/ink.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';
import { type ForcesShown, isSlack, shownForce } from './forcesShown.ts';

/** Widths of a band for the least and the greatest force, px. */
const NARROW = 4;
const WIDE = 19;
/** Bands stay this far from the nodes, px. */
const CLEAR = 16;
/** Chevrons stand this far apart, px. */
const CHEVRON_EVERY = 46;
/** Below this, N, a bar carries nothing. */
const NOTHING = 1;

/**
 * Forces as they run through a bay: width is force; chevrons apart in a hollow band pull, chevrons together in a filled one squeeze; what is slack droops, dashed;
 * given loads are solid arrows, what supports answer hollow ones.
 */
export function forcesInk(
  view: SheetView,
  layout: Layout,
  bay: BayLayout,
  shown: ForcesShown,
  selected: string | null,
  units: UnitSystem,
): readonly Ink[] {
  const bars = bay.bars.flatMap((id) => layout.bars.get(id) ?? []).filter((bar) => !bar.line);
  const most = bars.reduce((top, { id }) => Math.max(top, Math.abs(shownForce(shown, id) ?? 0)), 1);
  return [
    ...bars.flatMap((bar) => barInk(view, bar.id === selected, bar, shown, most, units)),
    ...loadInk(view, layout, bay, shown, units),
    ...reactionInk(view, layout, bay, shown, units),
  ];
}

function barInk(
  view: SheetView,
  chosen: boolean,
  bar: Bar,
  shown: ForcesShown,
  most: number,
  units: UnitSystem,
): readonly Ink[] {
  const force = shownForce(shown, bar.id);
  if (force === null) return [];
  const [a, b] = [onSheet(view, bar.from), onSheet(view, bar.to)];
  const run = minus(b, a);
  const way = heading(run, 1);
  const length = span(run);
  if (way === null || length < 3 * CLEAR) return [];
  if (isSlack(shown, bar.id)) return [droop(bar, a, b, length)];
  if (Math.abs(force) < NOTHING) return [];
  const half = (NARROW + (WIDE - NARROW) * Math.sqrt(Math.abs(force) / most)) / 2;
  const side = across(way);
  const [start, end] = [from(a, way, CLEAR), from(b, way, -CLEAR)];
  const band = polyline(
    [from(start, side, half), from(end, side, half), from(end, side, -half), from(start, side, -half)],
    true,
  );
  const pulls = force > 0;
  const look = pulls ? 'pulled' : 'squeezed';
  const middle = length / 2;
  const chevrons: string[] = [];
  // A figure stands in the middle of members, a label beside diagonals.
  for (let s = CLEAR + 12; s < length - CLEAR - 6; s += CHEVRON_EVERY) {
    if (!bar.angle && Math.abs(s - middle) < 24) continue;
    const outwards = s > middle === pulls ? 1 : -1;
    chevrons.push(chevron(from(a, way, s), way, side, Math.min(half - 1, 6), outwards));
  }
  return [
    { kind: 'path', key: `band ${bar.id}`, look: `scene-band ${look}${chosen ? ' chosen' : ''}`, d: band },
    { kind: 'path', key: `chevrons ${bar.id}`, look: 'scene-chevron', d: chevrons.join('') },
    ...(bar.angle
      ? []
      : [
          {
            kind: 'words',
            key: `force ${bar.id}`,
            look: 'scene-words strong',
            at: [a[0] + run[0] / 2, a[1] + run[1] / 2 + 4],
            anchor: 'middle',
            text: showForce(Math.abs(force), units, 'bare'),
          } satisfies Ink,
        ]),
  ];
}

function chevron(at: Vec2, way: Vec2, side: Vec2, half: number, towards: 1 | -1): string {
  const size = Math.max(2.5, half);
  const back = from(at, way, -towards * size);
  return polyline([from(back, side, size), at, from(back, side, -size)]);
}

/** Hanging a little below its line as seen on the sheet. */
function droop(bar: Bar, a: Vec2, b: Vec2, length: number): Ink {
  const deep = Math.min(26, 0.07 * length);
  const middle: Vec2 = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2 + 2 * deep];
  const px = (v: number): string => v.toFixed(1);
  return {
    kind: 'path',
    key: `slack ${bar.id}`,
    look: 'scene-slack',
    d: `M${px(a[0])} ${px(a[1])}Q${px(middle[0])} ${px(middle[1])} ${px(b[0])} ${px(b[1])}`,
  };
}

/** An arrow is as long as this for the greatest, and never shorter than that, px. */
const LONGEST = 54;
const SHORTEST = 24;

function loadInk(
  view: SheetView,
  layout: Layout,
  bay: BayLayout,
  { given }: ForcesShown,
  units: UnitSystem,
): readonly Ink[] {
  const here = bay.nodes.flatMap((id) => {
    const at = layout.nodes.get(id)?.at;
    const force = given.get(id);
    return at && force && Math.hypot(...force) > NOTHING ? [{ id, at, force }] : [];
  });
  const most = here.reduce((top, { force }) => Math.max(top, Math.hypot(...force)), 1);
  return here.flatMap(({ id, at, force }) =>
    parts(force).flatMap((part, k) => arrow(view, `load ${id} ${k}`, at, part, most, 'given', units)),
  );
}

function reactionInk(
  view: SheetView,
  layout: Layout,
  bay: BayLayout,
  { states }: ForcesShown,
  units: UnitSystem,
): readonly Ink[] {
  const [only] = states;
  if (!only || states.length > 1) return [];
  const here = bay.nodes.flatMap((id) => {
    const at = layout.nodes.get(id)?.at;
    const force = only.reactions.get(id);
    return at && force ? [{ id, at, force }] : [];
  });
  const most = here.reduce((top, { force }) => Math.max(top, Math.hypot(...force)), 1);
  return here.flatMap(({ id, at, force }) =>
    parts(force).flatMap((part, k) => arrow(view, `reaction ${id} ${k}`, at, part, most, 'answered', units)),
  );
}

/** Level and upright apart, as people read them. */
function parts(force: Vec3): readonly Vec3[] {
  const level: Vec3 = [force[0], force[1], 0];
  const upright: Vec3 = [0, 0, force[2]];
  return [level, upright].filter((part) => Math.hypot(...part) > 50);
}

function arrow(
  view: SheetView,
  key: string,
  at: Vec3,
  force: Vec3,
  most: number,
  look: 'given' | 'answered',
  units: UnitSystem,
): readonly Ink[] {
  const size = Math.hypot(...force);
  const way = heading(directionOnSheet(view, scale(force, 1 / size)), 0.2 * view.pxPerMm);
  if (way === null) return [];
  const length = Math.max(SHORTEST, LONGEST * Math.sqrt(size / most));
  const tip = from(onSheet(view, at), way, -8);
  const tail = from(tip, way, -length);
  const words = from(tail, way, -6);
  const text = showForce(size, units, 'bare');
  const said: Ink = {
    kind: 'words',
    key: `${key} says`,
    look: 'scene-words strong',
    // Beside an upright arrow: over or under it stand bars and their figures.
    at: Math.abs(way[0]) > 0.5 ? [words[0], words[1] + 4] : [tail[0] + 9, tail[1] + (way[1] > 0 ? 10 : -2)],
    anchor: way[0] > 0.5 ? 'end' : 'start',
    text,
  };
  if (look === 'given')
    return [
      { kind: 'path', key: `${key} shaft`, look: 'scene-load', d: line(tail, from(tip, way, -7)) },
      { kind: 'path', key: `${key} head`, look: 'scene-load-head', d: arrowHead(tip, way) },
      said,
    ];
  const side = across(way);
  const neck = from(tip, way, -10);
  const outline = polyline(
    [
      from(tail, side, 2.5),
      from(neck, side, 2.5),
      from(neck, side, 6),
      tip,
      from(neck, side, -6),
      from(neck, side, -2.5),
      from(tail, side, -2.5),
    ],
    true,
  );
  return [{ kind: 'path', key, look: 'scene-reaction', d: outline }, said];
}
