import { describe, expect, it, vi } from 'vitest';
import { createStore } from 'zustand/vanilla';
import { newWallBay } from '../../../core/project/newBay.ts';
import { newProject } from '../../../core/project/newProject.ts';
import { writeProject } from '../../../core/project/writeProject.ts';
import type { Assessor } from '../../../renderer/assessing/assessor.ts';
import type { Host, HostProblem, HostResult, OpenedFile, StartState } from '../../../renderer/host/host.ts';
import { documents } from '../../../renderer/store/documents.ts';
import { isChanged, presentProject } from '../../../renderer/store/shown.ts';
import { windowActions } from '../../../renderer/store/windowActions.ts';
import { firstState, type WindowState } from '../../../renderer/store/windowState.ts';

const shed = { ...newProject('shed'), bays: [newWallBay('W1', 'wall')] };
const file = (text: string, token = 'one'): OpenedFile => ({ token, name: 'shed.json', text });

interface HostSays {
  readonly start?: Partial<StartState>;
  readonly open?: HostResult<OpenedFile> | null;
  readonly save?: HostProblem;
}

function hostSaying({ start = {}, open = null, save }: HostSays) {
  const saved: { readonly token: string; readonly text: string; readonly force: boolean }[] = [];
  const host = {
    kind: 'browser',
    start: async () => ({ opened: null, recovery: null, problem: null, ...start }),
    open: async () => open,
    save: vi.fn(async (token: string, text: string, force: boolean) => {
      if (save !== undefined && !force) return { ok: false, problem: save } as const;
      saved.push({ token, text, force });
      return { ok: true, value: { token, name: 'shed.json' } } as const;
    }),
    saveAs: vi.fn(async (name: string, text: string) => {
      saved.push({ token: '', text, force: false });
      return { ok: true, value: { token: 'new', name } } as const;
    }),
    autosave: vi.fn(async () => undefined),
    confirmClose: vi.fn(),
  };
  return { host: host as unknown as Host, calls: host, saved };
}

async function begun(says: HostSays) {
  const { host, calls, saved } = hostSaying(says);
  const store = createStore<WindowState>(() => firstState('light'));
  const actions = windowActions(store, () => 0);
  const papers = documents({ host, store, actions, assessor: {} as Assessor });
  await papers.begin();
  return { store, actions, papers, calls, saved };
}

const OPENED = { start: { opened: file(writeProject(shed)) } };

describe('what passes between the window and its host', () => {
  it('opens the file given at start as saved', async () => {
    const { store } = await begun(OPENED);
    expect(presentProject(store.getState())).toEqual(shed);
    expect([isChanged(store.getState()), store.getState().file.token]).toEqual([false, 'one']);
  });

  it('starts with an empty project when there is nothing to open', async () => {
    const { store } = await begun({});
    expect([store.getState().started, presentProject(store.getState()).bays]).toEqual([true, []]);
  });

  it('takes a file without a place yet as one that has to be saved under a name', async () => {
    const { papers, calls } = await begun({ start: { opened: file(writeProject(shed), '') } });
    expect(await papers.save()).toBe(true);
    expect(calls.save).not.toHaveBeenCalled();
    expect(calls.saveAs.mock.calls[0]?.[0]).toBe('shed.tautline.json');
  });

  it('shows what is wrong with a broken file and leaves the open project as it was', async () => {
    const { store, papers } = await begun({ ...OPENED, open: { ok: true, value: file('{"format": 7}') } });
    const before = presentProject(store.getState());
    await papers.open();
    const { dialog } = store.getState();
    expect(dialog?.kind).toBe('broken file');
    expect(dialog?.kind === 'broken file' && dialog.problems.length).toBeGreaterThan(0);
    expect(presentProject(store.getState())).toBe(before);
  });

  it('shows what is wrong with a broken file at start, over an empty project', async () => {
    const { store } = await begun({ start: { opened: file('not a project') } });
    expect([store.getState().started, store.getState().dialog?.kind]).toEqual([true, 'broken file']);
  });

  it('asks before unsaved changes would be lost, and goes on once that is answered', async () => {
    const { store, actions, papers, calls } = await begun(OPENED);
    actions.edit({ kind: 'remove bay', bay: 'W1' });
    await papers.close();
    expect(store.getState().dialog).toEqual({ kind: 'unsaved', next: { kind: 'close' } });
    expect(calls.confirmClose).not.toHaveBeenCalled();
    await papers.goOn({ kind: 'close' });
    expect(calls.confirmClose).toHaveBeenCalledOnce();
  });

  it('does not ask when nothing is unsaved', async () => {
    const { papers, calls } = await begun(OPENED);
    await papers.close();
    expect(calls.confirmClose).toHaveBeenCalledOnce();
  });

  it('never tells a save that failed as saved', async () => {
    const { store, actions, papers } = await begun({
      ...OPENED,
      save: { kind: 'no room', name: 'shed.json' },
    });
    actions.edit({ kind: 'name project', name: 'other' });
    expect(await papers.save()).toBe(false);
    expect(isChanged(store.getState())).toBe(true);
    expect(store.getState().dialog?.kind).toBe('host problem');
  });

  it('asks what to do when the file was changed by another, and writes over it only when told to', async () => {
    const { store, actions, papers, saved } = await begun({
      ...OPENED,
      save: { kind: 'changed on disk', name: 'shed.json' },
    });
    actions.edit({ kind: 'name project', name: 'other' });
    expect(await papers.save()).toBe(false);
    expect(store.getState().dialog?.kind).toBe('changed on disk');
    expect(await papers.save(true)).toBe(true);
    expect(saved).toHaveLength(1);
    expect(isChanged(store.getState())).toBe(false);
  });

  it('counts work that goes on while a save is under way as unsaved', async () => {
    const { store, actions, papers } = await begun(OPENED);
    actions.edit({ kind: 'name project', name: 'other' });
    const saving = papers.save();
    actions.edit({ kind: 'name project', name: 'yet another' });
    await saving;
    expect(isChanged(store.getState())).toBe(true);
  });

  it('offers what a crash left over, and takes it up as unsaved', async () => {
    const copy = {
      name: 'shed.json',
      token: 'one',
      text: writeProject(shed),
      savedAt: '2026-01-01T10:00:00Z',
    };
    const { store, papers } = await begun({ start: { recovery: copy } });
    expect(store.getState().dialog).toEqual({ kind: 'recovery', copy });
    papers.takeUp(copy);
    expect(presentProject(store.getState())).toEqual(shed);
    expect([isChanged(store.getState()), store.getState().dialog]).toEqual([true, null]);
  });
});
