import path from 'node:path';
import { type BrowserWindow, dialog, type FileFilter } from 'electron';
import { safeFileName } from '../files/safeFileName.ts';

const EVERY_FILE: FileFilter = { name: 'All files', extensions: ['*'] };
const PROJECTS: FileFilter = { name: 'Tautline projects', extensions: ['json'] };

const KINDS: Readonly<Record<string, string>> = {
  csv: 'Comma-separated values',
  json: 'JSON',
  html: 'Web page',
  pdf: 'PDF document',
};

/** The path of a project that the user picks, or null when they turn back. */
export async function askProjectToOpen(window: BrowserWindow): Promise<string | null> {
  return await askToOpen(window, 'Open a project', [PROJECTS, EVERY_FILE]);
}

export async function askFileToRead(
  window: BrowserWindow,
  extensions: readonly string[],
): Promise<string | null> {
  const plain = extensions.map((one) => one.replace(/^\./, ''));
  const filters =
    plain.length === 0 ? [EVERY_FILE] : [{ name: kindOf(plain[0]), extensions: plain }, EVERY_FILE];
  return await askToOpen(window, 'Read a file', filters);
}

/** Where to save a project. The system's dialog has asked already when something is there. */
export async function askWhereToSave(
  window: BrowserWindow,
  suggestedName: string,
  folder: string | null,
): Promise<string | null> {
  return await askForPlace(window, 'Save the project', suggestedName, folder, PROJECTS);
}

export async function askWhereToExport(
  window: BrowserWindow,
  suggestedName: string,
  folder: string | null,
): Promise<string | null> {
  const extension = path.extname(safeFileName(suggestedName)).slice(1).toLowerCase();
  const filter = extension === '' ? EVERY_FILE : { name: kindOf(extension), extensions: [extension] };
  return await askForPlace(window, 'Save as', suggestedName, folder, filter);
}

async function askToOpen(
  window: BrowserWindow,
  title: string,
  filters: FileFilter[],
): Promise<string | null> {
  const chosen = await dialog.showOpenDialog(window, { title, filters, properties: ['openFile'] });
  return chosen.canceled ? null : (chosen.filePaths[0] ?? null);
}

async function askForPlace(
  window: BrowserWindow,
  title: string,
  suggestedName: string,
  folder: string | null,
  filter: FileFilter,
): Promise<string | null> {
  const name = safeFileName(suggestedName);
  const chosen = await dialog.showSaveDialog(window, {
    title,
    defaultPath: folder === null ? name : path.join(folder, name),
    filters: filter === EVERY_FILE ? [EVERY_FILE] : [filter, EVERY_FILE],
    properties: ['createDirectory', 'showOverwriteConfirmation'],
  });
  return chosen.canceled || chosen.filePath === '' ? null : chosen.filePath;
}

function kindOf(extension: string | undefined): string {
  return (extension === undefined ? undefined : KINDS[extension.toLowerCase()]) ?? 'Files';
}
