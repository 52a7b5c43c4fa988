import type { RecoveryCopy } from './host.ts';
import type { Kept } from './kept.ts';

/** Unsaved work as kept by one page. Pages open side by side each keep their own. */
export interface KeptCopy extends Omit<RecoveryCopy, 'token'> {
  /** Where it came from, and what that held, where the browser lets the page come back to it. */
  readonly handle: FileSystemFileHandle | null;
  readonly known: string | null;
}

export interface BrowserRecovery {
  /** The newest copy that a page left behind which is no longer open. */
  leftOver(): Promise<KeptCopy | null>;
  keep(copy: KeptCopy): Promise<void>;
  forget(): Promise<void>;
}

const PREFIX = 'recovery:';

/** @param locks tell which pages are still open; without them every other page counts as gone */
export function browserRecovery(kept: Kept, locks: LockManager | undefined): BrowserRecovery {
  const own = `${PREFIX}${crypto.randomUUID()}`;
  let takenOver: string | null = null;
  // Held until the page goes, however it goes.
  void locks?.request(own, () => new Promise<never>(() => undefined));

  async function dropTakenOver(): Promise<void> {
    if (takenOver !== null) await kept.remove(takenOver);
    takenOver = null;
  }

  return {
    async leftOver() {
      const open = new Set((await locks?.query())?.held?.map((lock) => lock.name));
      const keys = (await kept.keys()).filter(
        (key) => key.startsWith(PREFIX) && key !== own && !open.has(key),
      );
      const copies = await Promise.all(keys.map(async (key) => ({ key, copy: copyOf(await kept.get(key)) })));
      const newest = copies
        .filter((one) => one.copy !== null)
        .sort((a, b) => (b.copy?.savedAt ?? '').localeCompare(a.copy?.savedAt ?? ''))[0];
      takenOver = newest?.key ?? null;
      return newest?.copy ?? null;
    },
    async keep(copy) {
      await kept.put(own, copy);
      await dropTakenOver();
    },
    async forget() {
      await kept.remove(own);
      await dropTakenOver();
    },
  };
}

/** What was kept, if an earlier version of the page kept it in today's form. */
function copyOf(value: unknown): KeptCopy | null {
  if (typeof value !== 'object' || value === null) return null;
  const { name, text, savedAt, handle, known }: Partial<Record<keyof KeptCopy, unknown>> = value;
  if (typeof name !== 'string' || typeof text !== 'string' || typeof savedAt !== 'string') return null;
  return {
    name,
    text,
    savedAt,
    handle: handle instanceof FileSystemFileHandle ? handle : null,
    known: typeof known === 'string' ? known : null,
  };
}
