import { EventEmitter } from 'node:events';
import { readFileSync } from 'node:fs';
import type { BrowserContext, Frame, Page } from 'playwright-core';
import { appAddress, plainAddress } from './addresses.ts';
import { DELIVER_FUNCTION, INVOKE_BINDING, type InvokeAnswer, pageSide } from './pageSide.ts';

/** What main gives to `new BrowserWindow`, as far as the stand-in minds it. */
export interface WindowOptions {
  readonly x?: number;
  readonly y?: number;
  readonly width?: number;
  readonly height?: number;
  readonly show?: boolean;
  readonly webPreferences?: { readonly preload?: string; readonly [setting: string]: unknown };
}

/** What the windows of one stand-in share. */
export interface WindowSurroundings {
  readonly context: BrowserContext;
  /** Answers a call from a page's preload. */
  readonly invoke: (event: InvokeEvent, channel: string, args: readonly unknown[]) => Promise<InvokeAnswer>;
  /** A report was sent to the printer. */
  readonly printed: (html: string) => void;
  readonly allClosed: () => void;
}

/** As main sees who calls. */
export interface InvokeEvent {
  readonly sender: StandInContents;
  readonly senderFrame: { readonly url: string; readonly parent: object | null };
}

type OpenHandler = (details: { readonly url: string }) => { readonly action: 'allow' | 'deny' };

/** Stands in for Electron's WebContents: the page inside a window. */
export class StandInContents extends EventEmitter {
  readonly id: number;
  openHandler: OpenHandler | null = null;
  readonly #window: StandInWindow;
  readonly #printed: (html: string) => void;

  constructor(window: StandInWindow, printed: (html: string) => void) {
    super();
    this.id = window.id;
    this.#window = window;
    this.#printed = printed;
  }

  send(channel: string, ...args: unknown[]): void {
    const given = structuredClone(args);
    void this.#window.page.then((page) =>
      page.evaluate(
        ([name, at, values]) => (Reflect.get(window, name) as (c: string, v: unknown) => void)(at, values),
        [DELIVER_FUNCTION, channel, given] as const,
      ),
    );
  }

  setWindowOpenHandler(handler: OpenHandler): void {
    this.openHandler = handler;
  }

  reload(): void {
    void this.#window.page.then((page) => page.reload());
  }

  print(_options: object, done: (success: boolean, reason: string) => void): void {
    void this.#window.page
      .then((page) => page.content())
      .then((html) => {
        this.#printed(html);
        done(true, '');
      });
  }

  async printToPDF(options: {
    readonly preferCSSPageSize?: boolean;
    readonly printBackground?: boolean;
  }): Promise<Uint8Array> {
    const page = await this.#window.page;
    return await page.pdf({
      preferCSSPageSize: options.preferCSSPageSize ?? false,
      printBackground: options.printBackground ?? false,
    });
  }
}

/** Stands in for Electron's BrowserWindow: a page of a Playwright Chromium. */
export class StandInWindow extends EventEmitter {
  static #count = 0;
  readonly id = ++StandInWindow.#count;
  readonly options: WindowOptions;
  readonly webContents: StandInContents;
  /** Electron makes its page at once; Playwright takes a moment. */
  readonly page: Promise<Page>;
  title = '';
  edited = false;
  maximised = false;
  readonly #around: WindowSurroundings;
  readonly #open: Set<StandInWindow>;
  /** A navigation that main itself asked for, which no `will-navigate` announces. */
  #expected: string | null = null;
  #gone = false;

  constructor(around: WindowSurroundings, open: Set<StandInWindow>, options: WindowOptions) {
    super();
    this.#around = around;
    this.#open = open;
    this.options = options;
    this.webContents = new StandInContents(this, around.printed);
    open.add(this);
    this.page = this.#makePage();
  }

  async loadURL(address: string): Promise<void> {
    const page = await this.page;
    this.#expected = plainAddress(address);
    await page.goto(this.#expected);
    this.emit('ready-to-show');
  }

  /** Whether the page may go where it wants to: main is asked, as Electron asks it. */
  mayNavigate(address: string): boolean {
    if (address === this.#expected) return true;
    let prevented = false;
    const event = { preventDefault: () => (prevented = true), url: appAddress(address) };
    this.webContents.emit('will-navigate', event, event.url);
    return !prevented;
  }

  /** Lets a test lead the page elsewhere, as an attacker would wish to. */
  expect(address: string): void {
    this.#expected = address;
  }

  close(): void {
    let prevented = false;
    this.emit('close', { preventDefault: () => (prevented = true) });
    if (!prevented) this.destroy();
  }

  destroy(): void {
    if (this.#gone) return;
    this.#gone = true;
    this.#open.delete(this);
    void this.page.then((page) => page.close());
    this.emit('closed');
    if (this.#open.size === 0) this.#around.allClosed();
  }

  isDestroyed(): boolean {
    return this.#gone;
  }

  getNormalBounds(): { x: number; y: number; width: number; height: number } {
    const { x = 0, y = 0, width = 800, height = 600 } = this.options;
    return { x, y, width, height };
  }

  setTitle(title: string): void {
    this.title = title;
  }

  setDocumentEdited(edited: boolean): void {
    this.edited = edited;
  }

  maximize(): void {
    this.maximised = true;
  }

  isMaximized(): boolean {
    return this.maximised;
  }

  isMinimized(): boolean {
    return false;
  }

  show(): void {}
  focus(): void {}
  restore(): void {}

  async #makePage(): Promise<Page> {
    const page = await this.#around.context.newPage();
    const { width = 800, height = 600 } = this.options;
    await page.setViewportSize({ width, height });
    const { preload } = this.options.webPreferences ?? {};
    if (preload !== undefined) {
      await page.exposeBinding(INVOKE_BINDING, ({ frame }, channel: string, args: readonly unknown[]) =>
        this.#around.invoke(this.#event(frame), channel, args),
      );
      await page.addInitScript({ content: pageSide(readFileSync(preload, 'utf8')) });
    }
    page.on('popup', (popup) => {
      const address = popup.url();
      if (this.webContents.openHandler?.({ url: address }).action !== 'allow') void popup.close();
    });
    page.on('crash', () => this.webContents.emit('render-process-gone', {}, { reason: 'crashed' }));
    return page;
  }

  #event(frame: Frame): InvokeEvent {
    return {
      sender: this.webContents,
      senderFrame: { url: appAddress(frame.url()), parent: frame.parentFrame() },
    };
  }
}
