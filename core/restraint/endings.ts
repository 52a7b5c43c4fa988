import { dot } from '../geometry/vector.ts';
import type { Bar, BarId, BayLayout, Layout } from '../layout/model.ts';
import { nodeLiesOn, ON_THE_BAR } from './stations.ts';

/** For each diagonal of a bay the bars that end on it between its ends. Only a bay drawn freely can have any. */
export function endings(bay: BayLayout, layout: Layout): readonly (readonly [BarId, readonly Bar[]])[] {
  const bars = bay.bars.flatMap((id) => layout.bars.get(id) ?? []);
  const byNode = new Map<string, Bar[]>();
  for (const bar of bars)
    for (const node of [bar.i, bar.j]) {
      const list = byNode.get(node);
      if (list) list.push(bar);
      else byNode.set(node, [bar]);
    }
  const nodesBeside = nodesInOrder(bay, layout);
  return bay.diagonals.flatMap((id) => {
    const bar = layout.bars.get(id);
    if (!bar) return [];
    const touching = nodesBeside(bar)
      .filter((node) => nodeLiesOn(layout, node, bar))
      .flatMap((node) => byNode.get(node) ?? []);
    return touching.length > 0 ? [[id, touching] as const] : [];
  });
}

/** Nodes of a bay that lie on one of its bars between that bar's ends, of the bars that count. */
export function nodesOnBars(
  bay: BayLayout,
  layout: Layout,
  counts: (bar: Bar) => boolean,
): ReadonlySet<string> {
  const nodesBeside = nodesInOrder(bay, layout);
  const on = new Set<string>();
  for (const id of bay.bars) {
    const bar = layout.bars.get(id);
    if (bar && counts(bar))
      for (const node of nodesBeside(bar)) if (nodeLiesOn(layout, node, bar)) on.add(node);
  }
  return on;
}

/** Nodes of a bay sorted along its plane, so that in a long row of bars each looks at the nodes beside it alone. */
function nodesInOrder(bay: BayLayout, layout: Layout): (bar: Bar) => readonly string[] {
  const right = bay.planes[0]?.right ?? [1, 0, 0];
  const sorted = bay.nodes
    .flatMap((id) => layout.nodes.get(id) ?? [])
    .map((node) => ({ id: node.id, along: dot(node.at, right) }))
    .sort((p, q) => p.along - q.along);
  return (bar) => {
    const [from, to] = [dot(bar.from, right), dot(bar.to, right)];
    const least = Math.min(from, to) - ON_THE_BAR;
    const most = Math.max(from, to) + ON_THE_BAR;
    const beside: string[] = [];
    for (let k = firstFrom(sorted, least); k < sorted.length; k++) {
      const node = sorted[k];
      if (!node || node.along > most) break;
      beside.push(node.id);
    }
    return beside;
  };
}

/** Place of the first that lies at `least` or beyond, by halving. */
function firstFrom(sorted: readonly { readonly along: number }[], least: number): number {
  let [low, high] = [0, sorted.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sorted[middle]?.along ?? 0) < least) low = middle + 1;
    else high = middle;
  }
  return low;
}
