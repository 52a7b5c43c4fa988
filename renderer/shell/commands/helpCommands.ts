import type { Command } from './command.ts';

export const helpCommands: readonly Command[] = [
  {
    id: 'keyboard',
    menu: 'Help',
    group: 1,
    label: () => 'Keyboard',
    shortcut: { key: 'F1' },
    run: ({ actions }) => actions.openDialog({ kind: 'keyboard' }),
  },
  {
    id: 'keyboard by sign',
    menu: 'Help',
    group: 1,
    label: () => 'Keyboard',
    shortcut: { key: '?' },
    hidden: true,
    run: ({ actions }) => actions.openDialog({ kind: 'keyboard' }),
  },
  {
    id: 'about',
    menu: 'Help',
    group: 1,
    label: () => 'About and cautions',
    run: ({ actions }) => actions.openDialog({ kind: 'about' }),
  },
];
