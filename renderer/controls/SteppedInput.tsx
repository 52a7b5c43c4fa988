import type { JSX, KeyboardEvent } from 'react';
import { StepSign } from '../glyphs/signs.tsx';
import type { Draft } from './useDraft.ts';

interface SteppedInputProps {
  readonly id: string;
  /** Accessible name where no label stands beside it. */
  readonly name?: string;
  readonly draft: Draft;
  readonly unit: string;
  readonly value: number | null;
  readonly valueText: string;
  readonly messageId: string;
  readonly left?: boolean;
  /** What stands behind the figure that is shown; null where that is all. */
  readonly title?: string | null;
  /** A step up or down, ten of them with page keys; the draft is handed on first. */
  onStep(steps: number): void;
}

const STEPS: Readonly<Record<string, number>> = { ArrowUp: 1, ArrowDown: -1, PageUp: 10, PageDown: -10 };

/** A number to type, with steps by arrow keys and by two small buttons. */
export function SteppedInput(props: SteppedInputProps): JSX.Element {
  const { id, name, draft, unit, value, valueText, messageId, left = false, title = null, onStep } = props;
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>): void => {
    const steps = STEPS[event.key];
    if (steps !== undefined) {
      event.preventDefault();
      onStep(steps);
    } else if (event.key === 'Enter') draft.commit(false);
    else if (event.key === 'Escape' && (draft.editing || draft.message !== null)) {
      event.stopPropagation();
      draft.drop();
    }
  };
  return (
    <div className="field" data-refused={draft.message !== null || undefined}>
      <input
        id={id}
        className={left ? 'field-text' : 'field-number'}
        role="spinbutton"
        aria-label={name}
        title={title ?? undefined}
        aria-valuenow={value ?? undefined}
        aria-valuetext={valueText}
        aria-invalid={draft.message !== null || undefined}
        aria-describedby={draft.message === null ? undefined : messageId}
        autoComplete="off"
        spellCheck={false}
        value={draft.text}
        onChange={(event) => draft.type(event.target.value)}
        onFocus={(event) => event.target.select()}
        onBlur={() => draft.commit(true)}
        onKeyDown={onKeyDown}
      />
      {unit !== '' && <span className="field-unit">{unit}</span>}
      <span className="field-steps" aria-hidden="true">
        <button type="button" tabIndex={-1} onClick={() => onStep(1)}>
          <StepSign up />
        </button>
        <button type="button" tabIndex={-1} onClick={() => onStep(-1)}>
          <StepSign up={false} />
        </button>
      </span>
    </div>
  );
}
