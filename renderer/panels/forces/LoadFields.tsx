import type { JSX } from 'react';
import type { Load, LoadCase } from '../../../core/project/actions.ts';
import type { Project } from '../../../core/project/model.ts';
import { loadUnits } from '../../../core/units/loadUnits.ts';
import { MM_PER_INCH } from '../../../core/units/unitSystem.ts';
import { IconButton } from '../../controls/IconButton.tsx';
import { LengthField } from '../../controls/LengthField.tsx';
import { NumberField } from '../../controls/NumberField.tsx';
import { SelectField } from '../../controls/SelectField.tsx';
import { CloseSign } from '../../glyphs/signs.tsx';
import { useActions } from '../../shell/services.tsx';
import { refusalText } from '../recipe/useRecipeEdit.ts';
import { AmountField, PlaceField, VectorFields } from './LoadParts.tsx';
import { usePlaces } from './usePlaces.ts';

interface LoadFieldsProps {
  readonly load: Load;
  readonly loadCase: LoadCase;
  readonly project: Project;
}

/** As the schema has them: kN, kN/m, kN/m², mm. */
const MOST = { force: 100_000, perLength: 100_000, pressure: 50, shortened: 200 } as const;

/** One load: what it acts on, and how much. Directions are those of the project, Z up. */
export function LoadFields({ load, loadCase, project }: LoadFieldsProps): JSX.Element {
  const actions = useActions();
  const { units } = project.settings;
  const { force, perLength } = loadUnits(units);
  const set = (changed: Load): string | null =>
    refusalText(actions.edit({ kind: 'load', loadCase: loadCase.id, id: load.id, load: changed }));
  const name = `${load.id} of ${loadCase.id}`;
  return (
    <li className="load" data-kind={load.kind}>
      <span className="load-word">
        {WORDS[load.kind]}
        {load.kind === 'node' && <small>{force.unit}</small>}
        {load.kind === 'line' && <small>{perLength.unit}</small>}
      </span>
      <Fields load={load} name={name} project={project} set={set} />
      <IconButton
        label={`Remove load ${name}`}
        onClick={() => actions.edit({ kind: 'load', loadCase: loadCase.id, id: load.id, load: null })}
      >
        <CloseSign />
      </IconButton>
    </li>
  );
}

const WORDS: Readonly<Record<Load['kind'], string>> = {
  node: 'force on',
  line: 'along',
  shortened: 'draws tight',
  gable: 'gable at',
  side: 'wall at',
  bowed: 'rafters of',
};

interface FieldsProps {
  readonly load: Load;
  readonly name: string;
  readonly project: Project;
  set(changed: Load): string | null;
}

function Fields({ load, name, project, set }: FieldsProps): JSX.Element {
  const places = usePlaces();
  const { units } = project.settings;
  const { force, perLength, pressure } = loadUnits(units);
  const bays = (kind: 'roof' | 'wall') =>
    project.bays
      .filter((bay) => bay.recipe.kind === kind)
      .map((bay) => ({ value: bay.id, label: bay.name === '' ? bay.id : `${bay.id} ${bay.name}` }));
  switch (load.kind) {
    case 'node':
      return (
        <>
          <PlaceField
            label={`Node of ${name}`}
            value={load.node}
            options={places.nodes}
            onChange={(node) => set({ ...load, node })}
          />
          <VectorFields
            label={`Force of ${name}`}
            value={load.force}
            of={force}
            most={MOST.force}
            onChange={(changed) => set({ ...load, force: changed })}
          />
        </>
      );
    case 'line':
      return (
        <>
          <PlaceField
            label={`Bar of ${name}`}
            value={load.bar}
            options={places.members}
            onChange={(bar) => set({ ...load, bar })}
          />
          <VectorFields
            label={`Load of ${name}`}
            value={load.perMetre}
            of={perLength}
            most={MOST.perLength}
            onChange={(perMetre) => set({ ...load, perMetre })}
          />
        </>
      );
    case 'shortened':
      return (
        <>
          <PlaceField
            label={`Bar of ${name}`}
            value={load.bar}
            options={places.diagonals}
            onChange={(bar) => set({ ...load, bar })}
          />
          <AmountField
            label={`Shorter than its place, ${name}`}
            value={load.by}
            of={
              units === 'us'
                ? { unit: 'in', shown: 1 / MM_PER_INCH, step: 1 / 32, decimals: 4 }
                : { unit: 'mm', shown: 1, step: 0.5, decimals: 2 }
            }
            most={MOST.shortened}
            onChange={(by) => set({ ...load, by })}
          />
        </>
      );
    case 'bowed':
      return (
        <>
          <PlaceField
            label={`Bay of ${name}`}
            value={load.bay}
            options={bays('roof')}
            onChange={(bay) => set({ ...load, bay })}
          />
          <AmountField
            label={`Squeeze in each rafter of ${name}`}
            value={load.squeeze}
            of={force}
            most={MOST.force}
            onChange={(squeeze) => set({ ...load, squeeze: Math.max(0, squeeze) })}
          />
          <NumberField
            bare
            label={`Rafters that lean on it, ${name}`}
            unit="rafters"
            value={load.rafters}
            least={1}
            most={1000}
            onChange={(rafters) => set({ ...load, rafters })}
          />
          <NumberField
            bare
            label={`Bracing gives its span over, ${name}`}
            unit="span/"
            value={load.gives}
            least={50}
            most={100_000}
            step={100}
            onChange={(gives) => set({ ...load, gives })}
          />
        </>
      );
    case 'gable':
    case 'side':
      return (
        <>
          <PlaceField
            label={`Bay of ${name}`}
            value={load.bay}
            options={bays(load.kind === 'gable' ? 'roof' : 'wall')}
            onChange={(bay) => set({ ...load, bay })}
          />
          <AmountField
            label={`Pressure of ${name}`}
            value={load.pressure}
            of={pressure}
            most={MOST.pressure}
            onChange={(changed) => set({ ...load, pressure: changed })}
          />
          {load.kind === 'gable' ? (
            <>
              <SelectField
                bare
                label={`Rafter of ${name}`}
                value={String(load.rafter)}
                options={[
                  { value: '1', label: 'on rafter 1' },
                  { value: '2', label: 'on rafter 2' },
                ]}
                onChange={(rafter) => set({ ...load, rafter: rafter === '2' ? 2 : 1 })}
              />
              <LengthField
                bare
                label={`Ground level of ${name}`}
                mm={load.ground}
                units={units}
                least={-1_000_000}
                most={1_000_000}
                onChange={(ground) => set({ ...load, ground })}
              />
            </>
          ) : (
            <LengthField
              bare
              label={`Width of wall of ${name}`}
              mm={load.width}
              units={units}
              most={1_000_000}
              onChange={(width) => set({ ...load, width })}
            />
          )}
        </>
      );
    default:
      return load satisfies never;
  }
}
