import { radiusFor } from '../section/direction.ts';
import { type BowingBar, bareBar, lengthOf, planeWays, type Steel } from './barProblems.ts';
import { type Partner, pairLoad } from './bowing.ts';
import { loadOf } from './critical.ts';

export interface CurvePoint {
  readonly at: number;
  /** N. */
  readonly N: number;
}

/** Critical load of the bar against the tension in its partner over its own compression, from both compressed to fully taut. */
export function loadAgainstPartner(
  bar: BowingBar,
  partner: Partner,
  steel: Steel,
  steps = 40,
): readonly CurvePoint[] {
  return Array.from({ length: steps + 1 }, (_, k) => {
    const at = -1 + (2 * k) / steps;
    return { at, N: pairLoad(bar, { ...partner, tensionShare: at }, steel)?.N ?? 0 };
  });
}

export interface PositionPoint extends CurvePoint {
  /** By the rule, N. */
  readonly rule: number;
}

/** Critical load with one crossing, rigid in the plane, anywhere along the bar: exact, and by the rule. `at` is the share of the length. */
export function loadAgainstPosition(bar: BowingBar, steel: Steel, steps = 40): readonly PositionPoint[] {
  const bare = bareBar(bar, steel);
  const length = lengthOf(bar.restraint);
  const { inPlane, outOfPlane } = planeWays(bar);
  const { section } = bar;
  return Array.from({ length: steps - 1 }, (_, k) => {
    const at = (k + 1) / steps;
    const N = loadOf({ ...bare, holds: [{ at: at * length, direction: inPlane, stiffness: 'rigid' }] });
    const slenderness = Math.max(
      length / radiusFor(section, outOfPlane),
      (Math.max(at, 1 - at) * length) / section.rv,
    );
    return { at, N, rule: (Math.PI ** 2 * steel.E * section.area) / slenderness ** 2 };
  });
}
