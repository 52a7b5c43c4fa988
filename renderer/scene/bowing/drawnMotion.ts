/** How bars are drawn moved away from their lines: a computed shape, or what a push does. The amounts are core's; only the size of the drawing is chosen here. */
import type { BarMovement, PushTest } from '../../../core/frame/pushing.ts';
import { add, along, scale, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { Bar, BarId, Layout } from '../../../core/layout/model.ts';
import type { ModeInSpace } from '../../../core/study/model.ts';

export interface DrawnMotion {
  /** A shape has no size of its own, and may swing; a push has one, drawn so many times larger. */
  readonly kind: 'shape' | 'push';
  readonly lines: readonly MotionLine[];
}

export interface MotionLine {
  readonly bar: BarId;
  /** Whether it is the chosen bar, drawn in full. */
  readonly chosen: boolean;
  readonly points: readonly MovedPoint[];
}

export interface MovedPoint {
  /** On the set-out line, mm. */
  readonly on: Vec3;
  /** Away from it as drawn, mm. */
  readonly by: Vec3;
}

/** Largest displacement of a drawn shape over the length of its bar. */
const RISE = 0.08;

/** The computed shape of one bar. */
export function barShape(bar: Bar, mode: ModeInSpace): DrawnMotion {
  const rise = RISE * bar.length;
  return {
    kind: 'shape',
    lines: [
      {
        bar: bar.id,
        chosen: true,
        points: mode.points.map(({ at, displacement }) => ({
          on: along(bar.from, bar.direction, at),
          by: scale(displacement, rise),
        })),
      },
    ],
  };
}

/** The computed shape of a whole bay. */
export function bayShape(layout: Layout, chosen: BarId, movement: readonly BarMovement[]): DrawnMotion {
  const most = largest(movement);
  const rise = RISE * (layout.bars.get(chosen)?.length ?? 0);
  return { kind: 'shape', lines: movedLines(layout, chosen, movement, most > 0 ? rise / most : 0) };
}

/**
 * What a push does, drawn so many times its size.
 * @param force N along the section's x and y
 */
export function pushMotion(layout: Layout, test: PushTest, force: Vec2, times: number): DrawnMotion {
  return { kind: 'push', lines: movedLines(layout, test.bar, pushedMovement(test, force), times) };
}

/** The movement of every bar under a force on the pushed place, mm: the answers to one newton, scaled and added. */
export function pushedMovement(test: PushTest, [fx, fy]: Vec2): readonly BarMovement[] {
  return test.alongX.map(({ bar, points }) => {
    const other = test.alongY.find((each) => each.bar === bar)?.points ?? [];
    return {
      bar,
      points: points.map(({ at, displacement }, k) => ({
        at,
        displacement: add(scale(displacement, fx), scale(other[k]?.displacement ?? [0, 0, 0], fy)),
      })),
    };
  });
}

/** How the pushed place itself moves under a force, mm in space. */
export function placeMovement(test: PushTest, force: Vec2): Vec3 {
  const own = pushedMovement(test, force).find(({ bar }) => bar === test.bar)?.points ?? [];
  const nearest = own.reduce<(typeof own)[number] | null>(
    (best, point) =>
      best === null || Math.abs(point.at - test.at) < Math.abs(best.at - test.at) ? point : best,
    null,
  );
  return nearest?.displacement ?? [0, 0, 0];
}

function movedLines(
  layout: Layout,
  chosen: BarId,
  movement: readonly BarMovement[],
  times: number,
): readonly MotionLine[] {
  return movement.flatMap(({ bar: id, points }): readonly MotionLine[] => {
    const bar = layout.bars.get(id);
    if (!bar) return [];
    return [
      {
        bar: id,
        chosen: id === chosen,
        points: points.map(({ at, displacement }) => ({
          on: along(bar.from, bar.direction, at),
          by: scale(displacement, times),
        })),
      },
    ];
  });
}

function largest(movement: readonly BarMovement[]): number {
  return Math.max(0, ...movement.flatMap(({ points }) => points.map((p) => Math.hypot(...p.displacement))));
}
