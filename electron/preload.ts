/** Runs sandboxed before the page: maps `Host` to channels and does nothing else. */
import { contextBridge, ipcRenderer } from 'electron';
import type { Host, HostCommand } from '../renderer/host/host.ts';
import { COMMAND_CHANNEL, channelOf, HOST_GLOBAL } from './channels.ts';

const host: Host = {
  kind: 'desktop',
  start: () => ipcRenderer.invoke(channelOf('start')),
  open: () => ipcRenderer.invoke(channelOf('open')),
  openRecent: (token) => ipcRenderer.invoke(channelOf('openRecent'), token),
  recent: () => ipcRenderer.invoke(channelOf('recent')),
  save: (token, text, force) => ipcRenderer.invoke(channelOf('save'), token, text, force),
  saveAs: (suggestedName, text) => ipcRenderer.invoke(channelOf('saveAs'), suggestedName, text),
  autosave: (copy) => ipcRenderer.invoke(channelOf('autosave'), copy),
  exportText: (suggestedName, text, mime) =>
    ipcRenderer.invoke(channelOf('exportText'), suggestedName, text, mime),
  print: (html) => ipcRenderer.invoke(channelOf('print'), html),
  savePdf: (suggestedName, html) => ipcRenderer.invoke(channelOf('savePdf'), suggestedName, html),
  importText: (extensions) => ipcRenderer.invoke(channelOf('importText'), extensions),
  setDocumentState: (state) => void ipcRenderer.invoke(channelOf('setDocumentState'), state),
  confirmClose: () => void ipcRenderer.invoke(channelOf('confirmClose')),
  onCommand(listener) {
    const heard = (_event: unknown, command: HostCommand) => listener(command);
    ipcRenderer.on(COMMAND_CHANNEL, heard);
    return () => void ipcRenderer.removeListener(COMMAND_CHANNEL, heard);
  },
};

contextBridge.exposeInMainWorld(HOST_GLOBAL, host);
