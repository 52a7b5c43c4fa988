import { BrowserWindow, screen } from 'electron';
import { readKept, writeKept } from '../files/keptState.ts';
import { lockDownContents, SANDBOXED } from './lockDown.ts';
import { SMALLEST_WINDOW, type WindowPlace, windowPlace, windowPlaceShape } from './windowPlace.ts';

/** The window where it last stood, without its page yet. `placeFile` keeps the place between sessions. */
export async function createMainWindow(preload: string, placeFile: string): Promise<BrowserWindow> {
  const kept = await readKept(placeFile, windowPlaceShape);
  const place = windowPlace(kept, screenAreas());
  const window = new BrowserWindow({
    x: place.x,
    y: place.y,
    width: place.width,
    height: place.height,
    minWidth: SMALLEST_WINDOW.width,
    minHeight: SMALLEST_WINDOW.height,
    show: false,
    // The window draws its commands itself; the menu bar is there for its keys, and for Alt.
    autoHideMenuBar: true,
    title: 'Tautline',
    webPreferences: { ...SANDBOXED, preload },
  });
  lockDownContents(window.webContents);
  if (place.maximised) window.maximize();
  window.once('ready-to-show', () => window.show());
  // The page's own title would overwrite what `setDocumentState` shows.
  window.on('page-title-updated', (event) => event.preventDefault());
  return window;
}

/** Keeps the window's place for the next session; a place that cannot be kept is given up silently. */
export async function keepWindowPlace(window: BrowserWindow, placeFile: string): Promise<void> {
  const place: WindowPlace = { ...window.getNormalBounds(), maximised: window.isMaximized() };
  await writeKept(placeFile, place).catch(() => undefined);
}

/** Work areas, the main screen first. */
function screenAreas() {
  const main = screen.getPrimaryDisplay();
  const others = screen.getAllDisplays().filter((display) => display.id !== main.id);
  return [main, ...others].map((display) => display.workArea);
}
