/** The command line as `npm run build` makes it: README.md names it. */
import { spawnSync } from 'node:child_process';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

let folder = '';
beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'tautline-built-'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

const run = (...args: readonly string[]) =>
  spawnSync(process.execPath, ['out/command/tautline.mjs', ...args], { encoding: 'utf8' });

describe('the built command', () => {
  it('writes a project, and a schedule of it beside it', async () => {
    const project = path.join(folder, 'wall.json');
    expect(run('new', 'wall-bay', '-o', project).status).toBe(0);
    const csv = path.join(folder, 'wall.csv');
    // A new bay is unmarked and over its limit.
    expect(run('schedule', project, '-f', 'csv', '-o', csv).status).toBe(1);
    expect(await readFile(csv, 'utf8')).toMatch(/^\ufeff?mark,/);
  });

  it('never writes over a project, and says so', async () => {
    const project = path.join(folder, 'wall.json');
    run('new', 'wall-bay', '-o', project);
    const before = await readFile(project, 'utf8');
    for (const command of ['schedule', 'assess', 'check', 'report']) {
      const ended = run(command, project, '-o', project);
      expect(ended.status, command).toBe(2);
      expect(ended.stderr, command).toContain('is a project');
    }
    expect(await readFile(project, 'utf8')).toBe(before);
  });
});
