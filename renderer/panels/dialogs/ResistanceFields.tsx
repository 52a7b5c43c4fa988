import type { JSX } from 'react';
import type { PracticeId, ResistanceSettings, Settings } from '../../../core/project/model.ts';
import { usualGrades } from '../../../core/resistance/grades.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { IconButton } from '../../controls/IconButton.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';

interface ResistanceFieldsProps {
  readonly settings: Settings;
  onChange(change: Partial<Settings>, what: string): string | null;
}

/** What the user may choose about resistances, as far as the practice leaves a choice. */
export function ResistanceFields({ settings, onChange }: ResistanceFieldsProps): JSX.Element {
  const chosen = settings.resistance ?? {};
  const set = (change: ResistanceSettings, what: string): string | null =>
    onChange({ resistance: { ...chosen, ...change } }, what);
  return (
    <>
      <h3>Strength</h3>
      <PracticeFields practice={settings.practice} chosen={chosen} set={set} />
      {DEDUCTS_PUNCHED.has(settings.practice) && (
        <div className="dialog-note">
          <CheckField
            label="Holes are punched full size"
            checked={chosen.punchedHoles ?? false}
            onChange={(punchedHoles) => set({ punchedHoles }, 'how holes are made')}
          />
        </div>
      )}
      <GradeFields settings={settings} onChange={onChange} />
    </>
  );
}

/** Practices whose net area knows the difference. */
const DEDUCTS_PUNCHED: ReadonlySet<PracticeId> = new Set(['as4100', 'is800']);

interface PracticeFieldsProps {
  readonly practice: PracticeId;
  readonly chosen: ResistanceSettings;
  set(change: ResistanceSettings, what: string): string | null;
}

function PracticeFields({ practice, chosen, set }: PracticeFieldsProps): JSX.Element | null {
  switch (practice) {
    case 'aisc360':
      return (
        <Segmented
          label="Method"
          value={chosen.method ?? 'LRFD'}
          options={[
            { value: 'LRFD', label: 'LRFD' },
            { value: 'ASD', label: 'ASD' },
          ]}
          onChange={(method) => set({ method }, 'the method')}
        />
      );
    case 'en1993':
      return (
        <>
          {GAMMAS.map(({ name, label, usual }) => (
            <NumberField
              key={name}
              label={label}
              value={chosen[name] ?? usual}
              least={0.8}
              most={2}
              step={0.05}
              decimals={2}
              onChange={(gamma) => set({ [name]: gamma }, `the partial factor ${label}`)}
            />
          ))}
          <Segmented
            label="Block of one leg"
            value={chosen.blockTearing ?? 'off the middle'}
            options={[
              { value: 'off the middle', label: 'Off the middle, (3.10)' },
              { value: 'through the middle', label: 'Through it, (3.9)' },
            ]}
            onChange={(blockTearing) => set({ blockTearing }, 'how a block tears')}
          />
        </>
      );
    case 'is800':
      return (
        <Segmented
          label="Gusset gives"
          value={chosen.gussetFixity ?? 'hinged'}
          options={[
            { value: 'fixed', label: 'Fixity, Table 12' },
            { value: 'hinged', label: 'A hinge' },
          ]}
          onChange={(gussetFixity) => set({ gussetFixity }, 'what the gusset gives')}
        />
      );
    case 'sans10162':
    case 'csaS16':
    case 'as4100':
      return null;
    default:
      return practice satisfies never;
  }
}

/** As EN 1993-1-1 6.1 and EN 1993-1-8 2.2 recommend; national annexes differ. */
const GAMMAS = [
  { name: 'gammaM0', label: 'γM0', usual: 1 },
  { name: 'gammaM1', label: 'γM1', usual: 1 },
  { name: 'gammaM2', label: 'γM2', usual: 1.25 },
] as const;

/** Steels that no list here has, by the name that the bays use. */
function GradeFields({ settings, onChange }: ResistanceFieldsProps): JSX.Element {
  const own = settings.ownGrades ?? [];
  const put = (k: number, change: Partial<(typeof own)[number]>): string | null =>
    onChange(
      { ownGrades: own.map((grade, index) => (index === k ? { ...grade, ...change } : grade)) },
      'an own grade',
    );
  return (
    <>
      <p className="dialog-note">
        Grades known under this practice: {usualGrades(settings.practice).join(', ')} and others. Any other is
        given here, by its name.
      </p>
      <ul className="own-grades">
        {own.map(({ grade, fy, fu }, k) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: a grade is known by its place while its name is typed
          <li key={k}>
            <TextField
              bare
              label={`Name of grade ${k + 1}`}
              value={grade}
              check={(text) => (text === '' ? 'Name the grade.' : null)}
              onChange={(name) => put(k, { grade: name })}
            />
            <NumberField
              bare
              label={`Yield stress of grade ${k + 1}, N/mm²`}
              unit="N/mm² yield"
              value={fy}
              least={100}
              most={1000}
              step={5}
              onChange={(to) => put(k, { fy: to })}
            />
            <NumberField
              bare
              label={`Tensile strength of grade ${k + 1}, N/mm²`}
              unit="N/mm² strength"
              value={fu}
              least={100}
              most={1500}
              step={5}
              onChange={(to) => put(k, { fu: to })}
            />
            <IconButton
              label={`Remove grade ${grade}`}
              onClick={() => onChange({ ownGrades: own.filter((_, index) => index !== k) }, 'own grades')}
            >
              <CloseSign />
            </IconButton>
          </li>
        ))}
      </ul>
      <button
        type="button"
        className="link-button"
        onClick={() =>
          onChange(
            { ownGrades: [...own, { grade: `steel ${own.length + 1}`, fy: 275, fu: 410 }] },
            'own grades',
          )
        }
      >
        Add a grade of my own
      </button>
    </>
  );
}
