import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ask, noteCommands, until } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { startDesktop } from './startDesktop.ts';

let desktop: Desktop;
beforeEach(async () => {
  desktop = await startDesktop({ blank: true });
});
afterEach(() => desktop.end());

describe('closing', () => {
  it('needs no question when everything is saved', async () => {
    await desktop.clickClose();
    expect(await desktop.hasQuit(3000)).toBe(true);
    expect(await desktop.asked()).toEqual([]);
  });

  it('asks in the window when there is unsaved work, and waits for the answer', async () => {
    const heard = await noteCommands(desktop.page);
    await ask(desktop.page, 'setDocumentState', { title: 'Shed', dirty: true });
    await until(desktop.title, (title) => title.startsWith('• '));
    await desktop.clickClose();
    expect(await until(heard, (all) => all.length > 0)).toEqual(['close']);
    // 300 ms: far longer than an unhindered close takes here.
    expect(await desktop.hasQuit(300)).toBe(false);

    await ask(desktop.page, 'confirmClose');
    expect(await desktop.hasQuit(3000)).toBe(true);
  });

  it('goes by the menu through the same question', async () => {
    const heard = await noteCommands(desktop.page);
    await ask(desktop.page, 'setDocumentState', { title: 'Shed', dirty: true });
    await until(desktop.title, (title) => title.startsWith('• '));
    await desktop.clickMenu('file.close');
    expect(await until(heard, (all) => all.length > 0)).toEqual(['close']);
  });
});

describe('a window that cannot ask', () => {
  async function unsavedWork(): Promise<void> {
    await ask(desktop.page, 'setDocumentState', { title: 'Shed', dirty: true });
    await ask(desktop.page, 'autosave', {
      name: 'Shed',
      token: null,
      text: 'work',
      savedAt: '2026-02-03T04:05:06.000Z',
    });
  }
  const recoveryText = async (): Promise<string> =>
    JSON.parse(await readFile(path.join(desktop.userData, 'recovery.json'), 'utf8')).text;

  it('because it hangs is waited for, or closed without losing what was kept', async () => {
    await unsavedWork();
    await desktop.hang();
    await desktop.reply('message', { response: 0 });
    await desktop.clickClose();
    expect(await desktop.hasQuit(300)).toBe(false);
    expect(await desktop.asked()).toEqual(['message']);

    await desktop.reply('message', { response: 1 });
    await desktop.clickClose();
    expect(await desktop.hasQuit(3000)).toBe(true);
    expect(await recoveryText()).toBe('work');
  });

  it('because it broke down can be left, and what was kept stays', async () => {
    await unsavedWork();
    await desktop.reply('message', { response: 1 });
    await desktop.crashPage();
    expect(await desktop.hasQuit(3000)).toBe(true);
    expect(await recoveryText()).toBe('work');
  });
});

describe('the window', () => {
  it('shows the project and whether it is saved in its title', async () => {
    await ask(desktop.page, 'setDocumentState', { title: 'Marrow Lane', dirty: false });
    await until(desktop.title, (title) => title === 'Marrow Lane – Tautline');
    await ask(desktop.page, 'setDocumentState', { title: 'Marrow Lane', dirty: true });
    await until(desktop.title, (title) => title === '• Marrow Lane – Tautline');
  });

  it('keeps its place for the next session', async () => {
    await desktop.clickClose();
    expect(await desktop.hasQuit(3000)).toBe(true);
    const kept = JSON.parse(await readFile(path.join(desktop.userData, 'window.json'), 'utf8'));
    expect(Object.keys(kept).toSorted()).toEqual(['height', 'maximised', 'width', 'x', 'y']);
  });

  it('takes a file from a second start, and lets the window open it', async () => {
    const file = path.join(desktop.userData, 'second.json');
    await writeFile(file, 'second');
    const heard = await noteCommands(desktop.page);
    await desktop.startAgain([file]);
    const [command] = await until(heard, (all) => all.length > 0);
    expect(command).toEqual({ kind: 'open recent', token: expect.any(String) });
    const token = typeof command === 'object' ? command.token : '';
    expect(await ask(desktop.page, 'openRecent', token)).toMatchObject({
      ok: true,
      value: { name: 'second.json', text: 'second' },
    });
  });
});

describe('the page', () => {
  const status = (address: string): Promise<number> =>
    desktop.page.evaluate(async (at) => (await fetch(at)).status, address);

  it('gets the built window and nothing outside it, however the address is spelt', async () => {
    expect(await status('/index.html')).toBe(200);
    for (const wayOut of [
      '/../electron/main.cjs',
      '/%2e%2e/electron/main.cjs',
      '/..%2felectron%2fmain.cjs',
      '/assets/..%2f..%2felectron/main.cjs',
      '/..%5celectron%5cmain.cjs',
      '/%00/index.html',
      '/%E0%A4%A',
      '/%2fetc/passwd',
    ])
      expect([wayOut, await status(new URL(wayOut, desktop.address('app://tautline')).href)]).not.toContain(
        200,
      );
  });

  it('runs no script but its own files', async () => {
    const ran = await desktop.page.evaluate(async () => {
      const inline = document.createElement('script');
      inline.textContent = 'window.inlineRan = true';
      document.body.append(inline);
      // A test's own scripts may evaluate text; what a timer evaluates later falls under the page's policy.
      setTimeout('window.textRan = true', 0);
      await new Promise((resolve) => setTimeout(resolve, 100));
      return [Reflect.get(window, 'inlineRan'), Reflect.get(window, 'textRan')];
    });
    expect(ran).toEqual([undefined, undefined]);
  });

  it('reaches nothing on the network', async () => {
    const reached = await desktop.page.evaluate(async () => {
      const image = new Image();
      const shown = new Promise<boolean>((resolve) => {
        image.onload = () => resolve(true);
        image.onerror = () => resolve(false);
      });
      image.src = 'https://example.org/picture.png';
      const fetched = await fetch('https://example.org/').then(
        () => true,
        () => false,
      );
      return fetched || (await shown);
    });
    expect(reached).toBe(false);
  });

  it('stays where it is', async () => {
    const before = desktop.page.url();
    await desktop.page.evaluate(() => {
      window.location.href = 'https://example.org/';
    });
    await new Promise((resolve) => setTimeout(resolve, 300));
    expect(desktop.page.url()).toBe(before);
    await expect(ask(desktop.page, 'recent')).resolves.toEqual([]);
  });

  it('opens no other window', async () => {
    await desktop.page.evaluate(() => void window.open('https://example.org/'));
    await new Promise((resolve) => setTimeout(resolve, 300));
    // One that is let stand stays; one that is refused may take a busy machine a while to go.
    await expect.poll(() => desktop.page.context().pages().length, { timeout: 5000 }).toBe(1);
  });
});
