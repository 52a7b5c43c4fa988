import path from 'node:path';
import { z } from 'zod';
import { inTurn } from './inTurn.ts';
import { readKept, writeKept } from './keptState.ts';

const MOST = 10;
const keptShape = z.array(z.string()).max(100);

/** Paths of the projects last worked on, the newest first, kept between sessions. */
export interface RecentFiles {
  list(): readonly string[];
  add(path: string): Promise<void>;
  remove(path: string): Promise<void>;
}

/** @param changed called after every change of the list */
export async function recentFiles(file: string, changed: () => void): Promise<RecentFiles> {
  let paths = ((await readKept(file, keptShape)) ?? []).filter(path.isAbsolute).slice(0, MOST);
  const oneAtATime = inTurn();

  async function become(next: readonly string[]): Promise<void> {
    paths = next.slice(0, MOST);
    changed();
    // A list that cannot be kept is a nuisance, not a reason to refuse the file that was opened.
    await oneAtATime(() => writeKept(file, paths)).catch(() => undefined);
  }

  return {
    list: () => paths,
    add: (added) => become([path.resolve(added), ...paths.filter((one) => one !== path.resolve(added))]),
    remove: (gone) => become(paths.filter((one) => one !== path.resolve(gone))),
  };
}
