import { PROJECT_VERSION } from './model.ts';

type Data = Record<string, unknown>;

/** Step n brings a file of version n to version n + 1. Version 1 is the first, so there is none yet. */
const STEPS: Readonly<Record<number, (data: Data) => Data>> = {};

/** The data of a file of an older version, as the present version would have written it. */
export function migrated(data: Data, version: number): Data {
  let current = data;
  for (let from = version; from < PROJECT_VERSION; from++) {
    const step = STEPS[from];
    if (!step) throw new Error(`no way from version ${from} to ${from + 1}`);
    current = { ...step(current), version: from + 1 };
  }
  return current;
}
