import { useEffect, useState } from 'react';

/** Whether the window's typefaces are there, so that what was measured before can be measured again. */
export function useFontsLoaded(): boolean {
  const [loaded, setLoaded] = useState(() => document.fonts.check(CONDENSED));
  useEffect(() => {
    let wanted = true;
    const done = (): void => {
      if (wanted) setLoaded(true);
    };
    document.fonts.load(CONDENSED).then(done, done);
    return () => {
      wanted = false;
    };
  }, []);
  return loaded;
}

const CONDENSED = '600 12px "IBM Plex Sans Condensed"';
