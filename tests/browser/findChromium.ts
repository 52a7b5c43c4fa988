import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import { type FoundChromium, findChromium } from '../../electron/browser/findChromium.ts';

/**
 * A Chromium for the tests: one that is there, or one fetched now. On Debian as root the system's own package; else
 * Playwright's build. Null when there is none to be had.
 */
export function haveChromium(say: (line: string) => void): FoundChromium | null {
  const found = findChromium();
  if (found !== null) return found;
  if (isDebianAsRoot()) {
    say('No Chromium here: installing the chromium package.');
    run('apt-get', ['update']);
    run('apt-get', ['install', '-y', '--no-install-recommends', 'chromium']);
  } else {
    say("No Chromium here: fetching Playwright's.");
    const cli = path.join(
      path.dirname(createRequire(import.meta.url).resolve('playwright-core/package.json')),
      'cli.js',
    );
    run(process.execPath, [cli, 'install', 'chromium']);
  }
  return findChromium();
}

function isDebianAsRoot(): boolean {
  return process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');
}

function run(command: string, args: readonly string[]): void {
  spawnSync(command, args, {
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  });
}
