/** Walls of tubes: how slender they may be and still yield before they buckle. From memory, verify. */
import type { CompressionQuestion, Steel } from '../model.ts';
import type { Working } from '../working.ts';

export interface WallLimit {
  /** Most D/t, or (side − 3t)/t. */
  readonly most: (steel: Steel) => number;
  readonly says: string;
}

export interface WallLimits {
  readonly round: WallLimit;
  readonly square: WallLimit;
}

/** Beyond the limit no rule is held here for what is left of the wall. */
export function requireStoutWall(
  { section, steel }: CompressionQuestion,
  limits: WallLimits,
  working: Working,
): void {
  const { shape, connectedLeg: across, thickness: t } = section;
  if (shape !== 'round tube' && shape !== 'square tube') return;
  const round = shape === 'round tube';
  const slender = round ? across / t : (across - 3 * t) / t;
  const { most, says } = round ? limits.round : limits.square;
  working.requires(
    `${round ? 'D/t' : '(side − 3t)/t'} not above ${says} = ${most(steel).toFixed(1)}: a thinner wall buckles before it yields`,
    slender <= most(steel) * (1 + 1e-9),
    slender.toFixed(1),
  );
}
