import { readFile } from 'node:fs/promises';
import type { Project } from '../../core/project/model.ts';
import { readProject } from '../../core/project/readProject.ts';
import type { Attempt } from './trouble.ts';

export async function readProjectFile(file: string): Promise<Attempt<Project>> {
  let text: string;
  try {
    text = await readFile(file, 'utf8');
  } catch (error) {
    return { ok: false, trouble: { kind: 'unreadable', file, why: systemWords(error) } };
  }
  const read = readProject(text);
  return read.ok
    ? { ok: true, value: read.project }
    : { ok: false, trouble: { kind: 'no project', file, problems: read.problems } };
}

/** What the file system said, in a word or two. */
export function systemWords(error: unknown): string {
  const code = error instanceof Error && 'code' in error ? String(error.code) : '';
  switch (code) {
    case 'ENOENT':
      return 'no such file or folder';
    case 'EISDIR':
      return 'it is a folder';
    case 'ENOTDIR':
      return 'its folder is a file';
    case 'EACCES':
    case 'EPERM':
    case 'EROFS':
      return 'not allowed';
    case 'ENOSPC':
      return 'no room on the disk';
    default:
      return error instanceof Error ? error.message : String(error);
  }
}
