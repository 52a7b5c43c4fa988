/** The desktop's main process: one window, one project at a time. */
import path from 'node:path';
import { app, type BrowserWindow, dialog, ipcMain, Menu, protocol, session } from 'electron';
import example from '../assets/examples/marrow-lane.json' with { type: 'json' };
import type { HostCommand, OpenedFile } from '../renderer/host/host.ts';
import { COMMAND_CHANNEL } from './channels.ts';
import { claimAppScheme, serveApp, WINDOW_ADDRESS } from './desktop/appScheme.ts';
import { answerCheckedCalls } from './desktop/checkedCalls.ts';
import { guardClosing, offerReloadAfterCrash } from './desktop/closing.ts';
import { deskAnswers, recentList } from './desktop/desk.ts';
import { givenFile } from './desktop/givenFile.ts';
import { lockDownSession } from './desktop/lockDown.ts';
import { createMainWindow, keepWindowPlace } from './desktop/mainWindow.ts';
import { menuTemplate } from './desktop/menu.ts';
import { fileStore } from './files/fileStore.ts';
import { recentFiles } from './files/recentFiles.ts';
import { recoveryFile } from './files/recoveryFile.ts';

const PROGRAM = app.isPackaged ? null : __filename;
const PRELOAD = path.join(__dirname, 'preload.cjs');
const RENDERER = path.join(__dirname, '..', 'renderer');
const EXAMPLE: OpenedFile = {
  token: '',
  name: 'marrow-lane.json',
  text: JSON.stringify(example, null, 2),
};

app.setName('Tautline');
claimAppScheme(protocol);

// A second start hands its file to the first one and ends.
if (app.requestSingleInstanceLock()) run(givenFile(process.argv, PROGRAM, process.cwd())).catch(giveUp);
else app.quit();

async function run(named: string | null): Promise<void> {
  let given = named;
  // macOS hands over a file by this event, before or after the window is there.
  let takeFile = (file: string) => {
    given = file;
  };
  app.on('open-file', (event, file) => {
    event.preventDefault();
    takeFile(file);
  });
  app.on('window-all-closed', () => app.quit());
  await app.whenReady();
  lockDownSession(session.defaultSession);
  const pages = serveApp(protocol, RENDERER);

  const kept = (name: string) => path.join(app.getPath('userData'), name);
  const files = fileStore();
  const recents = await recentFiles(kept('recent.json'), showMenu);
  const recovery = recoveryFile(kept('recovery.json'));
  const home = app.getPath('home');
  const window = await createMainWindow(PRELOAD, kept('window.json'));
  let unsaved = false;

  const closing = guardClosing(window, {
    dirty: () => unsaved,
    ask: () => send('close'),
    async putAway() {
      await keepWindowPlace(window, kept('window.json'));
      await recovery.forgetOwn();
    },
  });
  offerReloadAfterCrash(window);

  answerCheckedCalls(
    ipcMain,
    () => (window.isDestroyed() ? null : window.webContents),
    deskAnswers({
      window,
      files,
      recents,
      recovery,
      pages,
      given,
      example: EXAMPLE,
      home,
      documentChanged({ title, dirty }) {
        unsaved = dirty;
        showDocument(window, title, dirty);
      },
      closeConfirmed: closing.confirm,
    }),
  );
  showMenu();

  app.on('second-instance', (_event, argv, folder) => {
    if (window.isMinimized()) window.restore();
    window.focus();
    const file = givenFile(argv, PROGRAM, folder);
    if (file !== null) takeFile(file);
  });
  takeFile = (file) => send({ kind: 'open recent', token: files.tokenOf(file) });
  await window.loadURL(WINDOW_ADDRESS).catch((reason: unknown) => {
    // A window closed before it has loaded is no failure.
    if (!window.isDestroyed()) throw reason;
  });

  function send(command: HostCommand): void {
    if (!window.isDestroyed()) window.webContents.send(COMMAND_CHANNEL, command);
  }

  function showMenu(): void {
    const template = menuTemplate({
      recent: recentList({ files, recents, home }),
      developerTools: !app.isPackaged,
      mac: process.platform === 'darwin',
      send,
      close: () => window.close(),
    });
    Menu.setApplicationMenu(Menu.buildFromTemplate(template));
  }
}

function giveUp(reason: unknown): void {
  dialog.showErrorBox('Tautline cannot start', reason instanceof Error ? reason.message : String(reason));
  app.exit(1);
}

function showDocument(window: BrowserWindow, title: string, dirty: boolean): void {
  window.setTitle(`${dirty ? '• ' : ''}${title === '' ? '' : `${title} – `}Tautline`);
  window.setDocumentEdited(dirty);
}
