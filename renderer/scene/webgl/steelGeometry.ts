import { BufferAttribute, BufferGeometry } from 'three';
import type { Draw } from '../geometry/drawPlan.ts';
import type { MergedSteel } from '../geometry/mergedSteel.ts';

/** The merged arrays on their way to the graphics card, held once however many draws use them. */
export interface SteelBuffers {
  readonly positions: BufferAttribute;
  readonly normals: BufferAttribute;
  readonly paints: BufferAttribute;
  readonly triangles: BufferAttribute;
  readonly edges: BufferAttribute;
  readonly fineEdges: BufferAttribute;
}

export function steelBuffers(merged: MergedSteel): SteelBuffers {
  return {
    positions: new BufferAttribute(merged.positions, 3),
    normals: new BufferAttribute(merged.normals, 3),
    paints: new BufferAttribute(merged.paints, 1),
    triangles: new BufferAttribute(merged.triangles, 1),
    edges: new BufferAttribute(merged.edges, 3),
    fineEdges: new BufferAttribute(merged.fineEdges, 3),
  };
}

/** The geometry of one draw: shared arrays, its own range. To be disposed of by who asked for it. */
export function drawGeometry(buffers: SteelBuffers, draw: Draw): BufferGeometry {
  const geometry = new BufferGeometry();
  if (draw.what === 'solids') {
    geometry.setAttribute('position', buffers.positions);
    geometry.setAttribute('normal', buffers.normals);
    geometry.setAttribute('paint', buffers.paints);
    geometry.setIndex(buffers.triangles);
  } else geometry.setAttribute('position', draw.what === 'edges' ? buffers.edges : buffers.fineEdges);
  geometry.setDrawRange(draw.range.start, draw.range.count);
  return geometry;
}

/** A band along a straight line in space, to be widened on the screen by the halo's shader. mm. */
export function haloGeometry(
  from: readonly [number, number, number],
  to: readonly [number, number, number],
): BufferGeometry {
  const geometry = new BufferGeometry();
  const four = (p: readonly number[]): Float32Array => new Float32Array([...p, ...p, ...p, ...p]);
  geometry.setAttribute('position', new BufferAttribute(four(from), 3));
  geometry.setAttribute('other', new BufferAttribute(four(to), 3));
  geometry.setAttribute('corner', new BufferAttribute(new Float32Array([0, -1, 1, -1, 1, 1, 0, 1]), 2));
  geometry.setIndex([0, 1, 2, 0, 2, 3]);
  return geometry;
}
