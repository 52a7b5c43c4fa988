/** Seeded, so that a failure comes again; the count is for the whole suite to stay within a minute. */
export const runs = (numRuns: number) => ({ seed: 70_706, numRuns });
