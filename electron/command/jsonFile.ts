import { readFile } from 'node:fs/promises';
import { systemWords } from './projectFile.ts';
import type { Attempt } from './trouble.ts';

/** What a JSON file holds, whatever that is. */
export async function readJsonFile(file: string): Promise<Attempt<unknown>> {
  let text: string;
  try {
    text = await readFile(file, 'utf8');
  } catch (error) {
    return { ok: false, trouble: { kind: 'unreadable', file, why: systemWords(error) } };
  }
  try {
    return { ok: true, value: JSON.parse(text.replace(/^\uFEFF/, '')) };
  } catch (error) {
    return {
      ok: false,
      trouble: { kind: 'no JSON', file, why: error instanceof Error ? error.message : String(error) },
    };
  }
}
