import type { JSX } from 'react';
import type { Member, UnitSystem } from '../../../core/project/model.ts';
import { LengthField } from '../../controls/LengthField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { TextField } from '../../controls/TextField.tsx';

interface MemberFieldsProps {
  /** "Columns". */
  readonly word: string;
  readonly member: Member;
  readonly units: UnitSystem;
  onChange(member: Member): string | null;
}

const SHAPES: readonly { readonly value: Member['shape']; readonly label: string }[] = [
  { value: 'I', label: 'I section' },
  { value: 'channel', label: 'channel' },
  { value: 'tube', label: 'tube' },
  { value: 'zed', label: 'zed' },
];

/** A member that is drawn to size and not checked. */
export function MemberFields({ word, member, units, onChange }: MemberFieldsProps): JSX.Element {
  return (
    <fieldset className="member">
      <legend className="member-name">{word}</legend>
      <TextField
        label="Name"
        value={member.name}
        check={(text) => (text === '' ? 'A member needs a name.' : null)}
        onChange={(name) => onChange({ ...member, name })}
      />
      <SelectField
        label="Shape"
        value={member.shape}
        options={SHAPES}
        onChange={(shape) => onChange({ ...member, shape })}
      />
      <LengthField
        label="Depth"
        mm={member.depth}
        units={units}
        least={10}
        most={3000}
        step={10}
        small
        onChange={(depth) => onChange({ ...member, depth })}
      />
      <LengthField
        label="Width"
        mm={member.width}
        units={units}
        least={10}
        most={2000}
        step={10}
        small
        onChange={(width) => onChange({ ...member, width })}
      />
    </fieldset>
  );
}
