import { readFile, stat } from 'node:fs/promises';
import { replaceFile } from '../files/replaceFile.ts';
import { systemWords } from './projectFile.ts';
import type { Terminal } from './terminal.ts';
import type { Attempt } from './trouble.ts';

/**
 * Writes a result to the file of -o, all or nothing, or to the terminal when there is none.
 *
 * @param existing whether a file that is there already may be replaced; a project never is, but by force
 */
export async function deliver(
  text: string,
  file: string | undefined,
  terminal: Terminal,
  existing: 'replace' | 'refuse' | 'force',
): Promise<Attempt<null>> {
  if (file === undefined) {
    terminal.out(text);
    return { ok: true, value: null };
  }
  if (existing === 'refuse' && (await isThere(file)))
    return { ok: false, trouble: { kind: 'would overwrite', file } };
  if (existing === 'replace' && (await isProject(file)))
    return { ok: false, trouble: { kind: 'over a project', file } };
  try {
    await replaceFile(file, text);
  } catch (error) {
    return { ok: false, trouble: { kind: 'unwritable', file, why: systemWords(error) } };
  }
  terminal.err(`${file}: written.\n`);
  return { ok: true, value: null };
}

/** By the mark that every project file bears near its beginning. */
async function isProject(file: string): Promise<boolean> {
  const text = await readFile(file, 'utf8').catch(() => '');
  return /^\s*\{\s*"format"\s*:\s*"tautline-project"/.test(text);
}

async function isThere(file: string): Promise<boolean> {
  try {
    await stat(file);
    return true;
  } catch {
    // Not there, or not to be seen: writing it will say which.
    return false;
  }
}
