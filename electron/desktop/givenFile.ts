import path from 'node:path';

/**
 * The project file named on a command line, as a full path, or null.
 *
 * @param argv as the process got it, executable first
 * @param program the main script where Electron runs one ("electron main.cjs FILE"); null in a packaged program
 * @param folder what relative names start from
 */
export function givenFile(argv: readonly string[], program: string | null, folder: string): string | null {
  let first = 1;
  if (program !== null) {
    const at = argv.findIndex((one) => path.resolve(folder, one) === program);
    if (at < 0) return null;
    first = at + 1;
  }
  // Chromium adds switches of its own to what a second start hands over.
  const name = argv.slice(first).find((one) => one !== '' && !one.startsWith('-'));
  return name === undefined ? null : path.resolve(folder, name);
}
