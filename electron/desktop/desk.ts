import path from 'node:path';
import type { BrowserWindow } from 'electron';
import type { HostResult, OpenedFile, RecentFile, SavedFile, StartState } from '../../renderer/host/host.ts';
import { fileProblem } from '../files/fileProblem.ts';
import { type FileStore, readTextFile } from '../files/fileStore.ts';
import type { RecentFiles } from '../files/recentFiles.ts';
import type { RecoveryFile } from '../files/recoveryFile.ts';
import { replaceFile } from '../files/replaceFile.ts';
import type { ReportPages } from './appScheme.ts';
import { askFileToRead, askProjectToOpen, askWhereToExport, askWhereToSave } from './dialogs.ts';
import type { HostAnswers } from './hostAnswers.ts';
import { printReport, reportPdf } from './paper.ts';

export interface DeskSetting {
  readonly window: BrowserWindow;
  readonly files: FileStore;
  readonly recents: RecentFiles;
  readonly recovery: RecoveryFile;
  readonly pages: ReportPages;
  /** Named on the command line; null for none. */
  readonly given: string | null;
  readonly example: OpenedFile;
  /** The user's own folder, written "~" in lists. */
  readonly home: string;
  readonly documentChanged: (state: { readonly title: string; readonly dirty: boolean }) => void;
  readonly closeConfirmed: () => void;
}

/** Answers to every call of the window: the files, dialogs, recovery and paper of one project at a time. */
export function deskAnswers(desk: DeskSetting): HostAnswers {
  const { window, files, recents, recovery } = desk;
  /** The file at hand; null while what is at hand has no place yet. */
  let current = desk.given ?? recents.list()[0] ?? null;

  async function read(file: string): Promise<HostResult<OpenedFile>> {
    const opened = await files.read(file);
    if (opened.ok) {
      current = path.resolve(file);
      await recents.add(file);
    } else if (opened.problem.kind === 'not found') await recents.remove(file);
    return opened;
  }

  async function start(): Promise<StartState> {
    const left = await leftOver(desk);
    if (current === null) return { opened: desk.example, recovery: left, problem: null };
    const opened = await read(current);
    if (opened.ok) return { opened: opened.value, recovery: left, problem: null };
    // A file that was asked for is missed aloud; one merely last worked on may have gone in the meantime.
    const asked = current === desk.given;
    current = null;
    return {
      opened: asked ? null : desk.example,
      recovery: left,
      problem: asked ? opened.problem : null,
    };
  }

  /** Takes note of where the project at hand now lives. */
  async function settled(file: string, saved: HostResult<SavedFile>): Promise<HostResult<SavedFile>> {
    if (saved.ok) {
      current = path.resolve(file);
      await recents.add(file);
    }
    return saved;
  }

  async function exportTo(
    suggestedName: string,
    content: () => Promise<string | Uint8Array>,
  ): Promise<HostResult<{ readonly name: string }> | null> {
    const file = await askWhereToExport(window, suggestedName, folderOf(current));
    if (file === null) return null;
    const name = path.basename(file);
    try {
      await replaceFile(file, await content());
      return { ok: true, value: { name } };
    } catch (error) {
      return { ok: false, problem: fileProblem(error, name) };
    }
  }

  return {
    start,
    async open() {
      const file = await askProjectToOpen(window);
      return file === null ? null : await read(file);
    },
    async openRecent(token) {
      const file = files.pathOf(token);
      return file === null ? unknownToken() : await read(file);
    },
    recent: () => recentList(desk),
    async save(token, text, force) {
      const file = files.pathOf(token);
      return file === null ? unknownToken() : await settled(file, await files.save(token, text, force));
    },
    async saveAs(suggestedName, text) {
      const file = await askWhereToSave(window, suggestedName, folderOf(current));
      return file === null ? null : await settled(file, await files.saveAt(file, text));
    },
    async autosave(copy) {
      if (copy === null) return await recovery.forget();
      const file = copy.token === null ? null : files.pathOf(copy.token);
      await recovery.keep({
        name: copy.name,
        path: file,
        knownContent: copy.token === null ? null : files.knownContent(copy.token),
        text: copy.text,
        savedAt: copy.savedAt,
      });
    },
    exportText: (suggestedName, text) => exportTo(suggestedName, async () => text),
    async print(html) {
      const failure = await printReport(desk.pages, html);
      return failure === null
        ? { ok: true, value: null }
        : { ok: false, problem: { kind: 'failed', name: 'report', detail: failure } };
    },
    savePdf: (suggestedName, html) => exportTo(suggestedName, () => reportPdf(desk.pages, html)),
    async importText(extensions) {
      const file = await askFileToRead(window, extensions);
      if (file === null) return null;
      const content = await readTextFile(file);
      if (!content.ok) return content;
      return { ok: true, value: { name: content.value.name, text: content.value.text } };
    },
    setDocumentState: desk.documentChanged,
    confirmClose: desk.closeConfirmed,
  };
}

/** Recent projects as the window and the menu show them. */
export function recentList(desk: Pick<DeskSetting, 'recents' | 'files' | 'home'>): readonly RecentFile[] {
  return desk.recents.list().map((file) => ({
    token: desk.files.tokenOf(file),
    name: path.basename(file),
    folder: shortFolder(path.dirname(file), desk.home),
  }));
}

async function leftOver({ files, recovery }: DeskSetting): Promise<StartState['recovery']> {
  const left = await recovery.read();
  if (left === null) return null;
  return {
    name: left.name,
    token: left.path === null ? null : files.recall(left.path, left.knownContent),
    text: left.text,
    savedAt: left.savedAt,
  };
}

function unknownToken(): {
  readonly ok: false;
  readonly problem: { readonly kind: 'not found'; readonly name: string };
} {
  return { ok: false, problem: { kind: 'not found', name: '' } };
}

function folderOf(file: string | null): string | null {
  return file === null ? null : path.dirname(file);
}

function shortFolder(folder: string, home: string): string {
  const relative = path.relative(home, folder);
  if (relative === '') return '~';
  return relative.startsWith('..') || path.isAbsolute(relative) ? folder : path.join('~', relative);
}
