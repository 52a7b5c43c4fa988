import type { Vec3 } from '../geometry/vector.ts';
import type { BayLayout, Layout } from '../layout/model.ts';

export interface FramingNode {
  /** Inside the bay: "L1", "a.R2". */
  readonly key: string;
  /** The node it goes by in the whole building. */
  readonly id: string;
  readonly at: Vec3;
}

/** Nodes at which bars of the framing meet; places where purlins and rails lie on it are none. */
export function framingNodes(bay: BayLayout, layout: Layout): readonly FramingNode[] {
  const framed = new Set(
    bay.bars.flatMap((id) => {
      const bar = layout.bars.get(id);
      return bar && !bar.line ? [bar.i, bar.j] : [];
    }),
  );
  return [...bay.nodeOf].flatMap(([key, id]) => {
    const node = layout.nodes.get(id);
    return node && framed.has(id) ? [{ key, id, at: node.at }] : [];
  });
}
