import { useEffect, useState } from 'react';

/** Where menus, lists and tips are put: inside the page's main part, above everything else in it. Null before the page is there. */
export function useOverlays(): HTMLElement | null {
  const [place, setPlace] = useState<HTMLElement | null>(null);
  useEffect(() => setPlace(document.getElementById('overlays')), []);
  return place;
}
