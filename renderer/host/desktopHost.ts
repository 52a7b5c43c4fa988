import type { Host } from './host.ts';

declare global {
  interface Window {
    /** Put there by the desktop's preload; missing in a browser. */
    readonly tautlineHost?: Host;
  }
}

/** The desktop around this page, or null in a plain browser. */
export function desktopHost(): Host | null {
  return window.tautlineHost ?? null;
}
