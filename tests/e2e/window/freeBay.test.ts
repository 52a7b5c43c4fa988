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
});
