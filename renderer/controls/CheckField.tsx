import type { JSX } from 'react';

interface CheckFieldProps {
  readonly label: string;
  readonly checked: boolean;
  onChange(checked: boolean): void;
}

export function CheckField({ label, checked, onChange }: CheckFieldProps): JSX.Element {
  return (
    <label className="check">
      <input type="checkbox" checked={checked} onChange={(event) => onChange(event.target.checked)} />
      <span>{label}</span>
    </label>
  );
}
