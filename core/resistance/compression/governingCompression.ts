import type { Resistance } from '../model.ts';
import { ECCENTRICITY_LEFT_OUT } from './compressionResistances.ts';

/** Note of a concentric check that a fulfilled rule for one leg would pass. */
const CAPPED =
  'The rule for one leg is met and allows more; the bar is not taken above what it carries through its centroid.';

/**
 * What a bar is judged by in compression; null where nothing gives a figure.
 *
 * - The rule for one leg where every condition of it is met, also where it is borrowed from another practice: it is the only one that counts with the eccentricity.
 *   The concentric checks cap it, both of them. Rules for one leg allow more than the centroid where they reckon with ends that do not turn (slender bars); that gain is
 *   not taken, since no one vouches for such ends here.
 * - Otherwise the lower concentric check. Its note says that the eccentricity is left out and a beam-column check still due.
 *   Where a condition stops being met (one bolt fewer, a slenderness past 200) this may be more than the rule gave just before: the caution then stands for what is missing.
 *
 * Both concentric checks count, the critical load and the lengths by the practice, so that a hold which one of them sees and the other does not never makes the bar stronger.
 */
export function governingCompression(resistances: readonly Resistance[]): Resistance | null {
  const given = resistances.filter((each) => each.against === 'compression' && each.applies);
  const oneLeg = leastOf(given.filter(({ kind }) => kind === 'compression, one leg'));
  const concentric = leastOf(given.filter(({ kind }) => kind !== 'compression, one leg'));
  if (!oneLeg || !concentric) return oneLeg ?? concentric;
  if (loadOf(oneLeg) <= loadOf(concentric)) return oneLeg;
  const note = concentric.note?.replace(ECCENTRICITY_LEFT_OUT, CAPPED) ?? CAPPED;
  return { ...concentric, note };
}

const loadOf = ({ resistance }: Resistance): number => resistance ?? Number.POSITIVE_INFINITY;

function leastOf(resistances: readonly Resistance[]): Resistance | null {
  return resistances.reduce<Resistance | null>(
    (least, each) => (each.resistance !== null && (!least || loadOf(each) < loadOf(least)) ? each : least),
    null,
  );
}
