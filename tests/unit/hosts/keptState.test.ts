import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { recentFiles } from '../../../electron/files/recentFiles.ts';
import { recoveryFile } from '../../../electron/files/recoveryFile.ts';

let folder: string;
beforeEach(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-kept-'));
});
afterEach(() => rm(folder, { recursive: true }));

describe('recent files', () => {
  const at = (name: string): string => path.join(folder, name);

  it('keeps the ten worked on last, each once, the newest first', async () => {
    const recents = await recentFiles(at('recent.json'), () => undefined);
    for (let number = 1; number <= 12; number += 1) await recents.add(at(`${number}.json`));
    await recents.add(at('5.json'));
    expect(recents.list().map((file) => path.basename(file, '.json'))).toEqual(
      '5 12 11 10 9 8 7 6 4 3'.split(' '),
    );
    expect((await recentFiles(at('recent.json'), () => undefined)).list()).toEqual(recents.list());
  });

  it('tells of every change, so that the menu can follow', async () => {
    let changes = 0;
    const recents = await recentFiles(at('recent.json'), () => {
      changes += 1;
    });
    await recents.add(at('a.json'));
    await recents.remove(at('a.json'));
    expect([changes, recents.list()]).toEqual([2, []]);
  });

  it.each(['', '{"a": 1}', '[1, 2]', '["relative.json"]'])(
    'begins empty when what was kept is %j',
    async (text) => {
      await writeFile(at('recent.json'), text);
      expect((await recentFiles(at('recent.json'), () => undefined)).list()).toEqual([]);
    },
  );
});

describe('the recovery copy', () => {
  const record = { name: 'a', path: null, knownContent: null, text: 't', savedAt: '2026-01-01T00:00:00Z' };

  it('is the last one kept, in whatever order the disk was ready', async () => {
    const recovery = recoveryFile(path.join(folder, 'deep', 'recovery.json'));
    await Promise.all(['1', '2', '3'].map((text) => recovery.keep({ ...record, text })));
    expect(await recovery.read()).toEqual({ ...record, text: '3' });
  });

  it('of an earlier session is not forgotten with what this one kept', async () => {
    const file = path.join(folder, 'recovery.json');
    await recoveryFile(file).keep(record);
    const next = recoveryFile(file);
    await next.forgetOwn();
    expect(await next.read()).toEqual(record);
    await next.keep({ ...record, text: 'own' });
    await next.forgetOwn();
    expect(await next.read()).toBeNull();
  });

  it('is readable text, so that work can be had back by hand', async () => {
    const file = path.join(folder, 'recovery.json');
    await recoveryFile(file).keep(record);
    expect(JSON.parse(await readFile(file, 'utf8'))).toEqual(record);
  });
});
