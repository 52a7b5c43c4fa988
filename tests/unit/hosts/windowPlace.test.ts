import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ScreenArea, SMALLEST_WINDOW, windowPlace } from '../../../electron/desktop/windowPlace.ts';

const screen: ScreenArea = { x: 0, y: 0, width: 1920, height: 1040 };
const second: ScreenArea = { x: 1920, y: 0, width: 1280, height: 1024 };

describe('where the window opens', () => {
  it('is the middle of the main screen the first time', () => {
    const { x, y, width, height, maximised } = windowPlace(null, [screen]);
    expect([x + width / 2, y + height / 2, maximised]).toEqual([960, 520, false]);
  });

  it('is where it stood, on whichever screen', () => {
    const place = { x: 2000, y: 40, width: 1000, height: 700, maximised: true };
    expect(windowPlace(place, [screen, second])).toEqual(place);
  });

  it('is the main screen again when the other one has been unplugged', () => {
    const place = { x: 2000, y: 40, width: 1000, height: 700, maximised: false };
    expect(windowPlace(place, [screen])).toEqual({
      x: 460,
      y: 170,
      width: 1000,
      height: 700,
      maximised: false,
    });
  });

  it('is never larger than the screen, and never too small to work in', () => {
    expect(windowPlace({ x: 0, y: 0, width: 9000, height: 9000, maximised: false }, [screen])).toMatchObject({
      width: 1920,
      height: 1040,
    });
    expect(windowPlace({ x: 0, y: 0, width: 10, height: 400, maximised: false }, [screen])).toMatchObject({
      ...SMALLEST_WINDOW,
    });
  });

  it('leaves the title bar where the pointer can catch it, whatever was kept', () => {
    const number = fc.double({ min: -1e5, max: 1e5 });
    const places = fc.record({
      x: number,
      y: number,
      width: number,
      height: number,
      maximised: fc.boolean(),
    });
    fc.assert(
      fc.property(places, (kept) => {
        const place = windowPlace(kept, [screen, second]);
        const caught = [screen, second].some(
          (one) =>
            place.y >= one.y &&
            // 32 px: the height of a title bar; 100 px: room for a pointer beside the buttons.
            place.y + 32 <= one.y + one.height &&
            Math.min(place.x + place.width, one.x + one.width) - Math.max(place.x, one.x) >= 100,
        );
        expect(caught).toBe(true);
        expect(
          Object.values(place).every((part) => typeof part === 'boolean' || Number.isInteger(part)),
        ).toBe(true);
      }),
      { seed: 1, numRuns: 300 },
    );
  });

  it('forgets a place with a number that is none', () => {
    const place = { x: Number.NaN, y: 0, width: 1000, height: 700, maximised: true };
    expect(windowPlace(place, [screen])).toEqual(windowPlace(null, [screen]));
  });
});
