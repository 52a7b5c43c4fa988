import { type DesignatedSizes, designatedLegs, designatedSizes, designationKey } from './designation.ts';
import type { StockAngle } from './model.ts';

const AT_MOST = 5;
/** Share of letter pairs in common below which a designation is no help. */
const LEAST_LIKENESS = 0.25;

/**
 * Designations nearest to what was typed, best first, at most five: by legs and thickness when it reads as an angle (or the beginning of
 * one), by letters otherwise.
 *
 * @param preferred the angles suggested as a rule, in the order in which equals are preferred
 * @param all taken instead when what was typed is in inches and the preferred ones are not, or the other way round
 */
export function nearestDesignations(
  typed: string,
  preferred: readonly StockAngle[],
  all: readonly StockAngle[],
): readonly string[] {
  const sizes = designatedSizes(typed) ?? designatedLegs(typed);
  const scored = sizes ? bySizes(sizes, preferred, all) : byLetters(typed, preferred);
  const ordered = scored.toSorted((a, b) => a.far - b.far).map(({ angle }) => angle.designation);
  return [...new Set(ordered)].slice(0, AT_MOST);
}

interface Scored {
  readonly angle: StockAngle;
  /** 0 for the same. */
  readonly far: number;
}

type TypedSizes = Omit<DesignatedSizes, 'thickness'> & Partial<Pick<DesignatedSizes, 'thickness'>>;

function bySizes(
  sizes: TypedSizes,
  preferred: readonly StockAngle[],
  all: readonly StockAngle[],
): readonly Scored[] {
  const ofScale = (angles: readonly StockAngle[]): readonly StockAngle[] =>
    angles.filter((angle) => (angle.catalogue === 'us') === sizes.inches);
  const inScale = ofScale(preferred);
  return (inScale.length > 0 ? inScale : ofScale(all)).map((angle) => ({
    angle,
    far: distance(sizes, angle),
  }));
}

function byLetters(typed: string, angles: readonly StockAngle[]): readonly Scored[] {
  const key = designationKey(typed);
  return angles
    .map((angle) => ({ angle, far: 1 - likeness(key, designationKey(angle.designation)) }))
    .filter(({ far }) => far <= 1 - LEAST_LIKENESS);
}

/** Sum of the relative differences of legs and thickness; the thickness, wrong by a step, matters less than a wrong leg. */
function distance(sizes: TypedSizes, angle: StockAngle): number {
  const { longLeg, shortLeg, thickness } = designatedSizes(angle.designation) ?? angle.outline;
  const relative = (a: number, b: number): number => Math.abs(a - b) / Math.max(a, b);
  return (
    2 * relative(sizes.longLeg, longLeg) +
    2 * relative(sizes.shortLeg, shortLeg) +
    (sizes.thickness === undefined ? 0 : relative(sizes.thickness, thickness))
  );
}

/** Share of neighbouring letter pairs in common, 0 to 1 (Dice's coefficient). */
function likeness(a: string, b: string): number {
  const pairsA = pairs(a);
  const pairsB = pairs(b);
  if (pairsA.size + pairsB.size === 0) return a === b ? 1 : 0;
  const common = [...pairsA].filter((pair) => pairsB.has(pair)).length;
  return (2 * common) / (pairsA.size + pairsB.size);
}

function pairs(text: string): ReadonlySet<string> {
  return new Set(Array.from({ length: Math.max(0, text.length - 1) }, (_, i) => text.slice(i, i + 2)));
}
