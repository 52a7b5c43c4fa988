import { type RefCallback, useCallback, useState } from 'react';

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** The inner size of an element in px, followed as it changes; null until it is laid out. */
export function useSize<E extends HTMLElement>(): readonly [RefCallback<E>, Size | null] {
  const [size, setSize] = useState<Size | null>(null);
  const ref = useCallback((element: E) => {
    const observer = new ResizeObserver(() => {
      const next = { width: element.clientWidth, height: element.clientHeight };
      setSize((old) => (old?.width === next.width && old.height === next.height ? old : next));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, size];
}
