import type { MenuItemConstructorOptions } from 'electron';
import { describe, expect, it } from 'vitest';
import { type MenuSetting, menuTemplate } from '../../../electron/desktop/menu.ts';
import type { HostCommand } from '../../../renderer/host/host.ts';

function menu(change: Partial<MenuSetting> = {}) {
  const sent: HostCommand[] = [];
  const template = menuTemplate({
    recent: [],
    developerTools: false,
    mac: false,
    send: (command) => void sent.push(command),
    close: () => undefined,
    ...change,
  });
  return { entries: flat(template), sent };
}

function flat(items: readonly MenuItemConstructorOptions[]): readonly MenuItemConstructorOptions[] {
  return items.flatMap((item) => [item, ...(Array.isArray(item.submenu) ? flat(item.submenu) : [])]);
}

describe('the menu', () => {
  it.each([false, true])('gives no accelerator twice (macOS: %s)', (mac) => {
    const keys = menu({ mac })
      .entries.map((entry) => entry.accelerator)
      .filter((key) => key !== undefined);
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys).toContain('CmdOrCtrl+S');
  });

  it('offers the developer tools only while the program is being made', () => {
    const roles = (developerTools: boolean) => menu({ developerTools }).entries.map((entry) => entry.role);
    expect(roles(true)).toContain('toggleDevTools');
    expect(roles(false)).not.toContain('toggleDevTools');
  });

  it('lists recent projects by name and folder, with ampersands as they are written', () => {
    const recent = [{ token: 'a', name: 'shed.json', folder: '~/Bolt & Co' }];
    const { entries, sent } = menu({ recent });
    const entry = entries.find(({ id }) => id === 'file.recent.0');
    // Electron takes a single ampersand for the mark of a shortcut and shows two as one.
    expect(entry?.label).toBe('shed.json (~/Bolt && Co)');
    (entry?.click as (() => void) | undefined)?.();
    expect(sent).toEqual([{ kind: 'open recent', token: 'a' }]);
  });

  it('says that there are none rather than showing an empty list', () => {
    expect(
      menu().entries.some(({ label, enabled }) => label === 'No recent projects' && enabled === false),
    ).toBe(true);
  });
});
