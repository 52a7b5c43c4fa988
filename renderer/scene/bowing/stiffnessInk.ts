import type { StiffnessEllipse } from '../../../core/frame/push.ts';
import { along, type Vec2 } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import { halfAxis } from '../../glyphs/stiffnessScale.ts';
import { type Ink, polyline } from '../drawing/ink.ts';
import { directionOnSheet, onSheet, type SheetView } from '../view/sheetView.ts';

/** Half the length of the softest axis, px, however near the view comes. */
const REACH = 46;
const CHORDS = 40;

/** What is offered at the stations of a bar, as small ellipses in the plane of its section: long is soft, short is stiff. */
export function stiffnessInk(
  view: SheetView,
  bar: Bar,
  angle: AngleBar,
  stations: readonly { readonly at: number; readonly ellipse: StiffnessEllipse }[],
): readonly Ink[] {
  return stations.map(({ at, ellipse }): Ink => {
    const middle = onSheet(view, along(bar.from, bar.direction, at));
    const [sx, sy] = ellipse.stiffWay;
    const stiff = halfAxis(ellipse.stiff) * REACH;
    const soft = halfAxis(ellipse.soft) * REACH;
    const x = directionOnSheet(view, angle.placement.x);
    const y = directionOnSheet(view, angle.placement.y);
    const points = Array.from({ length: CHORDS }, (_, k): Vec2 => {
      const turn = (2 * Math.PI * k) / CHORDS;
      const [a, b] = [stiff * Math.cos(turn), soft * Math.sin(turn)];
      // The stiffer way and the one square to it, in the section plane.
      const [px, py] = [(a * sx - b * sy) / view.pxPerMm, (a * sy + b * sx) / view.pxPerMm];
      return [middle[0] + px * x[0] + py * y[0], middle[1] + px * x[1] + py * y[1]];
    });
    return { kind: 'path', key: `stiffness ${at}`, look: 'scene-stiffness', d: polyline(points, true) };
  });
}
