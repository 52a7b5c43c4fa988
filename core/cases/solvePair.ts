import { criticalLoad } from '../stability/criticalLoad.ts';
import { type PlanarBar, pairCriticalLoad, planarPair } from '../stability/pair.ts';
import type { PairCase, SolvedPair } from './model.ts';
import { pairInWords } from './modeWords.ts';

/** Loads that differ by less than this share are one. */
const SAME = 1e-7;

export function solvePair({ id, type, considered, partner, tensionShare }: PairCase): SolvedPair {
  const { factor, second } = pairCriticalLoad(planarPair(considered, partner, tensionShare), {
    second: true,
  });
  if (factor === null || second === null) throw new Error('a pair whose bar is pressed has a critical load');
  const effective = factor > 0 ? Math.PI * Math.sqrt(considered.EI / factor) : null;
  return {
    type,
    id,
    N: factor,
    secondN: second,
    effectiveLength: effective,
    K: effective === null ? null : effective / considered.length,
    says: pairInWords(whatMoves(factor, considered, partner, -tensionShare)),
  };
}

/** The crossing stays when one of the bars buckles at that load with the crossing held. */
function whatMoves(
  factor: number,
  considered: PlanarBar,
  partner: PlanarBar,
  pressing: number,
): Parameters<typeof pairInWords>[0] {
  if (factor === 0) return 'no load';
  if (Math.abs(heldLoad(considered) / factor - 1) < SAME) return 'bar alone';
  if (pressing > 0 && Math.abs(heldLoad(partner) / pressing / factor - 1) < SAME) return 'partner alone';
  return 'crossing moves';
}

/** Compression at which a bar buckles out of its plane with the crossing held there. */
function heldLoad({ length, EI, crossingAt, cut }: PlanarBar): number {
  if (cut) return (Math.PI ** 2 * EI) / Math.max(crossingAt, length - crossingAt) ** 2;
  const { bar } = planarPair({ length, EI, crossingAt, cut }, { length, EI, crossingAt, cut }, 0);
  const holds = [{ at: crossingAt, direction: bar.outOfPlane, stiffness: 'rigid' as const }];
  return criticalLoad({ ...bar.problem, holds }, { second: false }).N ?? Number.POSITIVE_INFINITY;
}
