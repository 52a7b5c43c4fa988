import type { JSX } from 'react';
import type { CatalogueId } from '../../../core/catalogue/model.ts';
import type { MemberClass, Practice } from '../../../core/practice/model.ts';
import { PRACTICES, practiceFor } from '../../../core/practice/practices.ts';
import { endFixityOf } from '../../../core/project/endFixity.ts';
import type { Settings } from '../../../core/project/model.ts';
import { CheckField } from '../../controls/CheckField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Segmented } from '../../controls/Segmented.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { presentProject } from '../../store/shown.ts';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { DialogFrame } from './DialogFrame.tsx';
import { ResistanceFields } from './ResistanceFields.tsx';

const STOCK_LISTS: readonly { readonly value: CatalogueId; readonly label: string }[] = [
  { value: 'en', label: 'European, EN 10056-1' },
  { value: 'us', label: 'US, L shapes' },
  { value: 'au', label: 'Australian, AS/NZS 3679.1' },
];

/** What holds for the whole project. Every change is a step that can be undone. */
export function SettingsDialog(): JSX.Element {
  const actions = useActions();
  const project = useWindow(presentProject);
  const trying = useWindow((state) => state.trying !== null);
  const { settings } = project;
  const practice = practiceFor(settings.practice);
  const set = (change: Partial<Settings>, what: string): string | null =>
    refusalText(actions.edit({ kind: 'settings', change }, `Change ${what}`));
  return (
    <DialogFrame title="Project settings" onClose={actions.closeDialog}>
      <fieldset disabled={trying}>
        <legend className="unseen">Project settings</legend>
        <TextField
          label="Name"
          value={project.name}
          check={(text) => (text === '' ? 'A project needs a name.' : null)}
          onChange={(name) => refusalText(actions.edit({ kind: 'name project', name }))}
        />
        <h3>Slenderness</h3>
        <SelectField
          label="Practice"
          value={settings.practice}
          options={Object.values(PRACTICES).map(({ id, name }) => ({ value: id, label: name }))}
          onChange={(to) => set({ practice: to, memberClass: null }, 'the practice')}
        />
        <PracticeNote practice={practice} />
        <ClassField
          practice={practice}
          settings={settings}
          onChange={(memberClass) => set({ memberClass }, 'the class of member')}
        />
        <LimitFields practice={practice} settings={settings} onChange={set} />
        <Segmented
          label="Lengths between"
          value={settings.lengthBasis}
          options={[
            { value: 'set-out', label: 'Set-out points' },
            { value: 'connections', label: 'Connection centres' },
          ]}
          onChange={(lengthBasis) => set({ lengthBasis }, 'what lengths run between')}
        />
        <EndFixityFields settings={settings} onChange={set} />
        <SagFields settings={settings} onChange={set} />
        <ResistanceFields settings={settings} onChange={set} />
        <h3>Stock and units</h3>
        <SelectField
          label="Stock list"
          value={settings.catalogue}
          options={STOCK_LISTS}
          onChange={(catalogue) => set({ catalogue }, 'the stock list')}
        />
        <Segmented
          label="Units"
          value={settings.units}
          options={[
            { value: 'metric', label: 'mm, kg' },
            { value: 'us', label: 'ft-in, lb' },
          ]}
          onChange={(units) => set({ units }, 'the units')}
        />
      </fieldset>
    </DialogFrame>
  );
}

const STANDINGS: Readonly<Record<Practice['standing'], string>> = {
  shall: 'a requirement',
  advice: 'advice, not a requirement',
  none: 'gives no limit: your own is taken',
};

function PracticeNote({ practice }: { readonly practice: Practice }): JSX.Element {
  return (
    <div className="dialog-note">
      <p>
        Edition {practice.edition}; {STANDINGS[practice.standing]}. {practice.note}
      </p>
      <ul>
        {[...practice.tension, ...practice.compression].map((member) => (
          <li key={member.id}>
            {member.name}: {member.limit ?? 'no limit'}, {member.clause}{' '}
            <span className={member.confidence === 'from memory, verify' ? 'verify' : undefined}>
              ({member.confidence})
            </span>
          </li>
        ))}
      </ul>
    </div>
  );
}

interface ClassFieldProps {
  readonly practice: Practice;
  readonly settings: Settings;
  onChange(memberClass: string): void;
}

/** Only where the practice tells several classes of member in tension apart. */
function ClassField({ practice, settings, onChange }: ClassFieldProps): JSX.Element | null {
  const classes: readonly MemberClass[] = practice.tension;
  const [first] = classes;
  if (first === undefined || classes.length < 2) return null;
  return (
    <SelectField
      label="Class of member"
      value={classes.find(({ id }) => id === settings.memberClass)?.id ?? first.id}
      options={classes.map(({ id, name, limit }) => ({
        value: id,
        label: `${name}${limit === null ? '' : `, ${limit}`}`,
      }))}
      onChange={onChange}
    />
  );
}

interface SetProps {
  readonly settings: Settings;
  onChange(change: Partial<Settings>, what: string): string | null;
}

function LimitFields({
  practice,
  settings,
  onChange,
}: SetProps & { readonly practice: Practice }): JSX.Element {
  const noneGiven = practice.standing === 'none';
  return (
    <>
      <div className="dialog-note">
        <CheckField
          label={
            noneGiven ? 'A limit of my own in place of 300' : 'A limit of my own in place of the practice’s'
          }
          checked={settings.ownLimit !== null}
          onChange={(own) => onChange({ ownLimit: own ? 300 : null }, 'the own limit')}
        />
      </div>
      {settings.ownLimit !== null && (
        <NumberField
          label="Own limit on L/r"
          value={settings.ownLimit}
          least={50}
          most={1000}
          step={10}
          onChange={(ownLimit) => onChange({ ownLimit }, 'the own limit')}
        />
      )}
    </>
  );
}

const TURNING = [
  { value: 'stiff', label: 'Stiff' },
  { value: 'hinged', label: 'A hinge' },
] as const;

/** How ends turn in the push test and the critical loads; the rule by the marks takes them as hinges in any case. */
function EndFixityFields({ settings, onChange }: SetProps): JSX.Element {
  const ends = endFixityOf(settings);
  return (
    <>
      <Segmented
        label="Ends, in the plane"
        value={ends.inPlane}
        options={TURNING}
        onChange={(inPlane) => onChange({ endFixity: { ...ends, inPlane } }, 'how ends turn in the plane')}
      />
      <Segmented
        label="Ends, out of the plane"
        value={ends.outOfPlane}
        options={TURNING}
        onChange={(outOfPlane) =>
          onChange({ endFixity: { ...ends, outOfPlane } }, 'how ends turn out of the plane')
        }
      />
    </>
  );
}

function SagFields({ settings, onChange }: SetProps): JSX.Element {
  return (
    <>
      <div className="dialog-note">
        <CheckField
          label="Look at sag under own weight"
          checked={settings.sagRatio !== null}
          onChange={(look) => onChange({ sagRatio: look ? 200 : null }, 'the sag that is allowed')}
        />
      </div>
      {settings.sagRatio !== null && (
        <NumberField
          label="Sag allowed: length /"
          value={settings.sagRatio}
          least={50}
          most={2000}
          step={10}
          onChange={(sagRatio) => onChange({ sagRatio }, 'the sag that is allowed')}
        />
      )}
    </>
  );
}
