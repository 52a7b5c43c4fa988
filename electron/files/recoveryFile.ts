import { rm } from 'node:fs/promises';
import { z } from 'zod';
import { inTurn } from './inTurn.ts';
import { readKept, writeKept } from './keptState.ts';

/** Work not saved yet, as kept on disk against a crash. */
export interface RecoveryRecord {
  readonly name: string;
  /** Where the project came from; null when it had no place yet. */
  readonly path: string | null;
  /** Digest of what that file held when last read or saved, so that a later change by someone else still shows. */
  readonly knownContent: string | null;
  readonly text: string;
  /** ISO 8601. */
  readonly savedAt: string;
}

const recordShape: z.ZodType<RecoveryRecord> = z.strictObject({
  name: z.string(),
  path: z.string().nullable(),
  knownContent: z.string().nullable(),
  text: z.string(),
  savedAt: z.string(),
});

export interface RecoveryFile {
  read(): Promise<RecoveryRecord | null>;
  keep(record: RecoveryRecord): Promise<void>;
  forget(): Promise<void>;
  /** Forgets what this session kept. A copy left by an earlier one stays: the user may not have been asked about it yet. */
  forgetOwn(): Promise<void>;
}

export function recoveryFile(file: string): RecoveryFile {
  const oneAtATime = inTurn();
  let own = false;
  const forget = () => oneAtATime(() => rm(file, { force: true }));
  return {
    read: () => oneAtATime(() => readKept(file, recordShape)),
    keep(record) {
      own = true;
      return oneAtATime(() => writeKept(file, record));
    },
    forget,
    forgetOwn: async () => (own ? await forget() : undefined),
  };
}
