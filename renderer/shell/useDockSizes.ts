import { useCallback, useRef, useState } from 'react';
import type { LayoutChangedMeta, PanelSize, Layout as Sizes } from 'react-resizable-panels';
import { type DockSizes, firstSizes } from './firstSizes.ts';
import { keepSizes, keptSizes } from './keptSizes.ts';
import { useTablesHeight } from './useTablesHeight.ts';

interface Docks {
  /** To begin with. */
  readonly sizes: DockSizes;
  readonly tables: ReturnType<typeof useTablesHeight>;
  onLeft(size: PanelSize): void;
  onCard(size: PanelSize): void;
  /** Of any of the groups: what the user has dragged is kept for the next time. */
  onLayoutChanged(layout: Sizes, meta: LayoutChangedMeta): void;
}

/** So long after a drag its sizes may still come in, ms. */
const SETTLED = 1000;

/** How large the docks are: as they were left, or by the window's size. */
export function useDockSizes(): Docks {
  const [sizes] = useState(() => {
    const { innerWidth, innerHeight } = window;
    return keptSizes(localStorage, firstSizes(innerWidth, innerHeight), innerWidth, innerHeight);
  });
  const tables = useTablesHeight(sizes.tables);
  const now = useRef({ left: sizes.left, card: sizes.card });
  const { heights } = tables;
  const heightsNow = useRef(heights);
  heightsNow.current = heights;
  const draggedAt = useRef(Number.NEGATIVE_INFINITY);
  const keep = useCallback((): void => {
    keepSizes(localStorage, { ...now.current, tables: heightsNow.current() });
  }, []);
  const onLayoutChanged = useCallback(
    (_: Sizes, { isUserInteraction }: LayoutChangedMeta): void => {
      if (!isUserInteraction) return;
      draggedAt.current = performance.now();
      keep();
    },
    [keep],
  );
  // Panels are measured after the change of layout is told, by a frame or more.
  const measured = (dock: 'left' | 'card', { inPixels }: PanelSize): void => {
    now.current[dock] = inPixels;
    if (performance.now() - draggedAt.current < SETTLED) keep();
  };
  return {
    sizes,
    tables,
    onLeft: (size) => measured('left', size),
    onCard: (size) => measured('card', size),
    onLayoutChanged,
  };
}
