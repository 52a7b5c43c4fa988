import au from '../../assets/catalogues/au.json' with { type: 'json' };
import en from '../../assets/catalogues/en.json' with { type: 'json' };
import us from '../../assets/catalogues/us.json' with { type: 'json' };
import type { CatalogueId, Catalogues } from '../../core/catalogue/model.ts';
import { readCatalogue } from '../../core/catalogue/readCatalogue.ts';

export const CATALOGUE_IDS: readonly CatalogueId[] = ['en', 'us', 'au'];

let read: Catalogues | null = null;

/** The stock lists that come with the program, read once. */
export function builtInCatalogues(): Catalogues {
  read ??= { en: readCatalogue(en), us: readCatalogue(us), au: readCatalogue(au) };
  return read;
}
