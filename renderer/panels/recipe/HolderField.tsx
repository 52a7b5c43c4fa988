import type { JSX } from 'react';
import type { LineHolder } from '../../../core/project/model.ts';
import { SelectField } from '../../controls/SelectField.tsx';
import { useWindow } from '../../shell/services.tsx';
import { shownProject } from '../../store/shown.ts';

interface HolderFieldProps {
  readonly line: string;
  /** The line's own bay. */
  readonly bay: string;
  readonly heldBy: LineHolder;
  onChange(heldBy: LineHolder): void;
}

/** What stops a purlin or rail from moving along itself: nothing, another bay it runs on to, or what the user vouches for. */
export function HolderField({ line, bay, heldBy, onChange }: HolderFieldProps): JSX.Element {
  const bays = useWindow((state) => shownProject(state).bays);
  const others = bays.filter(({ id }) => id !== bay);
  const value = heldBy.kind === 'bay' ? `bay ${heldBy.bay}` : heldBy.kind;
  return (
    <SelectField
      bare
      label={`What holds ${line} along itself`}
      value={value}
      options={[
        { value: 'nothing', label: 'nothing' },
        ...others.map(({ id, name }) => ({ value: `bay ${id}`, label: `${id} ${name}` })),
        { value: 'vouched', label: 'as I vouch' },
      ]}
      onChange={(chosen) => {
        const other = others.find(({ id }) => chosen === `bay ${id}`);
        if (other !== undefined) onChange({ kind: 'bay', bay: other.id });
        else if (chosen === 'vouched') onChange({ kind: 'vouched', reason: 'roof sheeting as a diaphragm' });
        else onChange({ kind: 'nothing' });
      }}
    />
  );
}
