import au from '../../../assets/catalogues/au.json' with { type: 'json' };
import en from '../../../assets/catalogues/en.json' with { type: 'json' };
import us from '../../../assets/catalogues/us.json' with { type: 'json' };
import type { Catalogues } from '../../../core/catalogue/model.ts';
import { readCatalogue } from '../../../core/catalogue/readCatalogue.ts';

/** The catalogues that come with the program. */
export const stockCatalogues: Catalogues = {
  en: readCatalogue(en),
  us: readCatalogue(us),
  au: readCatalogue(au),
};
