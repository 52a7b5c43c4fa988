import { type DesignatedSizes, designatedSizes, designationKey } from './designation.ts';
import type { CatalogueId, Catalogues, FoundAngle, OwnAngle, Stock, StockAngle } from './model.ts';
import { nearestDesignations } from './nearest.ts';
import { ownStockAngle } from './ownAngle.ts';

const CATALOGUE_ORDER: readonly CatalogueId[] = ['en', 'us', 'au'];

/** How far a typed size may be off, mm: decimals of a metric size; 0.005 in of a rounded decimal inch ("0.313" for 5/16). */
const SAME_SIZE = { metric: 0.05, inches: 0.127 };

/**
 * The angles a project may use. `find` looks for the very designation first (own list, then the chosen catalogue, then the others), so that
 * "90x90x8EA" is the Australian angle whatever catalogue is chosen; then by sizes in the same order. A nominal thickness finds the angle
 * that carries it in its name. Own rows whose dimensions make no angle are left out, and of two with one designation the first counts.
 */
export function stockOf(chosen: CatalogueId, own: readonly OwnAngle[], catalogues: Catalogues): Stock {
  const ownAngles = own.flatMap((row) => {
    const made = ownStockAngle(row);
    return made.ok ? [made.angle] : [];
  });
  const choices = [...ownAngles, ...catalogues[chosen].angles];
  const others = CATALOGUE_ORDER.filter((id) => id !== chosen).flatMap((id) => catalogues[id].angles);
  const all = [...choices, ...others];
  const byKey = new Map<string, StockAngle>();
  for (const angle of all) {
    const key = designationKey(angle.designation);
    if (!byKey.has(key)) byKey.set(key, angle);
  }
  // Thousands of bars name the same few sections; only what is not a plain designation is searched for, and once.
  const searched = new Map<string, FoundAngle>();
  const find = (typed: string): FoundAngle => {
    const exact = byKey.get(designationKey(typed));
    if (exact) return { ok: true, angle: exact };
    const known = searched.get(typed);
    if (known) return known;
    const found = search(typed, choices, all);
    searched.set(typed, found);
    return found;
  };
  return { find, choices };
}

function search(typed: string, choices: readonly StockAngle[], all: readonly StockAngle[]): FoundAngle {
  const sizes = designatedSizes(typed);
  if (sizes) {
    const angle = all.find((a) => isNamed(a, sizes)) ?? all.find((a) => measures(a, sizes));
    if (angle) return { ok: true, angle };
  }
  return { ok: false, typed, nearest: nearestDesignations(typed, choices, all) };
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
