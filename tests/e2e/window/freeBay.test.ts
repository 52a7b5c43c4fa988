import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { command, row, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

describe('a free bay', () => {
  it('is still drawn when a level bar is added', async () => {
    const { page, complaints, close } = await stand.open();
    await command(page, 'File', 'New project');
    await page.getByRole('button', { name: /^Free bay/ }).click();
    await row(page, 'D1').waitFor();
    await page.getByRole('button', { name: 'Add a bar' }).click();
    await row(page, 'D3').waitFor();
    const view = page.getByRole('region', { name: 'View' });
    await expect.poll(() => view.innerText()).toMatch(/\bD3\b/);
    expect(await page.getByText('Could not draw').count()).toBe(0);
    expect(complaints).toEqual([]);
    await close();
  });

  it('gives a bar that is made a strut a size, and takes another', async () => {
    const { page, complaints, close } = await stand.open();
    await command(page, 'File', 'New project');
    await page.getByRole('button', { name: /^Free bay/ }).click();
    await row(page, 'D2').waitFor();
    const recipe = page.getByRole('region', { name: /^Recipe of/ });
    await recipe
      .getByLabel(/^Kind of/)
      .last()
      .selectOption('strut');
    const size = recipe.getByRole('group', { name: /^strut/ });
    const depth = size.getByRole('spinbutton', { name: 'Depth' });
    await depth.fill('140');
    await depth.press('Enter');
    await expect.poll(() => depth.inputValue()).toBe('140');
    await expect.poll(() => row(page, 'D2').count()).toBe(0);
    expect(complaints).toEqual([]);
    await close();
  });
});
