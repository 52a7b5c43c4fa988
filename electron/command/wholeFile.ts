import { randomUUID } from 'node:crypto';
import { open, realpath, rename, rm, stat } from 'node:fs/promises';
import path from 'node:path';

/**
 * Puts text in a file, all or nothing: a sibling is written, synced and takes the file's name, so that no half of a result is ever
 * left. Links are followed and the rights of a file that is there are kept; what is no plain file (a pipe, a terminal) is written to as it is.
 */
export async function writeWholeFile(file: string, text: string): Promise<void> {
  const target = await realpath(file).catch(() => file);
  const before = await stat(target).catch(() => null);
  if (before !== null && !before.isFile()) return writeThrough(target, 'w', text);
  const sibling = path.join(path.dirname(target), `.${path.basename(target)}.${randomUUID()}`);
  try {
    await writeThrough(sibling, 'wx', text, before?.mode);
    await rename(sibling, target);
  } catch (error) {
    await rm(sibling, { force: true });
    throw error;
  }
}

async function writeThrough(file: string, flags: 'w' | 'wx', text: string, mode?: number): Promise<void> {
  const handle = await open(file, flags, mode);
  try {
    await handle.writeFile(text);
    // A pipe or a terminal has nothing to sync.
    if (flags === 'wx') await handle.sync();
  } finally {
    await handle.close();
  }
}
