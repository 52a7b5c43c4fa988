import { Menubar } from 'radix-ui';
import { type JSX, useState } from 'react';
import { useOverlays } from '../../controls/useOverlays.ts';
import { TickSign } from '../../glyphs/signs.tsx';
import type { RecentFile } from '../../host/host.ts';
import { type Command, MENUS, type MenuName, shortcutText } from '../commands/command.ts';
import { COMMANDS, runCommand } from '../commands/commands.ts';
import { useServices, useWindow } from '../services.tsx';
import './menus.css';

export function MenuBar(): JSX.Element {
  const overlays = useOverlays();
  return (
    <Menubar.Root className="menu-bar" aria-label="Menus">
      {MENUS.map((menu) => (
        <Menubar.Menu key={menu}>
          <Menubar.Trigger className="menu-trigger">{menu}</Menubar.Trigger>
          <Menubar.Portal container={overlays}>
            <Menubar.Content className="menu" align="start" sideOffset={3} collisionPadding={6}>
              <MenuItems menu={menu} />
            </Menubar.Content>
          </Menubar.Portal>
        </Menubar.Menu>
      ))}
    </Menubar.Root>
  );
}

function MenuItems({ menu }: { readonly menu: MenuName }): JSX.Element {
  const commands = COMMANDS.filter((command) => command.menu === menu && command.hidden !== true);
  return (
    <>
      {commands.map((command, index) => (
        <MenuEntry
          key={command.id}
          command={command}
          ruled={index > 0 && commands[index - 1]?.group !== command.group}
        />
      ))}
    </>
  );
}

function MenuEntry({ command, ruled }: { readonly command: Command; readonly ruled: boolean }): JSX.Element {
  const services = useServices();
  const label = useWindow(command.label);
  const enabled = useWindow((state) => command.enabled?.(state) ?? true);
  const checked = useWindow((state) => command.checked?.(state) ?? null);
  const inside = (
    <>
      <span className="menu-tick">{checked === true && <TickSign />}</span>
      <span>{label}</span>
      {command.shortcut !== undefined && <kbd>{shortcutText(command.shortcut)}</kbd>}
    </>
  );
  const onSelect = (): void => runCommand(command, services);
  return (
    <>
      {ruled && <Menubar.Separator className="menu-rule" />}
      {checked === null ? (
        <Menubar.Item className="menu-item" disabled={!enabled} onSelect={onSelect}>
          {inside}
        </Menubar.Item>
      ) : (
        <Menubar.CheckboxItem className="menu-item" checked={checked} disabled={!enabled} onSelect={onSelect}>
          {inside}
        </Menubar.CheckboxItem>
      )}
      {command.id === 'open' && <RecentFiles />}
    </>
  );
}

function RecentFiles(): JSX.Element {
  const overlays = useOverlays();
  const { host, documents } = useServices();
  const [files, setFiles] = useState<readonly RecentFile[] | null>(null);
  const onOpenChange = (open: boolean): void => {
    if (open) void host.recent().then(setFiles, () => setFiles([]));
  };
  return (
    <Menubar.Sub onOpenChange={onOpenChange}>
      <Menubar.SubTrigger className="menu-item">
        <span className="menu-tick" />
        <span>Open recent</span>
        <span className="menu-more" aria-hidden="true">
          ›
        </span>
      </Menubar.SubTrigger>
      <Menubar.Portal container={overlays}>
        <Menubar.SubContent className="menu" sideOffset={2} collisionPadding={6}>
          {(files ?? []).map((file) => (
            <Menubar.Item
              key={file.token}
              className="menu-item menu-recent"
              onSelect={() => void documents.openRecent(file.token)}
            >
              <span className="menu-tick" />
              <span>{file.name}</span>
              <span className="second">{file.folder}</span>
            </Menubar.Item>
          ))}
          {files?.length === 0 && (
            <Menubar.Item className="menu-item" disabled>
              <span className="menu-tick" />
              <span>No files yet</span>
            </Menubar.Item>
          )}
        </Menubar.SubContent>
      </Menubar.Portal>
    </Menubar.Sub>
  );
}
