import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ask, given } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { startDesktop, testFolder } from './startDesktop.ts';

let desktop: Desktop;
let folder: Awaited<ReturnType<typeof testFolder>>;
beforeEach(async () => {
  folder = await testFolder();
  desktop = await startDesktop({ blank: true });
});
afterEach(async () => {
  await desktop.end();
  await folder.remove();
});

const report = (body: string): string =>
  `<!doctype html><html lang="en"><head><title>Report</title><style>@page { size: A5 landscape }</style></head><body>${body}</body></html>`;

async function pdfOf(html: string): Promise<string> {
  const file = path.join(folder.path, 'report.pdf');
  await desktop.reply('save', { canceled: false, filePath: file });
  expect(given(await ask(desktop.page, 'savePdf', 'report.pdf', html))).toEqual({ name: 'report.pdf' });
  return await readFile(file, 'latin1');
}

describe('a report as PDF', () => {
  it('is on the paper that the report asks for', async () => {
    const pdf = await pdfOf(report('<h1>Bracing</h1>'));
    expect(pdf.startsWith('%PDF-')).toBe(true);
    // A5 on its side is 210 x 148 mm, in points of 1/72 inch. Tolerance: Chromium lays out in whole CSS pixels, 0.75 pt.
    const [width = 0, height = 0] = (/\/MediaBox \[0 0 ([\d.]+) ([\d.]+)\]/.exec(pdf)?.slice(1) ?? []).map(
      Number,
    );
    expect(Math.abs(width - (210 / 25.4) * 72)).toBeLessThan(0.75);
    expect(Math.abs(height - (148 / 25.4) * 72)).toBeLessThan(0.75);
  });

  it('is laid out without running a script of the report', async () => {
    const pages = (pdf: string): number => [...pdf.matchAll(/\/Type \/Page\b/g)].length;
    const script =
      '<p>one page</p><script>document.body.innerHTML = \'<p style="break-before: page">a</p>\'.repeat(3)</script>';
    expect(pages(await pdfOf(report(script)))).toBe(1);
  });

  it('is not made when the user turns back', async () => {
    await desktop.reply('save', { canceled: true, filePath: '' });
    expect(await ask(desktop.page, 'savePdf', 'report.pdf', report(''))).toBeNull();
  });

  it('leaves no page behind', async () => {
    await pdfOf(report('<p>once</p>'));
    expect(desktop.page.context().pages()).toHaveLength(1);
  });
});
