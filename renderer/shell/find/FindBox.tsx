import { Popover } from 'radix-ui';
import { type JSX, type KeyboardEvent, useEffect, useId, useRef, useState } from 'react';
import { Key } from '../../controls/Key.tsx';
import { useOverlays } from '../../controls/useOverlays.ts';
import { FindSign } from '../../glyphs/signs.tsx';
import { toDrawing } from '../keys/regions.ts';
import { useServices } from '../services.tsx';
import { type Findable, found } from './findables.ts';
import './find.css';

/** Finds a bar, bay, crossing, finding or command by a few letters of its name. */
export function FindBox(): JSX.Element {
  const overlays = useOverlays();
  const services = useServices();
  const listId = useId();
  const input = useRef<HTMLInputElement>(null);
  const activeOption = useRef<HTMLDivElement>(null);
  const [typed, setTyped] = useState('');
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const offered = open ? found(typed, services.store.getState()) : [];

  // biome-ignore lint/correctness/useExhaustiveDependencies: follows the active option as it moves.
  useEffect(() => {
    activeOption.current?.scrollIntoView({ block: 'nearest' });
  }, [active]);

  const finish = (): void => {
    setOpen(false);
    setTyped('');
    setActive(0);
  };
  const choose = (findable: Findable): void => {
    finish();
    // What is chosen shows in the drawing, and a dialog that is asked for gives the keys back to it.
    toDrawing();
    findable.choose(services);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>): void => {
    switch (event.key) {
      case 'ArrowDown':
      case 'ArrowUp': {
        event.preventDefault();
        setOpen(true);
        const step = event.key === 'ArrowDown' ? 1 : -1;
        setActive((now) => (offered.length === 0 ? 0 : (now + step + offered.length) % offered.length));
        return;
      }
      case 'Enter': {
        const findable = offered[active];
        if (findable !== undefined) choose(findable);
        event.preventDefault();
        return;
      }
      case 'Escape':
        event.preventDefault();
        finish();
        toDrawing();
        return;
    }
  };

  return (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <Popover.Anchor asChild>
        <div className="find">
          <FindSign />
          <input
            ref={input}
            id="find-box"
            role="combobox"
            aria-label="Find a bar or a command"
            aria-expanded={open}
            aria-controls={open ? listId : undefined}
            aria-autocomplete="list"
            aria-activedescendant={offered[active] === undefined ? undefined : `${listId}-${active}`}
            autoComplete="off"
            spellCheck={false}
            placeholder="Find a bar or a command"
            value={typed}
            onChange={(event) => {
              setTyped(event.target.value);
              setActive(0);
              setOpen(true);
            }}
            onFocus={() => setOpen(true)}
            onBlur={finish}
            onKeyDown={onKeyDown}
          />
          <Key>Ctrl K</Key>
        </div>
      </Popover.Anchor>
      <Popover.Portal container={overlays}>
        <Popover.Content
          className="find-list"
          align="start"
          sideOffset={4}
          collisionPadding={8}
          role="presentation"
          onOpenAutoFocus={(event) => event.preventDefault()}
          onCloseAutoFocus={(event) => event.preventDefault()}
          onInteractOutside={(event) => event.preventDefault()}
        >
          <div id={listId} role="listbox" aria-label="Found">
            {offered.map((findable, index) => (
              <div key={findable.id} role="presentation">
                {findable.kind !== offered[index - 1]?.kind && (
                  <p className="find-kind" aria-hidden="true">
                    {findable.kind}
                  </p>
                )}
                {/* biome-ignore lint/a11y/useFocusableInteractive: focus stays in the text; the active option is told by aria-activedescendant. */}
                {/* biome-ignore lint/a11y/useKeyWithClickEvents: the text above takes the keys. */}
                <div
                  id={`${listId}-${index}`}
                  ref={index === active ? activeOption : undefined}
                  role="option"
                  aria-selected={index === active}
                  className="find-option"
                  onPointerDown={(event) => event.preventDefault()}
                  onClick={() => choose(findable)}
                >
                  <span>{findable.label}</span>
                  <span className="second">{findable.aside}</span>
                </div>
              </div>
            ))}
          </div>
          {offered.length === 0 && <p className="find-kind">Nothing is called that.</p>}
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
