import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { choose, command, lanes, row } from '../window/openedWindow.ts';
import { until } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { startDesktop, testFolder } from './startDesktop.ts';

let desktop: Desktop;
let folder: Awaited<ReturnType<typeof testFolder>>;
const complaints: string[] = [];
beforeEach(async () => {
  complaints.length = 0;
  folder = await testFolder();
});
afterEach(async () => {
  await desktop.end();
  await folder.remove();
});

async function start(args: readonly string[]): Promise<void> {
  desktop = await startDesktop({ args });
  // The page may have said something before anybody listened; loading it again lets it say so once more.
  desktop.page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  desktop.page.on('pageerror', (error) => complaints.push(error.message));
  await desktop.page.reload();
}

describe('the whole window on the desktop', () => {
  it('opens the example under the strict policy without a complaint', async () => {
    await start([]);
    await until(desktop.title, (title) => title.includes('Marrow Lane'));
    // The worker has answered once a diagonal's mark stands in the window.
    await desktop.page
      .getByText(/^D\d+$/)
      .first()
      .waitFor();
    expect(complaints).toEqual([]);
  });

  it('opens, saves and exports real files by the menu', async () => {
    const file = path.join(folder.path, 'shed.json');
    await writeFile(file, await readFile('assets/examples/marrow-lane.json', 'utf8'));
    await start([file]);
    await until(desktop.title, (title) => title.includes('Marrow Lane'));

    const copy = path.join(folder.path, 'copy.json');
    await desktop.reply('save', { canceled: false, filePath: copy });
    await desktop.clickMenu('file.saveAs');
    const saved = await until(
      () => readFile(copy, 'utf8').catch(() => ''),
      (text) => text !== '',
    );
    expect(JSON.parse(saved)).toEqual(JSON.parse(await readFile(file, 'utf8')));

    const csv = path.join(folder.path, 'schedule.csv');
    await desktop.reply('save', { canceled: false, filePath: csv });
    await desktop.clickMenu('file.exportCsv');
    const schedule = await until(
      () => readFile(csv, 'utf8').catch(() => ''),
      (text) => text !== '',
    );
    expect(schedule.split('\n')[0]).toMatch(/mark/i);
    expect(complaints).toEqual([]);
  });

  it('takes a wall bay from nothing to its schedule: joined, mended, a size picked, undone, saved, opened again', async () => {
    await start([]);
    await until(desktop.title, (title) => title.includes('Marrow Lane'));
    const { page } = desktop;
    await desktop.clickMenu('file.new');
    await until(desktop.title, (title) => title.includes('New project'));
    await command(page, 'Bay', 'Add a wall bay');
    const recipe = page.getByRole('region', { name: /^Recipe of/ });
    for (const [name, value] of [
      ['Width', '4800'],
      [/^Tier 1/, '3600'],
    ] as const) {
      const field = recipe.getByRole('spinbutton', { name }).first();
      await field.fill(value);
      await field.press('Enter');
    }
    await choose(page, 'D1');
    // 6.000 m over 1.37 cm (SCI P363, L 70×70×6) where nothing is joined; the half of it about v where the crossing is bolted.
    await expect.poll(async () => Math.abs((await lanes(page, 'D1')).v ?? 0)).toBeGreaterThan(435);
    await page.locator('[data-crossing]').first().click();
    const crossing = page.getByRole('region', { name: /^Crossing D1/ });
    await crossing.getByRole('radio', { name: 'bolted through' }).locator('xpath=ancestor::label').click();
    await expect.poll(async () => (await lanes(page, 'D1')).v).toBeLessThan(221);
    await page.keyboard.press('Escape');

    await page.getByRole('tab', { name: /^Shortlist/ }).click();
    const list = page.getByRole('listbox', { name: 'Stock angles by mass' });
    await list.getByRole('option').first().waitFor();
    await list.focus();
    for (let step = 0; step < 60; step++) await page.keyboard.press('ArrowRight');
    await page
      .getByRole('region', { name: 'Chosen stock angle' })
      .getByRole('button', { name: /^Take it for/ })
      .click();
    await until(
      async () => Math.max(...Object.values(await lanes(page, 'D1'))),
      (worst) => worst < 250,
    );
    await desktop.clickMenu('edit.undo');
    // Back to 6.000 m over 2.13 cm out of the plane.
    await expect.poll(async () => Math.max(...Object.values(await lanes(page, 'D1')))).toBeGreaterThan(278);

    await page.getByRole('tab', { name: /^Schedule/ }).click();
    await row(page, 'D1').waitFor();
    const file = path.join(folder.path, 'wall.json');
    await desktop.reply('save', { canceled: false, filePath: file });
    await desktop.clickMenu('file.save');
    const saved = JSON.parse(
      await until(
        () => readFile(file, 'utf8').catch(() => ''),
        (text) => text !== '',
      ),
    );
    expect(saved.bays[0].recipe.width).toBe(4800);
    expect(Object.values(saved.bays[0].joins)).toEqual([{ kind: 'bolted' }]);

    await desktop.clickMenu('file.new');
    await until(
      () => row(page, 'D1').count(),
      (count) => count === 0,
    );
    await desktop.reply('open', { canceled: false, filePaths: [file] });
    await desktop.clickMenu('file.open');
    await choose(page, 'D1');
    await expect.poll(async () => (await lanes(page, 'D1')).v).toBeLessThan(221);

    const csv = path.join(folder.path, 'wall.csv');
    await desktop.reply('save', { canceled: false, filePath: csv });
    await desktop.clickMenu('file.exportCsv');
    const schedule = await until(
      () => readFile(csv, 'utf8').catch(() => ''),
      (text) => text !== '',
    );
    // One head and two diagonals.
    expect(schedule.trim().split(/\r?\n/)).toHaveLength(3);
    expect(complaints).toEqual([]);
  });

  it('says what is wrong with a file that is broken, and leaves the file alone', async () => {
    const file = path.join(folder.path, 'broken.json');
    await writeFile(file, '{"format": "tautline-project", "vers');
    await start([file]);
    await desktop.page.getByText('broken.json').first().waitFor();
    expect(await readFile(file, 'utf8')).toBe('{"format": "tautline-project", "vers');
  });

  it('makes a PDF of the report', async () => {
    await start([]);
    await until(desktop.title, (title) => title.includes('Marrow Lane'));
    const pdf = path.join(folder.path, 'report.pdf');
    await desktop.reply('save', { canceled: false, filePath: pdf });
    await desktop.clickMenu('file.pdf');
    const bytes = await until(
      () => readFile(pdf, 'latin1').catch(() => ''),
      (text) => text !== '',
    );
    expect(bytes.startsWith('%PDF-')).toBe(true);
  });
});
