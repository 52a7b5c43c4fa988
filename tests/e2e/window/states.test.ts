import { readFile } from 'node:fs/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { choose, command, row, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
beforeAll(() => stand.start());
afterAll(() => stand.stop());

const EXAMPLE = 'assets/examples/marrow-lane.json';

async function openText(page: Awaited<ReturnType<WindowStand['open']>>['page'], text: string): Promise<void> {
  await choose(page, 'D1');
  const chooser = page.waitForEvent('filechooser');
  await page.keyboard.press('Control+o');
  await (await chooser).setFiles({
    name: 'given.json',
    mimeType: 'application/json',
    buffer: Buffer.from(text),
  });
}

describe('a file that cannot be opened', () => {
  it.each([
    ['is not JSON', '{ "format": ', /not readable as JSON/],
    ['is of a newer version', JSON.stringify({ format: 'tautline-project', version: 99 }), /version 99/],
    ['has an absurd width', null, /too large|too small|not a number/],
  ])('because it %s is told of, with what to do, and nothing is lost', async (_why, text, says) => {
    const { page, complaints, close } = await stand.open();
    const broken = text ?? (await readFile(EXAMPLE, 'utf8')).replace('"width": 6000,', '"width": 1e300,');
    await openText(page, broken);
    const wrong = page.getByRole('list', { name: 'What is wrong' });
    await wrong.waitFor();
    expect(await wrong.innerText()).toMatch(says);
    await page.getByRole('button', { name: 'Close' }).last().click();
    await choose(page, 'D2');
    expect(complaints).toEqual([]);
    await close();
  });

  it('for an unknown section alone is opened all the same, with a finding that its remedy closes', async () => {
    const { page, complaints, close } = await stand.open();
    await openText(
      page,
      (await readFile(EXAMPLE, 'utf8')).replace('"section": "70x70x6"', '"section": "71x71x6"'),
    );
    await page.getByRole('tab', { name: /^Findings/ }).click();
    const finding = page.getByRole('article', { name: /71x71x6 is in no stock list/ });
    await finding.waitFor();
    await finding.getByRole('button', { name: /^Try/ }).first().click();
    await page
      .getByRole('region', { name: 'Change on trial' })
      .getByRole('button', { name: /^Keep/ })
      .click();
    await expect.poll(() => finding.count()).toBe(0);
    expect(complaints).toEqual([]);
    await close();
  });
});

describe('a field', () => {
  it('refuses what is no length, says so beside it, and keeps the old value', async () => {
    const { page, close } = await stand.open();
    await choose(page, 'D1');
    const width = page
      .getByRole('region', { name: 'Recipe of W1' })
      .getByRole('spinbutton', { name: 'Width' })
      .first();
    for (const wrong of ['wide', '-5', '999999999']) {
      await width.fill(wrong);
      await width.press('Enter');
      await page.getByRole('region', { name: 'Recipe of W1' }).getByRole('alert').first().waitFor();
      expect(await row(page, 'D1').innerText()).toContain('7.32');
      await width.press('Escape');
    }
    await close();
  });

  it('is no longer refused once anything else has changed', async () => {
    const { page, close } = await stand.open();
    await choose(page, 'D1');
    const recipe = page.getByRole('region', { name: 'Recipe of W1' });
    await recipe.getByRole('spinbutton', { name: 'Width' }).first().fill('wide');
    await recipe.getByRole('spinbutton', { name: 'Tiers' }).first().focus();
    await recipe.getByRole('alert').first().waitFor();
    await recipe.getByRole('spinbutton', { name: 'Tiers' }).first().press('ArrowUp');
    await expect.poll(() => recipe.getByRole('alert').count()).toBe(0);
    await close();
  });

  it('for a section takes one of another stock list, and names the nearest where no list has it', async () => {
    const { page, close } = await stand.open();
    await choose(page, 'D1');
    const recipe = page.getByRole('region', { name: 'Recipe of W1' });
    const section = recipe.getByRole('combobox', { name: 'Section' });
    await section.fill('71x71x6');
    await section.press('Enter');
    await expect.poll(() => recipe.getByRole('alert').first().textContent()).toMatch(/Nearest: .*70×70×6/);
    await section.fill('L3x3x1/4');
    await section.press('Enter');
    await expect.poll(() => row(page, 'D1').textContent()).toMatch(/L3[×X]3[×X]1\/4/);
    await close();
  });

  it('takes feet and inches in US units', async () => {
    const { page, close } = await stand.open();
    await choose(page, 'D1');
    await page.getByRole('button', { name: /^Units: metric/ }).click();
    const width = page
      .getByRole('region', { name: 'Recipe of W1' })
      .getByRole('spinbutton', { name: 'Width' })
      .first();
    await width.fill("15'-9");
    await width.press('Enter');
    // 15'-9" is 4800.6 mm; with 4.2 m up: √(4800.6² + 4200²) = 6378.6 mm, 20'-11 1/8".
    await expect
      .poll(async () => (await row(page, 'D1').innerText()).replace(/\s+/g, ' '))
      .toContain('20\'-11 1/8" ');
    await close();
  });
});

describe('the schedule in US units', () => {
  it.each([1280, 1440])('cuts no figure short in a window %i px wide', async (width) => {
    const { page, close } = await stand.open({ width, height: 800 });
    await choose(page, 'D1');
    await page.getByRole('button', { name: /^Units: metric/ }).click();
    for (const columns of ['Bracing', 'Making', 'Bowing']) {
      await page.getByText(columns, { exact: true }).last().click();
      await expect.poll(() => row(page, 'D1').textContent()).toContain('24\'-0 3/8"');
      await expect
        .poll(() =>
          page
            .locator('.schedule-row > div')
            .evaluateAll((cells) =>
              cells.filter((cell) => cell.scrollWidth > cell.clientWidth).map((cell) => cell.textContent),
            ),
        )
        .toEqual([]);
    }
    await close();
  });
});

describe('the window', () => {
  it('is no taller than its page, and leads back to the example', async () => {
    const { page, complaints, close } = await stand.open({ width: 1280, height: 800 });
    const notices: string[] = [];
    page.on('console', (message) => {
      if (message.type() === 'warning') notices.push(message.text());
    });
    await choose(page, 'D1');
    expect(await page.evaluate(() => document.documentElement.scrollHeight)).toBe(800);
    await command(page, 'File', 'New project');
    const offers = page.locator('.empty-offer');
    await offers.first().waitFor();
    const heights = await offers.evaluateAll((all) => all.map((each) => each.getBoundingClientRect().height));
    expect(new Set(heights).size).toBe(1);
    await command(page, 'File', 'Open the example');
    await row(page, 'D1').waitFor();
    expect(notices.filter((text) => text.includes('THREE'))).toEqual([]);
    expect(complaints).toEqual([]);
    await close();
  });

  it('shows the whole form for a length by hand as it unfolds', async () => {
    const { page, close } = await stand.open({ width: 1280, height: 800 });
    await choose(page, 'D1');
    await page.getByText('Lengths by hand', { exact: true }).click();
    await page.getByRole('button', { name: /^Take another length/ }).click();
    const take = page.getByRole('button', { name: 'Take it', exact: true });
    await expect.poll(async () => ((await take.boundingBox())?.y ?? 9999) + 20).toBeLessThan(780);
    await close();
  });
});

describe('without WebGL', () => {
  it('the bay is drawn flat, with the same buttons', async () => {
    const { page, close } = await stand.open({
      before: 'HTMLCanvasElement.prototype.getContext = function () { return null; };',
    });
    await page.getByText(/3D/).first().waitFor();
    await page
      .locator('[data-crossing="W1/t1.fall+t1.rise"]')
      .or(page.locator('[data-crossing]').first())
      .first()
      .click();
    await page.getByRole('region', { name: /^Crossing/ }).waitFor();
    await close();
  });
});

describe('the theme', () => {
  it('follows the machine until one is chosen', async () => {
    const { page, close } = await stand.open({ theme: 'dark' });
    const ground = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
    const dark = await ground();
    await command(page, 'View', 'Light');
    await expect.poll(ground).not.toBe(dark);
    await command(page, 'View', 'Dark');
    await expect.poll(ground).toBe(dark);
    await close();
  });
});
