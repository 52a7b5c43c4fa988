/** The names under which the window's calls reach the main process: the whole contract between the two, as strings. */
import type { Host } from '../renderer/host/host.ts';

/** Every member of `Host` that asks or tells the machine something. */
export type HostCall = Exclude<keyof Host, 'kind' | 'onCommand'>;

/** Written out as a record, so that the compiler misses none. */
const CHANNELS: Readonly<Record<HostCall, `tautline:${HostCall}`>> = {
  start: 'tautline:start',
  open: 'tautline:open',
  openRecent: 'tautline:openRecent',
  recent: 'tautline:recent',
  save: 'tautline:save',
  saveAs: 'tautline:saveAs',
  autosave: 'tautline:autosave',
  exportText: 'tautline:exportText',
  print: 'tautline:print',
  savePdf: 'tautline:savePdf',
  importText: 'tautline:importText',
  setDocumentState: 'tautline:setDocumentState',
  confirmClose: 'tautline:confirmClose',
};

export const HOST_CALLS = Object.keys(CHANNELS) as readonly HostCall[];

export function channelOf(call: HostCall): string {
  return CHANNELS[call];
}

/** From main to the window: menu commands and requests to close. */
export const COMMAND_CHANNEL = 'tautline:command';

/** The name under which the preload shows the host to the page. */
export const HOST_GLOBAL = 'tautlineHost';
