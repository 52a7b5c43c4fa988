import { readFile, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ask, given } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { startDesktop, testFolder } from './startDesktop.ts';

let desktop: Desktop;
let folder: Awaited<ReturnType<typeof testFolder>>;
beforeEach(async () => {
  folder = await testFolder();
  desktop = await startDesktop({ blank: true });
});
afterEach(async () => {
  await desktop.end();
  await folder.remove();
});

const inFolder = (name: string): string => path.join(folder.path, name);

async function openFile(name: string, text: string) {
  await writeFile(inFolder(name), text);
  await desktop.reply('open', { canceled: false, filePaths: [inFolder(name)] });
  return given(await ask(desktop.page, 'open'));
}

describe('opening', () => {
  it('begins with the example, which has no place yet', async () => {
    const { opened, recovery, problem } = await ask(desktop.page, 'start');
    expect(opened).toMatchObject({ token: '', name: 'marrow-lane.json' });
    expect(JSON.parse(opened?.text ?? '')).toEqual(
      JSON.parse(await readFile('assets/examples/marrow-lane.json', 'utf8')),
    );
    expect([recovery, problem]).toEqual([null, null]);
  });

  it('gives name and text of the file picked, and a token without its path', async () => {
    const opened = await openFile('shed.json', '{"shed": 1}');
    expect(opened).toEqual({ token: expect.any(String), name: 'shed.json', text: '{"shed": 1}' });
    expect(JSON.stringify(opened)).not.toContain(folder.path);
  });

  it('gives null when the user turns back', async () => {
    await desktop.reply('open', { canceled: true, filePaths: [] });
    expect(await ask(desktop.page, 'open')).toBeNull();
  });

  it('opens the file named on the command line', async () => {
    await writeFile(inFolder('given.json'), 'given');
    await using(await startDesktop({ blank: true, args: [inFolder('given.json')] }), async ({ page }) => {
      expect((await ask(page, 'start')).opened).toMatchObject({ name: 'given.json', text: 'given' });
    });
  });

  it('says which named file is not there', async () => {
    await using(await startDesktop({ blank: true, args: [inFolder('missing.json')] }), async ({ page }) => {
      expect(await ask(page, 'start')).toEqual({
        opened: null,
        recovery: null,
        problem: { kind: 'not found', name: 'missing.json' },
      });
    });
  });

  it('reads a file of another kind for import, and keeps no token of it', async () => {
    await writeFile(inFolder('own.csv'), 'L 60×60×5;5,82', 'latin1');
    await desktop.reply('open', { canceled: false, filePaths: [inFolder('own.csv')] });
    // Written as Windows-1252, as spreadsheets do: the multiplication sign must come out whole.
    expect(given(await ask(desktop.page, 'importText', ['csv']))).toEqual({
      name: 'own.csv',
      text: 'L 60×60×5;5,82',
    });
    expect(await ask(desktop.page, 'recent')).toEqual([]);
  });
});

describe('saving', () => {
  it('writes the whole text, and keeps what was there before as the previous copy', async () => {
    const { token } = await openFile('shed.json', 'first');
    expect(given(await ask(desktop.page, 'save', token, 'second', false))).toEqual({
      token,
      name: 'shed.json',
    });
    expect(await readFile(inFolder('shed.json'), 'utf8')).toBe('second');
    expect(await readFile(inFolder('shed.json.previous'), 'utf8')).toBe('first');
  });

  it('keeps the last different copy when the same text is saved twice', async () => {
    const { token } = await openFile('shed.json', 'first');
    for (const text of ['second', 'second']) given(await ask(desktop.page, 'save', token, text, false));
    expect(await readFile(inFolder('shed.json.previous'), 'utf8')).toBe('first');
  });

  it('refuses a file that someone else has changed, and overwrites it only when told to', async () => {
    const { token } = await openFile('shed.json', 'mine');
    await writeFile(inFolder('shed.json'), 'theirs');
    expect(await ask(desktop.page, 'save', token, 'mine again', false)).toEqual({
      ok: false,
      problem: { kind: 'changed on disk', name: 'shed.json' },
    });
    expect(await readFile(inFolder('shed.json'), 'utf8')).toBe('theirs');

    given(await ask(desktop.page, 'save', token, 'mine again', true));
    expect(await readFile(inFolder('shed.json'), 'utf8')).toBe('mine again');
    expect(await readFile(inFolder('shed.json.previous'), 'utf8')).toBe('theirs');
  });

  it('goes on saving after its own saves', async () => {
    const { token } = await openFile('shed.json', '1');
    for (const text of ['2', '3']) given(await ask(desktop.page, 'save', token, text, false));
    expect(await readFile(inFolder('shed.json'), 'utf8')).toBe('3');
  });

  it('saves in the order asked when two saves overlap', async () => {
    const { token } = await openFile('shed.json', '0');
    const texts = ['a', 'b', 'c', 'd'];
    await Promise.all(texts.map((text) => ask(desktop.page, 'save', token, text, false)));
    expect(await readFile(inFolder('shed.json'), 'utf8')).toBe('d');
  });

  it('saves in a new place, and from then on there', async () => {
    await desktop.reply('save', { canceled: false, filePath: inFolder('new.json') });
    const { token, name } = given(await ask(desktop.page, 'saveAs', 'Shed A/B', 'one'));
    expect(name).toBe('new.json');
    given(await ask(desktop.page, 'save', token, 'two', false));
    expect(await readFile(inFolder('new.json'), 'utf8')).toBe('two');
  });

  it('leaves everything as it was when the user turns back', async () => {
    await desktop.reply('save', { canceled: true, filePath: '' });
    expect(await ask(desktop.page, 'saveAs', 'shed.json', 'text')).toBeNull();
  });

  it('makes a file again that was deleted meanwhile', async () => {
    const { token } = await openFile('shed.json', 'first');
    await rm(inFolder('shed.json'));
    given(await ask(desktop.page, 'save', token, 'second', false));
    expect(await readFile(inFolder('shed.json'), 'utf8')).toBe('second');
  });

  it('says so when a save fails, and never that it was saved', async () => {
    await writeFile(inFolder('not-a-folder'), '');
    await desktop.reply('save', { canceled: false, filePath: inFolder('not-a-folder/shed.json') });
    const saved = await ask(desktop.page, 'saveAs', 'shed.json', 'text');
    expect(saved).toEqual({ ok: false, problem: { kind: 'not found', name: 'shed.json' } });
    expect(await ask(desktop.page, 'recent')).toEqual([]);
  });

  it('exports a document byte for byte', async () => {
    await desktop.reply('save', { canceled: false, filePath: inFolder('schedule.csv') });
    const text = 'mark,section\r\nD1,70×70×6\r\n';
    expect(given(await ask(desktop.page, 'exportText', 'schedule.csv', text, 'text/csv'))).toEqual({
      name: 'schedule.csv',
    });
    expect(await readFile(inFolder('schedule.csv'), 'utf8')).toBe(text);
  });
});

describe('recent projects', () => {
  it('are listed newest first, with a folder to tell them apart, and open by token', async () => {
    await openFile('one.json', '1');
    await openFile('two.json', '2');
    const recent = await ask(desktop.page, 'recent');
    expect(recent.map(({ name, folder: at }) => [name, at])).toEqual([
      ['two.json', folder.path],
      ['one.json', folder.path],
    ]);
    const again = given(await ask(desktop.page, 'openRecent', recent[1]?.token ?? ''));
    expect(again).toMatchObject({ name: 'one.json', text: '1' });
  });

  it('lose a file that is gone, and say so', async () => {
    const { token } = await openFile('gone.json', '1');
    await rm(inFolder('gone.json'));
    expect(await ask(desktop.page, 'openRecent', token)).toEqual({
      ok: false,
      problem: { kind: 'not found', name: 'gone.json' },
    });
    expect(await ask(desktop.page, 'recent')).toEqual([]);
  });

  it('outlive the session, which begins again with the last one', async () => {
    await openFile('kept.json', 'kept');
    await desktop.clickClose();
    expect(await desktop.hasQuit(3000)).toBe(true);
    await using(await startDesktop({ blank: true, userData: desktop.userData }), async ({ page }) => {
      expect((await ask(page, 'start')).opened).toMatchObject({ name: 'kept.json', text: 'kept' });
      expect((await ask(page, 'recent')).map(({ name }) => name)).toEqual(['kept.json']);
    });
  });

  it('stand in the menu, where each opens through the window', async () => {
    await openFile('one.json', '1');
    expect((await desktop.menu())['file.recent.0']).toBe(`one.json (${folder.path})`);
  });
});

async function using(other: Desktop, use: (other: Desktop) => Promise<void>): Promise<void> {
  try {
    await use(other);
  } finally {
    await other.end();
  }
}
