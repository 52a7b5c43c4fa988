import type { BayLayout, Layout } from '../layout/model.ts';
import { nodesOnBars } from './endings.ts';
import type { Holdings } from './heldNodes.ts';

/** Nodes of a freely drawn bay that are no support, to which no two bars lead from held places in any bay, and that lie on no bar which is itself held at both ends. */
export function looseNodes(bay: BayLayout, layout: Layout, holdings: Holdings): ReadonlySet<string> {
  const isHeld = (node: string): boolean => {
    for (const { held } of holdings.values()) if (held.has(node)) return true;
    return false;
  };
  const free = bay.nodes.filter((node) => !isHeld(node));
  if (free.length === 0) return new Set();
  const onBars = nodesOnBars(bay, layout, ({ i, j }) => isHeld(i) && isHeld(j));
  return new Set(free.filter((node) => !onBars.has(node)));
}
