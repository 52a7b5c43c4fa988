/** Where a browser may read and write: through handles to real files where it gives them, else by upload and download. */
import type { HostProblem } from './host.ts';

/** One file that the user has chosen. */
export interface Place {
  readonly name: string;
  /** What the file holds now; null where the browser does not let a page look again. */
  read(): Promise<string | null>;
  /** Throws a DOMException when the browser or the disk refuses. */
  write(text: string): Promise<void>;
  /** Lasting, where the browser gives one. */
  readonly handle: FileSystemFileHandle | null;
}

/** A file just picked, with what it held. */
export interface PickedFile {
  readonly place: Place;
  readonly text: string;
}

export interface Picker {
  /** Null when the user turns back. */
  pickToRead(extensions: readonly string[]): Promise<PickedFile | null>;
  pickToWrite(suggestedName: string, mime: string): Promise<Place | null>;
}

interface FilePickerOptions {
  readonly suggestedName?: string;
  readonly types?: readonly { readonly description: string; readonly accept: Record<string, string[]> }[];
}

/** The parts of the File System Access API that TypeScript's own types leave out. */
interface PickingWindow {
  readonly showOpenFilePicker?: (options: FilePickerOptions) => Promise<FileSystemFileHandle[]>;
  readonly showSaveFilePicker?: (options: FilePickerOptions) => Promise<FileSystemFileHandle>;
}

interface AskingHandle {
  readonly requestPermission?: (wanted: { mode: 'read' | 'readwrite' }) => Promise<PermissionState>;
}

/** @param plain keeps to upload and download even where the browser could do more */
export function pickerOf(page: Window & PickingWindow, plain: boolean): Picker {
  const { showOpenFilePicker, showSaveFilePicker } = page;
  if (plain || showOpenFilePicker === undefined || showSaveFilePicker === undefined) return plainPicker(page);
  return {
    async pickToRead(extensions) {
      const [handle] = (await unlessTurnedBack(showOpenFilePicker.call(page, typesOf(extensions)))) ?? [];
      return handle === undefined
        ? null
        : { place: placeOfHandle(handle), text: await (await handle.getFile()).text() };
    },
    async pickToWrite(suggestedName, mime) {
      const extension = /\.[a-z0-9]+$/i.exec(suggestedName)?.[0];
      const types = extension === undefined ? {} : typesOf([extension], mime);
      const handle = await unlessTurnedBack(showSaveFilePicker.call(page, { suggestedName, ...types }));
      return handle === null ? null : placeOfHandle(handle);
    },
  };
}

/** A place on disk that the browser lets the page come back to. */
export function placeOfHandle(handle: FileSystemFileHandle): Place {
  return {
    name: handle.name,
    handle,
    async read() {
      await ask(handle, 'read');
      return await (await handle.getFile()).text();
    },
    async write(text) {
      await ask(handle, 'readwrite');
      // The browser writes to a file of its own and puts it in place when closed: all or nothing.
      const writing = await handle.createWritable();
      try {
        await writing.write(text);
      } catch (error) {
        await writing.abort();
        throw error;
      }
      await writing.close();
    },
  };
}

/** A place that can only be downloaded to. */
export function downloadPlace(page: Window, name: string, mime: string): Place {
  return {
    name,
    handle: null,
    read: async () => null,
    write: async (text) => download(page, name, new Blob([text], { type: mime })),
  };
}

/** What a browser refused, as the plain data that the window has words for. */
export function placeProblem(error: unknown, name: string): HostProblem {
  switch (error instanceof DOMException ? error.name : '') {
    case 'NotFoundError':
      return { kind: 'not found', name };
    case 'NotAllowedError':
    case 'NoModificationAllowedError':
    case 'SecurityError':
      return { kind: 'not allowed', name };
    case 'QuotaExceededError':
      return { kind: 'no room', name };
    default:
      return { kind: 'failed', name, detail: error instanceof Error ? error.message : String(error) };
  }
}

function plainPicker(page: Window): Picker {
  return {
    async pickToRead(extensions) {
      const file = await pickByInput(page.document, extensions);
      return file === null
        ? null
        : { place: downloadPlace(page, file.name, file.type), text: await file.text() };
    },
    pickToWrite: async (suggestedName, mime) => downloadPlace(page, suggestedName, mime),
  };
}

function pickByInput(document: Document, extensions: readonly string[]): Promise<File | null> {
  const input = document.createElement('input');
  input.type = 'file';
  input.accept = extensions.map(dotted).join(',');
  return new Promise((resolve) => {
    input.addEventListener('change', () => resolve(input.files?.[0] ?? null));
    input.addEventListener('cancel', () => resolve(null));
    input.click();
  });
}

/** The browser may still be reading the blob some time after the click; ms. */
const DOWNLOAD_TIME = 60_000;

function download(page: Window, name: string, blob: Blob): void {
  const address = URL.createObjectURL(blob);
  const link = page.document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  page.setTimeout(() => URL.revokeObjectURL(address), DOWNLOAD_TIME);
}

function typesOf(extensions: readonly string[], mime = 'application/octet-stream'): FilePickerOptions {
  if (extensions.length === 0) return {};
  const [type = mime] = mime.split(';');
  return { types: [{ description: 'Files', accept: { [type]: extensions.map(dotted) } }] };
}

function dotted(extension: string): string {
  return extension.startsWith('.') ? extension : `.${extension}`;
}

async function ask(handle: FileSystemFileHandle & AskingHandle, mode: 'read' | 'readwrite'): Promise<void> {
  const answer = (await handle.requestPermission?.({ mode })) ?? 'granted';
  if (answer !== 'granted') throw new DOMException('The browser was not allowed to.', 'NotAllowedError');
}

async function unlessTurnedBack<T>(picked: Promise<T>): Promise<T | null> {
  try {
    return await picked;
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') return null;
    throw error;
  }
}
