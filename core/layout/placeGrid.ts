import { distance, type Vec3 } from '../geometry/vector.ts';

/** Places nearer than this are one, mm. */
export const SAME_PLACE = 1;
const CELL = 4 * SAME_PLACE;

/** Things at places, found again by place without looking through them all. */
export class PlaceGrid<T extends { readonly at: Vec3 }> {
  readonly #cells = new Map<string, T[]>();

  /** The first thing put within 1 mm of a place. Looks in the cells within reach: one as a rule, eight at a corner. */
  near(at: Vec3): T | null {
    const [x, y, z] = at;
    for (let i = index(x - SAME_PLACE); i <= index(x + SAME_PLACE); i++)
      for (let j = index(y - SAME_PLACE); j <= index(y + SAME_PLACE); j++)
        for (let k = index(z - SAME_PLACE); k <= index(z + SAME_PLACE); k++)
          for (const thing of this.#cells.get(`${i},${j},${k}`) ?? [])
            if (distance(thing.at, at) <= SAME_PLACE) return thing;
    return null;
  }

  put(thing: T): void {
    const [x, y, z] = thing.at;
    const home = `${index(x)},${index(y)},${index(z)}`;
    const cell = this.#cells.get(home);
    if (cell) cell.push(thing);
    else this.#cells.set(home, [thing]);
  }
}

const index = (value: number): number => Math.floor(value / CELL);
