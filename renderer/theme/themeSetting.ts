/** Light, dark, or as the machine is set. */
export type ThemeSetting = 'light' | 'dark' | 'system';
export type Theme = 'light' | 'dark';

const KEPT = 'tautline.theme';

/** The setting kept from last time; the machine's own when nothing is kept or it cannot be read. */
export function keptTheme(storage: Storage): ThemeSetting {
  try {
    const kept = storage.getItem(KEPT);
    return kept === 'light' || kept === 'dark' ? kept : 'system';
  } catch {
    return 'system'; // Storage may be refused, as in a private window: the setting then lasts as long as the window.
  }
}

export function keepTheme(storage: Storage, setting: ThemeSetting): void {
  try {
    storage.setItem(KEPT, setting);
  } catch {
    // As above.
  }
}

export function themeOf(setting: ThemeSetting, machineIsDark: boolean): Theme {
  if (setting !== 'system') return setting;
  return machineIsDark ? 'dark' : 'light';
}
