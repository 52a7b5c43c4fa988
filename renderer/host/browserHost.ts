import { browserRecents } from './browserRecents.ts';
import { browserRecovery } from './browserRecovery.ts';
import { printInFrame } from './framePrinting.ts';
import type {
  Host,
  HostProblem,
  HostResult,
  OpenedFile,
  RecoveryCopy,
  SavedFile,
  StartState,
} from './host.ts';
import { keptInBrowser } from './kept.ts';
import { type Place, pickerOf, placeOfHandle, placeProblem } from './places.ts';

const PROJECT_EXTENSIONS = ['.json'];
const PROJECT_MIME = 'application/json';

/** A place the window holds a token of, with what it held when last read or saved; null when that cannot be known. */
interface KnownPlace {
  readonly place: Place;
  readonly known: string | null;
}

/**
 * `Host` by the browser's own means. Files are real ones where the browser lets a page write them; otherwise, or with
 * `?plain-files` in the address, opening uploads and saving downloads. `?given=KEY` opens the file that the local
 * server was started with, as a copy.
 */
export function browserHost(): Host {
  const asked = new URLSearchParams(window.location.search);
  const picker = pickerOf(window, asked.has('plain-files'));
  const kept = keptInBrowser();
  const recents = browserRecents(kept);
  const recovery = browserRecovery(kept, navigator.locks);
  const places = new Map<string, KnownPlace>();
  let dirty = false;

  window.addEventListener('beforeunload', (event) => {
    if (dirty) event.preventDefault();
  });

  async function hold(place: Place, known: string, token: string = crypto.randomUUID()): Promise<string> {
    places.set(token, { place, known });
    if (place.handle !== null) await ifKept(recents.add({ token, handle: place.handle }), undefined);
    return token;
  }

  async function write(place: Place, text: string, token?: string): Promise<HostResult<SavedFile>> {
    try {
      await place.write(text);
    } catch (error) {
      return refused(placeProblem(error, place.name));
    }
    return done({ token: await hold(place, text, token), name: place.name });
  }

  async function start(): Promise<StartState> {
    const left = await ifKept(recovery.leftOver(), null);
    const copy = left === null ? null : { name: left.name, text: left.text, savedAt: left.savedAt };
    let token: string | null = null;
    if (left?.handle != null) {
      token = crypto.randomUUID();
      places.set(token, { place: placeOfHandle(left.handle), known: left.known });
    }
    const given = asked.get('given');
    const opened = given === null ? done(await example()) : await givenFile(given);
    return {
      opened: opened.ok ? opened.value : null,
      recovery: copy === null ? null : { ...copy, token },
      problem: opened.ok ? null : opened.problem,
    };
  }

  async function openRecent(token: string): Promise<HostResult<OpenedFile>> {
    const recent = (await ifKept(recents.list(), [])).find((one) => one.token === token);
    if (recent === undefined) return refused({ kind: 'not found', name: '' });
    const place = placeOfHandle(recent.handle);
    try {
      const text = (await place.read()) ?? '';
      return done({ token: await hold(place, text, token), name: place.name, text });
    } catch (error) {
      const problem = placeProblem(error, place.name);
      if (problem.kind === 'not found') await ifKept(recents.remove(token), undefined);
      return refused(problem);
    }
  }

  async function keepCopy(copy: RecoveryCopy): Promise<void> {
    const from = copy.token === null ? undefined : places.get(copy.token);
    await recovery.keep({
      name: copy.name,
      text: copy.text,
      savedAt: copy.savedAt,
      handle: from?.place.handle ?? null,
      known: from?.known ?? null,
    });
  }

  return {
    kind: 'browser',
    start,
    async open() {
      const picked = await picker.pickToRead(PROJECT_EXTENSIONS);
      if (picked === null) return null;
      const { place, text } = picked;
      return done({ token: await hold(place, text), name: place.name, text });
    },
    openRecent,
    recent: async () =>
      (await ifKept(recents.list(), [])).map(({ token, handle }) => ({
        token,
        name: handle.name,
        folder: '',
      })),
    async save(token, text, force) {
      const at = places.get(token);
      if (at === undefined) return refused({ kind: 'not found', name: '' });
      if (!force && (await changedSince(at)))
        return refused({ kind: 'changed on disk', name: at.place.name });
      return await write(at.place, text, token);
    },
    async saveAs(suggestedName, text) {
      const place = await picker.pickToWrite(suggestedName, PROJECT_MIME);
      return place === null ? null : await write(place, text);
    },
    autosave: (copy) => ifKept(copy === null ? recovery.forget() : keepCopy(copy), undefined),
    async exportText(suggestedName, text, mime) {
      const place = await picker.pickToWrite(suggestedName, mime);
      if (place === null) return null;
      try {
        await place.write(text);
        return done({ name: place.name });
      } catch (error) {
        return refused(placeProblem(error, place.name));
      }
    },
    print: (html) => printed(html, null),
    // The browser's own printing dialog makes the PDF, and asks for its name.
    savePdf: (suggestedName, html) => printed(html, { name: suggestedName }),
    async importText(extensions) {
      const picked = await picker.pickToRead(extensions);
      return picked === null ? null : done({ name: picked.place.name, text: picked.text });
    },
    setDocumentState(state) {
      dirty = state.dirty;
      document.title = `${state.dirty ? '• ' : ''}${state.title === '' ? '' : `${state.title} – `}Tautline`;
    },
    // A page has no menu bar; its commands are all in the window.
    onCommand: () => () => undefined,
    confirmClose() {
      dirty = false;
      window.close();
    },
  };
}

async function example(): Promise<OpenedFile> {
  const { default: project } = await import('../../assets/examples/marrow-lane.json');
  return { token: '', name: 'marrow-lane.json', text: JSON.stringify(project, null, 2) };
}

/** The file that the local server was started with; it has no place that the page could save to. */
async function givenFile(key: string): Promise<HostResult<OpenedFile>> {
  const name = 'the given file';
  try {
    const answer = await fetch(`/given/${encodeURIComponent(key)}`);
    if (!answer.ok) return refused({ kind: 'not found', name });
    const given: unknown = await answer.json();
    if (!isNamedText(given)) throw new Error('The server sent something else than a file.');
    return done({ token: '', name: given.name, text: given.text });
  } catch (error) {
    return refused(placeProblem(error, name));
  }
}

function isNamedText(value: unknown): value is { readonly name: string; readonly text: string } {
  if (typeof value !== 'object' || value === null) return false;
  const { name, text }: { name?: unknown; text?: unknown } = value;
  return typeof name === 'string' && typeof text === 'string';
}

async function changedSince({ place, known }: KnownPlace): Promise<boolean> {
  if (known === null) return false;
  try {
    const now = await place.read();
    return now !== null && now !== known;
  } catch {
    // Gone or shut: writing will say which.
    return false;
  }
}

async function printed<T>(html: string, value: T): Promise<HostResult<T>> {
  try {
    await printInFrame(window, html);
    return done(value);
  } catch (error) {
    return refused(placeProblem(error, 'report'));
  }
}

/** What the browser keeps between pages is a comfort; where it keeps nothing, the work goes on without. */
async function ifKept<T>(asked: Promise<T>, otherwise: T): Promise<T> {
  try {
    return await asked;
  } catch {
    return otherwise;
  }
}

function done<T>(value: T): { readonly ok: true; readonly value: T } {
  return { ok: true, value };
}

function refused(problem: HostProblem): { readonly ok: false; readonly problem: HostProblem } {
  return { ok: false, problem };
}
