import path from 'node:path';
import type { Browser } from 'playwright-core';
import { launchChromium } from '../../browser/launchChromium.ts';
import type { Desktop, DesktopSetting, DialogKind } from './desktop.ts';
import { plainAddress } from './standIn/addresses.ts';
import { type MenuEntry, StandIn } from './standIn/standIn.ts';

/** One for all stand-ins of a test file; Playwright ends it with the process. */
let chromium: Promise<Browser> | null = null;

/** The stand-in, each in a browser context of its own. */
export async function standInDesktop(setting: DesktopSetting): Promise<Desktop> {
  chromium ??= launchChromium();
  const context = await (await chromium).newContext();
  context.setDefaultTimeout(10_000);
  const home = path.join(setting.userData, 'home');
  const standIn = new StandIn({ ...setting, context, home });
  await standIn.start();
  const window = await standIn.window();
  const page = await window.page;
  await page.waitForLoadState('load');
  return {
    host: 'stand-in',
    page,
    userData: setting.userData,
    reply: async (kind, reply) => standIn.reply(kind, reply),
    asked: async () => standIn.asked.map(({ kind }) => kind).filter(isDialogKind),
    menu: async () => Object.fromEntries(entriesOf(standIn.menu).map(({ id, label }) => [id, label ?? ''])),
    async clickMenu(id) {
      const entry = entriesOf(standIn.menu).find((one) => one.id === id);
      if (entry?.click === undefined) throw new Error(`the menu has no entry ${id}`);
      entry.click();
    },
    title: async () => window.title,
    clickClose: async () => window.close(),
    hasQuit: (ms) => Promise.race([standIn.quit.then(() => true), after(ms)]),
    startAgain: async (args) => standIn.secondStart(args, process.cwd()),
    async lead(address) {
      window.expect(plainAddress(address));
      await page.goto(plainAddress(address));
    },
    address: plainAddress,
    hang: async () => void window.emit('unresponsive'),
    crashPage: async () => void window.webContents.emit('render-process-gone', {}, { reason: 'crashed' }),
    crash: () => standIn.crash(),
    end: () => standIn.crash(),
  };
}

function entriesOf(menu: readonly MenuEntry[]): readonly (MenuEntry & { readonly id: string })[] {
  return menu.flatMap((entry) => [
    ...(entry.id === undefined ? [] : [{ ...entry, id: entry.id }]),
    ...entriesOf(entry.submenu ?? []),
  ]);
}

function isDialogKind(kind: DialogKind | 'error'): kind is DialogKind {
  return kind !== 'error';
}

function after(ms: number): Promise<false> {
  return new Promise((resolve) => setTimeout(() => resolve(false), ms));
}
