import { useMemo } from 'react';
import type { BarId, BayLayout } from '../../../core/layout/model.ts';
import type { SteelPart } from '../geometry/steelPart.ts';
import type { SheetView } from '../view/sheetView.ts';
import { flatSteel, spineOf, toneClass } from './flatSteel.ts';

export interface FlatBayProps {
  readonly view: SheetView;
  readonly parts: readonly SteelPart[];
  readonly bay: BayLayout | null;
  readonly selectedBar: BarId | null;
  readonly hoveredBar: BarId | null;
}

/** The bay drawn as flat polygons: what is shown where there is no WebGL. */
export function FlatBay({ view, parts, bay, selectedBar, hoveredBar }: FlatBayProps) {
  const flat = useMemo(() => flatSteel(view, parts, bay?.planes ?? []), [view, parts, bay]);
  const halo = spineOf(view, selectedBar === null ? [] : parts.filter((part) => part.bar === selectedBar));
  return (
    <svg className="scene-flat" width={view.width} height={view.height} aria-hidden="true" focusable="false">
      {halo !== '' && <path className="scene-halo" d={halo} />}
      {flat.map(({ part, faces }, index) => (
        <g
          // biome-ignore lint/suspicious/noArrayIndexKey: the pieces of a bar have no name of their own, and hold no state
          key={index}
          className={part.bar !== null && part.bar === hoveredBar ? 'scene-solid-hovered' : undefined}
        >
          {faces.map((face) => (
            <path
              key={face.d}
              className={toneClass(part.paint, face.tone, part.bar !== null && part.bar === selectedBar)}
              d={face.d}
            />
          ))}
        </g>
      ))}
    </svg>
  );
}
