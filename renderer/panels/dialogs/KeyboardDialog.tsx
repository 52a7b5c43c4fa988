import type { JSX } from 'react';
import { MENUS, shortcutText } from '../../shell/commands/command.ts';
import { COMMANDS } from '../../shell/commands/commands.ts';
import { useServices } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

interface KeyRow {
  readonly keys: string;
  readonly does: string;
}

const MOVING: readonly KeyRow[] = [
  { keys: 'F6', does: 'Next part of the window' },
  { keys: 'Shift F6', does: 'Part before' },
  { keys: 'Esc', does: 'Put back what is on trial or pushed, close what is docked' },
  { keys: 'Enter', does: 'Keep what is on trial' },
  { keys: '↑ ↓', does: 'Rows of the schedule and of lists; a step of a number' },
  { keys: 'Page ↑ ↓', does: 'Ten steps of a number, a page of the schedule' },
  { keys: '↑ ↓ ← →', does: 'In the view: turn it' },
  { keys: 'Shift ↑ ↓ ← →', does: 'In the view: move it' },
  { keys: '+ −', does: 'In the view: closer, farther' },
  { keys: 'Home', does: 'In the view: fit the bay' },
  { keys: '← →', does: 'While pushing: the place on the bar' },
  { keys: 'Shift ↑ ↓ ← →', does: 'While pushing: out of the plane, in the plane' },
  { keys: '← →', does: 'Tabs, choices, stock angles of the shortlist' },
];

/** Every key of the window. */
export function KeyboardDialog(): JSX.Element {
  const { actions, store } = useServices();
  const state = store.getState();
  return (
    <DialogFrame title="Keyboard" wide onClose={actions.closeDialog}>
      <div className="keyboard-columns">
        <KeyTable title="Moving about" rows={MOVING} />
        {MENUS.map((menu) => {
          const rows = COMMANDS.flatMap((command): KeyRow[] =>
            command.menu === menu && command.shortcut !== undefined
              ? [{ keys: shortcutText(command.shortcut), does: plain(command.label(state)) }]
              : [],
          );
          return rows.length === 0 ? null : <KeyTable key={menu} title={menu} rows={rows} />;
        })}
      </div>
    </DialogFrame>
  );
}

/** Without what the command would do just now: "Undo" of "Undo: Change width". */
const plain = (label: string): string => label.replace('…', '').replace(/:.*/, '');

function KeyTable({
  title,
  rows,
}: {
  readonly title: string;
  readonly rows: readonly KeyRow[];
}): JSX.Element {
  return (
    <section>
      <h3>{title}</h3>
      <table className="shortcuts" aria-label={title}>
        <tbody>
          {rows.map(({ keys, does }) => (
            <tr key={`${keys} ${does}`}>
              <th scope="row">{does}</th>
              <td>
                <kbd>{keys}</kbd>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
