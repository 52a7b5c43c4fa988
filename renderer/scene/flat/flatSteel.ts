import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { dot, subtract } from '../../../core/geometry/vector.ts';
import type { Plane } from '../../../core/layout/model.ts';
import { endFaces, type Face, type Prism, pointOf, sideFaces } from '../geometry/prism.ts';
import type { Paint, SteelPart } from '../geometry/steelPart.ts';
import { toneOf } from '../view/light.ts';
import { nearness, onSheet, type SheetView } from '../view/sheetView.ts';

/** One solid drawn flat: faces that are seen, farthest first, as paths for each tone; in the order in which they are painted. */
export interface FlatPart {
  readonly part: SteelPart;
  readonly faces: readonly FlatFace[];
}

export interface FlatFace {
  readonly tone: 1 | 2 | 3;
  readonly d: string;
}

/**
 * The steel as flat polygons in the order to paint them, for sheets without WebGL. Plane by plane, the
 * farther one first; in each by how far a solid stands from the plane, then by distance: right for a bay, whose bars lie in layers; not
 * for any heap of solids.
 */
export function flatSteel(
  view: SheetView,
  parts: readonly SteelPart[],
  planes: readonly Plane[],
): readonly FlatPart[] {
  const inOrder = planes.toSorted((a, b) => nearness(view, a.origin) - nearness(view, b.origin));
  const rank = new Map(inOrder.map((plane, index) => [plane.id, index]));
  const byId = new Map(planes.map((plane) => [plane.id, plane]));
  const sorted = parts
    .map((part) => {
      const middle = middleOf(part.prism);
      return {
        part,
        plane: rank.get(part.plane) ?? 0,
        layer: layerOf(middle, byId.get(part.plane), view),
        near: nearness(view, middle),
      };
    })
    .toSorted((a, b) => a.plane - b.plane || a.layer - b.layer || a.near - b.near);
  return sorted.map(({ part }) => ({ part, faces: flatFaces(view, part.prism) }));
}

/** The faces of a prism that look towards the viewer, farthest first. */
export function flatFaces(view: SheetView, prism: Prism): readonly FlatFace[] {
  return [...sideFaces(prism), ...endFaces(prism)]
    .filter((face) => dot(face.normal, view.towards) > 1e-3)
    .map((face) => ({ face, near: nearness(view, centreOf(face)) }))
    .toSorted((a, b) => a.near - b.near)
    .map(({ face }) => ({
      tone: toneOf(face.normal, view),
      d: pathOf(face.corners.map((p) => onSheet(view, p))),
    }));
}

/** The middle line of a bar's steel, for its halo. */
export function spineOf(view: SheetView, parts: readonly SteelPart[]): string {
  const first = parts[0]?.prism;
  const last = parts.at(-1)?.prism;
  if (!first || !last) return '';
  const middle = sectionMiddle(first);
  return pathOf(
    [onSheet(view, pointOf(first, middle, first.from)), onSheet(view, pointOf(last, middle, last.to))],
    false,
  );
}

/** Class of a face in the style sheet. */
export function toneClass(paint: Paint, tone: 1 | 2 | 3, selected: boolean): string {
  return `scene-face ${selected ? 'selected' : paint} tone${tone}`;
}

/** Whole tenths of a metre would do for a bay; a millimetre keeps bars on either side of a gusset apart. */
function layerOf(middle: Vec3, plane: Plane | undefined, view: SheetView): number {
  if (!plane) return 0;
  const facing = Math.sign(dot(plane.normal, view.towards)) || 1;
  return Math.round(dot(subtract(middle, plane.origin), plane.normal)) * facing;
}

function middleOf(prism: Prism): Vec3 {
  return pointOf(prism, sectionMiddle(prism), (prism.from + prism.to) / 2);
}

function sectionMiddle(prism: Prism): Vec2 {
  const n = prism.outline.length;
  return [
    prism.outline.reduce((sum, p) => sum + p[0], 0) / n,
    prism.outline.reduce((sum, p) => sum + p[1], 0) / n,
  ];
}

function centreOf(face: Face): Vec3 {
  const n = face.corners.length;
  const sum = face.corners.reduce(
    (total, p) => [total[0] + p[0], total[1] + p[1], total[2] + p[2]] as Vec3,
    [0, 0, 0],
  );
  return [sum[0] / n, sum[1] / n, sum[2] / n];
}

function pathOf(points: readonly Vec2[], closed = true): string {
  const body = points
    .map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${x.toFixed(1)} ${y.toFixed(1)}`)
    .join('');
  return closed ? `${body}Z` : body;
}
