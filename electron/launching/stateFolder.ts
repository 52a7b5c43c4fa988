import os from 'node:os';
import path from 'node:path';

/** Where this user's programs keep what is worth keeping between runs, by the custom of each system. */
export function stateFolder(env: NodeJS.ProcessEnv = process.env): string {
  const home = os.homedir();
  switch (process.platform) {
    case 'darwin':
      return path.join(home, 'Library/Application Support/Tautline window');
    case 'win32':
      return path.join(env.LOCALAPPDATA ?? path.join(home, 'AppData/Local'), 'Tautline window');
    default:
      return path.join(env.XDG_STATE_HOME ?? path.join(home, '.local/state'), 'tautline');
  }
}
