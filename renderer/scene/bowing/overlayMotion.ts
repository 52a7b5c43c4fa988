import { add, scale, type Vec2, type Vec3 } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar, Layout } from '../../../core/layout/model.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce, showMovement } from '../../../core/units/loads.ts';
import type { BayViewProps } from '../bayViewProps.ts';
import { barShape, bayShape, type DrawnMotion, placeMovement, pushMotion } from './drawnMotion.ts';
import type { ShownPush } from './pushInk.ts';
import type { PushShown } from './pushShown.ts';

/** What moves over the steel: a computed shape, or a push. */
export interface OverlayMotion {
  readonly motion: DrawnMotion | null;
  readonly push: ShownPush | null;
  /** Changes when another shape is shown, which then grows from the straight bar. */
  readonly key: string | null;
}

export function overlayMotion(
  layout: Layout,
  bar: Bar | null,
  { shape, push, units, bow }: Pick<BayViewProps, 'shape' | 'push' | 'units' | 'bow'>,
): OverlayMotion {
  if (bar?.angle == null) return { motion: null, push: null, key: null };
  if (push !== null) return { ...pushed(layout, bar, bar.angle, push, units), key: null };
  if (shape === null || !bow) return { motion: null, push: null, key: null };
  const key = `${bar.id} ${shape.kind}`;
  return shape.kind === 'bar'
    ? { motion: barShape(bar, shape.mode), push: null, key }
    : { motion: bayShape(layout, bar.id, shape.movement), push: null, key };
}

function pushed(
  layout: Layout,
  bar: Bar,
  angle: AngleBar,
  { at, test, force, most, times }: PushShown,
  units: UnitSystem,
): Pick<OverlayMotion, 'motion' | 'push'> {
  const movement: Vec3 = test === null ? [0, 0, 0] : placeMovement(test, force);
  return {
    motion: test === null ? null : pushMotion(layout, test, force, times),
    push: {
      bar,
      at,
      force: inSpace(angle, force),
      most,
      by: scale(movement, times),
      forceSays: showForce(Math.hypot(...force), units),
      movementSays: showMovement(Math.hypot(...movement), units),
    },
  };
}

function inSpace({ placement }: AngleBar, [x, y]: Vec2): Vec3 {
  return add(scale(placement.x, x), scale(placement.y, y));
}
