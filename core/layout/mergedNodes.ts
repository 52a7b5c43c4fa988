import type { Vec3 } from '../geometry/vector.ts';
import type { Node, NodeSupport } from './model.ts';
import { PlaceGrid } from './placeGrid.ts';
import type { SketchNode } from './sketch.ts';

interface Merging {
  readonly id: string;
  readonly at: Vec3;
  readonly label: string;
  readonly supports: Record<string, NodeSupport>;
}

/** Gathers the nodes of all bays; those at one place become one, under the first one's id. */
export class NodeRegister {
  readonly #nodes = new Map<string, Merging>();
  readonly #places = new PlaceGrid<Merging>();

  /** Adds a bay's node and returns the id it goes by. */
  add(bay: string, node: SketchNode): string {
    const found = this.#places.near(node.at) ?? this.#put(bay, node);
    if (node.support && !found.supports[bay]) found.supports[bay] = node.support;
    return found.id;
  }

  all(): ReadonlyMap<string, Node> {
    return this.#nodes;
  }

  #put(bay: string, node: SketchNode): Merging {
    const made: Merging = { id: `${bay}/${node.key}`, at: node.at, label: node.label, supports: {} };
    this.#nodes.set(made.id, made);
    this.#places.put(made);
    return made;
  }
}
