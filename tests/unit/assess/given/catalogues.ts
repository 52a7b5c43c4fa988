/** The stock lists as they are shipped. */
import au from '../../../../assets/catalogues/au.json' with { type: 'json' };
import en from '../../../../assets/catalogues/en.json' with { type: 'json' };
import us from '../../../../assets/catalogues/us.json' with { type: 'json' };
import type { CatalogueId, Catalogues, OwnAngle } from '../../../../core/catalogue/model.ts';
import { readCatalogue } from '../../../../core/catalogue/readCatalogue.ts';
import { stockOf } from '../../../../core/catalogue/stock.ts';
import type { SectionProperties } from '../../../../core/section/model.ts';

export const CATALOGUES: Catalogues = {
  en: readCatalogue(en),
  us: readCatalogue(us),
  au: readCatalogue(au),
};

export const stock = (chosen: CatalogueId = 'en', own: readonly OwnAngle[] = []) =>
  stockOf(chosen, own, CATALOGUES);

/** Properties of a stock angle. They have checks of their own against printed tables in tests/published. */
export function propertiesOf(designation: string): SectionProperties {
  const found = stock().find(designation);
  if (!found.ok) throw new Error(`${designation} is not in stock`);
  return found.angle.properties;
}
