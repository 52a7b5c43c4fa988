import type { MenuItemConstructorOptions } from 'electron';
import type { HostCommand, RecentFile } from '../../renderer/host/host.ts';

export interface MenuSetting {
  readonly recent: readonly RecentFile[];
  /** Only while the program is being made. */
  readonly developerTools: boolean;
  readonly mac: boolean;
  readonly send: (command: HostCommand) => void;
  readonly close: () => void;
}

/** The menu bar. Every entry of Tautline's own sends a command to the window, which decides what it means just then. */
export function menuTemplate(setting: MenuSetting): MenuItemConstructorOptions[] {
  const entry = (
    id: string,
    label: string,
    command: HostCommand,
    accelerator?: string,
  ): MenuItemConstructorOptions => ({
    id,
    label,
    click: () => setting.send(command),
    ...(accelerator === undefined ? {} : { accelerator }),
  });
  const line: MenuItemConstructorOptions = { type: 'separator' };
  const about = entry('help.about', 'About Tautline', 'about');

  const file: MenuItemConstructorOptions[] = [
    entry('file.new', 'New', 'new', 'CmdOrCtrl+N'),
    entry('file.open', 'Open…', 'open', 'CmdOrCtrl+O'),
    { id: 'file.recent', label: 'Open recent', submenu: recentEntries(setting) },
    line,
    entry('file.save', 'Save', 'save', 'CmdOrCtrl+S'),
    entry('file.saveAs', 'Save as…', 'save as', 'CmdOrCtrl+Shift+S'),
    line,
    entry('file.exportCsv', 'Export schedule as CSV…', 'export csv'),
    entry('file.exportJson', 'Export schedule as JSON…', 'export json'),
    line,
    entry('file.report', 'Report…', 'report', 'CmdOrCtrl+P'),
    entry('file.print', 'Print report…', 'print'),
    entry('file.pdf', 'Save report as PDF…', 'pdf', 'CmdOrCtrl+Shift+P'),
    line,
    { id: 'file.close', label: 'Close', accelerator: 'CmdOrCtrl+W', click: setting.close },
  ];

  const edit: MenuItemConstructorOptions[] = [
    entry('edit.undo', 'Undo', 'undo', 'CmdOrCtrl+Z'),
    entry('edit.redo', 'Redo', 'redo', setting.mac ? 'Cmd+Shift+Z' : 'Ctrl+Y'),
    line,
    { role: 'cut' },
    { role: 'copy' },
    { role: 'paste' },
    { role: 'selectAll' },
    line,
    entry('edit.find', 'Find', 'find', 'CmdOrCtrl+K'),
  ];

  const view: MenuItemConstructorOptions[] = [
    {
      id: 'view.theme',
      label: 'Theme',
      submenu: [
        entry('view.light', 'Light', 'theme light'),
        entry('view.dark', 'Dark', 'theme dark'),
        entry('view.system', 'System', 'theme system'),
      ],
    },
    line,
    { role: 'zoomIn' },
    { role: 'zoomOut' },
    { role: 'resetZoom' },
    line,
    { role: 'togglefullscreen' },
    ...(setting.developerTools ? [line, { role: 'toggleDevTools' } as const] : []),
  ];

  const own: MenuItemConstructorOptions = {
    label: 'Tautline',
    submenu: [
      about,
      line,
      { role: 'services' },
      line,
      { role: 'hide' },
      { role: 'hideOthers' },
      line,
      { role: 'quit' },
    ],
  };

  return [
    ...(setting.mac ? [own] : []),
    { label: 'File', submenu: file },
    { label: 'Edit', submenu: edit },
    { label: 'View', submenu: view },
    { label: 'Help', submenu: [about] },
  ];
}

function recentEntries(setting: MenuSetting): MenuItemConstructorOptions[] {
  if (setting.recent.length === 0) return [{ label: 'No recent projects', enabled: false }];
  return setting.recent.map((one, index) => ({
    id: `file.recent.${index}`,
    // A single ampersand would mark a letter as the entry's shortcut.
    label: `${one.name} (${one.folder})`.replaceAll('&', '&&'),
    click: () => setting.send({ kind: 'open recent', token: one.token }),
  }));
}
