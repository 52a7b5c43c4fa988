import type { StoreApi } from 'zustand/vanilla';
import { writeProject } from '../../core/project/writeProject.ts';
import type { Host } from '../host/host.ts';
import { isChanged, presentProject } from './shown.ts';
import type { WindowState } from './windowState.ts';

/** ms of quiet before a copy is kept. */
const QUIET = 1500;

/**
 * Keeps a copy of unsaved work with the host, for recovery after a crash, and tells it the title and whether closing must ask.
 * Returns how to stop.
 */
export function startAutosaving(store: StoreApi<WindowState>, host: Host): () => void {
  let timer: ReturnType<typeof setTimeout> | null = null;
  let told = '';
  const follow = (state: WindowState): void => {
    if (!state.started) return;
    const project = presentProject(state);
    const dirty = isChanged(state);
    const now = JSON.stringify([project.name, dirty]);
    if (now !== told) {
      told = now;
      host.setDocumentState({ title: project.name, dirty });
    }
  };
  const stop = store.subscribe((state, before) => {
    follow(state);
    if (state.history === before.history || !isChanged(state)) return;
    if (timer !== null) clearTimeout(timer);
    timer = setTimeout(() => keep(store.getState(), host), QUIET);
  });
  follow(store.getState());
  return () => {
    stop();
    if (timer !== null) clearTimeout(timer);
  };
}

function keep(state: WindowState, host: Host): void {
  if (!isChanged(state)) return;
  const { name, token } = state.file;
  void host.autosave({
    name,
    token,
    text: writeProject(presentProject(state)),
    savedAt: new Date().toISOString(),
  });
}
