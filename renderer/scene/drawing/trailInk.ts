import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, distance } from '../../../core/geometry/vector.ts';
import type { BarId, Layout } from '../../../core/layout/model.ts';
import type { TrailStep } from '../../../core/restraint/model.ts';
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
} from './ink.ts';

/** An arrow head about every so many px of a leg. */
const HEAD_EVERY = 90;
/** Half the stop bar at the support that a trail ends at, px. */
const STOP = 12;
/** A longer text than this stays in the panel, unless it is where the trail ends. */
const SHORT = 30;

/** One step along a bar, or at a node, with where it is in space. */
type Leg =
  | { readonly kind: 'along'; readonly step: number; readonly a: Vec3; readonly b: Vec3 }
  | { readonly kind: 'at'; readonly step: number; readonly at: Vec3 };

/**
 * The way from a hold to its support: a heavy line with arrows along the bars, numbered steps, a stop bar where it ends held; a dashed
 * double arrow where the holder is itself free to slide.
 */
export function trailInk(
  view: SheetView,
  layout: Layout,
  trail: readonly TrailStep[],
  heldBar: BarId | null,
): readonly Ink[] {
  const legs = legsOf(layout, trail, heldBar);
  const held = trail.at(-1)?.state === 'held';
  const lines = legs
    .filter((leg) => leg.kind === 'along')
    .map((leg) => ({
      step: leg.step,
      a: onSheet(view, leg.a),
      b: onSheet(view, leg.b),
      free: trail[leg.step + 1]?.state === 'free' || trail[leg.step]?.state === 'free',
    }));
  const bands: Ink[] = lines.map(({ step, a, b }) => ({
    kind: 'path',
    key: `trail band ${step}`,
    look: 'scene-trail-band',
    d: line(a, b),
  }));
  const runs = lines.flatMap(({ step, a, b, free }) => (free ? slide(step, a, b) : run(step, a, b)));
  const lastLine = lines.at(-1);
  const stop = held && lastLine ? stopBar(lastLine.a, lastLine.b) : [];
  return [...bands, ...runs, ...stop, ...plaques(view, trail, legs)];
}

function legsOf(layout: Layout, trail: readonly TrailStep[], heldBar: BarId | null): readonly Leg[] {
  const legs: Leg[] = [];
  let here = startOf(layout, trail, heldBar);
  for (const [step, { bar: id, node: nodeId }] of trail.entries()) {
    const node = nodeId === null ? undefined : layout.nodes.get(nodeId);
    if (node) {
      here = node.at;
      legs.push({ kind: 'at', step, at: node.at });
      continue;
    }
    const bar = id === null ? undefined : layout.bars.get(id);
    if (!bar) continue;
    const nextNode = trail.slice(step + 1).find((one) => one.node !== null)?.node ?? null;
    const next = nextNode === null ? undefined : layout.nodes.get(nextNode)?.at;
    const start = here ?? bar.from;
    // With no node to go to, the bar leads to its own end that is farther off.
    const end = next ?? (distance(start, bar.from) > distance(start, bar.to) ? bar.from : bar.to);
    if (legs.some((leg) => leg.kind === 'along' && leg.b === end && leg.a === start)) continue;
    legs.push({ kind: 'along', step, a: add(start, bar.offset), b: add(end, bar.offset) });
  }
  return legs;
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

function run(step: number, a: Vec2, b: Vec2): readonly Ink[] {
  const way = heading(minus(b, a), 1);
  if (way === null) return [];
  const length = span(minus(b, a));
  const heads = Math.max(1, Math.floor(length / HEAD_EVERY));
  const d = Array.from({ length: heads }, (_, index) =>
    arrowHead(from(a, way, (length * (index + 1)) / (heads + 0.5)), way),
  ).join('');
  return [
    { kind: 'path', key: `trail line ${step}`, look: 'scene-trail', d: line(a, b) },
    { kind: 'path', key: `trail heads ${step}`, look: 'scene-solid', d },
  ];
}

/** A holder that slides: dashed, with a head at both ends. */
function slide(step: number, a: Vec2, b: Vec2): readonly Ink[] {
  const way = heading(minus(b, a), 1);
  if (way === null) return [];
  const reach = Math.min(110, span(minus(b, a)));
  const p = from(a, way, -reach);
  const q = from(a, way, reach);
  const back: Vec2 = [-way[0], -way[1]];
  return [
    { kind: 'path', key: `trail slide ${step}`, look: 'scene-slide', d: line(p, q) },
    {
      kind: 'path',
      key: `trail slide heads ${step}`,
      look: 'scene-free-head',
      d: arrowHead(q, way) + arrowHead(p, back),
    },
  ];
}

function stopBar(a: Vec2, b: Vec2): readonly Ink[] {
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
      key: 'trail stop',
      look: 'scene-hold',
      d: line(from(b, side, STOP), from(b, side, -STOP)),
    },
    { kind: 'path', key: 'trail stop earth', look: 'scene-earth strong', d: hatch.join('') },
  ];
}

function plaques(view: SheetView, trail: readonly TrailStep[], legs: readonly Leg[]): readonly Ink[] {
  return legs.flatMap((leg): readonly Ink[] => {
    const text = trail[leg.step]?.text ?? '';
    const on =
      leg.kind === 'at'
        ? onSheet(view, leg.at)
        : times(plus(onSheet(view, leg.a), onSheet(view, leg.b)), 0.5);
    const at = plus(on, [0, -18]);
    const number: Ink = { kind: 'plaque', key: `trail step ${leg.step}`, at, text: String(leg.step + 1) };
    if (text.length > SHORT && leg.step !== trail.length - 1) return [number];
    // Near the right edge the words stand before the number.
    const before = at[0] + PLAQUE_HALF + 7 * text.length > view.width - 8;
    return [
      number,
      {
        kind: 'words',
        key: `trail words ${leg.step}`,
        look: 'scene-words',
        at: plus(at, [before ? -PLAQUE_HALF - 5 : PLAQUE_HALF + 5, 4]),
        anchor: before ? 'end' : 'start',
        text,
      },
    ];
  });
}
