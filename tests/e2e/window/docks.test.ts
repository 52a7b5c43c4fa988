/** The docks as the user leaves them, in the built window. */
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { row, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

const cardWidth = (page: Page): Promise<number> =>
  page.locator('#card').evaluate((card) => Math.round(card.getBoundingClientRect().width));

describe('a dock that is dragged', () => {
  it('is as wide when the window is opened again', async () => {
    const { page, complaints, close } = await stand.open();
    const first = await cardWidth(page);
    const gutter = await page.getByRole('separator', { name: 'Width of the card' }).boundingBox();
    if (gutter === null) throw new Error('no gutter');
    const [x, y] = [gutter.x + gutter.width / 2, gutter.y + 200];
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x - 10, y, { steps: 3 });
    await page.mouse.move(x + 40, y, { steps: 5 });
    await page.mouse.up();
    // As far as the hand went, to the pixel or two that a gutter takes up; the layout follows the hand by a frame or more.
    await expect.poll(async () => Math.abs(first - 40 - (await cardWidth(page)))).toBeLessThan(4);
    const dragged = await cardWidth(page);
    const kept = () => page.evaluate(() => JSON.parse(localStorage.getItem('tautline.docks') ?? '{}').card);
    await expect.poll(async () => Math.abs((await kept()) - dragged)).toBeLessThan(3);

    await page.reload();
    await row(page, 'D1').waitFor();
    expect(Math.abs((await cardWidth(page)) - dragged)).toBeLessThan(3);
    expect(complaints).toEqual([]);
    await close();
  });
});
