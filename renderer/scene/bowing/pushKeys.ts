import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { AngleBar } from '../../../core/layout/model.ts';
import { wayVector } from '../../store/pushing.ts';

/** What a key asks of a push. */
export type PushKey =
  | { readonly kind: 'place'; readonly step: 1 | -1 }
  | { readonly kind: 'force'; readonly inPlane: number; readonly outOfPlane: number };

/** One press with shift changes the force by this share of the greatest. */
const STEP = 0.1;

/** Left and right go from place to place; with shift, up and down push out of the plane, left and right in it. Null: another key. */
export function pushKey(key: string, shift: boolean): PushKey | null {
  switch (key) {
    case 'ArrowLeft':
      return shift ? { kind: 'force', inPlane: -STEP, outOfPlane: 0 } : { kind: 'place', step: -1 };
    case 'ArrowRight':
      return shift ? { kind: 'force', inPlane: STEP, outOfPlane: 0 } : { kind: 'place', step: 1 };
    case 'ArrowUp':
      return shift ? { kind: 'force', inPlane: 0, outOfPlane: STEP } : null;
    case 'ArrowDown':
      return shift ? { kind: 'force', inPlane: 0, outOfPlane: -STEP } : null;
    default:
      return null;
  }
}

/** The force after such a key, N along the section's x and y, no greater than the greatest. */
export function forceAfterKey(
  now: Vec2,
  { inPlane, outOfPlane }: Extract<PushKey, { kind: 'force' }>,
  most: number,
  angle: AngleBar,
): Vec2 {
  const a = wayVector('in plane', angle);
  const b = wayVector('out of plane', angle);
  const next: Vec2 = [
    now[0] + most * (inPlane * a[0] + outOfPlane * b[0]),
    now[1] + most * (inPlane * a[1] + outOfPlane * b[1]),
  ];
  const size = Math.hypot(...next);
  return size > most ? [(next[0] * most) / size, (next[1] * most) / size] : next;
}

/** The next of the places, in either direction, from where the push is now. */
export function placeAfterKey(places: readonly number[], now: number, step: 1 | -1): number {
  const beyond =
    step > 0 ? places.find((place) => place > now + 1) : places.findLast((place) => place < now - 1);
  return beyond ?? now;
}
