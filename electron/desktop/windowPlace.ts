import { z } from 'zod';

/** Where the window stands, screen pixels. */
export interface WindowPlace {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly maximised: boolean;
}

export interface ScreenArea {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export const windowPlaceShape: z.ZodType<WindowPlace> = z.strictObject({
  x: z.number(),
  y: z.number(),
  width: z.number(),
  height: z.number(),
  maximised: z.boolean(),
});

export const SMALLEST_WINDOW = { width: 960, height: 600 } as const;
const USUAL_WINDOW = { width: 1440, height: 900 } as const;

/** So much of the title bar must be on a screen for the window to be caught with the pointer; pixels. */
const GRIP = { width: 120, height: 32 } as const;

/**
 * Where to open the window: where it stood, as far as the screens of today allow. It is never larger than the screen
 * it stands on, and a place whose title bar is on no screen is given up for the middle of the first one.
 *
 * @param kept from the last session, or null
 * @param screens work areas, the main one first; at least one
 */
export function windowPlace(kept: WindowPlace | null, screens: readonly ScreenArea[]): WindowPlace {
  const main = screens[0] ?? { x: 0, y: 0, ...USUAL_WINDOW };
  if (
    kept === null ||
    !Object.values(kept).every((part) => typeof part === 'boolean' || Number.isFinite(part))
  )
    return centred(main, USUAL_WINDOW, false);
  const home = screens.find((screen) => gripIsOn(kept, screen));
  if (home === undefined) return centred(main, kept, kept.maximised);
  const { width, height } = fitted(kept, home);
  return {
    x: Math.round(clamp(kept.x, home.x - (width - GRIP.width), home.x + home.width - GRIP.width)),
    y: Math.round(clamp(kept.y, home.y, home.y + home.height - GRIP.height)),
    width,
    height,
    maximised: kept.maximised,
  };
}

function gripIsOn(place: ScreenArea, screen: ScreenArea): boolean {
  const across = Math.min(place.x + place.width, screen.x + screen.width) - Math.max(place.x, screen.x);
  return across >= GRIP.width && place.y >= screen.y && place.y + GRIP.height <= screen.y + screen.height;
}

function centred(
  screen: ScreenArea,
  size: { readonly width: number; readonly height: number },
  maximised: boolean,
): WindowPlace {
  const { width, height } = fitted(size, screen);
  return {
    x: Math.round(screen.x + (screen.width - width) / 2),
    y: Math.round(screen.y + (screen.height - height) / 2),
    width,
    height,
    maximised,
  };
}

function fitted(
  size: { readonly width: number; readonly height: number },
  screen: ScreenArea,
): { readonly width: number; readonly height: number } {
  return {
    width: Math.round(Math.min(Math.max(size.width, SMALLEST_WINDOW.width), screen.width)),
    height: Math.round(Math.min(Math.max(size.height, SMALLEST_WINDOW.height), screen.height)),
  };
}

function clamp(value: number, low: number, high: number): number {
  return Math.min(Math.max(value, low), Math.max(low, high));
}
