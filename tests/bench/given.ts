/** The project that is measured: rows of wall bays of four crossed tiers, every crossing joined. */
import au from '../../assets/catalogues/au.json' with { type: 'json' };
import en from '../../assets/catalogues/en.json' with { type: 'json' };
import us from '../../assets/catalogues/us.json' with { type: 'json' };
import type { Catalogues } from '../../core/catalogue/model.ts';
import { readCatalogue } from '../../core/catalogue/readCatalogue.ts';
import type { Bay, Join, Project } from '../../core/project/model.ts';
import { newFreeBay, newWallBay } from '../../core/project/newBay.ts';
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

/** One bay drawn freely: pairs of crossed diagonals in a row, as a drawing brought in from elsewhere would give. */
export function freeRow(pairs: number): Project {
  const made = newFreeBay('F1', 'a long row');
  if (made.recipe.kind !== 'free') throw new Error('a free bay is not free');
  const each = Array.from({ length: pairs }, (_, k) => k);
  const node = (id: string, x: number, z: number) => ({ id, at: [x, 0, z] as const, support: true });
  const bar = (id: string, from: string, to: string) =>
    ({ id, from, to, role: 'diagonal', member: null }) as const;
  const recipe = {
    ...made.recipe,
    nodes: each.flatMap((k) => [
      node(`a${k}`, k * 5000, 0),
      node(`b${k}`, k * 5000 + 4000, 0),
      node(`c${k}`, k * 5000 + 4000, 4000),
      node(`d${k}`, k * 5000, 4000),
    ]),
    bars: each.flatMap((k) => [bar(`p${k}`, `a${k}`, `c${k}`), bar(`q${k}`, `b${k}`, `d${k}`)]),
  };
  return { ...newProject('measured'), bays: [{ ...made, recipe }] };
}

export const CATALOGUES: Catalogues = {
  en: readCatalogue(en),
  us: readCatalogue(us),
  au: readCatalogue(au),
};
