/** The project that is measured: rows of wall bays of four crossed tiers, every crossing joined. */
import { readFileSync } from 'node:fs';
import type { Catalogue, CatalogueId, Catalogues } from '../../core/catalogue/model.ts';
import { readCatalogue } from '../../core/catalogue/readCatalogue.ts';
import type { Bay, Join, Project } from '../../core/project/model.ts';
import { newWallBay } from '../../core/project/newBay.ts';
import { newProject } from '../../core/project/newProject.ts';

const TIERS = ['t1', 't2', 't3', 't4'] as const;
const PACKED: Join = { kind: 'packed', packer: null };
/** Diagonals of one such bay. */
export const DIAGONALS_EACH = 2 * TIERS.length;

/** Bays side by side in rows of fifty, 9 m apart, so that they touch as bays of a building do. */
export function fourPanelBays(count: number): Project {
  return { ...newProject('measured'), bays: Array.from({ length: count }, (_, k) => fourPanelBay(k)) };
}

function fourPanelBay(k: number): Bay {
  const made = newWallBay(`W${k + 1}`, `wall ${k + 1}`);
  if (made.recipe.kind !== 'wall') throw new Error('a wall bay is no wall');
  return {
    ...made,
    place: { origin: [(k % 50) * 6000, Math.floor(k / 50) * 9000, 0], turn: 0 },
    recipe: { ...made.recipe, tiers: TIERS.map((id) => ({ id, height: 4000, pattern: 'crossed' })) },
    joins: Object.fromEntries(TIERS.map((id) => [`${id}.fall+${id}.rise`, PACKED])),
  };
}

export const CATALOGUES: Catalogues = { en: catalogue('en'), us: catalogue('us'), au: catalogue('au') };

function catalogue(id: CatalogueId): Catalogue {
  return readCatalogue(
    JSON.parse(readFileSync(new URL(`../../assets/catalogues/${id}.json`, import.meta.url), 'utf8')),
  );
}
