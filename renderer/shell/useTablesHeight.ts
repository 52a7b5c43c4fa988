import { type Ref, useEffect, useRef } from 'react';
import type { PanelImperativeHandle, PanelSize } from 'react-resizable-panels';
import type { DockTab } from '../store/windowState.ts';
import { useWindow } from './services.tsx';

interface TablesHeight {
  readonly panel: Ref<PanelImperativeHandle | null>;
  onResize(size: PanelSize): void;
  /** As they are now, px. */
  heights(): Readonly<Record<DockTab, number>>;
}

/** Each of the tables keeps a height of its own, which the user's drag changes. */
export function useTablesHeight(first: Readonly<Record<DockTab, number>>): TablesHeight {
  const panel = useRef<PanelImperativeHandle | null>(null);
  const heights = useRef<Record<DockTab, number>>({ ...first });
  const shown = useRef<DockTab>('schedule');
  const tab = useWindow((state) => state.tab);
  useEffect(() => {
    if (shown.current === tab) return;
    shown.current = tab;
    panel.current?.resize(heights.current[tab]);
  }, [tab]);
  return {
    panel,
    onResize: ({ inPixels }) => {
      heights.current[shown.current] = inPixels;
    },
    heights: () => ({ ...heights.current }),
  };
}
