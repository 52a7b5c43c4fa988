import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { choose, command, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

/** Plates of gussets are turned round with it as they are drawn; nothing else of the window uses it. */
const BREAKABLE = `
  const whole = Array.prototype.toReversed;
  Array.prototype.toReversed = function () {
    if (document.documentElement.dataset.breaks) throw new Error('a direction of no length');
    return whole.call(this);
  };
`;

describe('a view that cannot be drawn', () => {
  it('leaves the rest standing, says nothing of the inside, and is drawn again once the change is undone', async () => {
    const { page, close } = await stand.open({ before: BREAKABLE });
    await choose(page, 'D1');
    const failed = page.getByRole('alert').filter({ hasText: 'Could not draw the view' });
    const breaks = (on: boolean) =>
      page.evaluate((now) => {
        if (now) document.documentElement.dataset.breaks = 'yes';
        else delete document.documentElement.dataset.breaks;
      }, on);

    await breaks(true);
    const width = page
      .getByRole('region', { name: 'Recipe of W1' })
      .getByRole('spinbutton', { name: 'Width' })
      .first();
    await width.fill('7000');
    await width.press('Enter');
    await failed.waitFor();
    expect(await failed.textContent()).not.toContain('direction of no length');

    await breaks(false);
    await command(page, 'Edit', /^Undo/);
    await expect.poll(() => failed.count()).toBe(0);
    await page.locator('.scene-legend').waitFor();
    await close();
  });
});
