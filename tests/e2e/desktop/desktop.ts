/** Tautline's desktop as a test sees it: the real Electron where its binary is there, else the stand-in. */
import type { Page } from 'playwright-core';

export type DialogKind = 'open' | 'save' | 'message';

/** What the system's dialogs give back, as Electron words it. */
export interface DialogReplies {
  readonly open: { readonly canceled: boolean; readonly filePaths: string[] };
  readonly save: { readonly canceled: boolean; readonly filePath: string };
  readonly message: { readonly response: number };
}

export interface DesktopOptions {
  /** What stands after the program on the command line. */
  readonly args?: readonly string[];
  /** Folder of the program's own state; the same one again is the next session. A fresh one when left out. */
  readonly userData?: string;
  /** An empty page in place of the window, to drive the host alone. */
  readonly blank?: boolean;
}

export interface Desktop {
  readonly host: 'stand-in' | 'electron';
  readonly page: Page;
  readonly userData: string;
  /** Answers the next dialog of a kind in the user's place. */
  reply<Kind extends DialogKind>(kind: Kind, reply: DialogReplies[Kind]): Promise<void>;
  /** What dialogs have asked so far. */
  asked(): Promise<readonly DialogKind[]>;
  /** Labels of a menu's entries by id, for those that have one. */
  menu(): Promise<Readonly<Record<string, string>>>;
  clickMenu(id: string): Promise<void>;
  title(): Promise<string>;
  /** The user clicks the window's close button. */
  clickClose(): Promise<void>;
  /** Resolves to true when the program has quit within `ms`. */
  hasQuit(ms: number): Promise<boolean>;
  /** A second start of the program while this one runs. */
  startAgain(args: readonly string[]): Promise<void>;
  /** Leads the window's page to another address of the program, as no user could. */
  lead(address: string): Promise<void>;
  /** An address of the program as this host's pages know it. */
  address(app: string): string;
  /** The page stops answering, as far as main is told. */
  hang(): Promise<void>;
  /** The page's own process breaks down; main goes on. */
  crashPage(): Promise<void>;
  /** Ends it at once, as a power cut would. */
  crash(): Promise<void>;
  end(): Promise<void>;
}

/** What a host needs to start the program. */
export interface DesktopSetting {
  /** The built main process. */
  readonly main: string;
  readonly args: readonly string[];
  readonly userData: string;
  readonly blank: boolean;
}
