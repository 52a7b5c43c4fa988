/** The page's half of the stand-in, as the text of a script that runs before any script of the page. */

/** Names of the two doors between page and test process. */
export const INVOKE_BINDING = '__standInInvoke';
export const DELIVER_FUNCTION = '__standInDeliver';

/** What the test process answers to a call. */
export type InvokeAnswer = { readonly value: unknown } | { readonly error: string };

/**
 * Runs the built preload with the only `require` that a sandboxed one has, and the two parts of Electron it may use.
 * As in Electron, arguments cross by structured clone, and what is shown to the page cannot be changed by it.
 */
export function pageSide(preload: string): string {
  return `(() => {
  // Electron runs a preload in the page itself and in no frame of it.
  if (window.top !== window) return;
  const listeners = new Map();
  const of = (channel) => listeners.get(channel) ?? [];
  const ipcRenderer = {
    async invoke(channel, ...args) {
      const answer = await window.${INVOKE_BINDING}(channel, structuredClone(args));
      if ('error' in answer) throw new Error("Error invoking remote method '" + channel + "': " + answer.error);
      return answer.value;
    },
    on(channel, listener) { listeners.set(channel, [...of(channel), listener]); return ipcRenderer; },
    removeListener(channel, listener) { listeners.set(channel, of(channel).filter((one) => one !== listener)); return ipcRenderer; },
  };
  Object.defineProperty(window, '${DELIVER_FUNCTION}', {
    value: (channel, args) => { for (const listener of of(channel)) listener({}, ...args); },
  });
  const frozen = (value) => {
    for (const part of Object.values(value)) if (part !== null && typeof part === 'object') frozen(part);
    return Object.freeze(value);
  };
  const contextBridge = {
    exposeInMainWorld: (name, api) => Object.defineProperty(window, name, { value: frozen(api), enumerable: true }),
  };
  const require = (name) => {
    if (name === 'electron') return { ipcRenderer, contextBridge };
    throw new Error('module not found: ' + name);
  };
  const module = { exports: {} };
  const exports = module.exports;
  const process = undefined, Buffer = undefined, global = undefined, __dirname = undefined, __filename = undefined;
${preload}
})();`;
}
