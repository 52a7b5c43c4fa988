/** Which unknowns each node of a mesh has, and where they stand in the band. */
import type { Mesh } from './mesh.ts';

/** One unknown as weights on the fields of displacement, or on those of slope. */
export interface Unknown {
  readonly index: number;
  readonly of: 'displacement' | 'slope';
  /** Weight of each field. */
  readonly weights: readonly number[];
  /** A slope at a hinge belongs to the piece before it or after it only. */
  readonly side: 'both' | 'before' | 'after';
}

export interface Unknowns {
  /** One more than the last index used. */
  readonly size: number;
  /** Largest distance between two unknowns that meet, plus one. */
  readonly width: number;
  readonly ofNode: readonly (readonly Unknown[])[];
}

/** What is special about a node: a displacement shared with another bar, a hinge. Directions are unit vectors over the fields. */
export interface SpecialNode {
  readonly node: number;
  readonly shared: { readonly direction: readonly number[]; readonly index: number | null } | null;
  readonly hinge: readonly number[] | null;
}

export function unknownsOf(mesh: Mesh, first = 0, special: SpecialNode | null = null): Unknowns {
  const m = mesh.fields;
  let size = first;
  const ofNode = mesh.nodes.map((node, k): readonly Unknown[] => {
    const own = special?.node === k ? special : null;
    const list: Unknown[] = [];
    for (const { weights, index } of displacementWays(basisVectors(node.basis, node.free, m), own))
      list.push({ index: index ?? size++, of: 'displacement', weights, side: 'both' });
    for (const { weights, side } of slopeWays(m, node.slopesHeld, own?.hinge ?? null))
      list.push({ index: size++, of: 'slope', weights, side });
    return list;
  });
  const shared = special?.shared?.index ?? null;
  const width =
    shared !== null
      ? size
      : ofNode.reduce((most, list, k) => Math.max(most, list.length + (ofNode[k + 1]?.length ?? 0)), 1);
  return { size, width, ofNode };
}

function basisVectors(basis: Float64Array, free: number, m: number): readonly (readonly number[])[] {
  return Array.from({ length: free }, (_, p) => Array.from(basis.subarray(p * m, (p + 1) * m)));
}

interface Way {
  readonly weights: readonly number[];
  /** The index of an unknown that another bar has already; null for a new one. */
  readonly index: number | null;
}

function displacementWays(free: readonly (readonly number[])[], special: SpecialNode | null): readonly Way[] {
  const shared = special?.shared;
  if (!shared) return free.map((weights) => ({ weights, index: null }));
  const { direction, index } = shared;
  const inside = free.reduce((sum, vector) => sum + dotOf(vector, direction) ** 2, 0);
  if (inside < 1 - 1e-9) throw new Error('the shared displacement of a crossing must not be held rigidly');
  const others = squareTo(direction, free);
  return [{ weights: direction, index }, ...others.map((weights) => ({ weights, index: null }))];
}

function slopeWays(
  m: number,
  held: number,
  hinge: readonly number[] | null,
): readonly Pick<Unknown, 'weights' | 'side'>[] {
  const units = Array.from({ length: m }, (_, field) =>
    Array.from({ length: m }, (__, k) => (k === field ? 1 : 0)),
  );
  const free = units.filter((_, field) => !(held & (1 << field)));
  if (!hinge) return free.map((weights) => ({ weights, side: 'both' }));
  return [
    { weights: hinge, side: 'before' },
    { weights: hinge, side: 'after' },
    ...squareTo(hinge, free).map((weights) => ({ weights, side: 'both' }) as const),
  ];
}

/** Orthonormal vectors of the space of `vectors`, square to a direction that lies in it. */
function squareTo(
  direction: readonly number[],
  vectors: readonly (readonly number[])[],
): readonly (readonly number[])[] {
  const found: (readonly number[])[] = [];
  for (const vector of vectors) {
    const known = [direction, ...found];
    let rest = [...vector];
    for (let sweep = 0; sweep < 2; sweep++)
      for (const unit of known) {
        const share = dotOf(rest, unit);
        rest = rest.map((value, k) => value - share * (unit[k] ?? 0));
      }
    const size = Math.hypot(...rest);
    if (size > 1e-6) found.push(rest.map((value) => value / size));
  }
  return found;
}

const dotOf = (a: readonly number[], b: readonly number[]): number =>
  a.reduce((sum, value, k) => sum + value * (b[k] ?? 0), 0);
