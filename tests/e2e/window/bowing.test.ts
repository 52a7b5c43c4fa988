import type { Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { choose, type OpenedWindow, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
let opened: OpenedWindow;
let page: Page;
beforeAll(() => stand.start());
afterAll(() => stand.stop());
beforeEach(async () => {
  opened = await stand.open();
  page = opened.page;
  await choose(page, 'D2');
});
afterEach(async () => {
  expect(opened.complaints).toEqual([]);
  await opened.close();
});

/** The first number of a text, with its thin spaces taken out. */
const figure = (text: string): number =>
  Number(/-?\d[\d\u2009\u202f ]*(\.\d+)?/.exec(text)?.[0].replace(/[^\d.]/g, ''));

describe('a closer look at D2 of the example', () => {
  it('tells that its crossing is stiff in the plane and soft out of it', async () => {
    await page.getByRole('tab', { name: /^Bowing/ }).click();
    const stations = page.getByRole('region', { name: 'Stiffness at the stations' });
    await stations.getByText('out of plane').first().waitFor();
    const text = (await stations.innerText()).replace(/\s+/g, ' ');
    const following = (words: string): number =>
      figure(text.slice(text.lastIndexOf(`${words} `) + words.length));
    // METHODS.md §8: k_⊥ = k_p k_c sin²θ/(k_p cos²θ + k_c) with k = 2EA/(L/2), E = 200 000, A = 812.7 mm², L = 7 324 mm, tan(θ/2) = 4.2/6:
    // k = 88.8 kN/mm, θ = 70.0°, so k_⊥ = 70.2 kN/mm between rigid ends; the frame's own give takes up to a fifth of it.
    const inPlane = figure(text.slice(text.indexOf('in plane') + 8));
    expect(inPlane).toBeGreaterThan(0.8 * 70_200);
    expect(inPlane).toBeLessThan(1.01 * 70_200);
    // Out of the plane an unloaded equal partner offers 48 EI/L³ = 9.0 N/mm (I_y = 368 840 mm⁴), to the printed digit.
    expect(following('out of plane')).toBeGreaterThan(8.95);
    expect(following('out of plane')).toBeLessThan(9.05);
  });

  it('follows a push, and lets go by Escape', async () => {
    await page.getByRole('button', { name: /^Push/ }).click();
    const strip = page.getByRole('toolbar', { name: 'Push' });
    await strip.getByText(/N\/mm/).waitFor();
    await strip.getByText('in plane', { exact: true }).click();
    await expect.poll(() => strip.innerText()).toMatch(/in plane: .*N\/mm/);
    await page.keyboard.press('Escape');
  });

  it('shows what the bay leans on, and takes a join away on trial only', async () => {
    await page.getByRole('tab', { name: /^Bowing/ }).click();
    const leans = page.getByRole('region', { name: 'What W1 leans on' });
    await leans.getByRole('button', { name: /^Try/ }).first().click();
    const trial = page.getByRole('region', { name: 'Change on trial' });
    // Nothing joined: the whole 7.324 m over r_v = 13.7 mm is 534.
    await expect.poll(() => trial.innerText()).toMatch(/534/);
    await page.keyboard.press('Escape');
    await expect.poll(() => trial.count()).toBe(0);
  });
});
