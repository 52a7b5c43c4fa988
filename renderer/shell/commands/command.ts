import type { WindowState } from '../../store/windowState.ts';
import type { Services } from '../services.tsx';

export const MENUS = ['File', 'Edit', 'Bay', 'View', 'Report', 'Help'] as const;
export type MenuName = (typeof MENUS)[number];

/** A key with what is held down beside it. Ctrl stands for the command key too. */
export interface Shortcut {
  /** As the keyboard event gives it, lower case for letters. */
  readonly key: string;
  readonly ctrl?: boolean;
  readonly shift?: boolean;
}

/** Something the user may ask for: by menu, by key, or by name in the find box. */
export interface Command {
  readonly id: string;
  readonly menu: MenuName;
  /** Commands of one group stand together between rules. */
  readonly group: number;
  label(state: WindowState): string;
  readonly shortcut?: Shortcut;
  /** Left out of menus: a second key for something that is there already. */
  readonly hidden?: boolean;
  enabled?(state: WindowState): boolean;
  /** For what is on or off. */
  checked?(state: WindowState): boolean;
  run(services: Services): void;
}

const KEY_NAMES: Readonly<Record<string, string>> = { ' ': 'Space', ArrowLeft: '←', ArrowRight: '→' };

/** "Ctrl Shift Z", as menus and tips show it. */
export function shortcutText({ key, ctrl = false, shift = false }: Shortcut): string {
  const name = KEY_NAMES[key] ?? (key.length === 1 ? key.toUpperCase() : key);
  return [ctrl ? 'Ctrl' : '', shift ? 'Shift' : '', name].filter((part) => part !== '').join(' ');
}

export function isPressed(shortcut: Shortcut, event: KeyboardEvent): boolean {
  const key = event.key.length === 1 ? event.key.toLowerCase() : event.key;
  // A sign that needs Shift on some keyboards is told by the sign alone.
  const shiftMatters = /^[a-z]$/.test(shortcut.key) || shortcut.key.length > 1;
  return (
    key === shortcut.key &&
    (event.ctrlKey || event.metaKey) === (shortcut.ctrl ?? false) &&
    !event.altKey &&
    (!shiftMatters || event.shiftKey === (shortcut.shift ?? false))
  );
}
