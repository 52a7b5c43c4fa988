/** The sheet of the section in place, px. */
import type { Vec2 } from '../../../core/geometry/vector.ts';

export const CENTRE: Vec2 = [112, 100];
export const RING = 84;
