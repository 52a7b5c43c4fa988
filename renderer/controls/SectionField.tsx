import { Popover } from 'radix-ui';
import { type JSX, type KeyboardEvent, useEffect, useId, useRef, useState } from 'react';
import type { UnitSystem } from '../../core/project/model.ts';
import { showMassPerMetre } from '../../core/units/quantity.ts';
import type { SectionChoice, SectionFound } from '../assessing/assessApi.ts';
import { StepSign } from '../glyphs/signs.tsx';
import { shownSection } from './figures.ts';
import { Row } from './Row.tsx';
import { matchingSections, onlySection } from './sectionMatch.ts';
import { useOverlays } from './useOverlays.ts';
import { useRefusal } from './useRefusal.ts';

interface SectionFieldProps {
  readonly label: string;
  readonly designation: string;
  readonly choices: readonly SectionChoice[];
  readonly units: UnitSystem;
  readonly bare?: boolean;
  /** What a designation means that the list offered does not have. */
  onFind(typed: string): Promise<SectionFound>;
  onChange(designation: string): string | null;
}

/** An angle by its designation, with the stock list narrowing as one types. */
export function SectionField(props: SectionFieldProps): JSX.Element {
  const overlays = useOverlays();
  const { label, designation, choices, units, bare = false, onFind, onChange } = props;
  const id = useId();
  const listId = `${id}-list`;
  const messageId = `${id}-message`;
  const [typed, setTyped] = useState<string | null>(null);
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const [message, setMessage] = useRefusal(designation);
  const activeOption = useRef<HTMLDivElement>(null);

  const offered = matchingSections(choices, typed ?? '');
  const present = choices.findIndex((choice) => choice.designation === designation);

  // biome-ignore lint/correctness/useExhaustiveDependencies: follows the active option as it moves.
  useEffect(() => {
    activeOption.current?.scrollIntoView({ block: 'nearest' });
  }, [active, open]);

  const unfold = (): void => {
    setOpen(true);
    setActive(typed === null ? Math.max(0, present) : 0);
  };
  const take = (chosen: string): void => {
    setMessage(chosen === designation ? null : onChange(chosen));
    setTyped(null);
    setOpen(false);
  };
  const finish = (leaving: boolean): void => {
    setOpen(false);
    if (typed === null || typed.trim() === '') {
      setTyped(null);
      return;
    }
    const chosen = leaving ? onlySection(offered, typed) : offered[active];
    if (chosen !== undefined) take(chosen.designation);
    else {
      if (offered.length === 0) void takeFromElsewhere(typed.trim());
      else
        setMessage(`“${typed.trim()}” could be several angles: pick one from the list. The old one stays.`);
      if (leaving) setTyped(null);
    }
  };
  /** Not in the list offered: another stock list may have it, or it may be written otherwise. */
  const takeFromElsewhere = async (wanted: string): Promise<void> => {
    const found = await onFind(wanted).catch(() => null);
    if (found !== null && found.designation !== null) take(found.designation);
    else setMessage(notFound(wanted, found?.nearest ?? []));
  };

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>): void => {
    switch (event.key) {
      case 'ArrowDown':
      case 'ArrowUp': {
        event.preventDefault();
        if (!open) {
          unfold();
          return;
        }
        const step = event.key === 'ArrowDown' ? 1 : -1;
        setActive((now) => Math.min(offered.length - 1, Math.max(0, now + step)));
        return;
      }
      case 'Enter':
        if (open && offered[active] !== undefined) take(offered[active].designation);
        else finish(false);
        return;
      case 'Escape':
        if (!open && typed === null) return;
        event.stopPropagation();
        setOpen(false);
        setTyped(null);
        setMessage(null);
        return;
    }
  };

  const field = (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <Popover.Anchor asChild>
        <div className="field" data-refused={message !== null || undefined}>
          <input
            id={id}
            className="field-text"
            role="combobox"
            aria-label={bare ? label : undefined}
            aria-expanded={open}
            aria-controls={open ? listId : undefined}
            aria-autocomplete="list"
            aria-activedescendant={open && offered[active] !== undefined ? `${listId}-${active}` : undefined}
            aria-invalid={message !== null || undefined}
            aria-describedby={message === null ? undefined : messageId}
            autoComplete="off"
            spellCheck={false}
            value={typed ?? shownSection(designation)}
            onChange={(event) => {
              setTyped(event.target.value);
              setMessage(null);
              setOpen(true);
              setActive(0);
            }}
            onFocus={(event) => event.target.select()}
            onClick={() => {
              if (!open) unfold();
            }}
            onBlur={() => finish(true)}
            onKeyDown={onKeyDown}
          />
          <span className="field-drop">
            <StepSign up={false} />
          </span>
        </div>
      </Popover.Anchor>
      <Popover.Portal container={overlays}>
        <Popover.Content
          className="section-list"
          align="start"
          sideOffset={2}
          collisionPadding={8}
          onOpenAutoFocus={(event) => event.preventDefault()}
          onCloseAutoFocus={(event) => event.preventDefault()}
          onInteractOutside={(event) => event.preventDefault()}
          role="presentation"
        >
          <div id={listId} role="listbox" aria-label={`${label}: stock list`}>
            {offered.map((choice, index) => (
              // biome-ignore lint/a11y/useFocusableInteractive: focus stays in the text; the active option is told by aria-activedescendant.
              <div
                key={choice.designation}
                id={`${listId}-${index}`}
                ref={index === active ? activeOption : undefined}
                role="option"
                aria-selected={index === active}
                className="section-option"
                onPointerDown={(event) => event.preventDefault()}
                onClick={() => take(choice.designation)}
                onKeyDown={undefined}
              >
                <span>{shownSection(choice.designation)}</span>
                <span className="second">{choice.own ? 'own list' : ''}</span>
                <span className="second">{showMassPerMetre(choice.massPerMetre, units)}</span>
              </div>
            ))}
          </div>
          {offered.length === 0 && (
            <p className="section-none">None in this list; Enter looks in the others.</p>
          )}
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );

  if (!bare)
    return (
      <Row label={label} htmlFor={id} message={message} messageId={messageId}>
        {field}
      </Row>
    );
  return (
    <div className="bare-field">
      {field}
      {message !== null && (
        <p className="row-message" id={messageId} role="alert">
          {message}
        </p>
      )}
    </div>
  );
}

function notFound(wanted: string, nearest: readonly string[]): string {
  const near = nearest.length === 0 ? '' : ` Nearest: ${nearest.map(shownSection).join(', ')}.`;
  return `No stock list has “${wanted}”.${near} Pick one from the list, or add it to the own stock list. The old one stays.`;
}
