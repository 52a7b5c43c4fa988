import type { JSX } from 'react';
import type { Bay, Place, UnitSystem } from '../../../core/project/model.ts';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { Row } from '../../controls/Row.tsx';
import { TextField } from '../../controls/TextField.tsx';
import { useActions, useWindow } from '../../shell/services.tsx';
import { presentProject } from '../../store/shown.ts';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { DialogFrame } from './DialogFrame.tsx';

/** A bay's name, how many are built, and where it stands. */
export function BayDialog({ bayId }: { readonly bayId: string }): JSX.Element | null {
  const actions = useActions();
  const bays = useWindow((state) => presentProject(state).bays);
  const units = useWindow((state) => presentProject(state).settings.units);
  const trying = useWindow((state) => state.trying !== null);
  const bay = bays.find(({ id }) => id === bayId);
  if (bay === undefined) return null;
  const rename = (to: string): string | null => {
    const refused = refusalText(actions.edit({ kind: 'rename bay', bay: bay.id, to }));
    if (refused === null) actions.openDialog({ kind: 'bay', bay: to });
    return refused;
  };
  return (
    <DialogFrame title={`Name and place of ${bay.id}`} onClose={actions.closeDialog}>
      <fieldset key={bay.id} disabled={trying}>
        <legend className="unseen">Name and place of {bay.id}</legend>
        <TextField
          label="Short name"
          value={bay.id}
          check={(text) => idProblem(text, bay, bays)}
          onChange={rename}
        />
        <TextField
          label="Name"
          value={bay.name}
          onChange={(name) =>
            refusalText(actions.edit({ kind: 'bay', bay: bay.id, change: { name } }, `Name ${bay.id}`))
          }
        />
        <NumberField
          label="Number off"
          value={bay.numberOff}
          least={1}
          most={1000}
          onChange={(numberOff) =>
            refusalText(
              actions.edit(
                { kind: 'bay', bay: bay.id, change: { numberOff } },
                `Change the number of ${bay.id}`,
              ),
            )
          }
        />
        <PlaceFields bay={bay} units={units} />
      </fieldset>
    </DialogFrame>
  );
}

const AXES = ['X', 'Y', 'Z'] as const;

function PlaceFields({ bay, units }: { readonly bay: Bay; readonly units: UnitSystem }): JSX.Element {
  const actions = useActions();
  const { origin, turn } = bay.place;
  const put = (place: Place): string | null =>
    refusalText(actions.edit({ kind: 'bay', bay: bay.id, change: { place } }, `Move ${bay.id}`));
  return (
    <>
      <Row label="Stands at">
        <div className="place-fields">
          {AXES.map((axis, index) => (
            <LengthField
              key={axis}
              bare
              label={`${axis} of the origin`}
              mm={origin[index] ?? 0}
              units={units}
              least={-1e6}
              onChange={(mm) => {
                const [x = 0, y = 0, z = 0] = origin.map((old, place) => (place === index ? mm : old));
                return put({ origin: [x, y, z], turn });
              }}
            />
          ))}
        </div>
      </Row>
      <NumberField
        label="Turned by"
        value={turn}
        unit="°"
        least={-360}
        most={360}
        step={15}
        decimals={1}
        onChange={(to) => put({ origin, turn: to })}
      />
      <p className="dialog-note">
        X, Y across and along the building, Z up. The turn is anticlockwise seen from above.
      </p>
    </>
  );
}

function idProblem(text: string, bay: Bay, bays: readonly Bay[]): string | null {
  if (!/^[A-Za-z0-9_-]+$/.test(text)) return 'Use letters, digits, hyphen and underscore, such as W1.';
  if (bays.some(({ id }) => id === text && id !== bay.id)) return `${text} is taken by another bay.`;
  return null;
}
