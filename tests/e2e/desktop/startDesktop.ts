import { existsSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { electronBinary } from '../../../electron/electronBinary.ts';
import type { Desktop, DesktopOptions } from './desktop.ts';
import { electronDesktop } from './electronDesktop.ts';
import { standInDesktop } from './standInDesktop.ts';

export const MAIN = path.resolve(import.meta.dirname, '../../../out/electron/main.cjs');

export async function startDesktop(options: DesktopOptions = {}): Promise<Desktop> {
  if (!existsSync(MAIN)) throw new Error('There is no built desktop: `npm run build` first.');
  const userData = options.userData ?? (await mkdtemp(path.join(os.tmpdir(), 'tautline-state-')));
  const setting = { main: MAIN, args: options.args ?? [], blank: options.blank ?? false, userData };
  const binary = electronBinary();
  return binary === null ? await standInDesktop(setting) : await electronDesktop(binary, setting);
}

/** A folder for a test's files, and how to take it away. */
export async function testFolder(): Promise<{ readonly path: string; remove(): Promise<void> }> {
  const folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-files-'));
  return { path: folder, remove: () => rm(folder, { recursive: true, force: true }) };
}
