import type { Kept } from './kept.ts';

/** A file worked on before that the browser lets the page come back to. */
export interface RecentPlace {
  readonly token: string;
  readonly handle: FileSystemFileHandle;
}

export interface BrowserRecents {
  list(): Promise<readonly RecentPlace[]>;
  add(place: RecentPlace): Promise<void>;
  remove(token: string): Promise<void>;
}

const KEY = 'recents';
const MOST = 10;

export function browserRecents(kept: Kept): BrowserRecents {
  async function list(): Promise<readonly RecentPlace[]> {
    const value = await kept.get(KEY);
    return Array.isArray(value) ? value.filter(isRecentPlace) : [];
  }
  return {
    list,
    async add(place) {
      const others: RecentPlace[] = [];
      for (const one of await list()) if (!(await one.handle.isSameEntry(place.handle))) others.push(one);
      await kept.put(KEY, [place, ...others].slice(0, MOST));
    },
    async remove(token) {
      await kept.put(
        KEY,
        (await list()).filter((one) => one.token !== token),
      );
    },
  };
}

function isRecentPlace(value: unknown): value is RecentPlace {
  if (typeof value !== 'object' || value === null) return false;
  const { token, handle }: Partial<Record<keyof RecentPlace, unknown>> = value;
  return typeof token === 'string' && handle instanceof FileSystemFileHandle;
}
