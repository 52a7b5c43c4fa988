import { mkdir, mkdtemp, readdir, readFile, rm, stat, truncate, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { fileProblem } from '../../../electron/files/fileProblem.ts';
import { type FileStore, fileStore, LARGEST_FILE } from '../../../electron/files/fileStore.ts';

let folder: string;
let files: FileStore;
const at = (name: string): string => path.join(folder, name);
beforeEach(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-store-'));
  files = fileStore();
});
afterEach(() => rm(folder, { recursive: true }));

async function opened(name: string, text: string): Promise<string> {
  await writeFile(at(name), text);
  const read = await files.read(at(name));
  if (!read.ok) throw new Error(`not read: ${read.problem.kind}`);
  return read.value.token;
}

describe('tokens', () => {
  it('stand for one path each, however that is written', () => {
    expect(files.tokenOf(at('a.json'))).toBe(files.tokenOf(`${folder}/x/../a.json`));
    expect(files.tokenOf(at('a.json'))).not.toBe(files.tokenOf(at('b.json')));
    expect(files.pathOf(files.tokenOf(at('a.json')))).toBe(at('a.json'));
  });

  it('cannot be made up, and mean nothing to another store', () => {
    expect(files.pathOf('a')).toBeNull();
    expect(files.pathOf(at('a.json'))).toBeNull();
    expect(fileStore().pathOf(files.tokenOf(at('a.json')))).toBeNull();
  });
});

describe('reading', () => {
  it('drops a byte order mark, which JSON does not allow', async () => {
    await writeFile(at('bom.json'), '\ufeff{}');
    expect(await files.read(at('bom.json'))).toMatchObject({ ok: true, value: { text: '{}' } });
  });

  it('reads UTF-16 as some editors write it', async () => {
    await writeFile(at('wide.json'), Buffer.from('\ufeff{"a": "×"}', 'utf16le'));
    expect(await files.read(at('wide.json'))).toMatchObject({ ok: true, value: { text: '{"a": "×"}' } });
  });

  it('refuses a file far too large to be a project, without reading it', async () => {
    await writeFile(at('huge.json'), '');
    await truncate(at('huge.json'), LARGEST_FILE + 1);
    expect(await files.read(at('huge.json'))).toEqual({
      ok: false,
      problem: { kind: 'too large', name: 'huge.json' },
    });
  });

  it('refuses a folder', async () => {
    expect(await files.read(folder)).toMatchObject({ ok: false, problem: { kind: 'failed' } });
  });
});

describe('saving', () => {
  it('leaves nothing but the file and its previous copy behind', async () => {
    const token = await opened('a.json', '1');
    await files.save(token, '2', false);
    expect((await readdir(folder)).toSorted()).toEqual(['a.json', 'a.json.previous']);
  });

  it('puts a new file in place of the old one, and never writes into it', async () => {
    const token = await opened('a.json', '1');
    const before = await stat(at('a.json'));
    await files.save(token, '2', false);
    // Another inode: the old bytes were whole until the moment the new ones were.
    expect((await stat(at('a.json'))).ino).not.toBe(before.ino);
  });

  it('keeps the file as it was when the previous copy cannot be kept', async () => {
    const token = await opened('a.json', '1');
    // A folder of that name cannot be replaced by a file.
    await mkdir(at('a.json.previous'));
    expect(await files.save(token, '2', false)).toMatchObject({ ok: false });
    expect(await readFile(at('a.json'), 'utf8')).toBe('1');
  });

  it('tells a change by content, not by time: the same bytes written again are no change', async () => {
    const token = await opened('a.json', '1');
    await writeFile(at('a.json'), '1');
    expect(await files.save(token, '2', false)).toMatchObject({ ok: true });
  });

  it('refuses a change that keeps the size', async () => {
    const token = await opened('a.json', '1');
    await writeFile(at('a.json'), '9');
    expect(await files.save(token, '2', false)).toEqual({
      ok: false,
      problem: { kind: 'changed on disk', name: 'a.json' },
    });
  });

  it('saves at a place just chosen, whatever is there', async () => {
    await writeFile(at('b.json'), 'old');
    expect(await files.saveAt(at('b.json'), 'new')).toMatchObject({ ok: true, value: { name: 'b.json' } });
    expect(await readFile(at('b.json.previous'), 'utf8')).toBe('old');
  });

  it('knows for work recalled from an earlier session what the file held then', async () => {
    const token = await opened('a.json', '1');
    const recalled = files.recall(at('a.json'), files.knownContent(token));
    expect(recalled).not.toBe(token);
    await writeFile(at('a.json'), '9');
    await files.read(at('a.json'));
    expect(await files.save(recalled, '2', false)).toMatchObject({ problem: { kind: 'changed on disk' } });
    expect(await files.save(token, '3', false)).toMatchObject({ ok: true });
  });
});

describe('what the system refuses', () => {
  const systemError = (code: string): Error => Object.assign(new Error(`${code}: refused`), { code });

  // Codes as in errno(3).
  it.each([
    ['ENOENT', 'not found'],
    ['EACCES', 'not allowed'],
    ['EROFS', 'not allowed'],
    ['ENOSPC', 'no room'],
    ['EDQUOT', 'no room'],
    ['EFBIG', 'too large'],
  ])('is told by kind: %s is "%s"', (code, kind) => {
    expect(fileProblem(systemError(code), 'a.json')).toEqual({ kind, name: 'a.json' });
  });

  it('is told in the words of the system when there is no kind for it', () => {
    expect(fileProblem(systemError('EIO'), 'a.json')).toEqual({
      kind: 'failed',
      name: 'a.json',
      detail: 'EIO: refused',
    });
  });
});
