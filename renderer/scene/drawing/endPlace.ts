import type { Vec3 } from '../../../core/geometry/vector.ts';
import { along } from '../../../core/geometry/vector.ts';
import type { Bar } from '../../../core/layout/model.ts';

/** Inside the end of the steel, about the middle of the connection, mm. */
const INSIDE = 70;
/** Of a bar with no steel drawn, the part of its length at which its ends are marked. */
const PART = 0.08;

/** Where an end of a bar is marked: on the steel, at its connection, and clear of the set-out point that it shares with others. */
export function endPlace(bar: Bar, end: 'i' | 'j'): Vec3 {
  const cut = bar.angle?.cut;
  const steel = cut !== undefined && cut.total > 4 * INSIDE;
  const fromI = steel ? cut.startsAt + INSIDE : PART * bar.length;
  const fromJ = steel ? cut.endsBefore + INSIDE : PART * bar.length;
  return along(bar.from, bar.direction, end === 'i' ? fromI : bar.length - fromJ);
}
