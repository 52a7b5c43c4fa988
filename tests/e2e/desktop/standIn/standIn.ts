/**
 * Stands in for the parts of Electron that Tautline uses, on a Playwright Chromium. It runs the built main and preload,
 * the very files that Electron would run. It shows the contract between window and main, its checks, real file work,
 * menus, dialogs and the life of a window; it cannot show the isolation of contexts, the operating system's sandbox,
 * the system's own dialogs or packaging.
 */
import { EventEmitter } from 'node:events';
import Module, { createRequire } from 'node:module';
import path from 'node:path';
import type { BrowserContext, Page, Request as PageRequest, Route } from 'playwright-core';
import { appAddress, isPlainAppAddress } from './addresses.ts';
import type { InvokeAnswer } from './pageSide.ts';
import {
  type InvokeEvent,
  StandInWindow,
  type WindowOptions,
  type WindowSurroundings,
} from './standInWindow.ts';

export interface StandInOptions {
  readonly context: BrowserContext;
  /** The built main process. */
  readonly main: string;
  readonly userData: string;
  /** The user's own folder. */
  readonly home: string;
  /** What stands after the program on the command line. */
  readonly args: readonly string[];
  /** Serves an empty page in place of the window, for tests of the host alone. */
  readonly blank: boolean;
}

/** One entry of a menu, as main writes it. */
export interface MenuEntry {
  readonly id?: string;
  readonly label?: string;
  readonly role?: string;
  readonly accelerator?: string;
  readonly submenu?: readonly MenuEntry[];
  readonly click?: () => void;
}

export type DialogKind = 'open' | 'save' | 'message';

type Handler = (event: InvokeEvent, ...args: unknown[]) => unknown;
type SchemeHandler = (request: Request) => Promise<Response>;
type PermissionHandler = (contents: null, permission: string, decide: (granted: boolean) => void) => void;
type RequestFilter = (request: { url: string }, decide: (answer: { cancel?: boolean }) => void) => void;

const BLANK_PAGE = '<!doctype html><html lang="en"><head><title>blank</title></head><body></body></html>';
const WINDOW_PAGE = 'app://tautline/index.html';

export class StandIn {
  readonly asked: { readonly kind: DialogKind | 'error'; readonly options: unknown }[] = [];
  readonly printed: string[] = [];
  menu: readonly MenuEntry[] = [];
  readonly #options: StandInOptions;
  readonly #app = new EventEmitter();
  readonly #handlers = new Map<string, Handler>();
  readonly #schemes = new Map<string, SchemeHandler>();
  readonly #replies: { readonly kind: DialogKind; readonly reply: object }[] = [];
  readonly #windows = new Set<StandInWindow>();
  #permission: PermissionHandler = (_contents, _permission, decide) => decide(true);
  #filter: RequestFilter = (_request, decide) => decide({});
  #noteQuit: () => void = () => undefined;
  /** Resolves when the program has quit. */
  readonly quit = new Promise<void>((resolve) => {
    this.#noteQuit = resolve;
  });

  constructor(options: StandInOptions) {
    this.#options = options;
  }

  async start(): Promise<void> {
    await this.#options.context.route('**/*', (route) => this.#route(route));
    const { main, args } = this.#options;
    const electron = this.#electron();
    // The built main asks for 'electron' by `require`; nothing of that name may be loaded here.
    const loader = Module as unknown as { _load: (name: string, ...rest: unknown[]) => unknown };
    const load = loader._load;
    const { argv } = process;
    loader._load = (name, ...rest) => (name === 'electron' ? electron : load(name, ...rest));
    process.argv = ['electron', main, ...args];
    try {
      const require = createRequire(main);
      delete require.cache[main];
      require(main);
    } finally {
      loader._load = load;
      process.argv = argv;
    }
  }

  async window(): Promise<StandInWindow> {
    for (let tries = 0; tries < 250; tries += 1) {
      const [window] = this.#windows;
      if (window !== undefined && (await window.page).url().startsWith('http')) return window;
      await new Promise((resolve) => setTimeout(resolve, 20));
    }
    throw new Error('main opened no window');
  }

  /** The answer to the next dialog, which must be of this kind. */
  reply(kind: DialogKind, reply: object): void {
    this.#replies.push({ kind, reply });
  }

  secondStart(args: readonly string[], folder: string): void {
    this.#app.emit('second-instance', {}, ['electron', this.#options.main, ...args], folder);
  }

  /** Whether main would grant a page a permission. */
  grants(permission: string): boolean {
    let granted = true;
    this.#permission(null, permission, (answer) => {
      granted = answer;
    });
    return granted;
  }

  /** Everything stops at once, and nobody is asked or told. */
  async crash(): Promise<void> {
    this.#handlers.clear();
    await this.#options.context.close();
  }

  #electron(): object {
    const { userData, home } = this.#options;
    const around: WindowSurroundings = {
      context: this.#options.context,
      invoke: (event, channel, args) => this.#invoke(event, channel, args),
      printed: (html) => void this.printed.push(html),
      allClosed: () => void this.#app.emit('window-all-closed'),
    };
    const windows = this.#windows;
    class BrowserWindow extends StandInWindow {
      constructor(options: WindowOptions = {}) {
        super(around, windows, options);
      }
    }
    const ask = (kind: DialogKind) => async (_window: unknown, options: object) => {
      this.asked.push({ kind, options });
      const next = this.#replies.shift();
      if (next?.kind !== kind) throw new Error(`nobody answers this dialog: ${kind}`);
      return next.reply;
    };
    const display = { id: 1, workArea: { x: 0, y: 0, width: 1920, height: 1040 } };
    return {
      app: Object.assign(this.#app, {
        isPackaged: false,
        whenReady: async () => undefined,
        getPath: (name: string) =>
          name === 'home' ? home : path.join(userData, name === 'userData' ? '' : name),
        setName: () => undefined,
        requestSingleInstanceLock: () => true,
        quit: () => this.#noteQuit(),
        exit: () => this.#noteQuit(),
      }),
      BrowserWindow,
      ipcMain: {
        handle: (channel: string, handler: Handler) => {
          if (this.#handlers.has(channel)) throw new Error(`a second handler for ${channel}`);
          this.#handlers.set(channel, handler);
        },
      },
      dialog: {
        showOpenDialog: ask('open'),
        showSaveDialog: ask('save'),
        showMessageBox: ask('message'),
        showErrorBox: (title: string, content: string) =>
          void this.asked.push({ kind: 'error', options: { title, content } }),
      },
      Menu: {
        buildFromTemplate: (template: readonly MenuEntry[]) => template,
        setApplicationMenu: (menu: readonly MenuEntry[]) => {
          this.menu = menu;
        },
      },
      protocol: {
        registerSchemesAsPrivileged: () => undefined,
        handle: (scheme: string, handler: SchemeHandler) => void this.#schemes.set(scheme, handler),
      },
      screen: { getPrimaryDisplay: () => display, getAllDisplays: () => [display] },
      session: {
        defaultSession: {
          setPermissionRequestHandler: (handler: PermissionHandler) => {
            this.#permission = handler;
          },
          setPermissionCheckHandler: () => undefined,
          setDevicePermissionHandler: () => undefined,
          webRequest: {
            onBeforeRequest: (filter: RequestFilter) => {
              this.#filter = filter;
            },
          },
        },
      },
    };
  }

  async #invoke(event: InvokeEvent, channel: string, args: readonly unknown[]): Promise<InvokeAnswer> {
    const handler = this.#handlers.get(channel);
    if (handler === undefined) return { error: `Error: No handler registered for '${channel}'` };
    try {
      return { value: structuredClone(await handler(event, ...args)) };
    } catch (error) {
      return { error: String(error) };
    }
  }

  /** Everything a page asks for: main's filter and its own scheme decide, and nothing reaches the network. */
  async #route(route: Route): Promise<void> {
    const request = route.request();
    const address = appAddress(request.url());
    const page = pageItWouldLead(request);
    for (const window of this.#windows)
      if (page !== null && (await window.page) === page && !window.mayNavigate(request.url()))
        // An answer without content leaves the page where it is.
        return await route.fulfill({ status: 204 });
    let cancelled = false;
    this.#filter({ url: address }, (answer) => {
      cancelled = answer.cancel ?? false;
    });
    const handler = this.#schemes.get('app');
    if (cancelled || handler === undefined || !isPlainAppAddress(request.url())) return await route.abort();
    const response = await handler(new Request(address, { method: request.method() }));
    const blank = this.#options.blank && address.split('?')[0] === WINDOW_PAGE;
    await route.fulfill({
      status: response.status,
      headers: Object.fromEntries(response.headers),
      body: blank ? BLANK_PAGE : Buffer.from(await response.arrayBuffer()),
    });
  }
}

/** The page that a request would lead somewhere else; null when it only fetches, or leads a frame or a new page. */
function pageItWouldLead(request: PageRequest): Page | null {
  if (!request.isNavigationRequest()) return null;
  try {
    const frame = request.frame();
    return frame.parentFrame() === null ? frame.page() : null;
  } catch {
    // Playwright has no frame yet for the first request of a page that is just being opened.
    return null;
  }
}
