import { mkdir, mkdtemp, rm, utimes, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findChromium } from '../../../electron/browser/findChromium.ts';
import { electronBinary } from '../../../electron/electronBinary.ts';
import { isStale } from '../../../electron/launching/freshBuild.ts';
import { windowProfile } from '../../../electron/launching/windowProfile.ts';

let folder: string;
beforeEach(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-launch-'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

async function put(name: string, hour: number): Promise<string> {
  const file = path.join(folder, name);
  await mkdir(path.dirname(file), { recursive: true });
  await writeFile(file, '');
  const time = new Date(Date.UTC(2026, 0, 1, hour));
  await utimes(file, time, time);
  // A folder counts as changed when something came or went in it: here only the files matter.
  for (let up = path.dirname(file); up.startsWith(folder); up = path.dirname(up)) await utimes(up, 0, 0);
  return file;
}

async function putBuilt(hour: number): Promise<void> {
  for (const name of ['out/renderer/index.html', 'out/electron/main.cjs', 'out/electron/preload.cjs'])
    await put(name, hour);
}

describe('what is built', () => {
  it('is made new when it is missing, in whole or in part', async () => {
    expect(isStale(folder)).toBe(true);
    await putBuilt(2);
    expect(isStale(folder)).toBe(false);
    await rm(path.join(folder, 'out/electron/preload.cjs'));
    expect(isStale(folder)).toBe(true);
  });

  it('is made new when any source is newer, and only then', async () => {
    await put('core/section/angle.ts', 1);
    await putBuilt(2);
    await put('tests/a.test.ts', 3);
    expect(isStale(folder)).toBe(false);
    await put('core/section/angle.ts', 3);
    expect(isStale(folder)).toBe(true);
  });
});

describe('a browser for the window', () => {
  it('is the one named, or none at all: a name that is wrong is not passed over', async () => {
    const named = await put('my-chromium', 1);
    expect(findChromium({ TAUTLINE_CHROMIUM: named })).toEqual({ path: named, from: 'TAUTLINE_CHROMIUM' });
    expect(findChromium({ TAUTLINE_CHROMIUM: `${named}-not`, PATH: folder })).toBeNull();
  });

  it('is found on PATH, Chromium before Chrome', async () => {
    const ending = process.platform === 'win32' ? '.exe' : '';
    await put(`bin/google-chrome${ending}`, 1);
    const chromium = await put(`other/chromium${ending}`, 1);
    const PATH = ['bin', 'other'].map((one) => path.join(folder, one)).join(path.delimiter);
    expect(findChromium({ PATH })).toEqual({ path: chromium, from: 'PATH' });
  });
});

describe("Electron's binary", () => {
  it('is taken from the folder that the environment names, if it is there', async () => {
    expect(electronBinary({ ELECTRON_OVERRIDE_DIST_PATH: path.join(folder, 'none') })).toBeNull();
  });
});

describe('the profile of the browser window', () => {
  it('comes back to the port it was last served on, where the browser keeps its things', async () => {
    const first = await (await windowProfile(folder)).settle(40123);
    expect(first.folder).toBe(path.join(folder, 'profile'));
    expect((await windowProfile(folder)).port).toBe(40123);
  });

  it('is another one, for this run only, while another window has the port', async () => {
    await (await windowProfile(folder)).settle(40123);
    const second = await (await windowProfile(folder)).settle(40999);
    expect(second.folder.startsWith(folder)).toBe(false);
    await second.remove();
    expect((await windowProfile(folder)).port).toBe(40123);
  });
});
