import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { chmod, mkdir, mkdtemp, readFile, rm, symlink, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  type DocumentedCommand,
  documentedCommands,
  documentedPaths,
  documentedScripts,
} from './markdown.ts';

const ROOT = path.resolve(import.meta.dirname, '../../..');
const DOCUMENTS = ['README.md', 'DEVELOPERS.md'] as const;
const FOLDERS = ['core', 'renderer', 'electron', 'tests', 'assets', '.ci'];

const textOf = (name: string): Promise<string> => readFile(path.join(ROOT, name), 'utf8');

describe.each(DOCUMENTS)('%s', (name) => {
  it('names only scripts that are there', async () => {
    const { scripts }: { scripts: Record<string, string> } = JSON.parse(await textOf('package.json'));
    const named = documentedScripts(await textOf(name));
    expect(named.length).toBeGreaterThan(0);
    expect(named.filter((script) => scripts[script] === undefined)).toEqual([]);
  });

  it('names only files and folders that are there', async () => {
    const named = documentedPaths(await textOf(name), FOLDERS);
    expect(named.length).toBeGreaterThan(0);
    expect(named.filter((one) => !existsSync(path.join(ROOT, one)))).toEqual([]);
  });
});

describe('the command lines in the documents', () => {
  let folder: string;
  beforeAll(async () => {
    folder = await folderForCommands();
  });
  afterAll(() => rm(folder, { recursive: true }));

  it('run as they stand, with the exit codes they name', async () => {
    const commands = (
      await Promise.all(DOCUMENTS.map(async (name) => documentedCommands(name, await textOf(name))))
    ).flat();
    expect(commands.length).toBeGreaterThan(0);
    const wrong: string[] = [];
    // One after another: a command may read what one before it has written.
    for (const command of commands) {
      const { code, errors } = await run(command, folder);
      if (code !== command.exitCode)
        wrong.push(
          `${command.where}: ${command.line}\n  ends with ${code} for ${command.exitCode}: ${errors}`,
        );
    }
    expect(wrong).toEqual([]);
  });
});

/** A folder with the project's assets in it, and an `npm` that runs the command line from there. */
async function folderForCommands(): Promise<string> {
  const folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-docs-'));
  await symlink(path.join(ROOT, 'assets'), path.join(folder, 'assets'), 'junction');
  await mkdir(path.join(folder, 'bin'));
  const npm = path.join(folder, 'bin', 'npm');
  const tautline = path.join(ROOT, 'electron/command/tautline.ts');
  await writeFile(
    npm,
    [
      '#!/bin/sh',
      '[ "$1 $2 $3 $4" = "run --silent tautline --" ] || exit 99',
      'shift 4',
      `exec "${process.execPath}" --import "${import.meta.resolve('tsx')}" "${tautline}" "$@"`,
      '',
    ].join('\n'),
  );
  await chmod(npm, 0o755);
  return folder;
}

function run(
  { line }: DocumentedCommand,
  folder: string,
): Promise<{ readonly code: number | null; readonly errors: string }> {
  const PATH = `${path.join(folder, 'bin')}${path.delimiter}${process.env.PATH}`;
  const child = spawn('sh', ['-c', line], {
    cwd: folder,
    env: { ...process.env, PATH },
    stdio: ['ignore', 'ignore', 'pipe'],
    timeout: 20_000,
  });
  let errors = '';
  child.stderr.on('data', (part: Buffer) => {
    errors += part.toString();
  });
  return new Promise((resolve) => {
    child.on('close', (code) => resolve({ code, errors: errors.trim() }));
  });
}
