import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import { add, along } from '../../../core/geometry/vector.ts';
import type { AngleBar, Bar } from '../../../core/layout/model.ts';
import type { AngleOutline } from '../../../core/section/model.ts';
import { outlinePolygon } from '../../../core/section/outlinePath.ts';
import type { Prism } from './prism.ts';
import type { AngleScale } from './steelPart.ts';

/** Two chords an arc: round enough at the sizes a bay is seen at. */
const STEPS_PER_ARC = 2;

/**
 * The pieces of an angle bar as they lie in the bay, one prism for each. A bar whose section is not in stock, or with no length
 * left between its ends, has none.
 */
export function anglePrisms(bar: Bar, angle: AngleBar, scale: AngleScale): readonly Prism[] {
  if (angle.stock === null) return [];
  const outline = drawnOutline(angle.stock.outline, scale);
  const { x, y } = angle.placement;
  const origin = add(bar.from, drawnHeel(angle, scale));
  return angle.cut.pieces
    .filter((piece) => piece.to > piece.from)
    .map((piece) => ({
      outline,
      origin,
      x,
      y,
      axis: bar.direction,
      from: piece.from,
      to: piece.to,
      endAtFrom: true,
      endAtTo: true,
    }));
}

/** Outlines made so far. Bars of one stock angle share theirs, and with it what is worked out from it. */
const drawn: Readonly<Record<AngleScale, WeakMap<AngleOutline, readonly Vec2[]>>> = {
  true: new WeakMap(),
  doubled: new WeakMap(),
};

function drawnOutline(outline: AngleOutline, scale: AngleScale): readonly Vec2[] {
  const made = drawn[scale].get(outline);
  if (made) return made;
  const times = scale === 'doubled' ? 2 : 1;
  const fresh = outlinePolygon(outline, STEPS_PER_ARC).map(([x, y]): Vec2 => [x * times, y * times]);
  drawn[scale].set(outline, fresh);
  return fresh;
}

/**
 * From the set-out line to the heel as drawn, mm. Doubled, the line of bolts stays on the set-out line and the leg stays on its face
 * of the gusset: only the distance from heel to bolts grows.
 */
export function drawnHeel(angle: AngleBar, scale: AngleScale): Vec3 {
  const { placement } = angle;
  return scale === 'true' ? placement.heel : along(placement.heel, legInPlane(angle), -placement.gauge);
}

/** Unit vector from the heel along the leg that lies on the gusset. */
export function legInPlane(angle: AngleBar): Vec3 {
  return angle.spec.legInPlane === 'longer' ? angle.placement.y : angle.placement.x;
}

/** Size of the leg that lies on the gusset, mm; 0 without a section. */
export function legInPlaneSize(angle: AngleBar): number {
  if (angle.stock === null) return 0;
  const { longLeg, shortLeg } = angle.stock.outline;
  return angle.spec.legInPlane === 'longer' ? longLeg : shortLeg;
}
