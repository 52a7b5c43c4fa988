/** How a command ends. Documented in README.md; scripts rely on it. */
export type ExitCode = typeof FINE | typeof LIMIT_BROKEN | typeof BAD_INPUT;

export const FINE = 0;
/** Some finding breaks a limit that the practice or the project sets. */
export const LIMIT_BROKEN = 1;
/** A file that cannot be read or written, a section in no stock list, an option that makes no sense. Comes before a broken limit. */
export const BAD_INPUT = 2;
