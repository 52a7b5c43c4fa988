import { useEffect, useMemo } from 'react';
import type { BufferGeometry, ShaderMaterial, WebGLRenderer } from 'three';
import { type Draw, drawPlan } from '../geometry/drawPlan.ts';
import type { MergedSteel } from '../geometry/mergedSteel.ts';
import type { SceneMaterials } from './materials.ts';
import { drawGeometry, steelBuffers } from './steelGeometry.ts';

export interface SteelProps {
  readonly merged: MergedSteel;
  /** The bay in hand; null draws everything alike. */
  readonly bay: string | null;
  readonly materials: SceneMaterials;
}

/** The steel of the whole project in a handful of draw calls: neighbouring frames faint, the bay in hand over them. */
export function Steel({ merged, bay, materials }: SteelProps) {
  const buffers = useMemo(() => steelBuffers(merged), [merged]);
  const draws = useMemo(
    () => drawPlan(merged, bay).map((draw) => ({ draw, geometry: drawGeometry(buffers, draw) })),
    [merged, bay, buffers],
  );
  useEffect(
    () => () => {
      for (const { geometry } of draws) geometry.dispose();
    },
    [draws],
  );
  return draws.map(({ draw, geometry }) => (
    <SteelDraw key={geometry.uuid} draw={draw} geometry={geometry} material={materialFor(draw, materials)} />
  ));
}

function SteelDraw({
  draw,
  geometry,
  material,
}: {
  readonly draw: Draw;
  readonly geometry: BufferGeometry;
  readonly material: ShaderMaterial;
}) {
  const order = draw.as === 'context' ? 0 : 2;
  // All bays share their arrays, and so their bounds: culling by those would say nothing.
  const shared = {
    geometry,
    material,
    frustumCulled: false,
    renderOrder: order + (draw.what === 'solids' ? 0 : 1),
  };
  if (draw.what !== 'solids') return <lineSegments {...shared} />;
  if (draw.as === 'context') return <mesh {...shared} />;
  return <mesh {...shared} onBeforeRender={putContextBehind} />;
}

/** What has been drawn so far, the context, counts as behind everything: no neighbour hides the bay in hand. */
function putContextBehind(renderer: WebGLRenderer): void {
  renderer.clearDepth();
}

function materialFor(draw: Draw, materials: SceneMaterials): ShaderMaterial {
  if (draw.as === 'context') return draw.what === 'solids' ? materials.contextSolids : materials.contextEdges;
  switch (draw.what) {
    case 'solids':
      return materials.solids;
    case 'edges':
      return materials.edges;
    case 'fineEdges':
      return materials.fineEdges;
    default:
      return draw.what satisfies never;
  }
}
