import { capTriangles } from './capTriangles.ts';
import { type Growing, growingFloats, growingIndices } from './growing.ts';
import { type Edge, edgesOf, endFaces, type Face, sideFaces } from './prism.ts';
import { PAINTS, type SteelPart } from './steelPart.ts';

/** A run of elements: vertices of lines, or indices of triangles. */
export interface Range {
  readonly start: number;
  readonly count: number;
}

/** Where the solids and lines of one bay lie in the merged arrays. */
export interface BayRanges {
  readonly solids: Range;
  readonly edges: Range;
  readonly fineEdges: Range;
}

/**
 * All solids in one mesh and all lines in two, however many bars there are. Bay by bay, so that any bay and what comes before and after
 * it can be drawn by ranges of the same arrays. mm.
 */
export interface MergedSteel {
  readonly positions: Float32Array;
  readonly normals: Float32Array;
  /** Place in PAINTS, one for each vertex. */
  readonly paints: Float32Array;
  readonly triangles: Uint32Array;
  /** Pairs of points. */
  readonly edges: Float32Array;
  readonly fineEdges: Float32Array;
  readonly bays: ReadonlyMap<string, BayRanges>;
}

/** @param parts bay by bay: parts of one bay must stand together */
export function mergedSteel(parts: readonly SteelPart[]): MergedSteel {
  const positions = growingFloats();
  const normals = growingFloats();
  const paints = growingFloats();
  const triangles = growingIndices();
  const edges = growingFloats();
  const fineEdges = growingFloats();
  const bays = new Map<string, BayRanges>();

  const putFace = (face: Face, paint: number, indices: readonly number[]): void => {
    const base = positions.length / 3;
    for (const corner of face.corners) {
      positions.push3(corner[0], corner[1], corner[2]);
      normals.push3(face.normal[0], face.normal[1], face.normal[2]);
      paints.push(paint);
    }
    for (const index of indices) triangles.push(base + index);
  };

  for (const group of byBay(parts)) {
    const before = [triangles.length, edges.length / 3, fineEdges.length / 3] as const;
    for (const { prism, paint } of group.parts) {
      const tone = PAINTS.indexOf(paint);
      for (const face of sideFaces(prism)) putFace(face, tone, QUAD);
      for (const face of endFaces(prism)) putFace(face, tone, capTriangles(prism.outline, face.reversed));
      for (const edge of edgesOf(prism)) putEdge(edge.fine ? fineEdges : edges, edge);
    }
    bays.set(group.bay, {
      solids: { start: before[0], count: triangles.length - before[0] },
      edges: { start: before[1], count: edges.length / 3 - before[1] },
      fineEdges: { start: before[2], count: fineEdges.length / 3 - before[2] },
    });
  }
  return {
    positions: positions.taken(),
    normals: normals.taken(),
    paints: paints.taken(),
    triangles: triangles.taken(),
    edges: edges.taken(),
    fineEdges: fineEdges.taken(),
    bays,
  };
}

/** A side is two triangles. */
const QUAD = [0, 1, 2, 0, 2, 3] as const;

function putEdge(into: Growing<Float32Array>, edge: Edge): void {
  into.push3(edge.from[0], edge.from[1], edge.from[2]);
  into.push3(edge.to[0], edge.to[1], edge.to[2]);
}

function byBay(
  parts: readonly SteelPart[],
): readonly { readonly bay: string; readonly parts: readonly SteelPart[] }[] {
  const groups: { readonly bay: string; readonly parts: SteelPart[] }[] = [];
  for (const part of parts) {
    const last = groups.at(-1);
    if (last?.bay === part.bay) last.parts.push(part);
    else groups.push({ bay: part.bay, parts: [part] });
  }
  return groups;
}
