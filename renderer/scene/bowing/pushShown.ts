import type { PushTest } from '../../../core/frame/pushing.ts';
import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { PushWay } from '../../store/push.ts';

/** A push on the chosen bar, ready to be drawn and to be changed by hand. */
export interface PushShown {
  /** mm from end i. */
  readonly at: number;
  /** Where a hand is led to, mm from end i, in order. */
  readonly places: readonly number[];
  readonly way: PushWay;
  /** Null while it is worked out. */
  readonly test: PushTest | null;
  /** Greatest force, N. */
  readonly most: number;
  /** N along the section's x and y. */
  readonly force: Vec2;
  /** Whether a hand has set the force; otherwise it is the greatest, shown for a start. */
  readonly byHand: boolean;
  /** How many times its size a movement is drawn. */
  readonly times: number;
}

export interface PushChange {
  readonly at?: number;
  readonly force?: Vec2;
}
