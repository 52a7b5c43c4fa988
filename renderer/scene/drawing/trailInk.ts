import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, distance } from '../../../core/geometry/vector.ts';
import type { Bar, BarId, Layout } from '../../../core/layout/model.ts';
import type { TrailStep } from '../../../core/restraint/model.ts';
import { type Box, boxAbout, inside, overlap } from '../view/box.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import {
  across,
  arrowHead,
  from,
  heading,
  type Ink,
  line,
  minus,
  PLAQUE_HALF,
  plus,
  span,
  times,
  wordsBox,
} from './ink.ts';

/** An arrow head about every so many px of a leg. */
const HEAD_EVERY = 90;
/** Half the stop bar at the support that a trail ends at, px. */
const STOP = 12;
/** A longer text than this stays in the panel, unless it is where the trail ends. */
const SHORT = 30;
/** A stretch shorter than this on the sheet carries no number, px. */
const SHORTEST_NUMBERED = 60;

/** A stretch along a bar. `step` null: the other half of a bar that an earlier step has named. */
interface Leg {
  readonly step: number | null;
  readonly a: Vec3;
  readonly b: Vec3;
  /** Ends where it is held: a stop bar is drawn. */
  readonly held: boolean;
  /** Leads nowhere: the bar slides along itself. */
  readonly free: boolean;
}

/** A trail in space: its stretches, and the places that carry a number. */
interface TrailPlan {
  readonly legs: readonly Leg[];
  readonly marks: readonly { readonly step: number; readonly at: Vec3 }[];
}

/**
 * The way from a hold to its supports: a heavy line with arrows along the bars, numbered steps, a stop bar where it ends held; a dashed
 * double arrow where the holder is itself free to slide.
 *
 * @param inTheWay what the words of the steps should not cover; those without room are left to the panel
 */
export function trailInk(
  view: SheetView,
  layout: Layout,
  trail: readonly TrailStep[],
  heldBar: BarId | null,
  inTheWay: readonly Box[],
): readonly Ink[] {
  const plan = trailPlan(layout, trail, heldBar);
  const lines = plan.legs.map((leg) => ({ ...leg, p: onSheet(view, leg.a), q: onSheet(view, leg.b) }));
  return [
    ...lines.map(
      ({ p, q }, index): Ink => ({
        kind: 'path',
        key: `trail band ${index}`,
        look: 'scene-trail-band',
        d: line(p, q),
      }),
    ),
    ...lines.flatMap(({ p, q, free }, index) => (free ? slide(index, p, q) : run(index, p, q))),
    ...lines.flatMap(({ p, q, held }, index) => (held ? stopBar(index, p, q) : [])),
    ...plaques(view, trail, plan, inTheWay),
  ];
}

/** Steps come as bar, node, bar, node…; after a node that is held a second branch may begin at the other end of the first bar. */
function trailPlan(layout: Layout, trail: readonly TrailStep[], heldBar: BarId | null): TrailPlan {
  const legs: Leg[] = [];
  const marks: { readonly step: number; readonly at: Vec3 }[] = [];
  const start = startOf(layout, trail, heldBar);
  const firstBar = trail.map((step) => layout.bars.get(step.bar ?? '')).find((bar) => bar !== undefined);
  let here = start;
  for (const [index, step] of trail.entries()) {
    const node = layout.nodes.get(step.node ?? '');
    if (node) {
      const branches = trail[index - 1]?.state === 'held' && start !== null && firstBar !== undefined;
      if (branches) legs.push(legAlong(firstBar, null, start, node.at, step.state));
      here = node.at;
      marks.push({ step: index, at: node.at });
      continue;
    }
    const bar = layout.bars.get(step.bar ?? '');
    if (!bar) continue;
    const origin = here ?? bar.from;
    const next = trail.slice(index + 1).find((one) => one.node !== null);
    const onwards = layout.nodes.get(next?.node ?? '')?.at;
    // With no node to go to, the bar leads to its own end that is farther off.
    const end = onwards ?? (distance(origin, bar.from) > distance(origin, bar.to) ? bar.from : bar.to);
    if (trail[index - 1]?.bar === step.bar) {
      // A second word on the same bar: what becomes of it at its end.
      marks.push({ step: index, at: add(end, bar.offset) });
      continue;
    }
    const state = next?.state ?? trail[index + 1]?.state ?? step.state;
    legs.push(legAlong(bar, index, origin, end, onwards ? state : state === 'free' ? 'free' : 'on the way'));
  }
  return { legs, marks };
}

function legAlong(bar: Bar, step: number | null, a: Vec3, b: Vec3, state: TrailStep['state']): Leg {
  return {
    step,
    a: add(a, bar.offset),
    b: add(b, bar.offset),
    held: state === 'held',
    free: state === 'free',
  };
}

/** Where the held bar meets the first bar of its trail; null when they do not meet at a crossing. */
function startOf(layout: Layout, trail: readonly TrailStep[], heldBar: BarId | null): Vec3 | null {
  const first = trail.find((step) => step.bar !== null)?.bar;
  if (heldBar === null || first === undefined) return null;
  for (const crossing of layout.crossings.values()) {
    const ends = [crossing.a, crossing.b];
    if (ends.includes(heldBar) && first !== null && ends.includes(first)) return crossing.at;
  }
  return null;
}

function run(index: number, a: Vec2, b: Vec2): readonly Ink[] {
  const way = heading(minus(b, a), 1);
  if (way === null) return [];
  const length = span(minus(b, a));
  const heads = Math.max(1, Math.floor(length / HEAD_EVERY));
  const d = Array.from({ length: heads }, (_, head) =>
    arrowHead(from(a, way, (length * (head + 1)) / (heads + 0.5)), way),
  ).join('');
  return [
    { kind: 'path', key: `trail line ${index}`, look: 'scene-trail', d: line(a, b) },
    { kind: 'path', key: `trail heads ${index}`, look: 'scene-solid', d },
  ];
}

/** A holder that slides: dashed, with a head at both ends. */
function slide(index: number, a: Vec2, b: Vec2): readonly Ink[] {
  const way = heading(minus(b, a), 1);
  if (way === null) return [];
  const reach = Math.min(110, span(minus(b, a)));
  const p = from(a, way, -reach);
  const q = from(a, way, reach);
  const back: Vec2 = [-way[0], -way[1]];
  return [
    { kind: 'path', key: `trail slide ${index}`, look: 'scene-slide', d: line(p, q) },
    {
      kind: 'path',
      key: `trail slide heads ${index}`,
      look: 'scene-free-head',
      d: arrowHead(q, way) + arrowHead(p, back),
    },
  ];
}

function stopBar(index: number, a: Vec2, b: Vec2): readonly Ink[] {
  const way = heading(minus(b, a), 1);
  if (way === null) return [];
  const side = across(way);
  const hatch = [-1, -0.5, 0, 0.5, 1].map((part) => {
    const foot = from(b, side, part * STOP);
    return line(foot, plus(foot, plus(times(way, 5), times(side, -3))));
  });
  return [
    {
      kind: 'path',
      key: `trail stop ${index}`,
      look: 'scene-hold',
      d: line(from(b, side, STOP), from(b, side, -STOP)),
    },
    { kind: 'path', key: `trail stop earth ${index}`, look: 'scene-earth strong', d: hatch.join('') },
  ];
}

function plaques(
  view: SheetView,
  trail: readonly TrailStep[],
  plan: TrailPlan,
  inTheWay: readonly Box[],
): readonly Ink[] {
  const alongBars = plan.legs.flatMap(({ step, a, b }): readonly { step: number; on: Vec2 }[] => {
    const [p, q] = [onSheet(view, a), onSheet(view, b)];
    // A short stretch has no room for a number of its own beside that of its end.
    return step === null || span(minus(q, p)) < SHORTEST_NUMBERED
      ? []
      : [{ step, on: times(plus(p, q), 0.5) }];
  });
  const atPlaces = plan.marks.map(({ step, at }) => ({ step, on: onSheet(view, at) }));
  const numbers = [...alongBars, ...atPlaces].map(({ step, on }) => ({ step, at: plus(on, [0, -18]) }));
  const taken: Box[] = [...inTheWay, ...numbers.map(({ at }) => boxAbout(at, PLAQUE_HALF))];
  const ink: Ink[] = numbers.map(({ step, at }) => ({
    kind: 'plaque',
    key: `trail step ${step}`,
    at,
    text: String(step + 1),
  }));
  const sheet: Box = { left: 4, top: 4, width: view.width - 8, height: view.height - 8 };
  // Where the trail ends matters most, and is placed first.
  for (const { step, at } of numbers.toSorted(
    (a, b) => Number(b.step === trail.length - 1) - Number(a.step === trail.length - 1),
  )) {
    const text = trail[step]?.text ?? '';
    if (text.length > SHORT && step !== trail.length - 1) continue;
    const words = (['start', 'end'] as const)
      .map(
        (anchor): Extract<Ink, { kind: 'words' }> => ({
          kind: 'words',
          key: `trail words ${step}`,
          look: 'scene-words',
          at: plus(at, [anchor === 'start' ? PLAQUE_HALF + 5 : -PLAQUE_HALF - 5, 4]),
          anchor,
          text,
        }),
      )
      .find((one) => inside(wordsBox(one), sheet) && taken.every((box) => overlap(box, wordsBox(one)) === 0));
    if (!words) continue;
    taken.push(wordsBox(words));
    ink.push(words);
  }
  return ink;
}
