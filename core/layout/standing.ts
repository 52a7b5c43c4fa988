import type { BayLayout, Node, NodeSupport } from './model.ts';

/** Lower than this counts as below, mm. */
const BELOW = 1;
const STANDING: NodeSupport = { kind: 'standing' };

/**
 * Feet of walls that stand on another bay: where a node that a wall takes for its foundation is one of a wall, or of a bay drawn freely, that
 * has supports of its own farther down, it is held as that bay holds it, and not by the ground.
 */
export function withFeetOnBays(
  nodes: ReadonlyMap<string, Node>,
  bays: readonly BayLayout[],
): ReadonlyMap<string, Node> {
  const carriers = bays.filter(({ kind }) => kind === 'wall' || kind === 'free');
  if (carriers.length < 2) return nodes;
  const lowest = new Map(carriers.map((bay) => [bay.id, lowestSupport(nodes, bay)]));
  const through = new Map<string, BayLayout[]>();
  for (const bay of carriers)
    for (const id of bay.nodes) {
      const list = through.get(id);
      if (list) list.push(bay);
      else through.set(id, [bay]);
    }
  return new Map(
    [...nodes].map(([id, node]) => {
      const carried = (through.get(id) ?? []).some(
        (bay) =>
          !node.supports[bay.id] && (lowest.get(bay.id) ?? Number.POSITIVE_INFINITY) < node.at[2] - BELOW,
      );
      return [id, carried ? standing(node) : node] as const;
    }),
  );
}

const lowestSupport = (nodes: ReadonlyMap<string, Node>, bay: BayLayout): number =>
  bay.nodes.reduce((least, id) => {
    const node = nodes.get(id);
    return node?.supports[bay.id] ? Math.min(least, node.at[2]) : least;
  }, Number.POSITIVE_INFINITY);

const standing = (node: Node): Node => ({
  ...node,
  supports: Object.fromEntries(
    Object.entries(node.supports).map(([bay, support]) => [
      bay,
      support.kind === 'foundation' ? STANDING : support,
    ]),
  ),
});
