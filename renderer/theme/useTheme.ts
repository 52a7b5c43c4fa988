import { useEffect, useState } from 'react';
import { type Theme, type ThemeSetting, themeOf } from './themeSetting.ts';

/** The theme in force; sets it on the page and follows the machine while the setting is "system". */
export function useTheme(setting: ThemeSetting): Theme {
  const [machineIsDark, setMachineIsDark] = useState(() => machine().matches);
  useEffect(() => {
    const query = machine();
    const follow = (): void => setMachineIsDark(query.matches);
    query.addEventListener('change', follow);
    return () => query.removeEventListener('change', follow);
  }, []);
  const theme = themeOf(setting, machineIsDark);
  useEffect(() => {
    document.documentElement.dataset['theme'] = theme;
  }, [theme]);
  return theme;
}

function machine(): MediaQueryList {
  return window.matchMedia('(prefers-color-scheme: dark)');
}
