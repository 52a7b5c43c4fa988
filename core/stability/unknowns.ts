/** Which unknowns each node of a mesh has, and where they stand in the band. */
import type { Mesh } from './mesh.ts';

/** One unknown as weights on the fields of displacement, or on those of slope. */
export interface Unknown {
  readonly index: number;
  readonly of: 'displacement' | 'slope';
  /** Weight of each field. */
  readonly weights: readonly number[];
}

export interface Unknowns {
  readonly size: number;
  /** Largest distance between two unknowns that meet, plus one. */
  readonly width: number;
  readonly ofNode: readonly (readonly Unknown[])[];
}

export function unknownsOf(mesh: Mesh): Unknowns {
  const m = mesh.fields;
  let size = 0;
  const ofNode = mesh.nodes.map((node): readonly Unknown[] => {
    const list: Unknown[] = [];
    for (let p = 0; p < node.free; p++)
      list.push({
        index: size++,
        of: 'displacement',
        weights: Array.from(node.basis.subarray(p * m, (p + 1) * m)),
      });
    for (let field = 0; field < m; field++)
      if (!(node.slopesHeld & (1 << field)))
        list.push({
          index: size++,
          of: 'slope',
          weights: Array.from({ length: m }, (_, k) => (k === field ? 1 : 0)),
        });
    return list;
  });
  const width = ofNode.reduce(
    (most, list, k) => Math.max(most, list.length + (ofNode[k + 1]?.length ?? 0)),
    1,
  );
  return { size, width, ofNode };
}
