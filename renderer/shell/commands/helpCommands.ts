import type { Command } from './command.ts';

export const helpCommands: readonly Command[] = [
  {
    id: 'keyboard',
    menu: 'Help',
    group: 1,
    label: () => 'Keyboard',
    shortcut: { key: '?' },
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
