import { redoLabel, undoLabel } from '../../store/history.ts';
import type { Command } from './command.ts';

export const editCommands: readonly Command[] = [
  {
    id: 'undo',
    menu: 'Edit',
    group: 1,
    label: ({ history, trying }) =>
      trying === null ? named('Undo', undoLabel(history)) : 'Put back the change on trial',
    shortcut: { key: 'z', ctrl: true },
    enabled: ({ history, trying }) => trying !== null || undoLabel(history) !== null,
    run: ({ actions }) => actions.undo(),
  },
  {
    id: 'redo',
    menu: 'Edit',
    group: 1,
    label: ({ history }) => named('Redo', redoLabel(history)),
    shortcut: { key: 'z', ctrl: true, shift: true },
    enabled: ({ history, trying }) => trying === null && redoLabel(history) !== null,
    run: ({ actions }) => actions.redo(),
  },
  {
    id: 'redo, other key',
    menu: 'Edit',
    group: 1,
    label: () => 'Redo',
    hidden: true,
    shortcut: { key: 'y', ctrl: true },
    enabled: ({ history, trying }) => trying === null && redoLabel(history) !== null,
    run: ({ actions }) => actions.redo(),
  },
  {
    id: 'keep trial',
    menu: 'Edit',
    group: 2,
    label: () => 'Keep the change on trial',
    enabled: ({ trying }) => trying !== null,
    run: ({ actions }) => actions.keepTrial(),
  },
  {
    id: 'find',
    menu: 'Edit',
    group: 3,
    label: () => 'Find a bar or a command',
    shortcut: { key: 'k', ctrl: true },
    run: () => document.querySelector<HTMLInputElement>('#find-box')?.focus(),
  },
];

function named(verb: string, label: string | null): string {
  return label === null ? verb : `${verb}: ${label}`;
}
