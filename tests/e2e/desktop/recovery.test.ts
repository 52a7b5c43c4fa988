import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ask, given } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { startDesktop, testFolder } from './startDesktop.ts';

let folder: Awaited<ReturnType<typeof testFolder>>;
let file: string;
const running: Desktop[] = [];
beforeEach(async () => {
  folder = await testFolder();
  file = path.join(folder.path, 'shed.json');
  await writeFile(file, 'saved');
});
afterEach(async () => {
  for (const desktop of running.splice(0)) await desktop.end();
  await folder.remove();
});

async function start(userData?: string): Promise<Desktop> {
  const desktop = await startDesktop({ blank: true, ...(userData === undefined ? {} : { userData }) });
  running.push(desktop);
  return desktop;
}

const savedAt = '2026-02-03T04:05:06.000Z';

/** A session that opened the file, kept unsaved work and came to a sudden end; its folder of state. */
async function crashedSession(): Promise<string> {
  const { page, reply, crash, userData } = await start();
  await reply('open', { canceled: false, filePaths: [file] });
  const { token } = given(await ask(page, 'open'));
  await ask(page, 'autosave', { name: 'shed.json', token, text: 'unsaved work', savedAt });
  await crash();
  running.pop();
  return userData;
}

describe('after a crash', () => {
  it('the work kept last is offered beside the file as it was saved', async () => {
    const { page } = await start(await crashedSession());
    const { opened, recovery } = await ask(page, 'start');
    expect(opened).toMatchObject({ name: 'shed.json', text: 'saved' });
    expect(recovery).toEqual({ name: 'shed.json', token: expect.any(String), text: 'unsaved work', savedAt });
  });

  it('the work taken up is saved to the file it came from', async () => {
    const { page } = await start(await crashedSession());
    const { recovery } = await ask(page, 'start');
    given(await ask(page, 'save', recovery?.token ?? '', 'unsaved work', false));
    expect(await readFile(file, 'utf8')).toBe('unsaved work');
  });

  it('a file that someone else has changed since is still not overwritten unasked', async () => {
    const userData = await crashedSession();
    await writeFile(file, 'theirs');
    const { page } = await start(userData);
    const { opened, recovery } = await ask(page, 'start');
    expect(await ask(page, 'save', recovery?.token ?? '', 'unsaved work', false)).toEqual({
      ok: false,
      problem: { kind: 'changed on disk', name: 'shed.json' },
    });
    // Whoever takes the file as it is now works on what is there.
    given(await ask(page, 'save', opened?.token ?? '', 'theirs, and more', false));
  });

  it('the offer stays until it is answered, even over a session in which nothing was done', async () => {
    const userData = await crashedSession();
    const idle = await start(userData);
    await ask(idle.page, 'start');
    await idle.clickClose();
    expect(await idle.hasQuit(3000)).toBe(true);

    const { page } = await start(userData);
    expect((await ask(page, 'start')).recovery).toMatchObject({ text: 'unsaved work' });
    await ask(page, 'autosave', null);
    expect((await ask(page, 'start')).recovery).toBeNull();
  });

  it('work on what has no place yet is offered too', async () => {
    const { page, crash, userData } = await start();
    await ask(page, 'autosave', { name: 'Example', token: '', text: 'new work', savedAt });
    await crash();
    running.pop();
    const next = await start(userData);
    expect((await ask(next.page, 'start')).recovery).toEqual({
      name: 'Example',
      token: null,
      text: 'new work',
      savedAt,
    });
  });

  it('a recovery file that is broken is passed over', async () => {
    const userData = await crashedSession();
    await writeFile(path.join(userData, 'recovery.json'), '{"name": "sh');
    const { page } = await start(userData);
    expect((await ask(page, 'start')).recovery).toBeNull();
  });
});

describe('after a session that ended well', () => {
  it('nothing is offered', async () => {
    const { page, clickClose, hasQuit, userData } = await start();
    await ask(page, 'autosave', { name: 'Example', token: null, text: 'work, undone again', savedAt });
    await clickClose();
    expect(await hasQuit(3000)).toBe(true);
    const next = await start(userData);
    expect((await ask(next.page, 'start')).recovery).toBeNull();
  });
});
