import { readFile } from 'node:fs/promises';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { launchChromium } from '../../browser/launchChromium.ts';
import { askHost, serveHostPage } from './servedHost.ts';

const given = { key: '0b5a2c1e-6d0f-4d5e-9c38-1c7b1a2f3e4d', name: 'shed.json', text: 'given' };
const savedAt = '2026-02-03T04:05:06.000Z';

let served: Awaited<ReturnType<typeof serveHostPage>>;
let browser: Browser;
let context: BrowserContext;
beforeAll(async () => {
  served = await serveHostPage(given);
  browser = await launchChromium();
});
afterAll(async () => {
  await browser.close();
  await served.close();
});
beforeEach(async () => {
  context = await browser.newContext();
});
afterEach(() => context.close());

async function openPage(query = '?plain-files'): Promise<Page> {
  const page = await context.newPage();
  await page.goto(new URL(query, served.address).href);
  await page.waitForFunction(() => Reflect.get(window, 'hostUnderTest') !== undefined);
  return page;
}

/** Answers the next upload; to be called before what asks for it. */
async function pick(page: Page, name: string, text: string): Promise<void> {
  const chooser = await page.waitForEvent('filechooser');
  await chooser.setFiles({ name, mimeType: 'application/json', buffer: Buffer.from(text) });
}

describe('a browser without real files', () => {
  it('begins with the example', async () => {
    const page = await openPage();
    const { opened, recovery, problem } = await askHost(page, 'start');
    expect(opened).toMatchObject({ token: '', name: 'marrow-lane.json' });
    expect(JSON.parse(opened?.text ?? '')).toEqual(
      JSON.parse(await readFile('assets/examples/marrow-lane.json', 'utf8')),
    );
    expect([recovery, problem]).toEqual([null, null]);
  });

  it('opens by upload and saves by download, under the same name', async () => {
    const page = await openPage();
    const [, opened] = await Promise.all([pick(page, 'shed.json', 'one'), askHost(page, 'open')]);
    expect(opened).toMatchObject({ ok: true, value: { name: 'shed.json', text: 'one' } });
    const token = opened?.ok ? opened.value.token : '';
    const [download, saved] = await Promise.all([
      page.waitForEvent('download'),
      askHost(page, 'save', token, 'two', false),
    ]);
    expect(saved).toEqual({ ok: true, value: { token, name: 'shed.json' } });
    expect(download.suggestedFilename()).toBe('shed.json');
    expect(await readFile(await download.path(), 'utf8')).toBe('two');
  });

  it('saves in a new place under the name suggested', async () => {
    const page = await openPage();
    const [download, saved] = await Promise.all([
      page.waitForEvent('download'),
      askHost(page, 'saveAs', 'Marrow Lane.tautline.json', 'text'),
    ]);
    expect(download.suggestedFilename()).toBe('Marrow Lane.tautline.json');
    expect(saved).toMatchObject({ ok: true, value: { name: 'Marrow Lane.tautline.json' } });
  });

  it('exports and imports text of other kinds', async () => {
    const page = await openPage();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      askHost(page, 'exportText', 'schedule.csv', 'mark\r\nD1', 'text/csv'),
    ]);
    expect(await readFile(await download.path(), 'utf8')).toBe('mark\r\nD1');
    const [, imported] = await Promise.all([
      pick(page, 'own.csv', 'a;b'),
      askHost(page, 'importText', ['csv']),
    ]);
    expect(imported).toEqual({ ok: true, value: { name: 'own.csv', text: 'a;b' } });
  });

  it('does not know a token it never gave', async () => {
    const page = await openPage();
    expect(await askHost(page, 'save', '', 'text', false)).toMatchObject({
      ok: false,
      problem: { kind: 'not found' },
    });
  });
});

describe('the file that the local server was started with', () => {
  it('is opened as a copy, which has no place yet', async () => {
    const page = await openPage(`?given=${given.key}`);
    expect((await askHost(page, 'start')).opened).toEqual({ token: '', name: 'shed.json', text: 'given' });
  });

  it('is missed aloud when it is not there', async () => {
    const page = await openPage('?given=another');
    expect(await askHost(page, 'start')).toMatchObject({ opened: null, problem: { kind: 'not found' } });
  });
});

describe('recovery', () => {
  it('offers what a page kept that has gone, until it is answered', async () => {
    const first = await openPage();
    await askHost(first, 'autosave', { name: 'Shed', token: '', text: 'work', savedAt });
    await first.close();

    const second = await openPage();
    const copy = { name: 'Shed', token: null, text: 'work', savedAt };
    expect((await askHost(second, 'start')).recovery).toEqual(copy);
    expect((await askHost(second, 'start')).recovery).toEqual(copy);
    await askHost(second, 'autosave', null);
    expect((await askHost(second, 'start')).recovery).toBeNull();
  });

  it('leaves alone what a page keeps that is still open', async () => {
    const first = await openPage();
    await askHost(first, 'autosave', { name: 'Shed', token: null, text: 'work', savedAt });
    const second = await openPage();
    expect((await askHost(second, 'start')).recovery).toBeNull();
  });
});

/** Gives the page pickers that pick a file of the browser's own, as a user would pick one on disk. */
async function withPickers(page: Page, name: string): Promise<void> {
  await page.addInitScript((picked) => {
    const handle = async () => {
      const root = await navigator.storage.getDirectory();
      return await root.getFileHandle(picked, { create: true });
    };
    Object.assign(window, { showOpenFilePicker: async () => [await handle()], showSaveFilePicker: handle });
  }, name);
  await page.reload();
  await page.waitForFunction(() => Reflect.get(window, 'hostUnderTest') !== undefined);
}

const textOnDisk = (page: Page, name: string): Promise<string> =>
  page.evaluate(async (at) => {
    const root = await navigator.storage.getDirectory();
    return await (await (await root.getFileHandle(at)).getFile()).text();
  }, name);

const changeOnDisk = (page: Page, name: string, text: string): Promise<void> =>
  page.evaluate(
    async ([at, content]) => {
      const root = await navigator.storage.getDirectory();
      const writing = await (await root.getFileHandle(at, { create: true })).createWritable();
      await writing.write(content);
      await writing.close();
    },
    [name, text] as const,
  );

describe('a browser with real files', () => {
  it('saves to the file itself, and refuses when it was changed meanwhile', async () => {
    const page = await openPage('');
    await changeOnDisk(page, 'shed.json', 'one');
    await withPickers(page, 'shed.json');
    const opened = await askHost(page, 'open');
    const token = opened?.ok ? opened.value.token : '';
    expect(await askHost(page, 'save', token, 'two', false)).toMatchObject({ ok: true });
    expect(await textOnDisk(page, 'shed.json')).toBe('two');

    await changeOnDisk(page, 'shed.json', 'theirs');
    expect(await askHost(page, 'save', token, 'three', false)).toEqual({
      ok: false,
      problem: { kind: 'changed on disk', name: 'shed.json' },
    });
    expect(await askHost(page, 'save', token, 'three', true)).toMatchObject({ ok: true });
    expect(await textOnDisk(page, 'shed.json')).toBe('three');
  });

  it('lists recent files, and opens one again in another page', async () => {
    const first = await openPage('');
    await withPickers(first, 'new.json');
    await askHost(first, 'saveAs', 'new.json', 'text');
    const second = await openPage('');
    const [recent] = await askHost(second, 'recent');
    expect(recent).toMatchObject({ name: 'new.json', folder: '' });
    expect(await askHost(second, 'openRecent', recent?.token ?? '')).toMatchObject({
      ok: true,
      value: { name: 'new.json', text: 'text' },
    });
  });

  it('takes a picker that is turned back for no answer', async () => {
    const page = await openPage('');
    await page.addInitScript(() => {
      const turnBack = () => Promise.reject(new DOMException('turned back', 'AbortError'));
      Object.assign(window, { showOpenFilePicker: turnBack, showSaveFilePicker: turnBack });
    });
    await page.reload();
    expect(await askHost(page, 'open')).toBeNull();
    expect(await askHost(page, 'saveAs', 'a.json', 'text')).toBeNull();
  });
});

describe('paper', () => {
  it('prints the report from a frame in which no script runs, and leaves no frame behind', async () => {
    const page = await openPage();
    await page.evaluate(() => {
      const seen: string[] = [];
      Reflect.set(window, 'printedPages', seen);
      const { append } = document.body;
      // The frame's own window prints; note what it shows instead of opening a dialog.
      document.body.append = function noted(...nodes) {
        append.apply(document.body, nodes);
        for (const node of nodes)
          if (node instanceof HTMLIFrameElement)
            node.addEventListener('load', () => {
              Object.assign(node.contentWindow ?? {}, {
                print: () => seen.push(node.contentDocument?.body.textContent?.trim() ?? ''),
              });
            });
      };
    });
    const html = '<p>report</p><script>document.body.textContent = "script ran"</script>';
    expect(await askHost(page, 'print', html)).toEqual({ ok: true, value: null });
    expect(await askHost(page, 'savePdf', 'report.pdf', html)).toEqual({
      ok: true,
      value: { name: 'report.pdf' },
    });
    // Text content has the script's own text in it; had the script run, only its message would be left.
    const printed: string[] = await page.evaluate(() => Reflect.get(window, 'printedPages'));
    expect(printed.map((text) => text.slice(0, 6))).toEqual(['report', 'report']);
    expect(await page.locator('iframe').count()).toBe(0);
  });
});

describe('the page', () => {
  it('shows the project and whether it is saved in its title, and asks before it is left unsaved', async () => {
    const page = await openPage();
    await askHost(page, 'setDocumentState', { title: 'Marrow Lane', dirty: true });
    expect(await page.title()).toBe('• Marrow Lane – Tautline');
    // A browser asks only about a page that has been used.
    await page.mouse.click(10, 10);
    const asked = page.waitForEvent('dialog');
    const closing = page.close({ runBeforeUnload: true });
    const dialog = await asked;
    expect(dialog.type()).toBe('beforeunload');
    await dialog.dismiss();
    await closing;
    expect(page.isClosed()).toBe(false);

    await askHost(page, 'setDocumentState', { title: 'Marrow Lane', dirty: false });
    expect(await page.title()).toBe('Marrow Lane – Tautline');
  });
});
