/** Three hundred bays: the work is seen to go on, can be left off and taken up again, in the built window. */
import { Buffer } from 'node:buffer';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { writeProject } from '../../../core/project/writeProject.ts';
import { DIAGONALS_EACH, fourPanelBays } from '../../bench/given.ts';
import { command, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

const BAYS = 300;
/** ms: software drawing and two busy cores take their time over 2 400 diagonals. */
const LONG = 60_000;

async function openMany(page: Page): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await command(page, 'File', /^Open/);
  await (await chooser).setFiles({
    name: 'many.json',
    mimeType: 'application/json',
    buffer: Buffer.from(writeProject(fourPanelBays(BAYS))),
  });
}

describe('a project of three hundred bays', () => {
  it('shows how far the work is, stops when cancelled, says that figures are missing, and goes on when asked', async () => {
    const { page, complaints, close } = await stand.open();
    const status = page.getByRole('contentinfo');
    await openMany(page);
    const bar = status.getByRole('progressbar', { name: 'Bays worked out' });
    await bar.waitFor({ timeout: LONG });
    expect(await bar.getAttribute('max')).toBe(String(BAYS));
    // Seen to move before it is stopped.
    await page.waitForFunction(
      () => Number(document.querySelector('footer progress')?.getAttribute('value')) > 0,
      null,
      { timeout: LONG },
    );
    await status.getByRole('button', { name: 'Cancel' }).click();
    await status.getByText('Stopped: there are no figures yet').waitFor();
    expect(await bar.count()).toBe(0);

    await status.getByRole('button', { name: 'Work out' }).click();
    await status.getByText(`${BAYS * DIAGONALS_EACH} diagonals`).waitFor({ timeout: LONG });
    await status.getByText(/^Assessed in /).waitFor({ timeout: LONG });
    expect(complaints).toEqual([]);
    await close();
  });

  it('keeps the last figures when an edit of all is cancelled, and says that they are out of date', async () => {
    const { page, close } = await stand.open();
    const status = page.getByRole('contentinfo');
    await openMany(page);
    await status.getByText(`${BAYS * DIAGONALS_EACH} diagonals`).waitFor({ timeout: LONG });
    await status.getByText(/^Assessed in /).waitFor({ timeout: LONG });

    // How ends turn touches the critical loads of every bay.
    await command(page, 'File', /settings/i);
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('radiogroup', { name: 'Ends, out of the plane' }).getByText('Stiff').click();
    await page.keyboard.press('Escape');
    await status.getByRole('button', { name: 'Cancel' }).click({ timeout: LONG });
    await status.getByText('Stopped: the figures are out of date').waitFor();
    expect(await status.textContent()).toContain(`${BAYS * DIAGONALS_EACH} diagonals`);

    await status.getByRole('button', { name: 'Work out' }).click();
    await status.getByText(/^Assessed in /).waitFor({ timeout: LONG });
    await close();
  });
});
