import { mkdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import type { z } from 'zod';
import { replaceFile } from './replaceFile.ts';

/** What a small state file holds; null when it is missing, broken or of another shape: state is never worth an error. */
export async function readKept<T>(file: string, shape: z.ZodType<T>): Promise<T | null> {
  try {
    const read = shape.safeParse(JSON.parse(await readFile(file, 'utf8')));
    return read.success ? read.data : null;
  } catch {
    return null;
  }
}

export async function writeKept(file: string, state: unknown): Promise<void> {
  await mkdir(path.dirname(file), { recursive: true });
  await replaceFile(file, `${JSON.stringify(state, null, 2)}\n`);
}
