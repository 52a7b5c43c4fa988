import type { Command } from './command.ts';

export const fileCommands: readonly Command[] = [
  {
    id: 'new',
    menu: 'File',
    group: 1,
    label: () => 'New project',
    run: ({ documents }) => void documents.newProject(),
  },
  {
    id: 'open',
    menu: 'File',
    group: 1,
    label: () => 'Open…',
    shortcut: { key: 'o', ctrl: true },
    run: ({ documents }) => void documents.open(),
  },
  {
    id: 'example',
    menu: 'File',
    group: 1,
    label: () => 'Open the example',
    run: ({ documents }) => void documents.openExample(),
  },
  {
    id: 'save',
    menu: 'File',
    group: 2,
    label: () => 'Save',
    shortcut: { key: 's', ctrl: true },
    run: ({ documents }) => void documents.save(),
  },
  {
    id: 'save as',
    menu: 'File',
    group: 2,
    label: () => 'Save as…',
    shortcut: { key: 's', ctrl: true, shift: true },
    run: ({ documents }) => void documents.saveAs(),
  },
  {
    id: 'settings',
    menu: 'File',
    group: 3,
    label: () => 'Project settings…',
    shortcut: { key: ',', ctrl: true },
    run: ({ actions }) => actions.openDialog({ kind: 'settings' }),
  },
  {
    id: 'own stock',
    menu: 'File',
    group: 3,
    label: () => 'Own stock list…',
    run: ({ actions }) => actions.openDialog({ kind: 'own stock' }),
  },
];
