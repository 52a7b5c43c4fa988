import { type RefObject, useEffect, useLayoutEffect, useRef } from 'react';
import type { CrossingId } from '../../../core/layout/model.ts';

/**
 * Where the keys go when a crossing is opened and closed. Opened by a key, its chosen join takes them as soon as joins can be chosen;
 * closed with the keys in it, the crossing's own ring on the drawing has them again.
 *
 * @param ready whether the joins can be chosen
 */
export function usePanelFocus(
  panel: RefObject<HTMLElement | null>,
  crossing: CrossingId,
  ready: boolean,
): void {
  const openedFrom = useRef<Element | null>(null);
  useLayoutEffect(() => {
    const from = document.activeElement;
    openedFrom.current = from?.matches(':focus-visible') ? from : null;
    const opened = panel.current;
    return () => {
      if (opened === null || !opened.contains(document.activeElement)) return;
      document.querySelector<HTMLElement>(`[data-crossing="${crossing}"]`)?.focus();
    };
  }, [panel, crossing]);
  useEffect(() => {
    const from = openedFrom.current;
    if (!ready || from === null) return;
    openedFrom.current = null;
    // Whoever has gone elsewhere meanwhile is left there.
    if (document.activeElement !== from) return;
    const radios = [...(panel.current?.querySelectorAll<HTMLInputElement>('input[type="radio"]') ?? [])];
    (radios.find(({ checked }) => checked) ?? radios[0])?.focus();
  }, [panel, ready]);
}
