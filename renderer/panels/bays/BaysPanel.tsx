import { DropdownMenu } from 'radix-ui';
import type { JSX, KeyboardEvent } from 'react';
import type { RecipeKind } from '../../../core/project/model.ts';
import { useOverlays } from '../../controls/useOverlays.ts';
import { PlusSign } from '../../glyphs/signs.tsx';
import { addBay } from '../../shell/commands/bayCommands.ts';
import { useServices, useWindow } from '../../shell/services.tsx';
import { shownProject } from '../../store/shown.ts';
import { BayRow } from './BayRow.tsx';
import './bays.css';

const KINDS: readonly { readonly kind: RecipeKind; readonly label: string }[] = [
  { kind: 'wall', label: 'Wall bay' },
  { kind: 'roof', label: 'Roof bay' },
  { kind: 'knee', label: 'Knees' },
  { kind: 'free', label: 'Free bay' },
];

/** Every bay with what it is and its worst slenderness; new ones are added here. */
export function BaysPanel(): JSX.Element {
  const bays = useWindow((state) => shownProject(state).bays);
  return (
    <section className="bays" aria-label="Bays">
      <div className="panel-head">
        <h2>Bays</h2>
        <small>worst slenderness</small>
        <AddBay />
      </div>
      <ul className="bay-list" onKeyDown={moveFocus}>
        {bays.map((bay) => (
          <BayRow key={bay.id} bay={bay} />
        ))}
      </ul>
    </section>
  );
}

function AddBay(): JSX.Element {
  const overlays = useOverlays();
  const services = useServices();
  const trying = useWindow((state) => state.trying !== null);
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger
        className="icon-button small"
        aria-label="Add a bay"
        disabled={trying}
        title="Add a bay"
      >
        <PlusSign />
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal container={overlays}>
        <DropdownMenu.Content className="menu" align="end" sideOffset={3} collisionPadding={6}>
          {KINDS.map(({ kind, label }) => (
            <DropdownMenu.Item key={kind} className="menu-item" onSelect={() => addBay(services, kind)}>
              <span />
              <span>{label}</span>
            </DropdownMenu.Item>
          ))}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

/** Up and down go from bay to bay. */
function moveFocus(event: KeyboardEvent<HTMLUListElement>): void {
  const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
  if (step === 0) return;
  const rows = [...event.currentTarget.querySelectorAll<HTMLElement>('.bay-choose')];
  const at = rows.indexOf(document.activeElement as HTMLElement);
  if (at < 0) return;
  event.preventDefault();
  const next = rows[Math.min(rows.length - 1, Math.max(0, at + step))];
  next?.focus();
  next?.click();
}
