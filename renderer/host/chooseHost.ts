import { browserHost } from './browserHost.ts';
import { desktopHost } from './desktopHost.ts';
import type { Host } from './host.ts';

/** The machine as this page can reach it: the desktop when it runs in one, else the browser's own means. */
export function chooseHost(): Host {
  return desktopHost() ?? browserHost();
}
