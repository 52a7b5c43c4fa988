import type { Vec2 } from '../../../core/geometry/vector.ts';
import { dot } from '../../../core/geometry/vector.ts';
import { type Ink, polyline } from '../drawing/ink.ts';
import { toneClass } from '../flat/flatSteel.ts';
import { toneOf } from '../view/light.ts';
import { nearness, onSheet, type SheetView } from '../view/sheetView.ts';
import type { CrossingDetail } from './crossingDetail.ts';

/** The faces of a detail as the main view sees them, in a circle of `radius` px about (0, 0). */
export function detailInk(detail: CrossingDetail, main: SheetView, radius: number): readonly Ink[] {
  const view: SheetView = {
    ...main,
    centre: detail.centre,
    pxPerMm: radius / detail.reach,
    width: 0,
    height: 0,
  };
  const facing = dot(detail.out, view.towards) < 0 ? -1 : 1;
  const solids = detail.solids.toSorted((a, b) => (a.layer - b.layer) * facing);
  return solids.flatMap((solid, s) =>
    solid.faces
      .filter((face) => dot(face.normal, view.towards) > 1e-3)
      .map((face) => ({ face, near: Math.max(...face.corners.map((corner) => nearness(view, corner))) }))
      .toSorted((a, b) => a.near - b.near)
      .map(
        ({ face }, f): Ink => ({
          kind: 'path',
          key: `detail ${s} ${f}`,
          look: toneClass(solid.paint, toneOf(face.normal, view), solid.selected),
          d: polyline(
            face.corners.map((corner): Vec2 => onSheet(view, corner)),
            true,
          ),
        }),
      ),
  );
}
