import { type ChildProcess, spawn } from 'node:child_process';
import { chmod, readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { until } from './asking.ts';
import { testFolder } from './startDesktop.ts';

const LAUNCH = path.resolve('electron/launch.ts');

let folder: Awaited<ReturnType<typeof testFolder>>;
let started: ChildProcess | null = null;
beforeEach(async () => {
  folder = await testFolder();
});
afterEach(async () => {
  started?.kill('SIGKILL');
  started = null;
  await folder.remove();
});

/** Runs what `npm start` runs, with a folder of state of its own. */
function launch(args: readonly string[], env: NodeJS.ProcessEnv) {
  const child = spawn(process.execPath, ['--import', 'tsx', LAUNCH, ...args], {
    env: { ...process.env, XDG_STATE_HOME: folder.path, INIT_CWD: folder.path, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  started = child;
  let said = '';
  for (const stream of [child.stdout, child.stderr])
    stream.on('data', (part: Buffer) => {
      said += part.toString();
    });
  const ended = new Promise<number | null>((resolve) => child.on('exit', resolve));
  return { child, ended, said: async () => said };
}

const NO_DISPLAY = { DISPLAY: '', WAYLAND_DISPLAY: '' };
const address = (said: string): string | undefined => /http:\/\/127\.0\.0\.1:\d+\/\S*/.exec(said)?.[0];

/** In place of a browser: notes what it was started with, and stays until it is ended or `seconds` have gone. */
async function fakeBrowser(
  seconds: number,
): Promise<{ readonly file: string; args(): Promise<readonly string[]> }> {
  const file = path.join(folder.path, 'browser');
  const note = path.join(folder.path, 'args');
  await writeFile(file, `#!/bin/sh\nprintf '%s\\n' "$@" > "${note}"\nexec sleep ${seconds}\n`);
  await chmod(file, 0o755);
  return { file, args: async () => (await readFile(note, 'utf8').catch(() => '')).split('\n') };
}

describe('npm start', () => {
  it('without a display says so, serves the window at the address it prints, and ends at Ctrl-C', async () => {
    const { child, ended, said } = launch([], NO_DISPLAY);
    const served = address(await until(said, (all) => address(all) !== undefined)) ?? '';
    expect(await said()).toContain('There is no display here.');
    const page = await fetch(served);
    expect(page.status).toBe(200);
    expect(page.headers.get('content-security-policy')).toContain("default-src 'none'");

    child.kill('SIGINT');
    expect(await ended).toBe(0);
    await expect(fetch(served)).rejects.toThrow();
  });

  it('hands the file it is given to the page, from where the user stands', async () => {
    await writeFile(path.join(folder.path, 'shed.json'), '{"shed": 1}');
    const { said } = launch(['shed.json'], NO_DISPLAY);
    const served = new URL(address(await until(said, (all) => address(all) !== undefined)) ?? '');
    const given = await fetch(`${served.origin}/given/${served.searchParams.get('given')}`);
    expect(await given.json()).toEqual({ name: 'shed.json', text: '{"shed": 1}' });
  });

  it('says which file is not there, and opens nothing', async () => {
    const { ended, said } = launch(['missing.json'], NO_DISPLAY);
    expect(await ended).toBe(2);
    expect(await said()).toContain(`${path.join(folder.path, 'missing.json')} is not there`);
  });

  it('opens the window in a browser with a profile of its own, and ends when the window is closed', async () => {
    const browser = await fakeBrowser(1);
    const { ended, said } = launch(['--browser'], { DISPLAY: ':7', TAUTLINE_CHROMIUM: browser.file });
    const args = await until(browser.args, (all) => all.length > 1);
    expect(args).toContain(`--app=${address(await said())}`);
    expect(args).toContain(`--user-data-dir=${path.join(folder.path, 'tautline', 'profile')}`);
    expect(await ended).toBe(0);
    expect(await said()).toContain(`a window of ${browser.file}`);
  });

  it('ends the browser too at Ctrl-C', async () => {
    const browser = await fakeBrowser(60);
    const { child, ended } = launch(['--browser'], { DISPLAY: ':7', TAUTLINE_CHROMIUM: browser.file });
    await until(browser.args, (all) => all.length > 1);
    child.kill('SIGINT');
    expect(await ended).toBe(0);
  });

  it('prints the address when the browser does not come up', async () => {
    const browser = path.join(folder.path, 'browser');
    await writeFile(browser, '#!/bin/sh\nexit 3\n');
    await chmod(browser, 0o755);
    const { said } = launch(['--browser'], { DISPLAY: ':7', TAUTLINE_CHROMIUM: browser });
    await until(said, (all) => all.includes('Open this address'));
    expect(await said()).toContain('The browser window did not come up.');
  });
});
