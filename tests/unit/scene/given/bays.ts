import en from '../../../../assets/catalogues/en.json' with { type: 'json' };
import { readCatalogue } from '../../../../core/catalogue/readCatalogue.ts';
import { stockOf } from '../../../../core/catalogue/stock.ts';
import { layOut } from '../../../../core/layout/layOut.ts';
import type { Layout } from '../../../../core/layout/model.ts';
import type { Bay, Join, WallRecipe } from '../../../../core/project/model.ts';
import { newRoofBay, newWallBay } from '../../../../core/project/newBay.ts';
import { newProject } from '../../../../core/project/newProject.ts';

const european = readCatalogue(en);
const stock = stockOf('en', [], { en: european, us: european, au: european });

/** A layout of the given bays, with European stock. */
export function laidOut(...bays: readonly Bay[]): Layout {
  return layOut({ ...newProject('given'), bays }, stock);
}

/** One crossed tier, 6 m by 4 m, standing at the origin along X, with one join at its crossing. */
export function crossedWall(id = 'W1', join: Join | null = null): Bay {
  const bay = newWallBay(id, 'wall');
  return join === null ? bay : { ...bay, joins: { 't1.fall+t1.rise': join } };
}

/** Walls side by side, each of so many crossed tiers. */
export function walls(count: number, tiers: number): readonly Bay[] {
  return Array.from({ length: count }, (_, index) => {
    const bay = crossedWall(`W${index + 1}`);
    const recipe = bay.recipe as WallRecipe;
    return {
      ...bay,
      place: { origin: [index * 7000, 0, 0], turn: 0 },
      recipe: {
        ...recipe,
        tiers: Array.from({ length: tiers }, (__, tier) => ({
          id: `t${tier + 1}`,
          height: 4000,
          pattern: 'crossed' as const,
        })),
      },
    };
  });
}

export const roof = (): Bay => newRoofBay('R1', 'roof');
