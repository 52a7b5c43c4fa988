import type { JSX } from 'react';
import type { Vec3 } from '../../../core/geometry/vector.ts';
import type { LoadUnit } from '../../../core/units/loadUnits.ts';
import { NumberField } from '../../controls/NumberField.tsx';
import { SelectField, type SelectOption } from '../../controls/SelectField.tsx';

interface PlaceFieldProps {
  readonly label: string;
  readonly value: string;
  readonly options: readonly SelectOption<string>[];
  onChange(place: string): void;
}

/** What a load acts on. A place that is not there any more stays in the list, so that nothing changes unasked. */
export function PlaceField({ label, value, options, onChange }: PlaceFieldProps): JSX.Element {
  const there = options.some((option) => option.value === value);
  const offered = there ? options : [{ value, label: `${value} (not there)` }, ...options];
  return <SelectField bare label={label} value={value} options={offered} onChange={onChange} />;
}

interface AmountFieldProps {
  readonly label: string;
  /** As kept: kN, kN/m or kN/m². */
  readonly value: number;
  readonly of: LoadUnit;
  /** As kept, either way. */
  readonly most: number;
  /** In place of the unit. */
  readonly mark?: string;
  onChange(value: number): string | null;
}

/** How much, typed in the units of the project. */
export function AmountField({ label, value, of, most, mark, onChange }: AmountFieldProps): JSX.Element {
  return (
    <NumberField
      bare
      label={`${label}, ${of.unit}`}
      unit={mark ?? of.unit}
      value={value * of.shown}
      least={-most * of.shown}
      most={most * of.shown}
      step={of.step}
      decimals={of.decimals}
      onChange={(typed) => onChange(typed / of.shown)}
    />
  );
}

interface VectorFieldsProps {
  readonly label: string;
  readonly value: Vec3;
  readonly of: LoadUnit;
  readonly most: number;
  onChange(value: Vec3): string | null;
}

const AXES = ['X', 'Y', 'Z'] as const;

/** Three amounts along the axes of the project. */
export function VectorFields({ label, value, of, most, onChange }: VectorFieldsProps): JSX.Element {
  const [x, y, z] = value;
  const replaced = (k: number, part: number): Vec3 => [
    k === 0 ? part : x,
    k === 1 ? part : y,
    k === 2 ? part : z,
  ];
  return (
    <>
      {AXES.map((axis, k) => (
        <AmountField
          key={axis}
          label={`${label} along ${axis}`}
          mark={axis}
          value={value[k] ?? 0}
          of={of}
          most={most}
          onChange={(part) => onChange(replaced(k, part))}
        />
      ))}
    </>
  );
}
