import { createHash, randomUUID } from 'node:crypto';
import { readFile, stat } from 'node:fs/promises';
import path from 'node:path';
import type { HostResult, OpenedFile, SavedFile } from '../../renderer/host/host.ts';
import { fileProblem } from './fileProblem.ts';
import { inTurn } from './inTurn.ts';
import { bytesIfThere, replaceFileKeepingPrevious } from './replaceFile.ts';
import { textOf } from './textOf.ts';

/** Larger than any project or stock list; a file above it was picked by mistake. Bytes. */
export const LARGEST_FILE = 64 * 1024 * 1024;

/** Project files on disk. Paths stay here; the window gets tokens. */
export interface FileStore {
  /** The token that stands for a path, the same one each time. */
  tokenOf(path: string): string;
  /** Null for a token that this store never gave. */
  pathOf(token: string): string | null;
  read(path: string): Promise<HostResult<OpenedFile>>;
  /** Refused when the file holds something else than was last read or saved under this token, unless `force`. */
  save(token: string, text: string, force: boolean): Promise<HostResult<SavedFile>>;
  /** Saves at a place the user has just chosen, whatever is there. */
  saveAt(path: string, text: string): Promise<HostResult<SavedFile>>;
  /** A digest of what was last read or saved under a token; null when nothing was. */
  knownContent(token: string): string | null;
  /** A token of its own for work on a file as an earlier session knew it: later changes by others still refuse a save. */
  recall(path: string, knownContent: string | null): string;
}

export function fileStore(): FileStore {
  const tokens = new Map<string, string>();
  const paths = new Map<string, string>();
  const known = new Map<string, string>();
  const oneAtATime = inTurn();

  function newToken(full: string): string {
    const token = randomUUID();
    paths.set(token, full);
    return token;
  }

  function tokenOf(given: string): string {
    const full = path.resolve(given);
    const token = tokens.get(full) ?? newToken(full);
    tokens.set(full, token);
    return token;
  }

  async function read(given: string): Promise<HostResult<OpenedFile>> {
    const content = await readTextFile(path.resolve(given));
    if (!content.ok) return content;
    const token = tokenOf(given);
    known.set(token, content.value.digest);
    return { ok: true, value: { token, name: content.value.name, text: content.value.text } };
  }

  async function save(token: string, text: string, force: boolean): Promise<HostResult<SavedFile>> {
    const full = paths.get(token);
    if (full === undefined) return { ok: false, problem: { kind: 'not found', name: '' } };
    const name = path.basename(full);
    try {
      const onDisk = await bytesIfThere(full);
      const expected = known.get(token);
      const changed = onDisk !== null && expected !== undefined && digestOf(onDisk) !== expected;
      if (changed && !force) return { ok: false, problem: { kind: 'changed on disk', name } };
      await replaceFileKeepingPrevious(full, text);
    } catch (error) {
      return { ok: false, problem: fileProblem(error, name) };
    }
    known.set(token, digestOf(Buffer.from(text)));
    return { ok: true, value: { token, name } };
  }

  return {
    tokenOf,
    pathOf: (token) => paths.get(token) ?? null,
    read: (given) => oneAtATime(() => read(given)),
    save: (token, text, force) => oneAtATime(() => save(token, text, force)),
    saveAt: (given, text) => oneAtATime(() => save(tokenOf(given), text, true)),
    knownContent: (token) => known.get(token) ?? null,
    recall(given, knownContent) {
      const token = newToken(path.resolve(given));
      if (knownContent !== null) known.set(token, knownContent);
      return token;
    },
  };
}

/** A text file with its name and a digest of its bytes; refused above `LARGEST_FILE`. */
export async function readTextFile(
  full: string,
): Promise<HostResult<{ readonly name: string; readonly text: string; readonly digest: string }>> {
  const name = path.basename(full);
  try {
    const about = await stat(full);
    if (!about.isFile()) return { ok: false, problem: { kind: 'failed', name, detail: 'It is not a file.' } };
    if (about.size > LARGEST_FILE) return { ok: false, problem: { kind: 'too large', name } };
    const bytes = await readFile(full);
    return { ok: true, value: { name, text: textOf(bytes), digest: digestOf(bytes) } };
  } catch (error) {
    return { ok: false, problem: fileProblem(error, name) };
  }
}

function digestOf(bytes: Uint8Array): string {
  return createHash('sha256').update(bytes).digest('hex');
}
