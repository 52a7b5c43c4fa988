import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import { describe, expect, it } from 'vitest';

const start = promisify(execFile);
const ROOT = path.resolve(import.meta.dirname, '../../..');
const COMMAND = ['--import', 'tsx', path.join(ROOT, 'electron/command/tautline.ts')];

describe('the command as a process of its own', () => {
  it('writes its result to the standard output and ends with 0', async () => {
    const { stdout, stderr } = await start(
      process.execPath,
      [...COMMAND, 'section', '70x70x6', '-f', 'json'],
      { cwd: ROOT },
    );
    expect(JSON.parse(stdout)).toMatchObject({ designation: '70x70x6' });
    expect(stderr).toBe('');
  });

  it('writes its refusal to the error stream and ends with 2', async () => {
    await expect(
      start(process.execPath, [...COMMAND, 'section', 'nothing'], { cwd: ROOT }),
    ).rejects.toMatchObject({
      code: 2,
      stdout: '',
      stderr: expect.stringContaining('nothing: in no stock list.'),
    });
  });
});
