/** Where the keys go when something is found, opened and closed. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { choose, type OpenedWindow, row, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

/** What has the focus, by its name. */
const focused = (page: OpenedWindow['page']) =>
  page.evaluate(() => document.activeElement?.getAttribute('aria-label') ?? document.activeElement?.tagName);

describe('the keys', () => {
  it('are told of by F1 and by ?', async () => {
    const { page, close } = await stand.open();
    await choose(page, 'D1');
    for (const key of ['F1', '?']) {
      await page.keyboard.press(key);
      await page.getByRole('dialog', { name: 'Keyboard' }).waitFor();
      await page.keyboard.press('Escape');
      await expect.poll(() => page.getByRole('dialog').count()).toBe(0);
    }
    await close();
  });

  it('go to the drawing once a bar is found', async () => {
    const { page, close } = await stand.open();
    await choose(page, 'D1');
    await page.keyboard.press('Control+k');
    await page.keyboard.type('D13');
    await page.getByRole('option', { name: /^D13/ }).first().waitFor();
    await page.keyboard.press('Enter');
    await page.getByRole('region', { name: 'Lanes of D13' }).waitFor();
    expect(await focused(page)).toMatch(/^Drawing of bay R1/);
    await close();
  });

  it('go from a ring into its joins and, by Escape, back to the ring', async () => {
    const { page, complaints, close } = await stand.open();
    await choose(page, 'D1');
    const ring = page.getByRole('button', { name: /^Crossing D1 × D2/ });
    await ring.focus();
    await page.keyboard.press('Enter');
    await expect.poll(() => focused(page)).toBe('bolted through');
    await page.keyboard.press('Escape');
    await expect.poll(() => focused(page)).toMatch(/^Crossing D1 × D2/);
    expect(complaints).toEqual([]);
    await close();
  });
});

describe('the filter of the schedule', () => {
  it.each([1280, 1440])(
    'leaves every control beside the tabs in sight in a window %i px wide',
    async (width) => {
      const { page, close } = await stand.open({ width, height: 800 });
      await choose(page, 'D1');
      await page.getByRole('button', { name: 'Filter' }).click();
      await page.keyboard.type('D13');
      await expect.poll(() => row(page, 'D1').count()).toBe(0);
      const tools = await page
        .locator('.dock-tools')
        .evaluate((element) => [element.scrollWidth, element.clientWidth] as const);
      expect(tools[0]).toBeLessThanOrEqual(tools[1]);
      for (const name of ['Show all', 'Copy table', 'Export']) {
        const box = await page.getByRole('button', { name }).boundingBox();
        const dock = await page.locator('.dock').boundingBox();
        expect((box?.x ?? 0) + (box?.width ?? 0)).toBeLessThanOrEqual((dock?.x ?? 0) + (dock?.width ?? 0));
      }
      await page.keyboard.press('Escape');
      await row(page, 'D1').waitFor();
      expect(await focused(page)).toBe('Schedule');
      await close();
    },
  );
});

describe('a window made narrower', () => {
  it('keeps the bowing columns in sight, in US units too', async () => {
    const { page, close } = await stand.open({ width: 1440, height: 900 });
    await choose(page, 'D1');
    await page.getByRole('button', { name: /^Units: metric/ }).click();
    await page.getByText('Bowing', { exact: true }).last().click();
    await page.setViewportSize({ width: 1280, height: 800 });
    await expect
      .poll(() =>
        page.getByRole('grid', { name: 'Schedule' }).evaluate((grid) => grid.scrollWidth - grid.clientWidth),
      )
      .toBe(0);
    await close();
  });
});

describe('a roof in a narrow drawing', () => {
  it('has room to mark its crossings beside the docked panel', async () => {
    const { page, close } = await stand.open({ width: 1280, height: 800 });
    await choose(page, 'D9');
    await page.locator('[data-crossing="R1/a.p1.fall+a.p1.rise"]').click();
    await page.getByRole('region', { name: /^Crossing D9/ }).waitFor();
    // Rings of one bar, seen whole: none lies on another's middle, and each can be hit.
    await expect
      .poll(() =>
        page.evaluate(() => {
          const rings = [...document.querySelectorAll<HTMLElement>('[data-crossing*="a.p1.rise"]')]
            .filter((each) => each.style.visibility !== 'hidden')
            .map((each) => each.getBoundingClientRect());
          const near = rings.flatMap((a, k) =>
            rings
              .slice(k + 1)
              .map((b) =>
                Math.hypot(a.x + a.width / 2 - b.x - b.width / 2, a.y + a.height / 2 - b.y - b.height / 2),
              ),
          );
          return (
            rings.length >= 4 && Math.min(...near) >= 24 && Math.min(...rings.map((each) => each.width)) >= 24
          );
        }),
      )
      .toBe(true);
    await close();
  });
});
