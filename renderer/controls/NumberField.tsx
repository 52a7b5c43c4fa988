import { type JSX, useId } from 'react';
import { Row } from './Row.tsx';
import { SteppedInput } from './SteppedInput.tsx';
import { type Reading, useDraft } from './useDraft.ts';

export interface NumberFieldProps {
  readonly label: string;
  readonly value: number;
  readonly unit?: string;
  readonly least: number;
  readonly most: number;
  readonly step?: number;
  /** Decimals shown; 0 takes whole numbers alone. */
  readonly decimals?: number;
  readonly bare?: boolean;
  onChange(value: number): string | null;
}

export function NumberField(props: NumberFieldProps): JSX.Element {
  const { label, value, unit = '', least, most, step = 1, decimals = 0, bare = false, onChange } = props;
  const id = useId();
  const messageId = `${id}-message`;
  const shown = shownNumber(value, decimals);
  const draft = useDraft(shown, (text) => readNumber(text, props), onChange);
  const onStep = (steps: number): void => {
    if (draft.editing) draft.commit(false);
    const next = Math.min(most, Math.max(least, rounded(value + steps * step, decimals)));
    if (next !== value) draft.refuse(onChange(next));
  };
  const input = (
    <SteppedInput
      id={id}
      {...(bare ? { name: label } : {})}
      draft={draft}
      unit={unit}
      value={value}
      valueText={unit === '' ? shown : `${shown} ${unit}`}
      messageId={messageId}
      onStep={onStep}
    />
  );
  if (!bare)
    return (
      <Row label={label} htmlFor={id} message={draft.message} messageId={messageId}>
        {input}
      </Row>
    );
  return (
    <div className="bare-field">
      {input}
      {draft.message !== null && (
        <p className="row-message" id={messageId} role="alert">
          {draft.message}
        </p>
      )}
    </div>
  );
}

function shownNumber(value: number, decimals: number): string {
  return value.toFixed(decimals).replace('-', '−');
}

function rounded(value: number, decimals: number): number {
  return Number(value.toFixed(decimals));
}

function readNumber(
  text: string,
  { least, most, decimals = 0, unit = '' }: NumberFieldProps,
): Reading<number> {
  const plain = text.replace('−', '-').replace(',', '.').replace(unit, '').trim();
  const value = Number(plain);
  const range = `from ${shownNumber(least, 0)} to ${shownNumber(most, 0)}${unit === '' ? '' : ` ${unit}`}`;
  if (plain === '' || !Number.isFinite(value)) return { ok: false, message: `Type a number ${range}.` };
  if (decimals === 0 && !Number.isInteger(value))
    return { ok: false, message: `Type a whole number ${range}.` };
  if (value < least || value > most) return { ok: false, message: `Type a number ${range}.` };
  return { ok: true, value };
}
