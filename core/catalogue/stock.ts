import { type DesignatedSizes, designatedSizes, designationKey } from './designation.ts';
import type { CatalogueId, Catalogues, FoundAngle, OwnAngle, Stock, StockAngle } from './model.ts';
import { nearestDesignations } from './nearest.ts';
import { ownStockAngle } from './ownAngle.ts';
import { shapeCalled } from './shapeDesignation.ts';

const CATALOGUE_ORDER: readonly CatalogueId[] = ['en', 'us', 'au'];

/** How far a typed size may be off, mm: decimals of a metric size; 0.005 in of a rounded decimal inch ("0.313" for 5/16). */
const SAME_SIZE = { metric: 0.05, inches: 0.127 };

/**
 * The angles a project may use. `find` takes, in this order:
 * 1. the very designation in the own list or the chosen catalogue;
 * 2. the very designation in another catalogue, if it carries that catalogue's mark: "90x90x8EA" is the Australian angle whatever is chosen;
 * 3. the sizes, own list first, then the chosen catalogue, then the others, so that a plain "90x90x8" is the chosen catalogue's. The
 *    thickness in the name counts before the actual one, where the two differ.
 * Own rows whose dimensions make no angle are left out, and of two with one designation the first counts.
 */
export function stockOf(chosen: CatalogueId, own: readonly OwnAngle[], catalogues: Catalogues): Stock {
  const ownAngles = own.flatMap((row) => {
    const made = ownStockAngle(row);
    return made.ok ? [made.angle] : [];
  });
  const choices = [...ownAngles, ...catalogues[chosen].angles];
  const others = CATALOGUE_ORDER.filter((id) => id !== chosen).flatMap((id) => catalogues[id].angles);
  const byKey = byDesignation([...choices, ...others.filter(({ designation }) => isMarked(designation))]);
  // Thousands of bars name the same few sections; only what is not a plain designation is searched for, and once.
  const searched = new Map<string, FoundAngle>();
  const find = (typed: string): FoundAngle => {
    const exact = byKey.get(designationKey(typed));
    if (exact) return { ok: true, angle: exact };
    const known = searched.get(typed) ?? shapeOrAngle(typed);
    searched.set(typed, known);
    return known;
  };
  const shapeOrAngle = (typed: string): FoundAngle => {
    const shape = shapeCalled(typed, (designation) => {
      const found = find(designation);
      return found.ok ? found.angle : null;
    });
    return shape ? { ok: true, angle: shape } : search(typed, choices, [...choices, ...others]);
  };
  return { find, choices };
}

function byDesignation(angles: readonly StockAngle[]): ReadonlyMap<string, StockAngle> {
  const found = new Map<string, StockAngle>();
  for (const angle of angles) {
    const key = designationKey(angle.designation);
    if (!found.has(key)) found.set(key, angle);
  }
  return found;
}

/** Whether a designation says more than sizes: "90x90x8EA", "L3X3X1/4", but not "90x90x8". */
function isMarked(designation: string): boolean {
  return /[A-WYZ]/.test(designationKey(designation));
}

function search(typed: string, choices: readonly StockAngle[], all: readonly StockAngle[]): FoundAngle {
  const sizes = designatedSizes(typed);
  const angle = sizes && (all.find((a) => isNamed(a, sizes)) ?? all.find((a) => measures(a, sizes)));
  return angle
    ? { ok: true, angle }
    : { ok: false, typed, nearest: nearestDesignations(typed, choices, all) };
}

function isNamed(angle: StockAngle, sizes: DesignatedSizes): boolean {
  const named = designatedSizes(angle.designation);
  return named !== null && named.inches === sizes.inches && agree(named, sizes, sizes.inches);
}

function measures(angle: StockAngle, sizes: DesignatedSizes): boolean {
  return agree(angle.outline, sizes, sizes.inches);
}

function agree(
  a: Pick<DesignatedSizes, 'longLeg' | 'shortLeg' | 'thickness'>,
  b: DesignatedSizes,
  inches: boolean,
): boolean {
  const same = inches ? SAME_SIZE.inches : SAME_SIZE.metric;
  return (
    Math.abs(a.longLeg - b.longLeg) <= same &&
    Math.abs(a.shortLeg - b.shortLeg) <= same &&
    Math.abs(a.thickness - b.thickness) <= same
  );
}
