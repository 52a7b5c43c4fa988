import { readFile, stat, writeFile } from 'node:fs/promises';
import writeFileAtomic from 'write-file-atomic';
import { errorCode } from './fileProblem.ts';

/** Where the copy from before the last save is kept. */
export function previousCopyOf(path: string): string {
  return `${path}.previous`;
}

/**
 * Puts new bytes in place of what a file holds, all or nothing: a sibling is written, synced and takes the file's
 * name, so a power cut leaves either the old file or the new one, never half of one. Links are followed and the rights of
 * a file that is there are kept; what is no plain file (a pipe, a terminal) is written to as it is.
 */
export async function replaceFile(path: string, content: string | Uint8Array): Promise<void> {
  const there = await stat(path).catch(() => null);
  if (there !== null && !there.isFile()) await writeFile(path, content);
  else await writeFileAtomic(path, typeof content === 'string' ? content : Buffer.from(content));
}

/** As `replaceFile`, and keeps what the file held before as "<file>.previous". */
export async function replaceFileKeepingPrevious(path: string, content: string): Promise<void> {
  const before = await bytesIfThere(path);
  // Saving the same text twice must not push the last different copy out.
  if (before !== null && !before.equals(Buffer.from(content)))
    await replaceFile(previousCopyOf(path), before);
  await replaceFile(path, content);
}

export async function bytesIfThere(path: string): Promise<Buffer | null> {
  try {
    return await readFile(path);
  } catch (error) {
    if (errorCode(error) === 'ENOENT') return null;
    throw error;
  }
}
