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
  const onLayoutChanged = useCallback((_: Sizes, { isUserInteraction }: LayoutChangedMeta): void => {
    if (!isUserInteraction) return;
    // Panels tell their new sizes within the same turn.
    setTimeout(() => keepSizes(localStorage, { ...now.current, tables: heightsNow.current() }), 0);
  }, []);
  return {
    sizes,
    tables,
    onLeft: ({ inPixels }) => {
      now.current.left = inPixels;
    },
    onCard: ({ inPixels }) => {
      now.current.card = inPixels;
    },
    onLayoutChanged,
  };
}
