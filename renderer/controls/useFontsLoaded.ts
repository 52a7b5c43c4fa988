import { useEffect, useState } from 'react';

/** Whether the window's typefaces are there, so that what was measured before can be measured again. */
export function useFontsLoaded(): boolean {
  const [loaded, setLoaded] = useState(() => FACES.every((face) => document.fonts.check(face)));
  useEffect(() => {
    let wanted = true;
    const done = (): void => {
      if (wanted) setLoaded(true);
    };
    Promise.all(FACES.map((face) => document.fonts.load(face))).then(done, done);
    return () => {
      wanted = false;
    };
  }, []);
  return loaded;
}

const FACES = ['600 12px "IBM Plex Sans Condensed"', '600 12px "IBM Plex Sans"'] as const;
