/** A push on the chosen bar: where, which way, how hard. Not part of the project. */
import type { Vec2 } from '../../core/geometry/vector.ts';
import type { BarId } from '../../core/layout/model.ts';

export type PushWay = 'out of plane' | 'in plane' | 'any way';

export interface Pushing {
  /** The bar that place and force are meant for; they lapse when another is chosen. */
  readonly bar: BarId | null;
  /** mm from end i; null: where the bar is joined, or its middle. */
  readonly at: number | null;
  readonly way: PushWay;
  /** The greatest force, N; null: what moves the bar as far as makes sense. */
  readonly most: number | null;
  /** What pushes at present, N along the section's x and y; null: the greatest force, the way that is set. */
  readonly force: Vec2 | null;
}

export const NO_PUSH: Pushing = { bar: null, at: null, way: 'any way', most: null, force: null };
