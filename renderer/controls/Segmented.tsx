import { type JSX, type ReactNode, useId } from 'react';
import { Row } from './Row.tsx';

export interface SegmentOption<V extends string> {
  readonly value: V;
  readonly label: string;
  /** Drawn in place of the label, which stays the accessible name. */
  readonly sign?: ReactNode;
}

interface SegmentedProps<V extends string> {
  readonly label: string;
  readonly value: V | null;
  readonly options: readonly SegmentOption<V>[];
  readonly bare?: boolean;
  /** The value before a change on trial, drawn struck. */
  readonly was?: V | null;
  onChange(value: V): void;
}

/** A choice of few, side by side; arrow keys move the choice. */
export function Segmented<V extends string>(props: SegmentedProps<V>): JSX.Element {
  const { label, value, options, bare = false, was = null, onChange } = props;
  const name = useId();
  const group = (
    <div className="segments" role="radiogroup" aria-label={label}>
      {options.map((option) => (
        <label
          key={option.value}
          className="segment"
          data-was={option.value === was || undefined}
          title={option.sign === undefined ? undefined : option.label}
        >
          <input
            className="unseen"
            type="radio"
            name={name}
            value={option.value}
            checked={option.value === value}
            aria-label={option.label}
            onChange={() => onChange(option.value)}
          />
          {option.sign ?? <span>{option.label}</span>}
        </label>
      ))}
    </div>
  );
  return bare ? group : <Row label={label}>{group}</Row>;
}
