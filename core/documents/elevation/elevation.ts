import { add, along, type Vec3 } from '../../geometry/vector.ts';
import type { Bar, BarId, BayLayout, Crossing, Layout, Plane } from '../../layout/model.ts';
import type { UnitSystem } from '../../project/model.ts';
import { showLength } from '../../units/quantity.ts';
import { type Markup, markup } from '../markup.ts';
import type { Status } from '../words.ts';
import { angleStrip, endTicks, jointPlate } from './angleStrip.ts';
import { dimensionLines } from './dimensions.ts';
import { type Box, drawnFlag, type Flag, placedFlags } from './flags.ts';
import { type JoinShape, joinGlyph } from './joinGlyph.ts';
import { levelMarks } from './levelMarks.ts';
import { memberStrip, seenWidth } from './memberStrip.ts';
import { closedPath } from './path.ts';
import { isHeldPoint, nodeMarks } from './supports.ts';
import {
  acrossOf,
  type ElevationView,
  type Extent,
  extentOf,
  type Point,
  type Room,
  toSheet,
  viewOf,
} from './view.ts';

/** One plane of a bay, to be drawn square-on. */
export interface ElevationSubject {
  readonly layout: Layout;
  readonly bay: BayLayout;
  readonly plane: Plane;
  /** How a diagonal stands to its limit, with its L/r as shown. */
  readonly standing: (bar: BarId) => { readonly status: Status; readonly figure: string };
  readonly units: UnitSystem;
}

export interface Elevation {
  readonly svg: Markup;
  /** 125 for 1 to 125 on paper. */
  readonly ratio: number;
  /** How many times their true width the angles are drawn. */
  readonly widened: number;
  /** px for a metre, for the scale bar. */
  readonly pxPerMetre: number;
  /** What is on the drawing, for its legend. */
  readonly joins: readonly JoinShape[];
  readonly sides: readonly ('near' | 'far')[];
  /** Whether points are marked as held, other than by foundations. */
  readonly heldPoints: boolean;
}

/** The plane of a bay as it will be built, with joins, dimensions and flags. */
export function elevation(subject: ElevationSubject, room: Room): Elevation {
  const { layout, bay, plane, units } = subject;
  const bars = barsOf(layout, bay).filter((bar) => bar.plane === plane.id);
  const extent = steelExtent(plane, bars);
  const view = viewOf(plane, extent, room);
  const diagonals = bars.filter((bar) => bar.angle !== null);
  const members = [...bars.filter((bar) => bar.angle === null), ...endOnMembers(layout, bay, plane, bars)];
  const crossings = crossingsOn(layout, bay, bars);
  const widened = wideningFor(diagonals, view);
  const strips = (side: 'near' | 'far') =>
    diagonals.map((bar) => (bar.angle?.side === side ? angleStrip(bar, bar.angle, view, widened) : null));
  const over = (bar: Bar): boolean => bar.role !== 'beam' && bar.role !== 'strut';
  const isLine = (bar: Bar): boolean => bar.line !== null;
  const glyphs = placedGlyphs(crossings, view);
  const size = drawingSize(view, extent, room);

  const flags = diagonals.map((bar): Flag => {
    const { status, figure } = subject.standing(bar.id);
    return { mark: bar.mark, status, figure, from: toSheet(view, bar.from), to: toSheet(view, bar.to) };
  });
  const clear = glyphs.map(({ at: [x, y] }): Box => ({ x: x - 10, y: y - 10, width: 20, height: 20 }));
  const captions = glyphs.flatMap(({ crossing, at: [x, y] }) => {
    const beside = glyphs.filter((other) => other.crossing.point === crossing.point).length - 1;
    return crossingCaption(crossing, [x + GLYPH * beside, y], layout, units) ?? [];
  });

  const svg = markup`<svg class="elevation" width="${size[0]}" height="${size[1]}" viewBox="0 0 ${size[0]} ${size[1]}" role="img" aria-label="Elevation of ${bay.id}">${strips('far')}${gussets(bay, plane, view)}${plates(crossings, layout, view, widened)}${members
    .filter((bar) => !over(bar))
    .map((bar) => memberStrip(bar, view))}${strips('near')}${members
    .filter((bar) => over(bar) && !isLine(bar))
    .map((bar) =>
      memberStrip(bar, view),
    )}${members.filter(isLine).map((bar) => [memberStrip(bar, view), lineName(bar, view)])}${dimensionLines(bay.dimensions, view, extent, units)}${levelMarks(bay.dimensions, view, extent, units)}${nodeMarks(nodesOf(bars), bay.id, layout, view)}${diagonals.map((bar) => bar.angle && endTicks(bar, bar.angle, view))}${glyphs.map(({ crossing, at }) => joinGlyph(shapeOf(crossing), at))}${captions.map(({ text, box }) => markup`<rect x="${box.x - 2}" y="${box.y}" width="${box.width}" height="${box.height}" fill="#fff"/><text x="${box.x}" y="${box.y + 12}">${text}</text>`)}${placedFlags(
    flags,
    [...clear, ...captions.map(({ box }) => box)],
    view.origin[0] + extent.right * view.scale + BESIDE,
  ).map(drawnFlag)}</svg>`;

  return {
    svg,
    ratio: view.ratio,
    widened,
    pxPerMetre: view.scale * 1000,
    joins: [...new Set(crossings.map(shapeOf))],
    sides: [...new Set(diagonals.flatMap((bar) => bar.angle?.side ?? []))],
    heldPoints: nodesOf(bars).some((id) => isHeldPoint(layout.nodes.get(id)?.supports[bay.id]?.kind)),
  };
}

function barsOf(layout: Layout, bay: BayLayout): readonly Bar[] {
  return bay.bars.flatMap((id) => layout.bars.get(id) ?? []);
}

/** Members of the bay that pierce the plane where one of its own bars ends: the chord behind a knee. */
function endOnMembers(layout: Layout, bay: BayLayout, plane: Plane, bars: readonly Bar[]): readonly Bar[] {
  const ends = new Set(nodesOf(bars));
  const byEnd = new Map<string, Bar>();
  for (const bar of barsOf(layout, bay)) {
    if (bar.plane === plane.id || bar.angle !== null || acrossOf(plane, bar.direction) !== null) continue;
    for (const end of [bar.i, bar.j])
      if (ends.has(end)) byEnd.set(end, { ...bar, from: nodeAt(layout, end, bar) });
  }
  return [...byEnd.values()];
}

function nodeAt(layout: Layout, node: string, bar: Bar): Bar['from'] {
  return layout.nodes.get(node)?.at ?? bar.from;
}

function nodesOf(bars: readonly Bar[]): readonly string[] {
  return [...new Set(bars.flatMap((bar) => [bar.i, bar.j]))];
}

function crossingsOn(layout: Layout, bay: BayLayout, bars: readonly Bar[]): readonly Crossing[] {
  const here = new Set(bars.map((bar) => bar.id));
  return bay.crossings
    .flatMap((id) => layout.crossings.get(id) ?? [])
    .filter(({ a, b }) => here.has(a) && here.has(b));
}

function steelExtent(plane: Plane, bars: readonly Bar[]): Extent {
  return extentOf(
    plane,
    bars.flatMap((bar) => [bar.from, bar.to, ...edgesOf(bar, plane)]),
  );
}

/** The corners of a member as it shows; of an angle, nothing beyond its set-out line. */
function edgesOf(bar: Bar, plane: Plane): readonly Vec3[] {
  const across = acrossOf(plane, bar.direction);
  const [from, to] = [add(bar.from, bar.offset), add(bar.to, bar.offset)];
  if (bar.member === null || across === null) return [from, to];
  const half = seenWidth(bar, bar.member, plane, across) / 2;
  return [from, to].flatMap((end) => [along(end, across, half), along(end, across, -half)]);
}

/** Angles narrower than this on the sheet are drawn at twice their width, px: hatching and the edge of a leg need it. */
const NARROW = 6;

function wideningFor(diagonals: readonly Bar[], view: ElevationView): number {
  const widths = diagonals.flatMap((bar) => (bar.angle?.stock ? [bar.angle.stock.outline.shortLeg] : []));
  return widths.length > 0 && Math.min(...widths) * view.scale < NARROW ? 2 : 1;
}

function drawingSize(view: ElevationView, extent: Extent, { margins }: Room): Point {
  return [
    Math.ceil((extent.right - extent.left) * view.scale + margins.left + margins.right),
    Math.ceil((extent.top - extent.bottom) * view.scale + margins.top + margins.bottom),
  ];
}

function gussets(bay: BayLayout, plane: Plane, view: ElevationView): readonly Markup[] {
  return bay.gussets
    .filter((gusset) => gusset.plane === plane.id)
    .map(
      ({ corners }) =>
        markup`<path class="gu" d="${closedPath(corners.map((corner) => toSheet(view, corner)))}"/>`,
    );
}

function plates(
  crossings: readonly Crossing[],
  layout: Layout,
  view: ElevationView,
  widened: number,
): readonly (Markup | null)[] {
  return crossings.map(({ join, a, b }) => {
    if (join?.kind !== 'cut') return null;
    const cut = [a, b].map((id) => layout.bars.get(id)).find((bar) => bar?.key === join.cutBar);
    return cut?.angle ? jointPlate(cut, cut.angle, view, widened) : null;
  });
}

/** At one point the unlike joins stand beside each other, the second to the right of the first. */
function placedGlyphs(
  crossings: readonly Crossing[],
  view: ElevationView,
): readonly { readonly crossing: Crossing; readonly at: Point }[] {
  const atPoint = new Map<string, JoinShape[]>();
  return crossings.flatMap((crossing) => {
    const before = atPoint.get(crossing.point) ?? [];
    if (before.includes(shapeOf(crossing))) return [];
    atPoint.set(crossing.point, [...before, shapeOf(crossing)]);
    const [x, y] = toSheet(view, crossing.at);
    return [{ crossing, at: [x + GLYPH * before.length, y] as const }];
  });
}

/** Between the steel and a column of flags, px. */
const BESIDE = 34;

/** From the middle of one glyph to that of the next beside it, px. */
const GLYPH = 17;

function shapeOf({ join }: Crossing): JoinShape {
  return join?.kind ?? 'unmarked';
}

function lineName(bar: Bar, view: ElevationView): Markup {
  const [x, y] = toSheet(view, add(bar.to, bar.offset));
  return markup`<text class="halo" x="${x + 9}" y="${y + 4}">${bar.mark}</text>`;
}

/** How far along the diagonals they cross: "3.66 m", or each with its mark where they differ. Purlins and rails have none. */
function crossingCaption(
  crossing: Crossing,
  [x, y]: Point,
  layout: Layout,
  units: UnitSystem,
): { readonly text: string; readonly box: Box } | null {
  if (crossing.kind !== 'diagonals') return null;
  const spoken = (mm: number): string => showLength(mm, units, 'spoken');
  const [a, b] = [crossing.a, crossing.b].map((id) => layout.bars.get(id)?.mark ?? '');
  const same = Math.abs(crossing.onA - crossing.onB) < 5;
  const text = same ? spoken(crossing.onA) : `${a} ${spoken(crossing.onA)}, ${b} ${spoken(crossing.onB)}`;
  return { text, box: { x: x + 14, y: y - 8, width: text.length * 6, height: 16 } };
}
