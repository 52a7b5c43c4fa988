/** The stock lists, read once in each worker. */
import au from '../../assets/catalogues/au.json';
import en from '../../assets/catalogues/en.json';
import us from '../../assets/catalogues/us.json';
import type { Catalogues } from '../../core/catalogue/model.ts';
import { readCatalogue } from '../../core/catalogue/readCatalogue.ts';

export const catalogues: Catalogues = {
  en: readCatalogue(en),
  us: readCatalogue(us),
  au: readCatalogue(au),
};
