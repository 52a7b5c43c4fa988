import { type FormEvent, type JSX, useEffect, useId, useRef, useState } from 'react';
import type { LengthOverride, UnitSystem } from '../../../core/project/model.ts';
import type { Restraint } from '../../../core/restraint/model.ts';
import { AXES, type Axis } from '../../../core/section/model.ts';
import { lengthProblemText, parseLength, showLength } from '../../../core/units/quantity.ts';
import { SelectField } from '../../controls/SelectField.tsx';

interface OverrideFormProps {
  readonly restraint: Restraint | null;
  readonly units: UnitSystem;
  onTake(override: LengthOverride): string | null;
  onDone(): void;
}

/** Axis, length or factor, and the reason, without which it is not taken. */
export function OverrideForm({ restraint, units, onTake, onDone }: OverrideFormProps): JSX.Element {
  const id = useId();
  const [axis, setAxis] = useState<Axis>(
    restraint === null || restraint.governing.axis === 'free' ? 'y' : restraint.governing.axis,
  );
  const [length, setLength] = useState('');
  const [factor, setFactor] = useState('1');
  const [reason, setReason] = useState('');
  const [message, setMessage] = useState<string | null>(null);
  const form = useRef<HTMLFormElement>(null);
  // It unfolds at the foot of the card, below what is seen of it.
  useEffect(() => form.current?.scrollIntoView({ block: 'nearest' }), []);
  const found = restraint?.lanes[axis].found ?? null;

  const submit = (event: FormEvent): void => {
    event.preventDefault();
    const read = readOverride({ axis, length, factor, reason }, units);
    const refused = typeof read === 'string' ? read : onTake(read);
    setMessage(refused);
    if (refused === null) onDone();
  };

  return (
    <form ref={form} className="override-form" onSubmit={submit} noValidate>
      <SelectField<Axis>
        label="About axis"
        value={axis}
        options={AXES.map((each) => ({ value: each, label: each }))}
        onChange={setAxis}
      />
      <div className="row">
        <label className="row-label" htmlFor={`${id}-length`}>
          Length
        </label>
        <div className="field">
          <input
            id={`${id}-length`}
            className="field-text"
            autoComplete="off"
            placeholder={found === null ? '' : `${showLength(found, units)} found; empty keeps it`}
            value={length}
            onChange={(event) => setLength(event.target.value)}
          />
        </div>
      </div>
      <div className="row">
        <label className="row-label" htmlFor={`${id}-factor`}>
          Factor K
        </label>
        <div className="field">
          <input
            id={`${id}-factor`}
            className="field-text"
            inputMode="decimal"
            autoComplete="off"
            value={factor}
            onChange={(event) => setFactor(event.target.value)}
          />
        </div>
      </div>
      <div className="row">
        <label className="row-label" htmlFor={`${id}-reason`}>
          Reason
        </label>
        <div className="field">
          <input
            id={`${id}-reason`}
            className="field-text"
            autoComplete="off"
            placeholder="shown in every output"
            value={reason}
            onChange={(event) => setReason(event.target.value)}
          />
        </div>
      </div>
      {message !== null && (
        <p className="row-message" role="alert">
          {message}
        </p>
      )}
      <div className="override-buttons">
        <button type="submit" className="button">
          Take it
        </button>
        <button type="button" className="link-button" onClick={onDone}>
          Leave it
        </button>
      </div>
    </form>
  );
}

interface Typed {
  readonly axis: Axis;
  readonly length: string;
  readonly factor: string;
  readonly reason: string;
}

/** The override, or why it cannot be taken. */
function readOverride({ axis, length, factor, reason }: Typed, units: UnitSystem): LengthOverride | string {
  if (reason.trim() === '') return 'Give the reason: every output shows it, and the checker will ask.';
  const k = Number(factor.replace(',', '.'));
  if (!(k > 0) || k > 10) return 'The factor must be a number above 0, 1 as a rule.';
  if (length.trim() === '') {
    if (k === 1) return 'Give a length, or a factor other than 1.';
    return { axis, length: null, factor: k, reason: reason.trim() };
  }
  const parsed = parseLength(length, units);
  if (!parsed.ok) return lengthProblemText(parsed.problem, units);
  if (parsed.mm <= 0) return 'The length must be above nought.';
  return { axis, length: parsed.mm, factor: k, reason: reason.trim() };
}
