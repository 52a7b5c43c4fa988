import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { onTestFinished } from 'vitest';
import { runCommandLine } from '../../../electron/command/commandLine.ts';

export interface Run {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

/** Runs the command line in this process, with what it wrote to each stream. */
export async function run(...words: readonly string[]): Promise<Run> {
  let [out, err] = ['', ''];
  const code = await runCommandLine(words, {
    out: (text) => {
      out += text;
    },
    err: (text) => {
      err += text;
    },
  });
  return { code, out, err };
}

/** A folder of its own, gone after the test. */
export async function folder(): Promise<string> {
  const made = await mkdtemp(path.join(tmpdir(), 'tautline-command-'));
  onTestFinished(() => rm(made, { recursive: true, force: true }));
  return made;
}

/** A project file with what is told of `new`, then changed as text where asked. */
export async function projectFile(
  words: readonly string[],
  change: (text: string) => string = (text) => text,
): Promise<string> {
  const file = path.join(await folder(), 'shed.json');
  const made = await run('new', ...words, '-o', file);
  if (made.code !== 0) throw new Error(made.err);
  await writeFile(file, change(await readFile(file, 'utf8')));
  return file;
}

/** Diagonals of 5 m in 70x70x6, within 300 when bolted through, over it when free. */
export const CROSSED = ['wall-bay', '--width', '3000', '--tier', '4000:crossed'];
