import type { Session, WebContents } from 'electron';

/** A page without Node, apart from its preload, in the operating system's sandbox. */
export const SANDBOXED = {
  sandbox: true,
  contextIsolation: true,
  nodeIntegration: false,
  nodeIntegrationInWorker: false,
  nodeIntegrationInSubFrames: false,
  webSecurity: true,
  webviewTag: false,
  spellcheck: false,
} as const;

/** Schemes that Tautline's pages and the developer tools are made of; everything else would be the network. */
const OWN_SCHEMES = new Set(['app:', 'data:', 'blob:', 'devtools:', 'chrome-extension:']);

/** The one thing a page may ask for: to put text on the clipboard, as when the schedule is copied. Reading it is not granted. */
const GRANTED = 'clipboard-sanitized-write';

/** Beyond `GRANTED` no permission is given, no device shown, nothing fetched from the network. */
export function lockDownSession(session: Session): void {
  session.setPermissionRequestHandler((_contents, permission, decide) => decide(permission === GRANTED));
  session.setPermissionCheckHandler((_contents, permission) => permission === GRANTED);
  session.setDevicePermissionHandler(() => false);
  session.webRequest.onBeforeRequest((request, decide) => {
    decide({ cancel: !(URL.canParse(request.url) && OWN_SCHEMES.has(new URL(request.url).protocol)) });
  });
}

/** A page stays where it was put: it opens no window, goes nowhere else and holds no other page. */
export function lockDownContents(contents: WebContents): void {
  contents.setWindowOpenHandler(() => ({ action: 'deny' }));
  contents.on('will-navigate', (event) => event.preventDefault());
  contents.on('will-frame-navigate', (event) => event.preventDefault());
  contents.on('will-redirect', (event) => event.preventDefault());
  contents.on('will-attach-webview', (event) => event.preventDefault());
}
