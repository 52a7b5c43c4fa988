import { type Browser, chromium } from 'playwright-core';
import { findChromium } from '../../electron/browser/findChromium.ts';
import { QUIET, SOFTWARE_DRAWING } from '../../electron/browser/softwareDrawing.ts';

/** Drawing on the processor and in one colour space gives the same picture on every machine. */
export const CHROMIUM_SWITCHES: readonly string[] = [
  '--no-sandbox',
  ...SOFTWARE_DRAWING,
  ...QUIET,
  '--force-color-profile=srgb',
];

/** Starts the Chromium that `npm test` found. */
export async function launchChromium(): Promise<Browser> {
  const found = findChromium();
  if (found === null)
    throw new Error('No Chromium here. `npm test` gets one; or name one in TAUTLINE_CHROMIUM.');
  return await chromium.launch({ executablePath: found.path, args: [...CHROMIUM_SWITCHES], headless: true });
}
