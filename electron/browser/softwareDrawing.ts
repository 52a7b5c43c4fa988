import { existsSync } from 'node:fs';

/** Switches that make Chromium draw WebGL on the processor, the same on every machine. */
export const SOFTWARE_DRAWING: readonly string[] = [
  '--use-angle=swiftshader',
  '--enable-unsafe-swiftshader',
  '--ignore-gpu-blocklist',
];

/** Whether a program in a window can count on no graphics card: Linux shows one as a render node. */
export function hasNoGraphicsCard(): boolean {
  return process.platform === 'linux' && !existsSync('/dev/dri');
}

/** Switches for a Chromium that keeps to itself: no first-run page, nothing fetched in the background. */
export const QUIET: readonly string[] = [
  '--no-first-run',
  '--no-default-browser-check',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-quic',
];

/** Chromium's own sandbox refuses to run as root, as in most containers. */
export function sandboxSwitches(): readonly string[] {
  return process.getuid?.() === 0 ? ['--no-sandbox'] : [];
}
