import type { BarId } from '../layout/model.ts';
import type { Forces } from './model.ts';

export interface PartnerShare {
  /** Tension in the partner over compression in the bar; below 0 when both are squeezed. */
  readonly share: number;
  /** The combination in which it is so. */
  readonly state: string;
}

/** Compression below this share of a bar's greatest force says nothing of its bowing. */
const SMALL = 0.02;
/** A ratio beyond these is no worse and no better. */
const [LEAST, MOST] = [-1, 10];

/**
 * The least that a crossing's partner is pulled, over the compression of the bar, in any combination for strength that squeezes the bar; null where none does.
 * Forces of one and the same combination, so that no support is counted on that is slack when it is wanted.
 */
export function partnerShare(forces: Forces, bar: BarId, partner: BarId): PartnerShare | null {
  const strength = forces.states.filter(({ use }) => use === 'strength');
  const most = strength.reduce((top, state) => Math.max(top, Math.abs(state.forces.get(bar) ?? 0)), 0);
  let least: PartnerShare | null = null;
  for (const state of strength) {
    const squeezed = -(state.forces.get(bar) ?? 0);
    if (squeezed <= SMALL * most || squeezed <= 0) continue;
    const share = Math.min(MOST, Math.max(LEAST, (state.forces.get(partner) ?? 0) / squeezed));
    if (least === null || share < least.share) least = { share, state: state.id };
  }
  return least;
}
