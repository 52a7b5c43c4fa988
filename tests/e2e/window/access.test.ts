import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { choose, command, type OpenedWindow, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

/** Rules broken, each with the first element that breaks it. The report's preview is a document of its own. */
async function broken(page: Page): Promise<readonly string[]> {
  const { violations } = await new AxeBuilder({ page }).exclude('iframe').analyze();
  return violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.target.join(' ')}`);
}

async function withWindow(
  theme: 'light' | 'dark',
  use: (opened: OpenedWindow) => Promise<void>,
): Promise<void> {
  const opened = await stand.open({ theme });
  try {
    await use(opened);
    expect(opened.complaints).toEqual([]);
  } finally {
    await opened.close();
  }
}

describe.each(['light', 'dark'] as const)('in %s', (theme) => {
  it('the window breaks no rule of access, with each table before it and a crossing open', async () => {
    await withWindow(theme, async ({ page }) => {
      await choose(page, 'D2');
      for (const tab of [/^Schedule/, /^Shortlist/, /^Findings/, /^Bowing/, /^Forces/]) {
        await page.getByRole('tab', { name: tab }).click();
        await page.waitForTimeout(300);
        expect(await broken(page)).toEqual([]);
      }
      await page.getByRole('radio', { name: 'What acts' }).locator('xpath=ancestor::label').click();
      await page.waitForTimeout(300);
      expect(await broken(page)).toEqual([]);
      await page.locator('[data-crossing]').first().click();
      await page.getByRole('region', { name: /^Crossing/ }).waitFor();
      expect(await broken(page)).toEqual([]);
    });
  });

  it.each([
    ['File', /^Project settings/],
    ['File', /^Own stock list/],
    ['Help', /^Keyboard/],
    ['Help', /^About/],
    ['Report', 'Report…'],
  ] as const)('the dialog under %s, %s, breaks none and closes by Escape', async (menu, entry) => {
    await withWindow(theme, async ({ page }) => {
      await command(page, menu, entry);
      const dialog = page.getByRole('dialog');
      await dialog.waitFor();
      expect(await broken(page)).toEqual([]);
      await page.keyboard.press('Escape');
      await expect.poll(() => dialog.count()).toBe(0);
    });
  });
});

describe.each([
  [1280, 800],
  [1920, 1080],
] as const)('at %i by %i', (width, height) => {
  it('nothing reaches over the edge, and no word of a head, button or tab is cut off', async () => {
    const opened = await stand.open({ width, height });
    const { page } = opened;
    await choose(page, 'D2');
    const outside = await page.evaluate(() =>
      [...document.querySelectorAll('header, [data-region], footer, .verdicts, [role=tablist]')]
        .filter((element) => {
          const { left, right, top } = element.getBoundingClientRect();
          return left < -1 || right > window.innerWidth + 1 || top < -1 || top > window.innerHeight;
        })
        .map((element) => element.getAttribute('aria-label') ?? element.className),
    );
    expect(outside).toEqual([]);
    const cut = await page.evaluate(() =>
      [...document.querySelectorAll('button, [role=tab], h1, h2, h3, [role=columnheader]')]
        .filter(
          (element) =>
            element instanceof HTMLElement && element.offsetParent !== null && !element.closest('.unseen'),
        )
        .filter(
          (element) =>
            element.scrollWidth > element.clientWidth + 1 &&
            getComputedStyle(element).textOverflow !== 'ellipsis',
        )
        .map((element) => element.textContent?.trim())
        .filter((text) => text !== ''),
    );
    expect(cut).toEqual([]);
    await opened.close();
  });
});

describe('by keys alone', () => {
  it('F6 goes from region to region, and the schedule is walked by arrows', async () => {
    const { page, close } = await stand.open();
    const where = () =>
      page.evaluate(() => document.activeElement?.closest('[data-region]')?.getAttribute('aria-label') ?? '');
    const seen = new Set<string>();
    for (let press = 0; press < 8; press++) {
      await page.keyboard.press('F6');
      seen.add(await where());
    }
    expect(seen.size).toBeGreaterThanOrEqual(4);
    await page.getByRole('grid', { name: 'Schedule' }).focus();
    await page.keyboard.press('Home');
    const first = await page.getByRole('row', { selected: true }).first().innerText();
    await page.keyboard.press('ArrowDown');
    await expect.poll(() => page.getByRole('row', { selected: true }).first().innerText()).not.toBe(first);
    await close();
  });
});
