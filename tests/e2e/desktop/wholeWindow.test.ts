import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
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
