import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { along, cross, dot, subtract } from '../../../core/geometry/vector.ts';
import { joinName } from '../../../core/layout/joinWords.ts';
import type { AngleBar, Bar, BarId, BayLayout, Crossing, Layout } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showLength } from '../../../core/units/quantity.ts';
import { anglePrisms } from '../geometry/angleParts.ts';
import { memberPrism } from '../geometry/memberParts.ts';
import { joinPrisms } from '../geometry/plateParts.ts';
import { endFaces, type Face, type Prism, sideFaces } from '../geometry/prism.ts';
import type { Paint } from '../geometry/steelPart.ts';

/** A crossing taken out of the drawing and drawn large, angles at their true size. */
export interface CrossingDetail {
  readonly crossing: Crossing;
  /** What the middle of the detail shows, and how far round it it reaches, mm. */
  readonly centre: Vec3;
  readonly reach: number;
  /** Out of the plane of the bay, to its near side. */
  readonly out: Vec3;
  /** In any order; painted by `layer`, farthest first. */
  readonly solids: readonly DetailSolid[];
  readonly title: string;
  readonly note: string;
}

export interface DetailSolid {
  readonly faces: readonly Face[];
  /** Distance from the set-out along `out`, mm. */
  readonly layer: number;
  readonly paint: Paint;
  readonly selected: boolean;
}

/** The detail reaches so many times the longer leg from its middle, and no less than so far, mm. */
const LEGS = 2.1;
const LEAST = 110;

/** So far for a cut bar, whose plate and ends are what one wants to see, mm. */
const PLATED = 320;

/** Across the flats and height of a bolt's head, mm: about an M16. */
const HEAD = 24;
const HEAD_HEIGHT = 10;

/** Which crossing to show large: the selected one; else one of the selected bar's, with another diagonal first, joined first. Null: none. */
export function crossingToShow(
  layout: Layout,
  bay: BayLayout | null,
  selectedCrossing: string | null,
  selectedBar: BarId | null,
): Crossing | null {
  const chosen = selectedCrossing === null ? undefined : layout.crossings.get(selectedCrossing);
  if (chosen) return chosen;
  if (bay === null || selectedBar === null) return null;
  const own = bay.crossings.flatMap((id) => {
    const crossing = layout.crossings.get(id);
    return crossing && (crossing.a === selectedBar || crossing.b === selectedBar) ? [crossing] : [];
  });
  const rank = (one: Crossing): number => (one.kind === 'diagonals' ? 0 : 2) + (one.join === null ? 1 : 0);
  return own.toSorted((a, b) => rank(a) - rank(b))[0] ?? null;
}

/** Builds the detail of a crossing; null where one of its bars has no steel. */
export function crossingDetail(
  layout: Layout,
  crossing: Crossing,
  selectedBar: BarId | null,
  units: UnitSystem,
): CrossingDetail | null {
  const a = layout.bars.get(crossing.a);
  const b = layout.bars.get(crossing.b);
  const bay = layout.bays.find((one) => one.id === crossing.bay);
  if (!a?.angle?.stock || !b || !bay) return null;
  const plane = bay.planes.find((one) => one.id === a.plane);
  const out = plane?.normal ?? a.angle.placement.outOfPlane;
  const leg = Math.max(a.angle.stock.outline.longLeg, b.angle?.stock?.outline.longLeg ?? 0);

  const bars = [
    ...barSolids(layout, bay, a, crossing, out, selectedBar, leg),
    ...barSolids(layout, bay, b, crossing, out, selectedBar, leg),
  ];
  if (bars.length < 2) return null;
  const plates = joinPrisms(layout, crossing, 'true').map(
    (prism): DetailSolid => ({
      faces: facesOf(prism),
      layer: layerOf(facesOf(prism), crossing.at, out),
      paint: 'plate',
      selected: false,
    }),
  );
  const middle = b.angle ? 0 : dot(b.offset, out) / 2;
  const lineReach = b.angle ? 0 : Math.abs(dot(b.offset, out)) / 2 + (b.member?.depth ?? 0) / 2 + leg;
  return {
    crossing,
    centre: along(crossing.at, out, middle),
    reach: Math.max(LEAST, LEGS * leg, lineReach, crossing.join?.kind === 'cut' ? PLATED : 0),
    out,
    solids: [...bars, ...plates, ...bolts(a, b, crossing, out)],
    title: `${a.mark} × ${b.mark}, true profile`,
    note: gapNote(crossing, units),
  };
}

/** A bar near the crossing. The leg on the gusset and the leg that stands out are separate solids, so that a bolt can lie between them. */
function barSolids(
  layout: Layout,
  bay: BayLayout,
  bar: Bar,
  crossing: Crossing,
  out: Vec3,
  selectedBar: BarId | null,
  leg: number,
): readonly DetailSolid[] {
  const at = bar.id === crossing.a ? crossing.onA : crossing.onB;
  const selected = bar.id === selectedBar;
  const shown = 5 * Math.max(leg, LEAST);
  const near = (prism: Prism): readonly Prism[] => {
    const from = Math.max(prism.from, at - shown);
    const to = Math.min(prism.to, at + shown);
    return to > from ? [{ ...prism, from, to }] : [];
  };
  const { angle } = bar;
  if (!angle) {
    const faces = near(memberPrism(layout, bay, bar)).flatMap(facesOf);
    return faces.length === 0 ? [] : [{ faces, layer: dot(bar.offset, out), paint: 'member', selected }];
  }
  const thickness = angle.stock?.outline.thickness ?? 0;
  const level = dot(angle.placement.heel, out);
  const side = Math.sign(standing(angle, out)) || 1;
  const faces = anglePrisms(bar, angle, 'true').flatMap(near).flatMap(facesOf);
  const far = (face: Face): boolean => (layerOf([face], crossing.at, out) - level) * side > thickness * 1.05;
  const flat = faces.filter((face) => !far(face));
  const stands = faces.filter(far);
  return [
    { faces: flat, layer: level + (side * thickness) / 2, paint: 'diagonal', selected },
    { faces: stands, layer: level + side * 3 * thickness, paint: 'diagonal', selected },
  ];
}

/** How the leg that stands out runs along `out`, −1 to 1. */
function standing(angle: AngleBar, out: Vec3): number {
  const direction = angle.spec.legInPlane === 'longer' ? angle.placement.x : angle.placement.y;
  return dot(direction, out);
}

/** Head and nut of a bolt at the crossing, outside whatever it holds together. */
function bolts(a: Bar, b: Bar, crossing: Crossing, out: Vec3): readonly DetailSolid[] {
  const kind = crossing.join?.kind;
  if (!a.angle || (kind !== 'bolted' && kind !== 'packed')) return [];
  const surfaces = [a, b].flatMap(({ angle }) => {
    if (!angle) return [];
    const level = dot(angle.placement.heel, out);
    return [level, level + standing(angle, out) * (angle.stock?.outline.thickness ?? 0)];
  });
  const x = a.direction;
  const y = cross(out, x);
  const hexagon = Array.from({ length: 6 }, (_, index): Vec2 => {
    const turn = (Math.PI / 3) * index;
    const radius = HEAD / Math.sqrt(3);
    return [radius * Math.cos(turn), radius * Math.sin(turn)];
  });
  const head = (from: number, to: number): DetailSolid => ({
    faces: facesOf({
      outline: hexagon,
      origin: crossing.at,
      x,
      y,
      axis: out,
      from,
      to,
      endAtFrom: true,
      endAtTo: true,
    }),
    layer: (from + to) / 2,
    paint: 'member',
    selected: false,
  });
  const [low, high] = [Math.min(...surfaces), Math.max(...surfaces)];
  return [head(high, high + HEAD_HEIGHT), head(low - HEAD_HEIGHT, low)];
}

function gapNote(crossing: Crossing, units: UnitSystem): string {
  if (crossing.kind !== 'diagonals') return joinName(crossing.join);
  if (crossing.clash) return 'they run into each other';
  if (crossing.gap < 0.5) return 'the legs touch';
  return `${showLength(crossing.gap, units, 'small')} between the legs`;
}

function facesOf(prism: Prism): readonly Face[] {
  return [...sideFaces(prism), ...endFaces(prism)];
}

/** Mean distance of faces from a place along `out`, mm. */
function layerOf(faces: readonly Face[], at: Vec3, out: Vec3): number {
  const corners = faces.flatMap((face) => face.corners);
  const sum = corners.reduce((total, corner) => total + dot(subtract(corner, at), out), 0);
  return corners.length === 0 ? 0 : sum / corners.length;
}
