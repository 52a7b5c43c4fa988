import type { JSX } from 'react';
import { memberPlates } from '../../../core/frame/memberPlates.ts';
import type { Member, UnitSystem } from '../../../core/project/model.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { TextField } from '../../controls/TextField.tsx';

interface MemberFieldsProps {
  /** "Columns". */
  readonly word: string;
  readonly member: Member;
  readonly units: UnitSystem;
  /** Checked for what squeezes it: its steel matters. */
  readonly checked?: boolean;
  onChange(member: Member): string | null;
}

const SHAPES: readonly { readonly value: Member['shape']; readonly label: string }[] = [
  { value: 'I', label: 'I section' },
  { value: 'channel', label: 'channel' },
  { value: 'tube', label: 'tube' },
  { value: 'zed', label: 'zed' },
];

/** What the frame is made of, beside the diagonals. */
export function MemberFields({
  word,
  member,
  units,
  checked = false,
  onChange,
}: MemberFieldsProps): JSX.Element {
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
        onChange={(shape) => onChange(withUsualPlates({ ...member, shape }))}
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
      <PlateFields member={member} units={units} onChange={onChange} />
      {checked && (
        <TextField
          label="Grade"
          value={member.grade ?? ''}
          placeholder="as the diagonals"
          onChange={(grade) => onChange(withGrade(member, grade))}
        />
      )}
    </fieldset>
  );
}

function PlateFields({
  member,
  units,
  onChange,
}: Pick<MemberFieldsProps, 'member' | 'units' | 'onChange'>): JSX.Element {
  const { web, flange } = memberPlates(member);
  const usual = member.web === undefined && member.flange === undefined;
  const plated = member.shape === 'I' || member.shape === 'channel';
  const shared = { units, least: 0.5, most: 200, step: 0.5, small: true } as const;
  return (
    <>
      <div className="recipe-checks">
        <CheckField
          label="Usual thicknesses for its size"
          checked={usual}
          onChange={(wanted) =>
            onChange(
              wanted
                ? withUsualPlates(member)
                : { ...member, web: rounded(web), ...(plated ? { flange: rounded(flange) } : {}) },
            )
          }
        />
      </div>
      {!usual && (
        <LengthField
          {...shared}
          label={plated ? 'Web' : 'Wall'}
          mm={web}
          onChange={(mm) => onChange({ ...member, web: mm })}
        />
      )}
      {!usual && plated && (
        <LengthField
          {...shared}
          label="Flange"
          mm={flange}
          onChange={(mm) => onChange({ ...member, flange: mm })}
        />
      )}
    </>
  );
}

/** To a tenth of a millimetre, as tables have them. */
const rounded = (mm: number): number => Math.round(10 * mm) / 10;

function withUsualPlates({ web: _web, flange: _flange, ...rest }: Member): Member {
  return rest;
}

function withGrade({ grade: _grade, ...rest }: Member, grade: string): Member {
  return grade === '' ? rest : { ...rest, grade };
}
