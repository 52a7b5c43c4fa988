import path from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { type Loopback, serveLoopback } from '../../../electron/loopback/server.ts';
import { launchChromium } from '../../browser/launchChromium.ts';

export interface WindowWish {
  readonly width?: number;
  readonly height?: number;
  readonly theme?: 'light' | 'dark';
  /** Things may swing and grow; else the window is asked for little motion. */
  readonly motion?: boolean;
  /** Run in the page before anything of the program. */
  readonly before?: string;
}

/** The built window in Chromium, served as `npm start` serves it. */
export interface OpenedWindow {
  readonly page: Page;
  /** Errors that the page has written to its console or thrown. */
  readonly complaints: readonly string[];
  close(): Promise<void>;
}

/** One browser and one server for the tests of a file. */
export class WindowStand {
  #served: Loopback | null = null;
  #browser: Browser | null = null;

  async start(): Promise<void> {
    this.#served = await serveLoopback({ folder: path.resolve('out/renderer'), given: null, port: null });
    this.#browser = await launchChromium();
  }

  async stop(): Promise<void> {
    await this.#browser?.close();
    await this.#served?.close();
  }

  /** Opens the window and waits until the example's figures stand in it. */
  async open(wish: WindowWish = {}): Promise<OpenedWindow> {
    const browser = this.#browser;
    const served = this.#served;
    if (!browser || !served) throw new Error('the stand has not been started');
    const context: BrowserContext = await browser.newContext({
      viewport: { width: wish.width ?? 1440, height: wish.height ?? 900 },
      colorScheme: wish.theme ?? 'light',
      reducedMotion: wish.motion ? 'no-preference' : 'reduce',
    });
    context.setDefaultTimeout(8000);
    if (wish.before !== undefined) await context.addInitScript({ content: wish.before });
    const page = await context.newPage();
    const complaints: string[] = [];
    // Chromium hands choosers over only while somebody listens, and takes a moment to begin: listen from the start.
    page.on('filechooser', () => {});
    page.on('console', (message) => {
      if (message.type() === 'error') complaints.push(message.text());
    });
    page.on('pageerror', (error) => complaints.push(error.message));
    await page.goto(new URL('?plain-files', served.address).href);
    await row(page, 'D1').waitFor();
    return { page, complaints, close: () => context.close() };
  }
}

/** The schedule's row of a mark. */
export const row = (page: Page, mark: string) =>
  page.getByRole('grid', { name: 'Schedule' }).getByRole('row', { name: new RegExp(`^${mark}\\b`) });

/** Chooses a diagonal by its row and waits for its card. */
export async function choose(page: Page, mark: string): Promise<void> {
  await row(page, mark).click();
  await page.getByRole('region', { name: `Lanes of ${mark}` }).waitFor();
}

/** The lanes of the chosen bar: axis to slenderness, as the table for those who do not see the drawing says. */
export async function lanes(page: Page, mark: string): Promise<Record<string, number>> {
  const table = page.getByRole('table', { name: `Lanes of ${mark} as a table` });
  const rows = await table.locator('tbody tr').all();
  const found: Record<string, number> = {};
  for (const each of rows) {
    const axis = (await each.locator('th').innerText()).trim();
    found[axis] = Number((await each.locator('td').nth(2).innerText()).replace(/[^\d.]/g, ''));
  }
  return found;
}

/** Opens a menu of the menu bar and chooses an entry. */
export async function command(page: Page, menu: string, entry: string | RegExp): Promise<void> {
  await page.getByRole('menuitem', { name: menu, exact: true }).click();
  const item = page.getByRole('menuitem', { name: entry });
  const tick = page
    .getByRole('menuitemcheckbox', { name: entry })
    .or(page.getByRole('menuitemradio', { name: entry }));
  await item.or(tick).first().click();
}
