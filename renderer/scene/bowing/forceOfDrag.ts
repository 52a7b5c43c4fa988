import { stiffnessAlong } from '../../../core/bowing/barProblems.ts';
import type { PushTest } from '../../../core/frame/pushing.ts';
import { dot, type Vec2 } from '../../../core/geometry/vector.ts';
import type { AngleBar } from '../../../core/layout/model.ts';
import type { PushWay } from '../../store/push.ts';
import { wayVector } from '../../store/pushing.ts';
import { directionOnSheet, type SheetView } from '../view/sheetView.ts';

export interface Grip {
  readonly view: SheetView;
  readonly angle: AngleBar;
  readonly test: PushTest;
  readonly way: PushWay;
  /** Greatest force, N. */
  readonly most: number;
  /** How many times its size a movement is drawn. */
  readonly times: number;
}

/** A direction is seen end on when it is foreshortened to less than this. */
const END_ON = 0.2;
/** Within this of a way by name, a push goes that way: the rule's own 10°. */
const ALIKE = Math.cos((10 * Math.PI) / 180);

/**
 * The force that takes the pushed place as far as the pointer has been dragged, in the direction of the drag, or the greatest force when
 * the way is too stiff for that: displacement asked for, as drawn, over displacement for one newton that way.
 *
 * @param drag px on the sheet
 * @returns N along the section's x and y; nothing while the place can move without resistance
 */
export function forceOfDrag(grip: Grip, drag: Vec2): Vec2 {
  const { view, angle, test, way, most, times } = grip;
  const wish = way === 'any way' ? anyWay(view, angle, drag) : oneWay(view, angle, way, drag);
  const far = Math.hypot(...wish);
  if (test.ellipse === null || far < 1e-9) return [0, 0];
  const direction = snapped([wish[0] / far, wish[1] / far], angle);
  const stiffness = stiffnessOf(test, direction);
  const force = Math.min(most, (far / times) * stiffness);
  return [direction[0] * force, direction[1] * force];
}

/** N/mm against being pushed in a direction of the section plane, the bar in place; 0 while the place moves freely. */
export function stiffnessOf(test: PushTest, direction: Vec2): number {
  return test.ellipse === null ? 0 : stiffnessAlong({ ellipse: test.ellipse }, direction);
}

/** A drag along one way, mm as drawn: by how far it follows that way on the sheet, or upwards for a way seen end on. */
function oneWay(view: SheetView, angle: AngleBar, way: PushWay, drag: Vec2): Vec2 {
  const direction = wayVector(way, angle);
  const [x, y] = axesOnSheet(view, angle);
  const on: Vec2 = [x[0] * direction[0] + y[0] * direction[1], x[1] * direction[0] + y[1] * direction[1]];
  const seen = Math.hypot(...on);
  const amount =
    seen < END_ON
      ? -drag[1] * towardsViewer(view, angle, direction)
      : (drag[0] * on[0] + drag[1] * on[1]) / seen ** 2;
  return [(direction[0] * amount) / view.pxPerMm, (direction[1] * amount) / view.pxPerMm];
}

/** A drag as a movement in the section plane, mm as drawn; where that plane is seen edge on, as near as can be seen. */
function anyWay(view: SheetView, angle: AngleBar, drag: Vec2): Vec2 {
  const [x, y] = axesOnSheet(view, angle);
  const area = x[0] * y[1] - x[1] * y[0];
  if (Math.abs(area) < END_ON)
    return [
      (drag[0] * x[0] + drag[1] * x[1]) / view.pxPerMm,
      (drag[0] * y[0] + drag[1] * y[1]) / view.pxPerMm,
    ];
  return [
    (drag[0] * y[1] - drag[1] * y[0]) / area / view.pxPerMm,
    (x[0] * drag[1] - x[1] * drag[0]) / area / view.pxPerMm,
  ];
}

/** The section's x and y on the sheet, as shares of their true length. */
function axesOnSheet(view: SheetView, { placement }: AngleBar): readonly [Vec2, Vec2] {
  const share = (direction: AngleBar['placement']['x']): Vec2 => {
    const [right, down] = directionOnSheet(view, direction);
    return [right / view.pxPerMm, down / view.pxPerMm];
  };
  return [share(placement.x), share(placement.y)];
}

function towardsViewer(view: SheetView, { placement }: AngleBar, [a, b]: Vec2): 1 | -1 {
  return a * dot(placement.x, view.towards) + b * dot(placement.y, view.towards) < 0 ? -1 : 1;
}

/** A hand cannot drag to the degree: near a way by name, that way is meant. */
function snapped(direction: Vec2, angle: AngleBar): Vec2 {
  for (const way of ['in plane', 'out of plane'] as const) {
    const [x, y] = wayVector(way, angle);
    const along = direction[0] * x + direction[1] * y;
    if (Math.abs(along) >= ALIKE) return along < 0 ? [-x, -y] : [x, y];
  }
  return direction;
}
