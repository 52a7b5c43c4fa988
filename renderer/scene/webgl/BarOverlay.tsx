import { useEffect, useMemo } from 'react';
import { drawPlan } from '../geometry/drawPlan.ts';
import { mergedSteel } from '../geometry/mergedSteel.ts';
import { pointOf } from '../geometry/prism.ts';
import type { SteelPart } from '../geometry/steelPart.ts';
import type { SceneMaterials } from './materials.ts';
import { drawGeometry, haloGeometry, steelBuffers } from './steelGeometry.ts';

/** Draws the parts of one bar once more over the merged steel, which is left alone: in the marker's colour, or outlined for the pointer. */
export function BarOverlay({
  parts,
  as,
  materials,
}: {
  readonly parts: readonly SteelPart[];
  readonly as: 'selected' | 'hovered';
  readonly materials: SceneMaterials;
}) {
  const draws = useMemo(() => {
    const merged = mergedSteel(parts);
    const buffers = steelBuffers(merged);
    return drawPlan(merged, null).map((draw) => ({ what: draw.what, geometry: drawGeometry(buffers, draw) }));
  }, [parts]);
  const halo = useMemo(() => haloOf(parts), [parts]);
  useEffect(
    () => () => {
      for (const { geometry } of draws) geometry.dispose();
      halo?.dispose();
    },
    [draws, halo],
  );
  const linesFor = (what: 'edges' | 'fineEdges') => {
    if (as === 'hovered') return materials.hoveredEdges;
    return what === 'edges' ? materials.selectedEdges : materials.selectedFineEdges;
  };
  return (
    <>
      {as === 'selected' && halo !== null && (
        <mesh geometry={halo} material={materials.halo} renderOrder={4} frustumCulled={false} />
      )}
      {draws.map(({ what, geometry }) =>
        what === 'solids' ? (
          as === 'selected' && (
            <mesh
              key={geometry.uuid}
              geometry={geometry}
              material={materials.selectedSolids}
              renderOrder={5}
              frustumCulled={false}
            />
          )
        ) : (
          <lineSegments
            key={geometry.uuid}
            geometry={geometry}
            material={linesFor(what)}
            renderOrder={as === 'hovered' ? 8 : what === 'edges' ? 7 : 6}
            frustumCulled={false}
          />
        ),
      )}
    </>
  );
}

/** A band along the middle of the bar's steel, from its first piece to its last. */
function haloOf(parts: readonly SteelPart[]) {
  const first = parts[0]?.prism;
  const last = parts.at(-1)?.prism;
  if (!first || !last) return null;
  const n = first.outline.length;
  const middle = [
    first.outline.reduce((sum, p) => sum + p[0], 0) / n,
    first.outline.reduce((sum, p) => sum + p[1], 0) / n,
  ] as const;
  return haloGeometry(pointOf(first, middle, first.from), pointOf(last, middle, last.to));
}
