import { type BrowserWindow, dialog } from 'electron';

/** What stands between a window and its closing. */
export interface Closing {
  /** The user has chosen to close, in the window. */
  confirm(): void;
}

export interface ClosingTasks {
  /** Whether there is work that is not saved. */
  readonly dirty: () => boolean;
  /** Asks the user in the window: save, do not save, or go on working. */
  readonly ask: () => void;
  /** What must be done before the window goes for good. */
  readonly putAway: () => Promise<void>;
}

/**
 * Lets the window close at once when everything is saved. Otherwise the window asks the user and answers with
 * `confirm`; a window that hangs cannot ask, so then the question is put outside it, and the recovery copy stays.
 */
export function guardClosing(window: BrowserWindow, tasks: ClosingTasks): Closing {
  let answers = true;
  let leaving = false;
  window.on('unresponsive', () => {
    answers = false;
  });
  window.on('responsive', () => {
    answers = true;
  });

  window.on('close', (event) => {
    event.preventDefault();
    if (leaving) return;
    if (!tasks.dirty()) void leave();
    else if (answers) tasks.ask();
    else void offerToForce(window);
  });

  async function leave(): Promise<void> {
    leaving = true;
    // A copy or a place that cannot be put away must not keep the window open.
    await tasks.putAway().catch(() => undefined);
    if (!window.isDestroyed()) window.destroy();
  }

  return { confirm: () => void (leaving || leave()) };
}

async function offerToForce(window: BrowserWindow): Promise<void> {
  const { response } = await dialog.showMessageBox(window, {
    type: 'warning',
    title: 'Tautline',
    message: 'The window does not answer.',
    detail: 'Closed now, what was not saved is offered again at the next start, as far as it was kept.',
    buttons: ['Wait', 'Close without saving'],
    defaultId: 0,
    cancelId: 0,
    noLink: true,
  });
  if (response === 1 && !window.isDestroyed()) window.destroy();
}

/** When the page has crashed: loads it again, or closes; the recovery copy stays either way. */
export function offerReloadAfterCrash(window: BrowserWindow): void {
  window.webContents.on('render-process-gone', (_event, details) => {
    if (details.reason === 'clean-exit' || window.isDestroyed()) return;
    void (async () => {
      const { response } = await dialog.showMessageBox(window, {
        type: 'error',
        title: 'Tautline',
        message: 'The window has stopped working.',
        detail: 'Loaded again, it offers the work that was kept before it stopped.',
        buttons: ['Load again', 'Close'],
        defaultId: 0,
        cancelId: 1,
        noLink: true,
      });
      if (window.isDestroyed()) return;
      if (response === 0) window.webContents.reload();
      else window.destroy();
    })();
  });
}
