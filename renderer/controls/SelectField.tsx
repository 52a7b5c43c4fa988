import { type JSX, useId } from 'react';
import { StepSign } from '../glyphs/signs.tsx';
import { Row } from './Row.tsx';

export interface SelectOption<V extends string> {
  readonly value: V;
  readonly label: string;
}

interface SelectFieldProps<V extends string> {
  readonly label: string;
  readonly value: V;
  readonly options: readonly SelectOption<V>[];
  readonly bare?: boolean;
  onChange(value: V): void;
}

/** A choice of many from a list. */
export function SelectField<V extends string>({
  label,
  value,
  options,
  bare = false,
  onChange,
}: SelectFieldProps<V>): JSX.Element {
  const id = useId();
  const select = (
    <div className="field">
      <select
        id={id}
        className="field-select"
        aria-label={bare ? label : undefined}
        value={value}
        onChange={(event) => {
          const chosen = options.find((option) => option.value === event.target.value);
          if (chosen !== undefined) onChange(chosen.value);
        }}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
      <span className="field-drop">
        <StepSign up={false} />
      </span>
    </div>
  );
  return bare ? (
    select
  ) : (
    <Row label={label} htmlFor={id}>
      {select}
    </Row>
  );
}
