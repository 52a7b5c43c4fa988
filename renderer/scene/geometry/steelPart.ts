import type { BarId } from '../../../core/layout/model.ts';
import type { Prism } from './prism.ts';

/** Which set of tones a part is drawn in. */
export type Paint = 'member' | 'diagonal' | 'plate';
export const PAINTS: readonly Paint[] = ['member', 'diagonal', 'plate'];

/** Angles are drawn true, or at twice their size on a set-out that stays true. */
export type AngleScale = 'true' | 'doubled';

/** One solid of the drawing. */
export interface SteelPart {
  readonly prism: Prism;
  readonly paint: Paint;
  readonly bay: string;
  /** Plane of the bay that it lies in. */
  readonly plane: string;
  /** The bar it is a piece of; null for gussets, packers, plates. */
  readonly bar: BarId | null;
}
