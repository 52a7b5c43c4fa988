import { spawn } from 'node:child_process';
import type { MenuItem } from 'electron';
import { _electron } from 'playwright-core';
import { sandboxSwitches } from '../../../electron/browser/softwareDrawing.ts';
import { CHROMIUM_SWITCHES } from '../../browser/launchChromium.ts';
import type { Desktop, DesktopSetting, DialogKind } from './desktop.ts';

/** The real program, its dialogs answered inside its main process. */
export async function electronDesktop(binary: string, setting: DesktopSetting): Promise<Desktop> {
  const switches = [...sandboxSwitches(), ...CHROMIUM_SWITCHES, `--user-data-dir=${setting.userData}`];
  const program = await _electron.launch({
    executablePath: binary,
    args: [...switches, setting.main, ...setting.args],
  });
  const page = await program.firstWindow();
  await page.waitForLoadState('load');
  // A page of the program that is not there is empty, and has the preload all the same.
  if (setting.blank) await page.goto('app://tautline/blank');
  const quit = new Promise<true>((resolve) => program.on('close', () => resolve(true)));

  await program.evaluate(({ dialog }) => {
    const asked: string[] = [];
    const replies: { kind: string; reply: unknown }[] = [];
    const answer = (kind: string) => async () => {
      asked.push(kind);
      const next = replies.shift();
      if (next?.kind !== kind) throw new Error(`nobody answers this dialog: ${kind}`);
      return next.reply;
    };
    Object.assign(dialog, {
      showOpenDialog: answer('open'),
      showSaveDialog: answer('save'),
      showMessageBox: answer('message'),
    });
    Object.assign(globalThis, { testDialogs: { asked, replies } });
  });

  return {
    host: 'electron',
    page,
    userData: setting.userData,
    reply: (kind, reply) =>
      program.evaluate(
        (_electronModule, next) => {
          Reflect.get(globalThis, 'testDialogs').replies.push(next);
        },
        { kind, reply },
      ),
    asked: () => program.evaluate(() => Reflect.get(globalThis, 'testDialogs').asked as DialogKind[]),
    menu: () =>
      program.evaluate(({ Menu }) => {
        const entries: Record<string, string> = {};
        const visit = (items: MenuItem[]) => {
          for (const item of items) {
            if (item.id) entries[item.id] = item.label;
            if (item.submenu) visit(item.submenu.items);
          }
        };
        visit(Menu.getApplicationMenu()?.items ?? []);
        return entries;
      }),
    clickMenu: (id) =>
      program.evaluate(({ Menu }, wanted) => {
        const entry = Menu.getApplicationMenu()?.getMenuItemById(wanted);
        if (!entry) throw new Error(`the menu has no entry ${wanted}`);
        entry.click();
      }, id),
    title: () => program.evaluate(({ BrowserWindow }) => BrowserWindow.getAllWindows()[0]?.getTitle() ?? ''),
    clickClose: () => program.evaluate(({ BrowserWindow }) => BrowserWindow.getAllWindows()[0]?.close()),
    hasQuit: (ms) => Promise.race([quit, after(ms)]),
    startAgain: (args) =>
      new Promise((resolve) => {
        spawn(binary, [...switches, setting.main, ...args], { stdio: 'ignore' }).on('exit', () => resolve());
      }),
    lead: async (address) => void (await page.goto(address)),
    address: (app) => app,
    hang: () =>
      program.evaluate(({ BrowserWindow }) => void BrowserWindow.getAllWindows()[0]?.emit('unresponsive')),
    crashPage: () =>
      program.evaluate(({ BrowserWindow }) =>
        BrowserWindow.getAllWindows()[0]?.webContents.forcefullyCrashRenderer(),
      ),
    async crash() {
      program.process().kill('SIGKILL');
      await quit;
    },
    async end() {
      // Unsaved changes would hold a polite quit up.
      program.process().kill('SIGKILL');
      await quit;
    },
  };
}

function after(ms: number): Promise<false> {
  return new Promise((resolve) => setTimeout(() => resolve(false), ms));
}
