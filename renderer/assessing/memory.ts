import type { Snapshot } from './assessApi.ts';

/** Kept in a worker: the project as it stands, one on trial, and a few gone before. */
const KEPT = 4;

/** Works each snapshot out once, and keeps the last few. */
export function remembered<T extends object>(
  workOut: (snapshot: Snapshot) => T,
  most = KEPT,
): (snapshot: Snapshot) => T {
  const kept = new Map<number, T>();
  return (snapshot) => {
    const known = kept.get(snapshot.serial);
    if (known !== undefined) return known;
    const fresh = workOut(snapshot);
    kept.set(snapshot.serial, fresh);
    for (const old of [...kept.keys()].slice(0, -most)) kept.delete(old);
    return fresh;
  };
}
