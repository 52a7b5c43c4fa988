/**
 * The one door between the window and the machine it runs on. The desktop gives it over IPC, the browser over the
 * page's own means. Paths never cross it: the window holds opaque tokens.
 */
export interface Host {
  readonly kind: 'desktop' | 'browser';
  /**
   * What the window opens with: the file given at start, else the one last worked on, else the example (which has no
   * place yet: its token is ''). Asking again, as after a reload, gives the file at hand. A `recovery` stays until
   * `autosave` replaces or forgets it, so ask the user about it first.
   */
  start(): Promise<StartState>;
  /** Asks the user for a project file; null when they turn back. */
  open(): Promise<HostResult<OpenedFile> | null>;
  openRecent(token: string): Promise<HostResult<OpenedFile>>;
  recent(): Promise<readonly RecentFile[]>;
  /**
   * Saves where the file came from; refused with `changed on disk` when someone else wrote it since, unless `force`.
   * What has no place yet (token '') goes through `saveAs`.
   */
  save(token: string, text: string, force: boolean): Promise<HostResult<SavedFile>>;
  saveAs(suggestedName: string, text: string): Promise<HostResult<SavedFile> | null>;
  /** Keeps a copy for recovery after a crash; `null` forgets it. */
  autosave(copy: RecoveryCopy | null): Promise<void>;
  /** Writes a document of another kind (CSV, JSON, HTML report). Null when the user turns back. */
  exportText(
    suggestedName: string,
    text: string,
    mime: string,
  ): Promise<HostResult<{ readonly name: string }> | null>;
  /** Prints the report, or makes a PDF of it. */
  print(html: string): Promise<HostResult<null>>;
  savePdf(suggestedName: string, html: string): Promise<HostResult<{ readonly name: string }> | null>;
  /** Reads a text file the user picks (own stock list as CSV). */
  importText(
    extensions: readonly string[],
  ): Promise<HostResult<{ readonly name: string; readonly text: string }> | null>;
  /** Tells the host whether closing must ask, and what to show in the title. */
  setDocumentState(state: { readonly title: string; readonly dirty: boolean }): void;
  /** Menu commands and requests to close, as they come; returns how to stop listening. */
  onCommand(listener: (command: HostCommand) => void): () => void;
  /** Answers a `close` command once the user has chosen. */
  confirmClose(): void;
}

export interface StartState {
  readonly opened: OpenedFile | null;
  /** Left over from a session that did not end well. */
  readonly recovery: RecoveryCopy | null;
  readonly problem: HostProblem | null;
}

export interface OpenedFile {
  /** Opaque; '' for what has no place yet, whose first save asks where. */
  readonly token: string;
  readonly name: string;
  readonly text: string;
}

export interface SavedFile {
  readonly token: string;
  readonly name: string;
}

export interface RecentFile {
  readonly token: string;
  readonly name: string;
  readonly folder: string;
}

export interface RecoveryCopy {
  readonly name: string;
  /** Where it came from; null when it had no place yet. */
  readonly token: string | null;
  readonly text: string;
  /** ISO 8601. */
  readonly savedAt: string;
}

export type HostResult<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problem: HostProblem };

export type HostProblem =
  | { readonly kind: 'changed on disk'; readonly name: string }
  | { readonly kind: 'not found'; readonly name: string }
  | { readonly kind: 'not allowed'; readonly name: string }
  | { readonly kind: 'too large'; readonly name: string }
  | { readonly kind: 'no room'; readonly name: string }
  | { readonly kind: 'failed'; readonly name: string; readonly detail: string };

export type HostCommand =
  | 'new'
  | 'open'
  | 'save'
  | 'save as'
  | 'report'
  | 'print'
  | 'pdf'
  | 'export csv'
  | 'export json'
  | 'undo'
  | 'redo'
  | 'find'
  | 'theme light'
  | 'theme dark'
  | 'theme system'
  | 'about'
  | 'close'
  | OpenCommand;

/** Open a file chosen outside the window: from the menu's recent ones, or given to a second start. Answer with `openRecent`. */
export interface OpenCommand {
  readonly kind: 'open recent';
  readonly token: string;
}
