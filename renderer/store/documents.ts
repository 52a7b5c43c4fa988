/** Opening, saving and handing over: what passes between the window and its host. The open project is never touched by a failure. */
import type { StoreApi } from 'zustand/vanilla';
import { newProject } from '../../core/project/newProject.ts';
import { readProject, readProjectData } from '../../core/project/readProject.ts';
import { writeProject } from '../../core/project/writeProject.ts';
import type { Assessor } from '../assessing/assessor.ts';
import { reportFonts } from '../assessing/reportFonts.ts';
import type { Host, HostProblem, HostResult, OpenedFile, RecoveryCopy } from '../host/host.ts';
import type { NextStep } from './dialog.ts';
import { isChanged, presentProject } from './shown.ts';
import type { WindowActions } from './windowActions.ts';
import type { WindowState } from './windowState.ts';

export interface Documents {
  /** The file given at start, the example, or what a crash left over. */
  begin(): Promise<void>;
  newProject(): Promise<void>;
  /** As at the first start: a project of its own, in no file. */
  openExample(): Promise<void>;
  open(): Promise<void>;
  openRecent(token: string): Promise<void>;
  /** True when the project is safely in its file. */
  save(force?: boolean): Promise<boolean>;
  saveAs(): Promise<boolean>;
  close(): Promise<void>;
  /** Goes on with what unsaved changes held up. */
  goOn(next: NextStep): Promise<void>;
  takeUp(copy: RecoveryCopy): void;
  discardRecovery(): Promise<void>;
  exportSchedule(form: 'csv' | 'json'): Promise<void>;
  saveReport(): Promise<void>;
  savePdf(): Promise<void>;
  print(): Promise<void>;
  /** The report as HTML, for the preview. */
  report(): Promise<string>;
}

interface Parts {
  readonly host: Host;
  readonly store: StoreApi<WindowState>;
  readonly actions: WindowActions;
  readonly assessor: Assessor;
}

export function documents(parts: Parts): Documents {
  const { host, store, actions, assessor } = parts;
  const project = () => presentProject(store.getState());

  const unlessUnsaved = async (next: NextStep): Promise<void> => {
    if (isChanged(store.getState())) actions.openDialog({ kind: 'unsaved', next });
    else await goOn(next);
  };

  const goOn = async (next: NextStep): Promise<void> => {
    switch (next.kind) {
      case 'new': {
        const fresh = newProject('New project');
        actions.replaceProject(fresh, { name: fresh.name, token: null, saved: true });
        return;
      }
      case 'example': {
        const { default: example } = await import('../../assets/examples/marrow-lane.json');
        const name = 'marrow-lane.json';
        const read = readProjectData(example);
        if (read.ok) actions.replaceProject(read.project, { name, token: null, saved: true });
        else actions.openDialog({ kind: 'broken file', name, problems: read.problems });
        return;
      }
      case 'open':
        return take(await host.open());
      case 'open recent':
        return take(await host.openRecent(next.token));
      case 'close':
        await host.autosave(null);
        return host.confirmClose();
      default:
        return next satisfies never;
    }
  };

  const take = (result: HostResult<OpenedFile> | null): void => {
    if (result === null) return;
    if (result.ok) takeFile(result.value);
    else failed('open', result.problem);
  };

  const takeFile = (file: OpenedFile): void => {
    const read = readProject(file.text);
    if (!read.ok) {
      actions.openDialog({ kind: 'broken file', name: file.name, problems: read.problems });
      return;
    }
    // A file of an older form counts as unsaved, so that saving it again in today's form is the user's own act.
    const saved = read.migratedFrom === null;
    actions.replaceProject(read.project, {
      name: file.name,
      token: file.token === '' ? null : file.token,
      saved,
    });
    if (!saved)
      actions.say(`${file.name} was written by an earlier version; saving it will bring it up to date.`);
  };

  const failed = (doing: string, problem: HostProblem): void => {
    if (problem.kind === 'changed on disk')
      actions.openDialog({ kind: 'changed on disk', name: problem.name, next: null });
    else actions.openDialog({ kind: 'host problem', doing, problem });
  };

  const save = async (force = false): Promise<boolean> => {
    const { file } = store.getState();
    if (file.token === null) return saveAs();
    const saving = project();
    const result = await host.save(file.token, writeProject(saving), force);
    return settle(saving, result);
  };

  const saveAs = async (): Promise<boolean> => {
    const saving = project();
    return settle(saving, await host.saveAs(`${fileName(saving.name)}.tautline.json`, writeProject(saving)));
  };

  const settle = async (
    saving: ReturnType<typeof project>,
    result: Awaited<ReturnType<Host['saveAs']>>,
  ): Promise<boolean> => {
    if (result === null) return false;
    if (!result.ok) {
      failed('save', result.problem);
      return false;
    }
    actions.markSaved(saving, result.value.name, result.value.token);
    actions.say(`Saved as ${result.value.name}.`);
    await host.autosave(null);
    return true;
  };

  const handOver = async (suffix: string, text: Promise<string>, mime: string): Promise<void> => {
    const result = await host.exportText(`${fileName(project().name)}${suffix}`, await text, mime);
    if (result === null) return;
    if (result.ok) actions.say(`Written to ${result.value.name}.`);
    else failed('write the file', result.problem);
  };

  const report = async (): Promise<string> => {
    const fonts = await reportFonts();
    const date = new Date().toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
    return assessor.ask((api, snapshotOf) => api.report(snapshotOf(project()), { date, fonts }));
  };

  return {
    begin: async () => {
      const { opened, recovery, problem } = await host.start();
      if (opened === null) {
        const fresh = newProject('New project');
        actions.replaceProject(fresh, { name: fresh.name, token: null, saved: true });
      } else takeFile(opened);
      if (!store.getState().started) {
        const fresh = newProject('New project');
        const { dialog } = store.getState();
        actions.replaceProject(fresh, { name: fresh.name, token: null, saved: true });
        if (dialog !== null) actions.openDialog(dialog);
      }
      if (problem !== null) failed('open', problem);
      if (recovery !== null) actions.openDialog({ kind: 'recovery', copy: recovery });
    },
    newProject: () => unlessUnsaved({ kind: 'new' }),
    openExample: () => unlessUnsaved({ kind: 'example' }),
    open: () => unlessUnsaved({ kind: 'open' }),
    openRecent: (token) => unlessUnsaved({ kind: 'open recent', token }),
    save,
    saveAs,
    close: () => unlessUnsaved({ kind: 'close' }),
    goOn,
    takeUp: (copy) => {
      const read = readProject(copy.text);
      if (!read.ok) {
        actions.openDialog({ kind: 'broken file', name: copy.name, problems: read.problems });
        return;
      }
      actions.replaceProject(read.project, { name: copy.name, token: copy.token, saved: false });
      actions.closeDialog();
    },
    discardRecovery: async () => {
      actions.closeDialog();
      await host.autosave(null);
    },
    exportSchedule: (form) =>
      form === 'csv'
        ? handOver(' schedule.csv', ask(assessor, project(), 'scheduleCsv'), 'text/csv')
        : handOver(' schedule.json', ask(assessor, project(), 'scheduleJson'), 'application/json'),
    saveReport: () => handOver(' report.html', report(), 'text/html'),
    savePdf: async () => {
      const result = await host.savePdf(`${fileName(project().name)} report.pdf`, await report());
      if (result === null) return;
      if (result.ok) actions.say(`Written to ${result.value.name}.`);
      else failed('make the PDF', result.problem);
    },
    print: async () => {
      const result = await host.print(await report());
      if (!result.ok) failed('print', result.problem);
    },
    report,
  };
}

function ask(
  assessor: Assessor,
  project: ReturnType<typeof presentProject>,
  what: 'scheduleCsv' | 'scheduleJson',
): Promise<string> {
  return assessor.ask((api, snapshotOf) => api[what](snapshotOf(project)));
}

/** The project's name without what file systems refuse. */
function fileName(name: string): string {
  const clean = name
    .replace(/[\\/:*?"<>|\p{Cc}]/gu, ' ')
    .replace(/\s+/g, ' ')
    .trim();
  return clean === '' ? 'project' : clean;
}
