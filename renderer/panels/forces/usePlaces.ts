import { useMemo } from 'react';
import type { Layout } from '../../../core/layout/model.ts';
import { useWindow } from '../../shell/services.tsx';
import { shownAssessment } from '../../store/shown.ts';

interface Choice {
  readonly value: string;
  readonly label: string;
}

export interface Places {
  readonly nodes: readonly Choice[];
  readonly members: readonly Choice[];
  readonly diagonals: readonly Choice[];
}

/** What a load can be put on, by the names that the drawing uses. */
export function usePlaces(): Places {
  const layout = useWindow((state) => shownAssessment(state)?.layout ?? null);
  return useMemo(
    () => (layout === null ? { nodes: [], members: [], diagonals: [] } : placesIn(layout)),
    [layout],
  );
}

function placesIn(layout: Layout): Places {
  const bars = [...layout.bars.values()].filter((bar) => !bar.line);
  const framed = new Set(bars.flatMap(({ i, j }) => [i, j]));
  return {
    nodes: layout.bays.flatMap((bay) =>
      [...bay.nodeOf].flatMap(([key, id]) =>
        framed.has(id)
          ? [{ value: `${bay.id}/${key}`, label: `${bay.id} ${layout.nodes.get(id)?.label ?? key}` }]
          : [],
      ),
    ),
    members: bars.map((bar) => ({
      value: bar.id,
      label: bar.angle
        ? `${bar.bay} ${bar.mark}`
        : `${bar.bay} ${bar.key.replaceAll('.', ' ').replaceAll('-', ' ')}`,
    })),
    diagonals: bars
      .filter(({ angle }) => angle)
      .map((bar) => ({ value: bar.id, label: `${bar.bay} ${bar.mark}` })),
  };
}
