import { BrowserWindow } from 'electron';
import type { ReportPages } from './appScheme.ts';
import { lockDownContents, SANDBOXED } from './lockDown.ts';

/** What Electron says when the user closes the printing dialog without printing. */
const TURNED_BACK = /cancel/i;

/** Sends a report to a printer through the system's dialog. Returns why it failed, or null; turning back is no failure. */
export async function printReport(pages: ReportPages, html: string): Promise<string | null> {
  return await onPaper(pages, html, async (window) => {
    const failure = await new Promise<string | null>((resolve) => {
      window.webContents.print({ printBackground: true }, (success, reason) =>
        resolve(success ? null : reason || 'The system gave no reason.'),
      );
    });
    return failure !== null && TURNED_BACK.test(failure) ? null : failure;
  });
}

/** A report as a PDF file, on the paper that its own style asks for. */
export async function reportPdf(pages: ReportPages, html: string): Promise<Uint8Array> {
  return await onPaper(pages, html, (window) =>
    window.webContents.printToPDF({
      preferCSSPageSize: true,
      printBackground: true,
      generateTaggedPDF: true,
      generateDocumentOutline: true,
    }),
  );
}

/** Lays the report out in a hidden page that runs no script, and takes the page away afterwards. */
async function onPaper<T>(
  pages: ReportPages,
  html: string,
  use: (window: BrowserWindow) => Promise<T>,
): Promise<T> {
  const page = pages.show(html);
  const window = new BrowserWindow({
    show: false,
    width: 1000,
    height: 1400,
    webPreferences: { ...SANDBOXED, javascript: false },
  });
  lockDownContents(window.webContents);
  try {
    await window.loadURL(page.address);
    return await use(window);
  } finally {
    page.withdraw();
    window.destroy();
  }
}
