/** Every command of the window, in the order of the menus. */
import type { HostCommand } from '../../host/host.ts';
import type { Services } from '../services.tsx';
import { bayCommands } from './bayCommands.ts';
import type { Command } from './command.ts';
import { editCommands } from './editCommands.ts';
import { fileCommands } from './fileCommands.ts';
import { helpCommands } from './helpCommands.ts';
import { reportCommands } from './reportCommands.ts';
import { viewCommands } from './viewCommands.ts';

export const COMMANDS: readonly Command[] = [
  ...fileCommands,
  ...editCommands,
  ...bayCommands,
  ...viewCommands,
  ...reportCommands,
  ...helpCommands,
];

export function runCommand(command: Command, services: Services): void {
  if (command.enabled?.(services.store.getState()) ?? true) command.run(services);
}

/** What the host asks for, by its menus or by closing. */
export function runHostCommand(command: HostCommand, services: Services): void {
  if (typeof command === 'object') {
    void services.documents.openRecent(command.token);
    return;
  }
  if (command === 'close') {
    void services.documents.close();
    return;
  }
  const known = COMMANDS.find(({ id }) => id === command);
  if (known !== undefined) runCommand(known, services);
}
