import type { Resistance } from '../model.ts';

/**
 * What a bar is judged by: the rule for one leg where every condition of it is met, but never above what the bar resists loaded through its centroid; else the
 * lowest of the concentric ones, whose note says that eccentricity is left out. The critical load stands before the lengths by the practice where it is known.
 */
export function governingCompression(resistances: readonly Resistance[]): Resistance | null {
  const of = (kind: Resistance['kind']): Resistance | null =>
    resistances.find((each) => each.kind === kind && each.resistance !== null) ?? null;
  const concentric = of('compression, critical load') ?? of('compression, lengths by the practice');
  const oneLeg = of('compression, one leg');
  if (!oneLeg) return concentric;
  if (!concentric) return oneLeg;
  return (concentric.resistance ?? 0) < (oneLeg.resistance ?? 0) ? concentric : oneLeg;
}
