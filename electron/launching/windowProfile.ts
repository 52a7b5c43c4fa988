import { mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';

/** A browser profile of Tautline's own: nothing of the user's browsing comes into the window, or the other way. */
export interface WindowProfile {
  readonly folder: string;
  /** The port its last window was served on. What a browser keeps belongs to an address, port included. */
  readonly port: number | null;
  /** The profile to use for a window served on this port: this one, or one for this run when the port is not its own. */
  settle(port: number): Promise<WindowProfile>;
  /** Takes away what was only for this run. */
  remove(): Promise<void>;
}

/** The lasting profile under `state`, or one for this run when the folder cannot be written. */
export async function windowProfile(state: string): Promise<WindowProfile> {
  const folder = path.join(state, 'profile');
  const note = path.join(state, 'port');
  try {
    await mkdir(folder, { recursive: true });
  } catch {
    return await profileForOneRun();
  }
  const port = portIn(await readFile(note, 'utf8').catch(() => ''));
  return {
    folder,
    port,
    async settle(served) {
      // Another window of Tautline holds the port, and with it the profile: two browsers cannot share one.
      if (port !== null && served !== port) return await profileForOneRun();
      await writeFile(note, `${served}\n`);
      return this;
    },
    remove: async () => undefined,
  };
}

async function profileForOneRun(): Promise<WindowProfile> {
  const folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-'));
  return {
    folder,
    port: null,
    async settle() {
      return this;
    },
    remove: () => rm(folder, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 }),
  };
}

function portIn(text: string): number | null {
  const port = Number.parseInt(text, 10);
  return port >= 1024 && port <= 65535 ? port : null;
}
