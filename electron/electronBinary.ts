import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';

/**
 * Where Electron's own binary is, or null. Only looks: importing the `electron` package from Node would start
 * fetching a missing binary at once.
 */
export function electronBinary(env: NodeJS.ProcessEnv = process.env): string | null {
  const folder = packageFolder();
  if (folder === null) return null;
  const inside = insidePath(folder);
  const override = env.ELECTRON_OVERRIDE_DIST_PATH;
  if (override !== undefined && override !== '') return ifThere(path.join(override, inside ?? 'electron'));
  return inside === null ? null : ifThere(path.join(folder, 'dist', inside));
}

/** Fetching is given up after so long; ms. A machine without a network fails in a second or so. */
const FETCH_TIME = 240_000;

/** Fetches the binary by the package's own installer; null when that fails. */
export function fetchElectronBinary(): string | null {
  const folder = packageFolder();
  if (folder === null) return null;
  const installer = path.join(folder, 'install.js');
  if (!existsSync(installer)) return null;
  spawnSync(process.execPath, [installer], { stdio: 'ignore', timeout: FETCH_TIME });
  return electronBinary();
}

function packageFolder(): string | null {
  try {
    return path.dirname(createRequire(import.meta.url).resolve('electron/package.json'));
  } catch {
    return null;
  }
}

/** The binary's path inside its folder ("electron", "Electron.app/…"), as the installer notes it. */
function insidePath(folder: string): string | null {
  const note = path.join(folder, 'path.txt');
  return existsSync(note) ? readFileSync(note, 'utf8').trim() : null;
}

function ifThere(file: string): string | null {
  return existsSync(file) ? file : null;
}
