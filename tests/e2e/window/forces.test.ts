import type { Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { choose, command, type OpenedWindow, WindowStand } from './openedWindow.ts';

const stand = new WindowStand();
let opened: OpenedWindow;
let page: Page;
beforeAll(() => stand.start());
afterAll(() => stand.stop());
beforeEach(async () => {
  opened = await stand.open();
  page = opened.page;
});
afterEach(async () => {
  expect(opened.complaints).toEqual([]);
  await opened.close();
});

const table = () => page.getByRole('region', { name: /^Forces in/ });
const combination = (name: string) => table().getByRole('button', { name });

describe('wind on the gables of the example', () => {
  it('is followed from the roof to the ground, and slackens the other diagonals when it is turned round', async () => {
    await choose(page, 'D1');
    await page.getByRole('tab', { name: /^Forces/ }).click();
    await combination('0.9 G + 1.3 W, leaning on strength').click();
    // The label on the drawing says the force, so that it is there for those who do not see the band.
    const labelled = (mark: string, what: RegExp) =>
      expect
        .poll(() => page.locator(`.scene-label`, { hasText: mark }).first().getAttribute('aria-label'))
        .toMatch(what);
    await labelled('D1', /^D1, pulled, [\d.]+ kN$/);
    await labelled('D2', /^D2, slack$/);
    await combination('0.9 G + 1.3 W, W turned round, leaning back strength').click();
    await labelled('D1', /^D1, slack$/);
    await labelled('D2', /^D2, pulled, [\d.]+ kN$/);
  });

  it('is stepped through by keys', async () => {
    await choose(page, 'D1');
    await page.keyboard.press('f');
    const strip = page.getByRole('toolbar', { name: 'Forces' });
    await strip.getByText('Greatest of all').waitFor();
    await page.keyboard.press('.');
    await strip.getByText('1 of 13').waitFor();
    await page.keyboard.press(',');
    await strip.getByText('Greatest of all').waitFor();
  });

  it('shows the working of a diagonal, clause by clause, with what comes from memory marked', async () => {
    await choose(page, 'D1');
    const part = page.getByRole('region', { name: 'Forces and resistance of D1' });
    await part.getByRole('button', { name: /^.*Show the working/ }).click();
    // SANS 10162-1, 13.2(a)(i): 0.90 × 812.7 mm² × 355 N/mm² = 259.7 kN (METHODS.md, resistance in tension).
    await expect.poll(() => part.innerText()).toMatch(/0\.90 × 813 × 355[\s\S]*260 kN/);
    expect(await part.innerText()).toMatch(/from memory, verify/);
  });
});

describe('a beam at the head of a tier', () => {
  it('is found by its name, shows what squeezes it and what it resists, and gains by a thicker web and flange', async () => {
    await page.keyboard.press('Control+k');
    await page.getByRole('combobox', { name: 'Find a bar or a command' }).fill('t1.beam W1');
    await page.getByRole('option', { name: /t1\.beam W1/ }).click();
    const part = page.getByRole('region', { name: 'Compression of t1.beam' });
    // SANS 10162-1, 13.3.1, by hand: UB 203 × 133 × 25 without fillets over 6 m, L/r_y 192, 143 kN.
    await expect.poll(() => part.innerText()).toMatch(/143 kN[\s\S]*192/);
    await part.getByText('Show the working').click();
    expect(await part.innerText()).toMatch(/13\.3\.1/);
    await page.locator('summary', { hasText: 'Members' }).click();
    const beams = page.getByRole('group', { name: 'Beams' });
    await beams.getByRole('spinbutton', { name: 'Flange' }).fill('12');
    await beams.getByRole('spinbutton', { name: 'Flange' }).press('Enter');
    await expect.poll(() => part.innerText()).not.toMatch(/143 kN/);
    await beams.getByRole('checkbox', { name: 'Usual thicknesses for its size' }).check();
    await expect.poll(() => part.innerText()).toMatch(/Not met: its thicknesses are given/);
  });
});

describe('what a practice leaves to choose', () => {
  it('is chosen in the settings and at the ends: partial factors, a grade of the project’s own, rows and grade of bolts', async () => {
    await choose(page, 'D1');
    const part = page.getByRole('region', { name: 'Forces and resistance of D1' });
    await command(page, 'File', 'Project settings…');
    const dialog = page.getByRole('dialog', { name: 'Project settings' });
    await dialog.getByLabel('Practice', { exact: true }).selectOption({ label: 'EN 1993-1-1' });
    const gamma = dialog.getByRole('spinbutton', { name: 'γM2' });
    await gamma.fill('1.5');
    await gamma.press('Enter');
    await dialog.getByRole('button', { name: 'Add a grade of my own' }).click();
    await dialog.getByRole('textbox', { name: 'Name of grade 1' }).fill('old iron');
    await dialog.getByRole('textbox', { name: 'Name of grade 1' }).press('Enter');
    await page.keyboard.press('Escape');
    await part.getByRole('button', { name: /Show the working/ }).click();
    await expect.poll(() => part.innerText()).toMatch(/γM2[\s\S]*1\.50/);

    const recipe = page.getByRole('region', { name: /^Recipe of/ });
    await recipe.getByRole('textbox', { name: 'Grade' }).first().fill('old iron');
    await recipe.getByRole('textbox', { name: 'Grade' }).first().press('Enter');
    await expect.poll(() => part.innerText()).toMatch(/fy\s*275/);

    await page.locator('summary', { hasText: 'Ends' }).click();
    await recipe.getByLabel('Bolt grade').selectOption('10.9');
    await expect.poll(() => part.innerText()).toMatch(/1\s?000 N\/mm²/);
    await recipe.getByLabel('Rows along it').selectOption('staggered');
    await recipe.getByRole('spinbutton', { name: 'Rows apart' }).waitFor();
  });
});

describe('the faults planted in the example', () => {
  it('are mended by one remedy after another until nothing must be fixed, and the report is made of what is left', async () => {
    const counts = page.getByRole('button', { name: /^Findings: / });
    const mustFix = async () =>
      Number(/: (\d+) must fix/.exec((await counts.getAttribute('aria-label')) ?? '')?.[1]);
    expect(await mustFix()).toBeGreaterThan(5);
    await page.getByRole('tab', { name: /^Findings/ }).click();
    for (let steps = 0; steps < 16 && (await mustFix()) > 0; steps++) {
      const before = await counts.getAttribute('aria-label');
      const first = page.getByRole('article').filter({ hasText: 'must fix: ' }).first();
      await first.getByRole('button', { name: /^Try/ }).first().click({ timeout: 20_000 });
      await page
        .getByRole('region', { name: 'Change on trial' })
        .getByText(/[Cc]loses/)
        .waitFor();
      await page.getByRole('button', { name: /^Keep/ }).click();
      await expect.poll(() => counts.getAttribute('aria-label'), { timeout: 10_000 }).not.toBe(before);
    }
    expect(await mustFix()).toBe(0);
    await command(page, 'Report', 'Report…');
    const report = (await page.getByTitle('Report preview').getAttribute('srcdoc')) ?? '';
    expect(report).toContain('What acts');
    expect(report).toContain('Working of the check that governs');
    expect(report).toMatch(/\b0 to fix/);
  }, 240_000);
});

describe('what acts', () => {
  it('begins with an empty project that says how, and gets wind and the practice’s combinations', async () => {
    await page.getByRole('menuitem', { name: 'File', exact: true }).click();
    await page.getByRole('menuitem', { name: /^New project/ }).click();
    await page
      .getByRole('button', { name: /^Wall bay/ })
      .first()
      .click();
    await page.getByRole('tab', { name: /^Forces/ }).click();
    await page.locator('.forces-empty').getByRole('button', { name: 'Say what acts' }).click();
    await page.getByRole('button', { name: 'wind', exact: true }).click();
    await page.getByRole('button', { name: 'wind on a wall' }).click();
    await page.getByRole('button', { name: /^Take those of/ }).click();
    await page.getByRole('region', { name: 'Combinations' }).getByText('C1', { exact: true }).waitFor();
    await page.getByText('Combinations', { exact: true }).first().click();
    // Turned round: one diagonal of each crossed pair is slack either way.
    await expect.poll(() => table().innerText()).toMatch(/turned round/);
    await expect.poll(() => table().innerText()).toMatch(/slack/);
    await page.keyboard.press('Control+z');
    await expect.poll(() => page.getByRole('region', { name: /^Forces in/ }).count()).toBe(0);
  });

  it('takes an arrow from the keys of a node, and gives it back on undo', async () => {
    await choose(page, 'D1');
    await page.keyboard.press('1');
    await page.keyboard.press('f');
    const node = page.getByRole('button', { name: /^Force on left head of tier 1 in W/ });
    await node.focus();
    await page.keyboard.press('Shift+ArrowRight');
    await page.getByRole('button', { name: 'Force on left head of tier 1 in W: 10.0 kN across' }).waitFor();
    await page.keyboard.press('Control+z');
    await page.getByRole('button', { name: 'Force on left head of tier 1 in W', exact: true }).waitFor();
  });
});
