import { spawn } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';

const SOURCES = [
  'core',
  'renderer',
  'electron',
  'assets',
  'package.json',
  'package-lock.json',
  'vite.config.ts',
];

/** What a whole build leaves; the oldest of them tells how old the build is. */
const BUILT = ['out/renderer/index.html', 'out/electron/main.cjs', 'out/electron/preload.cjs'];

/** Whether what is built is missing, or older than any source it is made from. */
export function isStale(root: string): boolean {
  const built = BUILT.map((one) => path.join(root, one));
  if (!built.every((one) => existsSync(one))) return true;
  const oldest = Math.min(...built.map((one) => statSync(one).mtimeMs));
  return SOURCES.some((one) => newest(path.join(root, one)) > oldest);
}

/** Builds the window and the desktop. Returns what the builder said when it failed, or null. */
export function build(root: string, interrupted: AbortSignal): Promise<string | null> {
  const vite = path.join(
    path.dirname(createRequire(import.meta.url).resolve('vite/package.json')),
    'bin/vite.js',
  );
  const child = spawn(process.execPath, [vite, 'build', '--app'], {
    cwd: root,
    stdio: ['ignore', 'pipe', 'pipe'],
    signal: interrupted,
  });
  let said = '';
  child.stdout.on('data', (part: Buffer) => {
    said += part.toString();
  });
  child.stderr.on('data', (part: Buffer) => {
    said += part.toString();
  });
  return new Promise((resolve) => {
    child.on('error', (error) => resolve(error.message));
    child.on('close', (code) => resolve(code === 0 ? null : said));
  });
}

/** When the newest file of a folder was written, or a folder in it changed; 0 when it is not there. */
function newest(place: string): number {
  if (!existsSync(place)) return 0;
  const about = statSync(place);
  if (!about.isDirectory()) return about.mtimeMs;
  return Math.max(about.mtimeMs, ...readdirSync(place).map((name) => newest(path.join(place, name))));
}
