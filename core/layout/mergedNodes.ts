import { distance, type Vec3 } from '../geometry/vector.ts';
import type { Node, NodeSupport } from './model.ts';
import type { SketchNode } from './sketch.ts';

/** Nodes nearer than this are one, mm. */
const SAME_PLACE = 1;
const CELL = 4 * SAME_PLACE;

interface Merging {
  readonly id: string;
  readonly at: Vec3;
  readonly label: string;
  readonly supports: Record<string, NodeSupport>;
}

/** Gathers the nodes of all bays; those at one place become one, under the first one's id. */
export class NodeRegister {
  readonly #nodes = new Map<string, Merging>();
  readonly #cells = new Map<string, Merging[]>();

  /** Adds a bay's node and returns the id it goes by. */
  add(bay: string, node: SketchNode): string {
    const found = this.#near(node.at) ?? this.#put(bay, node);
    if (node.support && !found.supports[bay]) found.supports[bay] = node.support;
    return found.id;
  }

  all(): ReadonlyMap<string, Node> {
    return this.#nodes;
  }

  #put(bay: string, node: SketchNode): Merging {
    const made: Merging = { id: `${bay}/${node.key}`, at: node.at, label: node.label, supports: {} };
    this.#nodes.set(made.id, made);
    const home = cellOf(node.at);
    const cell = this.#cells.get(home);
    if (cell) cell.push(made);
    else this.#cells.set(home, [made]);
    return made;
  }

  /** Looks in the cells within reach of a point: one as a rule, eight at a corner. */
  #near(at: Vec3): Merging | null {
    const [x, y, z] = at;
    for (let i = index(x - SAME_PLACE); i <= index(x + SAME_PLACE); i++)
      for (let j = index(y - SAME_PLACE); j <= index(y + SAME_PLACE); j++)
        for (let k = index(z - SAME_PLACE); k <= index(z + SAME_PLACE); k++)
          for (const node of this.#cells.get(`${i},${j},${k}`) ?? [])
            if (distance(node.at, at) <= SAME_PLACE) return node;
    return null;
  }
}

const index = (value: number): number => Math.floor(value / CELL);
const cellOf = (at: Vec3): string => `${index(at[0])},${index(at[1])},${index(at[2])}`;
