import type { Assessment } from '../../../core/assessment.ts';
import { along, type Vec2 } from '../../../core/geometry/vector.ts';
import type { CrossingId } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { TrailStep } from '../../../core/restraint/model.ts';
import { motionInk } from '../bowing/motionInk.ts';
import type { OverlayMotion } from '../bowing/overlayMotion.ts';
import { pushInk } from '../bowing/pushInk.ts';
import { stiffnessInk } from '../bowing/stiffnessInk.ts';
import { detailInk } from '../detail/detailInk.ts';
import { DETAIL_RADIUS, type DetailPlace, detailPlace, FIGURE_CAPTION } from '../detail/detailPlace.ts';
import { bowInk } from '../drawing/bowInk.ts';
import { scaleInk, triadInk } from '../drawing/cornerInk.ts';
import { dimensionInk, dimensionLine } from '../drawing/dimensionInk.ts';
import { endPlace } from '../drawing/endPlace.ts';
import { groundInk } from '../drawing/groundInk.ts';
import { holdInk } from '../drawing/holdInk.ts';
import { from, heading, type Ink, line, PLAQUE_HALF, wordsBox } from '../drawing/ink.ts';
import { lineNamesInk } from '../drawing/lineNamesInk.ts';
import { setOutInk } from '../drawing/setOutInk.ts';
import { trailInk } from '../drawing/trailInk.ts';
import { forcesInk } from '../forces/forcesInk.ts';
import type { ForcesShown } from '../forces/forcesShown.ts';
import { type Box, boxAbout, clipped } from '../view/box.ts';
import { onSheet, type SheetView } from '../view/sheetView.ts';
import { crossingPlaces } from './crossingPlaces.ts';
import { type LabelWish, labelPlaces } from './labelPlaces.ts';
import type { OverlayContent } from './overlayContent.ts';
import { ringSizes, WIDEST_RING } from './ringSize.ts';

export interface OverlayInput {
  readonly view: SheetView;
  readonly content: OverlayContent;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
  readonly trail: readonly TrailStep[] | null;
  /** What is computed to move, in place of the marks' bow; nothing where neither is wanted. */
  readonly moves: OverlayMotion;
  /** Whether what is offered at the stations is drawn there. */
  readonly stiffness: boolean;
  readonly removed: readonly CrossingId[];
  /** Forces, where they are drawn. */
  readonly forces: ForcesShown | null;
  /** Whether a figure is wanted in the stead of a crossing's detail. */
  readonly figure: boolean;
  /** How far the bow has grown, 0 to about 1; of a shape that swings, −1 to 1. */
  readonly grown: number;
  /** Of the labels as they stand on the page, px, by bar. */
  readonly sizes: ReadonlyMap<string, { readonly width: number; readonly height: number }>;
  /** Places that labels took last time, and the detail. */
  readonly previous: ReadonlyMap<string, number>;
  readonly previousDetail: number | null;
  readonly legend: { readonly width: number; readonly height: number };
}

/** Where a button stands, px from the upper left corner of the sheet; ends turn with their bar, degrees. */
export interface Place {
  readonly x: number;
  readonly y: number;
  readonly turn?: number;
  /** Across the ring of a crossing, px. */
  readonly ring?: number;
}

export interface OverlayLayout {
  readonly ink: readonly Ink[];
  /** By "crossing …", "label …", "end …"; what is missing is not shown. */
  readonly places: ReadonlyMap<string, Place>;
  readonly candidates: ReadonlyMap<string, number>;
  /** Where the detail stands and what is in it; null: it is not wanted, or there is no room. */
  readonly detail: (DetailPlace & { readonly faces: readonly Ink[] }) | null;
}

/** Half the room that a glyph takes, and the mark of an end, px. */
const GLYPH_HALF = 11;
const END_HALF = 6;
/** Labels keep this clear of the edges, px. */
const EDGE = 6;
/** Where a bar is drawn shorter than this its ends cannot be told apart, px. */
const SHORTEST_WITH_ENDS = 60;

/** Where there is no room for every label, the graver ones are kept. */
const WEIGHT: Readonly<Record<OverlayContent['diagonals'][number]['label']['status'], number>> = {
  over: 3,
  near: 2,
  unknown: 1,
  within: 0,
};

/** Lays everything over the steel out on the sheet, for one view of it. */
export function layOutOverlay(input: OverlayInput): OverlayLayout {
  const { view, content, units } = input;
  const places = new Map<string, Place>();
  const sheet: Box = { left: EDGE, top: EDGE, width: view.width - 2 * EDGE, height: view.height - 2 * EDGE };

  const glyphs = crossingPlaces(view, input.assessment.layout, content.crossings);
  const rings = ringSizes([...glyphs.values()]);
  [...glyphs].forEach(([id, [x, y]], index) => {
    const ring = rings[index] ?? WIDEST_RING;
    if (within(sheet, x, y)) places.set(`crossing ${id}`, { x, y, ring });
  });
  for (const [key, place] of ends(view, content)) if (within(sheet, place.x, place.y)) places.set(key, place);

  for (const { id } of input.forces?.placing?.nodes ?? []) {
    const at = input.assessment.layout.nodes.get(id)?.at;
    const [x, y] = at ? onSheet(view, at) : [-1, -1];
    if (at && within(sheet, x, y)) places.set(`node ${id}`, { x, y });
  }

  const marks = [
    ...[...glyphs.values()].map((at, index) =>
      boxAbout(at, (GLYPH_HALF * (rings[index] ?? WIDEST_RING)) / WIDEST_RING),
    ),
    ...[...places]
      .filter(([key]) => key.startsWith('end '))
      .map(([, { x, y }]) => boxAbout([x, y], END_HALF)),
  ];
  const steelInk = inkOf(input, marks);
  const inTheWay = [...marks, ...wordsIn(steelInk)];
  const wishes = content.diagonals.flatMap(({ bar, label }): readonly LabelWish[] => {
    const size = input.sizes.get(bar.id);
    const seen = clipped([onSheet(view, bar.from), onSheet(view, bar.to)], sheet);
    if (!size || seen === null) return [];
    return [
      {
        key: bar.id,
        ...size,
        bar: seen,
        must: bar.id === content.selected?.id,
        weight: WEIGHT[label.status],
      },
    ];
  });
  const labels = labelPlaces(wishes, inTheWay, dimensionLines(view, content), sheet, input.previous);
  const gone = input.removed.flatMap((id): Ink[] => {
    const at = glyphs.get(id);
    return at ? [{ kind: 'ring', key: `gone ${id}`, look: 'scene-gone', at, radius: 17 }] : [];
  });
  const leaders = [...labels].map(
    ([key, place]): Ink => ({
      kind: 'path',
      key: `leader ${key}`,
      look: 'scene-leader',
      d: line(place.onBar, place.onBox),
    }),
  );
  for (const [key, { box }] of labels) places.set(`label ${key}`, { x: box.left, y: box.top });
  const taken = [...inTheWay, ...[...labels.values()].map((place) => place.box)];
  const figure = figureOf(input, taken);
  if (figure !== null) places.set('figure', { x: figure.at[0], y: figure.at[1] });
  const detail = input.figure || input.forces !== null ? null : detailOf(input, taken, glyphs);
  return {
    ink: [
      ...steelInk,
      ...gone,
      ...leaders,
      ...(detail?.around ?? []),
      ...triadInk(view),
      ...scaleInk(view, units, input.legend),
    ],
    places,
    detail,
    candidates: new Map([...labels].map(([key, place]) => [key, place.candidate])),
  };
}

/** A clear place for the figure of the pushed place, with a line to it. */
function figureOf(
  { view, content, moves, figure, previousDetail, legend }: OverlayInput,
  inTheWay: readonly Box[],
): (DetailPlace & { readonly around: readonly Ink[] }) | null {
  if (!figure || moves.push === null) return null;
  const { bar, at } = moves.push;
  const of = onSheet(view, along(bar.from, bar.direction, at));
  const bars = content.steelLines.map(([a, b]) => [onSheet(view, a), onSheet(view, b)] as const);
  const taken = [...inTheWay, ...corners(view, legend)];
  const place = detailPlace(view, of, bars, taken, previousDetail, FIGURE_CAPTION);
  if (place === null) return null;
  const way = heading([place.at[0] - of[0], place.at[1] - of[1]]) ?? [1, 0];
  const d = line(from(of, way, GLYPH_HALF + 4), from(place.at, way, -DETAIL_RADIUS));
  return { ...place, around: [{ kind: 'path', key: 'figure leader', look: 'scene-leader', d }] };
}

function detailOf(
  { view, content, previousDetail, legend }: OverlayInput,
  inTheWay: readonly Box[],
  glyphs: ReadonlyMap<string, Vec2>,
): (DetailPlace & { readonly faces: readonly Ink[]; readonly around: readonly Ink[] }) | null {
  const { detail } = content;
  const glyph = detail === null ? undefined : glyphs.get(detail.crossing.id);
  if (detail === null || glyph === undefined) return null;
  const bars = content.steelLines.map(([a, b]) => [onSheet(view, a), onSheet(view, b)] as const);
  const place = detailPlace(view, glyph, bars, [...inTheWay, ...corners(view, legend)], previousDetail);
  if (place === null) return null;
  const [x, y] = place.at;
  const way = heading([x - glyph[0], y - glyph[1]]) ?? [1, 0];
  const words = (row: number, look: string, text: string): Ink => ({
    kind: 'words',
    key: `detail words ${row}`,
    look: `scene-words ${look}`,
    at: [x, y + DETAIL_RADIUS + 17 + 15 * row],
    anchor: 'middle',
    text,
  });
  return {
    ...place,
    faces: detailInk(detail, view, DETAIL_RADIUS),
    around: [
      {
        kind: 'path',
        key: 'detail leader',
        look: 'scene-leader',
        d: line(from(glyph, way, GLYPH_HALF + 4), from(place.at, way, -DETAIL_RADIUS)),
      },
      words(0, 'strong', detail.title),
      words(1, 'quiet', detail.note),
    ],
  };
}

/** The lower corners, where triad, scale and legend stand. */
function corners(view: SheetView, legend: OverlayInput['legend']): readonly Box[] {
  return [
    { left: 0, top: view.height - 70, width: 210, height: 70 },
    {
      left: view.width - legend.width - 14,
      top: view.height - legend.height - 14,
      width: legend.width + 14,
      height: legend.height + 14,
    },
  ];
}

function inkOf(input: OverlayInput, marks: readonly Box[]): readonly Ink[] {
  const { view, content, assessment, units, trail, grown, moves } = input;
  const { bay, selected, bow } = content;
  const isPushed = moves.push !== null;
  const { layout } = assessment;
  const dimensions = bay === null ? [] : dimensionInk(view, bay, units);
  const push = moves.push === null ? [] : pushInk(view, moves.push);
  const restraint = selected === null ? null : (assessment.diagonals.get(selected.id)?.restraint ?? null);
  return [
    ...(bay === null ? [] : groundInk(view, layout, bay)),
    ...(bay === null ? [] : setOutInk(view, layout, bay)),
    ...dimensions,
    ...(bay === null ? [] : lineNamesInk(view, layout, bay)),
    ...(trail === null
      ? []
      : trailInk(view, layout, trail, selected?.id ?? null, [...marks, ...wordsIn(dimensions)])),
    ...(selected === null || bow === null || isPushed || moves.motion !== null
      ? []
      : bowInk(view, selected, bow, grown)),
    ...(moves.motion === null
      ? []
      : motionInk(view, layout, moves.motion, isPushed ? 1 : grown, [...marks, ...wordsIn(push)])),
    ...(selected?.angle && input.stiffness
      ? stiffnessInk(
          view,
          selected,
          selected.angle,
          assessment.diagonals.get(selected.id)?.bowing?.stations ?? [],
        )
      : []),
    ...push,
    ...(input.forces === null || bay === null
      ? []
      : forcesInk(view, layout, bay, input.forces, selected?.id ?? null, units)),
    // A lit trail says what holds the bar, and where; the notes of the bow would lie on it.
    ...(selected?.angle && bow !== null && restraint !== null && trail === null && !isPushed
      ? holdInk(view, selected, selected.angle, restraint, bow, {
          inTheWay: [...marks, ...wordsIn(dimensions)],
          free: moves.motion === null,
        })
      : []),
  ];
}

function ends(view: SheetView, content: OverlayContent): readonly (readonly [string, Place])[] {
  return content.diagonals.flatMap(({ bar }) => {
    const i = onSheet(view, endPlace(bar, 'i'));
    const j = onSheet(view, endPlace(bar, 'j'));
    const run: Vec2 = [j[0] - i[0], j[1] - i[1]];
    if (Math.hypot(run[0], run[1]) < SHORTEST_WITH_ENDS) return [];
    const turn = (Math.atan2(run[1], run[0]) * 180) / Math.PI;
    return [
      [`end ${bar.id}:i`, { x: i[0], y: i[1], turn }],
      [`end ${bar.id}:j`, { x: j[0], y: j[1], turn }],
    ] as const;
  });
}

function within(sheet: Box, x: number, y: number): boolean {
  return x >= sheet.left && x <= sheet.left + sheet.width && y >= sheet.top && y <= sheet.top + sheet.height;
}

function dimensionLines(view: SheetView, { bay }: OverlayContent): readonly (readonly [Vec2, Vec2])[] {
  const lines = (bay?.dimensions ?? []).map((one) => dimensionLine(view, one));
  return lines.filter((one) => one !== null);
}

/** The room that words and numbers take. */
function wordsIn(inks: readonly Ink[]): readonly Box[] {
  return inks.flatMap((ink) => {
    if (ink.kind === 'words') return [wordsBox(ink)];
    return ink.kind === 'plaque' ? [boxAbout(ink.at, PLAQUE_HALF)] : [];
  });
}
