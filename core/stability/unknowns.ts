/** Which unknowns each node of a mesh has, and in which order they stand. */
import type { Mesh } from './mesh.ts';
import { freeWays, type Way } from './ways.ts';

/** One unknown as weights on the fields of displacement, or on those of slope. */
export interface Unknown {
  readonly index: number;
  readonly of: 'displacement' | 'slope';
  readonly weights: Way;
  /** A slope at a hinge belongs to the piece before it or after it only. */
  readonly side: 'both' | 'before' | 'after';
}

export interface Unknowns {
  /** One more than the last index used here, that of the shared displacement left out. */
  readonly end: number;
  readonly ofNode: readonly (readonly Unknown[])[];
}

/** What is special about the node at a crossing. */
export interface SpecialNode {
  readonly node: number;
  /** A displacement that another bar has too, under one index: the fields times `row`, which with twist has the arm of the grip in it. */
  readonly shared: { readonly row: Way; readonly index: number };
  /** Unit vector over the fields. */
  readonly hinge: Way | null;
}

/** @param first index of the first unknown */
export function unknownsOf(mesh: Mesh, first = 0, special: SpecialNode | null = null): Unknowns {
  let end = first;
  const ofNode = mesh.nodes.map((node, k): readonly Unknown[] => {
    const list: Unknown[] = [];
    const here = special?.node === k ? special : null;
    const shared = here && sharedUnknown(node.displacements, here);
    if (shared) list.push(shared);
    for (const weights of shared ? besides(shared.weights, node.displacements) : node.displacements)
      list.push({ index: end++, of: 'displacement', weights, side: 'both' });
    const hinge = here?.hinge ?? null;
    if (hinge)
      for (const side of ['before', 'after'] as const)
        list.push({ index: end++, of: 'slope', weights: hinge, side });
    for (const weights of hinge ? besides(hinge, node.slopes) : node.slopes)
      list.push({ index: end++, of: 'slope', weights, side: 'both' });
    return list;
  });
  return { end, ofNode };
}

/** Less than this share of the row left free is none. */
const HELD = 1e-9;

/** The fields per unit of the shared displacement, in what is free at the node and square to all else that is. */
function sharedUnknown(free: readonly Way[], { shared: { row, index } }: SpecialNode): Unknown {
  const parts = free.map((way) => dotOf(way, row));
  const inside = row.map((_, field) =>
    free.reduce((sum, way, k) => sum + (parts[k] ?? 0) * (way[field] ?? 0), 0),
  );
  const size = dotOf(inside, inside);
  if (size < HELD * dotOf(row, row))
    throw new Error('the shared displacement of a crossing must not be held rigidly');
  return { index, of: 'displacement', weights: inside.map((part) => part / size), side: 'both' };
}

/** The rest of a space of ways when one direction in it is taken out. */
function besides(direction: Way, ways: readonly Way[]): readonly Way[] {
  const size = Math.sqrt(dotOf(direction, direction));
  const rest = freeWays(
    [direction.map((part) => part / size)],
    ways.map((row) => ({ row, stiffness: 1 })),
    direction.length,
  );
  return rest.slice(0, ways.length - 1);
}

const dotOf = (a: Way, b: Way): number => a.reduce((sum, value, k) => sum + value * (b[k] ?? 0), 0);
